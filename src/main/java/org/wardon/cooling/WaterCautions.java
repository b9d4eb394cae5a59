package org.wardon.cooling;

import java.util.ArrayList;
import java.util.List;
import org.wardon.air.MoistAir;
import org.wardon.produce.Caution;
import org.wardon.produce.Caution.Level;
import org.wardon.produce.Reason;
import org.wardon.produce.Reason.Argument;

/** What a keeper must hear of water on faces before it runs. */
final class WaterCautions {
    /** Legionella grows in water between these, °C. Source: from memory of WHO 2007, Legionella. */
    private static final double LEGIONELLA_FROM_C = 20;

    private static final double LEGIONELLA_TO_C = 45;

    /** Water must be this much colder than the setting to hold it (assumption), K. */
    private static final double COLDER_K = 1;

    private static final String PRACTICE = "common-practice";
    private static final String OWN_RULE = "assumption";

    private WaterCautions() {}

    /** {@code standing-water}: what is poured must not stand about. */
    static List<Caution> of(WettedWall wall, String chamberId) {
        return wall.waterKgPerDay() > 0
                ? List.of(caution(Level.CAUTION, "standing-water", chamberId, PRACTICE))
                : List.of();
    }

    /**
     * {@code wet-floor}, {@code water-near-electricity}, {@code water-grows-legionella}, {@code
     * water-too-warm}, {@code jacket-drips}.
     */
    static List<Caution> of(WaterFilm film, Setting setting, String chamberId, double pressurePa) {
        List<Caution> cautions = new ArrayList<>();
        if (film.flowKgS() <= 0) {
            return cautions;
        }
        cautions.add(caution(Level.CAUTION, "wet-floor", chamberId, PRACTICE));
        if (film.needsPower()) {
            cautions.add(caution(Level.CAUTION, "water-near-electricity", chamberId, PRACTICE));
        }
        double coldest = film.coldestC();
        double warmest = film.warmestC();
        if (film.open() && warmest >= LEGIONELLA_FROM_C) {
            cautions.add(
                    caution(
                            Level.CAUTION,
                            "water-grows-legionella",
                            chamberId,
                            PRACTICE,
                            Argument.of(warmest, "C"),
                            Argument.of(LEGIONELLA_FROM_C, "C"),
                            Argument.of(LEGIONELLA_TO_C, "C")));
        }
        if (coldest > setting.temperatureC() - COLDER_K) {
            cautions.add(
                    caution(
                            Level.CAUTION,
                            "water-too-warm",
                            chamberId,
                            OWN_RULE,
                            Argument.of(coldest, "C"),
                            Argument.of(setting.temperatureC(), "C")));
        }
        if (!film.open()) {
            drips(setting, chamberId, pressurePa, coldest, cautions);
        }
        return cautions;
    }

    private static void drips(
            Setting setting,
            String chamberId,
            double pressurePa,
            double coldestC,
            List<Caution> cautions) {
        double ratio =
                MoistAir.humidityRatioAt(
                        setting.temperatureC(),
                        Math.max(setting.humidityPct(), 1) / 100,
                        pressurePa);
        double dew = MoistAir.dewPointC(ratio, pressurePa);
        if (coldestC < dew) {
            cautions.add(
                    caution(
                            Level.NOTE,
                            "jacket-drips",
                            chamberId,
                            PRACTICE,
                            Argument.of(coldestC, "C"),
                            Argument.of(dew, "C")));
        }
    }

    private static Caution caution(
            Level level, String code, String chamberId, String source, Argument... arguments) {
        return new Caution(level, Reason.about(code, chamberId, source, arguments));
    }
}

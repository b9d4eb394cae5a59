package org.wardon.cooling;

import java.util.ArrayList;
import java.util.List;
import org.wardon.produce.Caution;
import org.wardon.produce.Caution.Level;
import org.wardon.produce.Reason;
import org.wardon.produce.Reason.Argument;

/**
 * What a keeper must hear of a cooler before it runs: it will ice up, cannot follow, or is
 * misstated.
 */
public final class CoolerCautions {
    /** Air below this needs a defrost, °C. Common practice, no source. */
    private static final double ICES_BELOW_C = 4;

    /** Fraction of Carnot of real machines. Source: table of cooling sources, 0.35 to 0.65. */
    private static final double LEAST_CARNOT = 0.35;

    private static final double MOST_CARNOT = 0.65;

    /**
     * Rated coil colder than its air by more than this is too small for its unit, K (assumption).
     */
    private static final double WIDEST_DIFFERENCE_K = 15;

    /** Air nearer to the melting point than this takes hardly anything from it, K (assumption). */
    private static final double LEAST_ABOVE_ICE_K = 2;

    private CoolerCautions() {}

    /**
     * Returns the cautions of a cooler at its setting: {@code ices-up}, {@code control-too-warm},
     * {@code rating-unlikely}, {@code coil-small} of a compressor, {@code pad-water} of a pad,
     * {@code night-air-rain} of night air, {@code ice-handling} and {@code ice-too-warm} of ice.
     *
     * @param cooler the cooler
     * @param setting what the keeper dialled in
     * @param chamberId the chamber, subject of the reasons
     * @param pressurePa air pressure of the site, Pa
     * @return the cautions, may be empty
     */
    public static List<Caution> of(
            Cooler cooler, Setting setting, String chamberId, double pressurePa) {
        return cooler.match(
                new Cooler.Kinds<>() {
                    @Override
                    public List<Caution> compressor(Compressor unit) {
                        List<Caution> cautions = new ArrayList<>();
                        follows(unit, setting, chamberId, cautions);
                        rating(unit, chamberId, pressurePa, cautions);
                        return cautions;
                    }

                    @Override
                    public List<Caution> wettedWall(WettedWall wall) {
                        return WaterCautions.of(wall, chamberId);
                    }

                    @Override
                    public List<Caution> waterFilm(WaterFilm film) {
                        return WaterCautions.of(film, setting, chamberId, pressurePa);
                    }

                    @Override
                    public List<Caution> evaporativePad(EvaporativePad pad) {
                        return List.of(
                                caution(Level.CAUTION, "pad-water", chamberId, "common-practice"));
                    }

                    @Override
                    public List<Caution> nightAir(NightAir fan) {
                        return List.of(
                                caution(
                                        Level.NOTE,
                                        "night-air-rain",
                                        chamberId,
                                        "common-practice"));
                    }

                    @Override
                    public List<Caution> iceBank(IceBank bank) {
                        return ice(bank, setting, chamberId);
                    }
                });
    }

    private static List<Caution> ice(IceBank bank, Setting setting, String chamberId) {
        List<Caution> cautions = new ArrayList<>();
        cautions.add(caution(Level.CAUTION, "ice-handling", chamberId, "common-practice"));
        double warmerK = setting.temperatureC() - bank.material().meltC();
        if (warmerK < LEAST_ABOVE_ICE_K) {
            cautions.add(
                    caution(
                            Level.CAUTION,
                            "ice-too-warm",
                            chamberId,
                            "assumption",
                            Argument.of(bank.material().meltC(), "C"),
                            Argument.of(setting.temperatureC(), "C")));
        }
        return cautions;
    }

    private static void follows(
            Compressor unit, Setting setting, String chamberId, List<Caution> cautions) {
        double kept = Thermostat.followedC(setting, unit.lowestC());
        if (kept < ICES_BELOW_C && unit.defrost().isEmpty()) {
            cautions.add(
                    caution(
                            Level.CAUTION,
                            "ices-up",
                            chamberId,
                            "common-practice",
                            Argument.of(kept, "C"),
                            Argument.of(ICES_BELOW_C, "C")));
        }
        if (kept > setting.temperatureC()) {
            cautions.add(
                    caution(
                            Level.CAUTION,
                            "control-too-warm",
                            chamberId,
                            "common-practice",
                            Argument.of(setting.temperatureC(), "C"),
                            Argument.of(kept, "C")));
        }
    }

    private static void rating(
            Compressor unit, String chamberId, double pressurePa, List<Caution> cautions) {
        CompressorLaw law = unit.law(pressurePa);
        double carnot = law.carnotFraction();
        if (carnot < LEAST_CARNOT || carnot > MOST_CARNOT) {
            cautions.add(
                    caution(
                            Level.NOTE,
                            "rating-unlikely",
                            chamberId,
                            "CARNOT-PAGE",
                            Argument.of(carnot, "1"),
                            Argument.of(LEAST_CARNOT, "1"),
                            Argument.of(MOST_CARNOT, "1")));
        }
        double difference = unit.ratedAirC() - law.ratedEvaporatingC();
        if (difference > WIDEST_DIFFERENCE_K) {
            cautions.add(
                    caution(
                            Level.NOTE,
                            "coil-small",
                            chamberId,
                            "assumption",
                            Argument.of(difference, "K"),
                            Argument.of(WIDEST_DIFFERENCE_K, "K")));
        }
    }

    private static Caution caution(
            Level level, String code, String chamberId, String source, Argument... arguments) {
        return new Caution(level, Reason.about(code, chamberId, source, arguments));
    }
}

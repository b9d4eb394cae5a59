package org.wardon.keeping;

import java.util.List;
import java.util.Optional;
import java.util.function.DoubleFunction;
import org.wardon.air.SaturatedAir;
import org.wardon.air.Timeline;
import org.wardon.keeping.life.Ageing;
import org.wardon.keeping.life.LifeCurve;
import org.wardon.lots.TranspirationLaw;
import org.wardon.produce.Commodity;
import org.wardon.produce.Fact;
import org.wardon.produce.rows.MoistureLimit;

/**
 * How much water a lot may lose.
 *
 * <p>The rule: the printed permissible loss, but never less than what the produce would lose in an
 * open package over the published life in the handbook's own condition (at the warm end of its
 * temperature, in the middle of its humidity), for there it keeps. For a commodity with a limit of
 * its own the shortest published life counts, for one that has only the general limit the life of
 * the draw.
 */
final class WaterLimit {
    /** General rule for produce: shrivel becomes obvious at 3 to 6 percent, id AH66-1986. */
    private static final double GENERAL_FRACTION = 0.03;

    private static final String GENERAL = "produce in general";

    /** Top of the formulas of moist air; a skin above it is long dead, °C. */
    private static final double HOTTEST_C = 60;

    private static final double USUAL_HUMIDITY = 0.925;

    private final double printedFraction;
    private final boolean general;
    private final String sourceId;
    private final LifeCurve curve;
    private final double handbookC;
    private final double handbookHumidity;

    WaterLimit(Commodity commodity, LifeCurve curve) {
        List<MoistureLimit> limits = commodity.water().limits();
        Optional<MoistureLimit> first = limits.stream().findFirst();
        printedFraction =
                first.map(row -> row.maxLossPct().lowest() / 100).orElse(GENERAL_FRACTION);
        general = first.isEmpty() || first.get().symptom().contains(GENERAL);
        sourceId = first.map(row -> row.maxLossPct().sourceId()).orElse("AH66-1986");
        this.curve = curve;
        handbookC = curve.level().atHighC();
        handbookHumidity =
                commodity
                        .needs()
                        .humidityPct()
                        .map(Fact::middle)
                        .map(pct -> pct / 100)
                        .orElse(USUAL_HUMIDITY);
    }

    String sourceId() {
        return sourceId;
    }

    /** Warm end of the handbook's temperature, °C. */
    double handbookC() {
        return handbookC;
    }

    /** Middle of the handbook's humidity, 0 to 1. */
    double handbookHumidity() {
        return handbookHumidity;
    }

    /** What an item loses, share of its mass a day. */
    interface Loss {
        double perDay(double skinC, double humidityFraction);
    }

    /** How fast a draw's loss uses up what it may lose; the limit is that of a usual skin. */
    WaterPace pace(Optional<DoubleFunction<TranspirationLaw>> laws, Ageing ageing) {
        double days = general ? ageing.lifeDays(handbookC) : curve.level().lowDays();
        if (laws.isEmpty()) {
            return new WaterPace(printedFraction, days, 0, (skinC, humidity) -> 0);
        }
        TranspirationLaw usual = laws.get().apply(Draw.MEDIAN.transpiration());
        Loss loss = (skinC, humidity) -> perDay(usual, skinC, humidity);
        double handbookPerDay = loss.perDay(handbookC, handbookHumidity);
        double limit = Math.max(printedFraction, handbookPerDay * days);
        return new WaterPace(limit, days, handbookPerDay, loss);
    }

    /** Water lost from a kilogram, kg a day; not below 0. */
    static double perDay(TranspirationLaw law, double skinC, double humidityFraction) {
        double saturated = SaturatedAir.pressurePa(Math.min(HOTTEST_C, skinC));
        double lost = law.waterKgPerKgS(saturated, humidityFraction * saturated);
        return Math.max(0, lost) * Timeline.DAY_S;
    }
}

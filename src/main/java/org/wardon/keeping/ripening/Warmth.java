package org.wardon.keeping.ripening;

import java.util.List;
import java.util.Optional;
import org.wardon.produce.rows.RipeningRow;

/**
 * The temperatures in which fruit ripens: at and below one it does not, from another on it ripens
 * by its days, up to a third nothing suffers, from a fourth on ripening fails; between the first
 * two and the last two the pace goes in a straight line (ours). Of several rows the first counts.
 *
 * @param noneAtC at and below it the fruit does not ripen, °C
 * @param fullFromC from here on it ripens by its days, °C
 * @param suffersAboveC from here on ripening is slower, °C
 * @param failsAtC here it stands still, °C
 */
record Warmth(double noneAtC, double fullFromC, double suffersAboveC, double failsAtC) {
    /**
     * Where only one end is printed, the other is so far towards the middle or beyond, K (ours).
     */
    private static final double FAILS_ABOVE_K = 5;

    private static final double FULL_ABOVE_K = 1;

    static Warmth of(List<RipeningRow> rows) {
        Optional<RipeningRow> cold = first(rows, "cold");
        Optional<RipeningRow> heat = first(rows, "heat");
        return new Warmth(
                cold.map(RipeningRow::lowC).orElse(Double.NEGATIVE_INFINITY),
                cold.map(row -> row.highC().orElse(row.lowC() + FULL_ABOVE_K))
                        .orElse(Double.NEGATIVE_INFINITY),
                heat.map(RipeningRow::lowC).orElse(Double.POSITIVE_INFINITY),
                heat.map(row -> row.highC().orElse(row.lowC() + FAILS_ABOVE_K))
                        .orElse(Double.POSITIVE_INFINITY));
    }

    static Optional<RipeningRow> first(List<RipeningRow> rows, String leg) {
        return rows.stream().filter(row -> row.leg().equals(leg)).findFirst();
    }

    /** Share of the pace that is left, 0 to 1. */
    double left(double temperatureC) {
        if (temperatureC < fullFromC) {
            return Math.max(0, (temperatureC - noneAtC) / (fullFromC - noneAtC));
        }
        if (temperatureC <= suffersAboveC) {
            return 1;
        }
        return Math.max(0, (failsAtC - temperatureC) / (failsAtC - suffersAboveC));
    }
}

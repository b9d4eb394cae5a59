package org.wardon.keeping.ripening;

import java.util.List;
import org.wardon.produce.rows.RipeningRow;

/**
 * Heat in which fruit does not ripen well: up to one temperature nothing suffers, from another on
 * ripening fails, between them the pace falls in a straight line (ours). Of several rows the first
 * counts.
 *
 * @param suffersAboveC from here on ripening is slower, °C
 * @param failsAtC here it stands still, °C
 */
record Heat(double suffersAboveC, double failsAtC) {
    /** Where only the beginning is printed, it fails so far above it, K (assumption). */
    private static final double FAILS_ABOVE_K = 5;

    static Heat of(List<RipeningRow> rows) {
        return rows.stream()
                .filter(row -> row.leg().equals("heat"))
                .findFirst()
                .map(row -> new Heat(row.lowC(), row.highC().orElse(row.lowC() + FAILS_ABOVE_K)))
                .orElse(new Heat(Double.POSITIVE_INFINITY, Double.POSITIVE_INFINITY));
    }

    /** Share of the pace that is left, 0 to 1. */
    double left(double temperatureC) {
        if (temperatureC <= suffersAboveC) {
            return 1;
        }
        return Math.max(0, (failsAtC - temperatureC) / (failsAtC - suffersAboveC));
    }
}

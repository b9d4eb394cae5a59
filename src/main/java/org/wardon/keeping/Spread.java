package org.wardon.keeping;

import java.util.Arrays;
import org.wardon.errors.Require;

/**
 * A range over draws: one in ten lies below p10, half below p50, nine in ten below p90.
 *
 * @param p10 tenth percentile
 * @param p50 median
 * @param p90 ninetieth percentile
 */
public record Spread(double p10, double p50, double p90) {
    /**
     * Returns the spread of values, one a draw, linear between neighbours.
     *
     * @param values {@code [draw]}, at least one, in any order
     * @return the spread, in the unit of the values
     */
    public static Spread of(double[] values) {
        Require.that(values.length > 0, "a spread needs at least one value");
        double[] sorted = values.clone();
        Arrays.sort(sorted);
        return new Spread(at(sorted, 0.1), at(sorted, 0.5), at(sorted, 0.9));
    }

    private static double at(double[] sorted, double share) {
        double place = share * (sorted.length - 1);
        int below = (int) place;
        int above = Math.min(below + 1, sorted.length - 1);
        return sorted[below] + (place - below) * (sorted[above] - sorted[below]);
    }
}

package org.wardon.air.normals;

import org.apache.commons.math3.analysis.solvers.BrentSolver;
import org.apache.commons.math3.special.Erf;

/**
 * How clear single days are in a month of a given mean clearness, radiation at the ground over that
 * above the air.
 *
 * <p>Source: Bendt, Collares-Pereira and Rabl 1981, The frequency distribution of daily insolation
 * values, Solar Energy 27, 1-5: an exponential between a dullest and a clearest day; the clearest
 * by Hollands and Huget 1983, the dullest 0.05, both as in Duffie and Beckman, equations 2.9.2 to
 * 2.9.6 (from memory). The exponent is solved for, so the mean is exact.
 */
final class ClearDays {
    private static final double DULLEST = 0.05;

    /** A month this dull or dark has days between none and twice its mean (assumption). */
    private static final double LEAST_SPREAD = 2;

    private static final double DULL_MOST = 0.2;

    private static final double STEEPEST = 300;
    private static final double EVEN = 1e-6;

    private ClearDays() {}

    /**
     * Returns the clearness of a day.
     *
     * @param mean mean clearness of the time of year, 0 to below 0.85
     * @param departure how far the day lies from usual, standard deviations
     * @return 0 to below 0.9
     */
    static double clearness(double mean, double departure) {
        if (mean <= 0) {
            return 0;
        }
        double low = Math.min(DULLEST, mean / LEAST_SPREAD);
        double high = Math.max(clearest(mean), Math.min(LEAST_SPREAD * mean, DULL_MOST));
        double steep = steepness((mean - low) / (high - low));
        double share = 0.5 * (1 + Erf.erf(departure / Math.sqrt(2)));
        return low + (high - low) * quantile(share, steep);
    }

    private static double clearest(double mean) {
        return 0.6313 + 0.267 * mean - 11.9 * Math.pow(mean - 0.75, 8);
    }

    /** The exponent over a span of 1 whose exponential distribution has a mean, 0 to 1. */
    static double steepness(double mean) {
        double near = Math.min(Math.max(mean, 1 / STEEPEST), 1 - 1 / STEEPEST);
        return new BrentSolver(1e-10)
                .solve(200, g -> meanOf(g) - near, -2 * STEEPEST, 2 * STEEPEST);
    }

    private static double meanOf(double g) {
        return Math.abs(g) < EVEN ? 0.5 + g / 12 : 1 / -Math.expm1(-g) - 1 / g;
    }

    private static double quantile(double share, double g) {
        if (Math.abs(g) < EVEN) {
            return share;
        }
        // Counted from the steep end, so that nothing overflows.
        return g > 0
                ? 1 + Math.log(share + (1 - share) * Math.exp(-g)) / g
                : Math.log1p(share * Math.expm1(g)) / g;
    }
}

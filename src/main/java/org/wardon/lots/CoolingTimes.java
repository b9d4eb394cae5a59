package org.wardon.lots;

import org.wardon.errors.Require;

/**
 * Times of a cooling that falls as j exp(-C t), as most do after a short lag.
 *
 * <p>Source: ASHRAE Handbook - Refrigeration 2006, chapter 10; half-cooling is ln(2 j)/C,
 * seven-eighths ln(8 j)/C.
 *
 * @param coefficientPerS cooling coefficient C, 1/s, above 0
 * @param lagFactor lag factor j, above 0.5; 1 for a single exponential
 */
public record CoolingTimes(double coefficientPerS, double lagFactor) {
    /** Refuses what never comes down to half. */
    public CoolingTimes {
        Require.that(
                coefficientPerS > 0,
                "coefficientPerS is " + coefficientPerS + "; above 0 is needed");
        Require.that(lagFactor > 0.5, "lagFactor is " + lagFactor + "; above 0.5 is needed");
    }

    /**
     * Returns the half-cooling time.
     *
     * @return s
     */
    public double halfS() {
        return untilS(0.5);
    }

    /**
     * Returns the seven-eighths cooling time.
     *
     * @return s
     */
    public double sevenEighthsS() {
        return untilS(0.125);
    }

    /**
     * Returns the time until a share of the starting difference is left.
     *
     * @param share above 0, below the lag factor
     * @return s
     */
    public double untilS(double share) {
        return Math.log(lagFactor / share) / coefficientPerS;
    }
}

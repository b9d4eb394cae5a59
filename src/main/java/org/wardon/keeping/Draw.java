package org.wardon.keeping;

/**
 * One numbered choice among all published ranges at once: for each, how far along it lies. The same
 * numbered draw stands behind every answer, with and without the chamber, so that differences are
 * like with like. Each quantile lies in 0 to 1, ends excluded; 0.5 is the middle.
 *
 * @param number number of the draw, 0 for the plain run
 * @param lifeLevel along the published life, low to high
 * @param slope along the published steepness with temperature, flat to steep
 * @param chilling along the dose that injures, tender to hardy
 * @param transpiration along the skin's conductance for water, tight to open
 * @param respiration along the respiration heat, low to high
 * @param packaging along the package's half-cooling time, quick to slow
 * @param delay along the age at arrival where it is not known, young to old
 * @param ethyleneReference along the ethylene in the air of the published trials, clean to foul
 * @param ethyleneGiven along the rate at which ethylene is given off, low to high
 * @param market along the conditions of the market leg, easy to hard
 * @param ripening along the share of life left once ripe, short to long
 * @param dormancy along the rest before sprouting, short to long
 * @param curing along what a lot that may not be cured still keeps, little to all
 * @param ripeningPace along the printed days from the start of ripening to ripe, short to long
 */
public record Draw(
        int number,
        double lifeLevel,
        double slope,
        double chilling,
        double transpiration,
        double respiration,
        double packaging,
        double delay,
        double ethyleneReference,
        double ethyleneGiven,
        double market,
        double ripening,
        double dormancy,
        double curing,
        double ripeningPace) {
    /** The plain run: the middle of every range. */
    public static final Draw MEDIAN =
            new Draw(0, 0.5, 0.5, 0.5, 0.5, 0.5, 0.5, 0.5, 0.5, 0.5, 0.5, 0.5, 0.5, 0.5, 0.5);

    /** How many ranges a draw chooses from. */
    static final int RANGES = 14;

    /** Refuses quantiles outside 0 to 1. */
    public Draw {
        double[] all = {
            lifeLevel,
            slope,
            chilling,
            transpiration,
            respiration,
            packaging,
            delay,
            ethyleneReference,
            ethyleneGiven,
            market,
            ripening,
            dormancy,
            curing,
            ripeningPace
        };
        for (double quantile : all) {
            if (!(quantile > 0 && quantile < 1)) {
                throw new IllegalArgumentException(
                        "a quantile of draw "
                                + number
                                + " is "
                                + quantile
                                + "; accepted is 0 to 1");
            }
        }
    }

    /**
     * Returns the draw of fourteen quantiles in the order of the record.
     *
     * @param number its number
     * @param quantiles {@code [range]}, 0 to 1
     * @return the draw
     */
    static Draw of(int number, double[] quantiles) {
        double[] q = quantiles;
        return new Draw(
                number, q[0], q[1], q[2], q[3], q[4], q[5], q[6], q[7], q[8], q[9], q[10], q[11],
                q[12], q[13]);
    }
}

package org.wardon.keeping.experience;

/**
 * How far lives of single lots lie from the middle of what is published, as the logarithm: a normal
 * spread, narrower or wider on its short than on its long side.
 *
 * @param shortSide standard deviation on the short side, above 0
 * @param longSide standard deviation on the long side, above 0
 */
public record LevelSpread(double shortSide, double longSide) {
    /**
     * Standard deviation of ln life from lot to lot in one place: what lives of one source deviate
     * from its own curve (life-pool table, measured; our own fit of published lives).
     */
    public static final double BETWEEN_LOTS = 0.169;

    /** A side nobody prints any width for keeps this one (ours). */
    private static final double LEAST = 0.02;

    /** Keeps both sides open. */
    public LevelSpread {
        shortSide = Math.max(LEAST, shortSide);
        longSide = Math.max(LEAST, longSide);
    }

    /**
     * Returns the logarithm of life over the published middle.
     *
     * @param z standard deviations, longer lives above 0
     * @return ln of a ratio
     */
    public double lnRatio(double z) {
        return z * side(z);
    }

    /**
     * Returns how many standard deviations a life lies from the published middle.
     *
     * @param lnRatio ln of the life over the published middle
     * @return standard deviations
     */
    public double z(double lnRatio) {
        return lnRatio / side(lnRatio);
    }

    /**
     * Returns the standard deviation on one side.
     *
     * @param sign below 0 for the short side
     * @return standard deviation of ln life
     */
    public double side(double sign) {
        return sign < 0 ? shortSide : longSide;
    }
}

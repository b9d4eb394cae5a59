package org.wardon.sharing;

/**
 * Temperatures side by side that do the same to a lot, for its days.
 *
 * @param lowC lowest, °C
 * @param highC highest, °C
 * @param what what they do to it
 */
public record Stretch(double lowC, double highC, What what) {
    /** Half of the distance between the temperatures looked at, K. */
    public static final double HALF_STEP_K = 0.5 * Settings.STEP_C;

    /** What a temperature does to a lot at the humidity that suits it best. */
    public enum What {
        /** It is nearer to freezing than the margin. */
        FREEZES,
        /** Cold injures it. */
        CHILLS,
        /** It is safe from cold and does not last its days. */
        SHORT,
        /** It lasts them in the middle of its range, or most of what it keeps at its best. */
        BEARS,
        /** It lasts its days even at the short end of its range. */
        LASTS;

        /**
         * Returns its word.
         *
         * @return lower case
         */
        public String word() {
            return name().toLowerCase(java.util.Locale.ROOT);
        }
    }
}

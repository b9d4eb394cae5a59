package org.wardon.keeping.pooling;

import org.wardon.errors.Require;

/**
 * One published life, or a bound on one.
 *
 * @param of what it speaks of and who says so
 * @param temperatureC temperature, °C, -5 to 50
 * @param lnDays logarithm of the life or of the bound, days
 * @param kind whether it is a life or bounds one
 * @param estimate whether its source calls it an estimate
 */
public record LifePoint(Trial of, double temperatureC, double lnDays, Kind kind, boolean estimate) {
    /** What a figure says of the life. */
    public enum Kind {
        /** It is the life. */
        EXACT,
        /** The life is at least as long: the trial stopped, or something else ended the lot. */
        AT_LEAST,
        /** The life is at most as long. */
        AT_MOST
    }

    /**
     * One source's figures on one kind of a crop; they share a level.
     *
     * @param crop commodity id
     * @param curve crop and variant; figures of one curve share a slope
     * @param source id of the source
     * @param part plant part, empty where nobody says
     * @param respirationKJMol slope of its respiration over that of all crops, kJ/mol; 0 where
     *     nobody printed rates
     * @param relative whether only ratios are known, so that the level means nothing
     */
    public record Trial(
            String crop,
            String curve,
            String source,
            String part,
            double respirationKJMol,
            boolean relative) {
        /** Refuses a trial that speaks of nothing. */
        public Trial {
            Require.text("crop", crop);
            Require.text("curve", curve);
        }

        /**
         * Returns whether two trials share a level.
         *
         * @param other another
         * @return true for one source on one curve
         */
        public boolean sharesLevel(Trial other) {
            return curve.equals(other.curve)
                    && source.equals(other.source)
                    && relative == other.relative;
        }
    }

    /** Refuses figures that cannot be. */
    public LifePoint {
        Require.within("temperatureC", temperatureC, -5, 50, "°C", "Lives are published there.");
        Require.within("lnDays", lnDays, -10, 10, "ln days", "Give the logarithm of days.");
    }

    /**
     * Returns whether the figure is a life, not a bound.
     *
     * @return true if so
     */
    public boolean exact() {
        return kind == Kind.EXACT;
    }
}

package org.wardon.keeping;

/**
 * When a fruit is ripe and until when it may be eaten, in one draw.
 *
 * @param ripeS ripe from here on, s; infinite where heat or cold keep it from ripening as it should
 * @param overripeS past eating from here on, s
 */
record RipeTimes(double ripeS, double overripeS) {
    /** Frozen before it is ripe, it does not ripen. */
    RipeTimes unlessFrozen(double frozenS) {
        return frozenS <= ripeS ? new RipeTimes(Double.POSITIVE_INFINITY, overripeS) : this;
    }

    boolean ripeAt(double atS) {
        return ripeS <= atS && atS < overripeS;
    }
}

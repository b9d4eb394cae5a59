package org.wardon.keeping;

/**
 * When a fruit is ripe and until when it may be eaten, in one draw.
 *
 * @param ripeS ripe from here on, s; infinite where it does not ripen as it should
 * @param overripeS past eating from here on, s
 */
record RipeTimes(double ripeS, double overripeS) {
    boolean ripeAt(double atS) {
        return ripeS <= atS && atS < overripeS;
    }
}

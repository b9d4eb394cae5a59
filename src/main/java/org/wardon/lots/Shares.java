package org.wardon.lots;

import org.wardon.errors.Require;

/**
 * Where in the printed ranges a lot is taken to lie, even in the logarithm.
 *
 * @param respiration 0 low to 1 high
 * @param transpiration 0 low to 1 high
 * @param packageTime 0 quickest to 1 slowest half-cooling time
 */
public record Shares(double respiration, double transpiration, double packageTime) {
    /** The middle of every range. */
    public static final Shares MIDDLE = new Shares(0.5, 0.5, 0.5);

    /** Refuses shares outside 0 to 1. */
    public Shares {
        Require.within("respiration share", respiration, 0, 1, "1", "");
        Require.within("transpiration share", transpiration, 0, 1, "1", "");
        Require.within("packageTime share", packageTime, 0, 1, "1", "");
    }
}

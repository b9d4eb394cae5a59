package org.wardon.cooling;

import org.wardon.errors.Require;

/**
 * A timed defrost.
 *
 * @param everyHours time between starts, h
 * @param minutes how long, min
 * @param heaterW heat given to the coil, W; 0 for defrost by air
 */
public record Defrost(double everyHours, double minutes, double heaterW) {
    private static final double MINUTES = 60;

    /** Checks the bounds. */
    public Defrost {
        Require.within("defrost.everyHours", everyHours, 1, 168, "h", "");
        Require.within("defrost.minutes", minutes, 1, 120, "min", "");
        Require.within("defrost.heaterW", heaterW, 0, 100_000, "W", "");
    }

    /**
     * Returns the share of the time the cooler is defrosted.
     *
     * @return 0 to 1
     */
    public double share() {
        return Math.min(minutes / (MINUTES * everyHours), 1);
    }
}

package org.wardon.enclosure;

import org.wardon.errors.Require;

/**
 * Heat given off inside.
 *
 * @param lightsW lights, W
 * @param lightsHoursPerDay hours a day the lights burn, within the door's hours
 * @param peopleHoursPerDay person-hours a day inside, within the door's hours
 * @param fansW fans besides those of the coolers, running always, W
 */
public record Gains(
        double lightsW, double lightsHoursPerDay, double peopleHoursPerDay, double fansW) {
    /** No gains at all. */
    public static final Gains NONE = new Gains(0, 0, 0, 0);

    /** Checks the bounds. */
    public Gains {
        Require.within("gains.lightsW", lightsW, 0, 100_000, "W", "");
        Require.within("gains.lightsHoursPerDay", lightsHoursPerDay, 0, 24, "h", "");
        Require.within("gains.peopleHoursPerDay", peopleHoursPerDay, 0, 480, "h", "");
        Require.within("gains.fansW", fansW, 0, 100_000, "W", "");
    }
}

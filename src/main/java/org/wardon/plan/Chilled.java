package org.wardon.plan;

import org.wardon.errors.Require;

/**
 * Time a lot spent cold before it came.
 *
 * @param atC how cold, °C
 * @param hours how long, h
 */
public record Chilled(double atC, double hours) {
    /** Checks the bounds. */
    public Chilled {
        Require.within("chilledBefore.atC", atC, -10, 40, "°C", "");
        Require.within("chilledBefore.hours", hours, 0, 5_000, "h", "");
    }
}

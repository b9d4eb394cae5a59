package org.wardon.plan;

import org.wardon.errors.Require;

/**
 * How long the keeper knows the crop to keep in the keeper's own store.
 *
 * @param days life, days
 * @param atC at this temperature, °C
 */
public record KnownLife(double days, double atC) {
    /** Checks the bounds. */
    public KnownLife {
        Require.within("knownLife.days", days, 0.1, 730, "day", "");
        Require.within("knownLife.atC", atC, -5, 45, "°C", "");
    }
}

package org.wardon.keeping;

import org.wardon.errors.Require;

/**
 * Cold that a lot went through before it arrived.
 *
 * @param atC temperature, °C
 * @param hours how long, h
 */
public record ColdSpell(double atC, double hours) {
    /** Checks the bounds. */
    public ColdSpell {
        Require.within("chilledBefore.atC", atC, -5, 40, "°C", "");
        Require.within("chilledBefore.hours", hours, 0, 8760, "h", "");
    }
}

package org.wardon.keeping;

import org.wardon.errors.Require;

/**
 * How long the commodity keeps in the keeper's own store.
 *
 * @param days days it keeps
 * @param atC temperature there, °C
 */
public record KnownLife(double days, double atC) {
    /** Checks the bounds. */
    public KnownLife {
        Require.within("knownLife.days", days, 0.1, 730, "day", "");
        Require.within("knownLife.atC", atC, -2, 40, "°C", "");
    }
}

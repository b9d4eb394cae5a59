package org.wardon.plan;

import org.wardon.errors.Require;

/**
 * Ethylene of the air around.
 *
 * @param outdoorPpm of outdoor air, µL/L
 * @param marketPpm of the market building, µL/L
 */
public record EthyleneAround(double outdoorPpm, double marketPpm) {
    /** Checks the bounds. */
    public EthyleneAround {
        Require.within("outdoorEthylenePpm", outdoorPpm, 0, 100, "ppm", "");
        Require.within("marketEthylenePpm", marketPpm, 0, 100, "ppm", "");
    }
}

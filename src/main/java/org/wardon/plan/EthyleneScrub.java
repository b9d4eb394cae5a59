package org.wardon.plan;

import org.wardon.errors.Require;

/**
 * A scrubber that takes ethylene out of the chamber's own air: permanganate beds, catalysts and the
 * like.
 *
 * @param airM3PerHour air drawn through it, m3/h
 * @param efficiencyPct share of the ethylene it takes at a pass, percent
 */
public record EthyleneScrub(double airM3PerHour, double efficiencyPct) {
    /** Checks the bounds. */
    public EthyleneScrub {
        Require.within("ethyleneScrub.airM3PerHour", airM3PerHour, 0, 100_000, "m3/h", "");
        Require.within("ethyleneScrub.efficiencyPct", efficiencyPct, 0, 100, "%", "");
    }

    /**
     * Returns the air that is as good as freed of ethylene.
     *
     * @return m3/s
     */
    public double cleanedM3s() {
        return airM3PerHour * efficiencyPct / 100 / 3_600;
    }
}

package org.wardon.sharing.placing;

import java.util.Optional;
import org.wardon.errors.Require;

/**
 * One lot as the search sees it.
 *
 * @param id its id, unique in the problem
 * @param massKg mass, kg
 * @param volumeM3 room it takes with its packages and ways, m3
 * @param firstDay first day it stands in the store, counted from 0
 * @param lastDay last day it stands in the store, not before the first
 * @param onlyIn id of the only chamber it may stand in; empty where it may go anywhere
 */
public record LotToPlace(
        String id,
        double massKg,
        double volumeM3,
        int firstDay,
        int lastDay,
        Optional<String> onlyIn) {
    /** Checks the bounds. */
    public LotToPlace {
        Require.text("id of a lot", id);
        Require.within("massKg of " + id, massKg, 0, 1e9, "kg", "");
        Require.within("volumeM3 of " + id, volumeM3, 0, 1e9, "m3", "");
        Require.within("firstDay of " + id, firstDay, 0, 100_000, "", "");
        Require.within("lastDay of " + id, lastDay, firstDay, 100_000, "", "");
    }

    /**
     * Returns whether two lots are in the store at the same time.
     *
     * @param other the other lot
     * @return true if they share a day
     */
    public boolean meets(LotToPlace other) {
        return firstDay <= other.lastDay && other.firstDay <= lastDay;
    }
}

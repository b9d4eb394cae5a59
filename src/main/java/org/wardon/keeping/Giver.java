package org.wardon.keeping;

import java.util.List;
import org.wardon.errors.Require;
import org.wardon.lots.LotHistory;

/**
 * A lot in the chambers of a store as it gives off and feels ethylene.
 *
 * @param model the lot, as it keeps
 * @param history what it goes through from its arrival on
 * @param massKg its mass, kg
 * @param leavesS from here on it gives nothing, s; it goes on feeling the air
 * @param places where it stands, in order of time; at least one
 */
public record Giver(
        KeepingModel model, LotHistory history, double massKg, double leavesS, List<Place> places) {
    /**
     * Where a lot stands from a time on.
     *
     * @param fromS time, s
     * @param chamber id of the chamber
     */
    public record Place(double fromS, String chamber) {}

    /** Copies the list. */
    public Giver {
        places = List.copyOf(places);
        Require.that(!places.isEmpty(), "a lot gives off where it stands, which is nowhere");
    }

    /** The chamber it stands in at a time; before its first place there. */
    String standsIn(double atS) {
        String chamber = places.get(0).chamber();
        for (Place place : places) {
            if (place.fromS() <= atS) {
                chamber = place.chamber();
            }
        }
        return chamber;
    }
}

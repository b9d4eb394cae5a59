package org.wardon.sharing.placing;

import java.util.List;
import org.wardon.errors.Require;

/**
 * One chamber as the search sees it.
 *
 * @param id its id, unique in the problem
 * @param massKg most it takes, kg
 * @param volumeM3 room for lots, m3
 * @param offers climates it can make, like beside like (by temperature, say)
 * @param mayRest whether it may be switched off; it then costs nothing and takes nothing
 */
public record ChamberToFill(
        String id, double massKg, double volumeM3, List<Offer> offers, boolean mayRest) {
    /** Copies the list and checks the bounds. */
    public ChamberToFill {
        Require.text("id of a chamber", id);
        offers = List.copyOf(offers);
        Require.within("massKg of " + id, massKg, 0, 1e9, "kg", "");
        Require.within("volumeM3 of " + id, volumeM3, 0, 1e9, "m3", "");
        Require.that(!offers.isEmpty() || mayRest, "chamber " + id + " can make no climate");
    }
}

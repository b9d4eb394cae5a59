package org.wardon.lots;

import org.wardon.errors.Require;

/**
 * One commodity that arrived together.
 *
 * @param id id of the lot
 * @param massKg net mass at arrival, kg
 * @param item one piece of it
 * @param packing what stands between the items and the chamber
 * @param respiration heat of respiration
 * @param transpiration water lost and dew caught
 */
public record Lot(
        String id,
        double massKg,
        Item item,
        Packing packing,
        RespirationLaw respiration,
        TranspirationLaw transpiration) {
    /** Refuses a blank id and a mass that is not above 0. */
    public Lot {
        Require.text("id", id);
        Require.within("massKg of lot " + id, massKg, 0.1, 500_000, "kg", "Give the net mass.");
    }

    /**
     * Returns the lot's items cut into shells.
     *
     * @return its shells
     */
    public Shells shells() {
        return Shells.of(item);
    }

    /**
     * Returns the lot breathing by another law, as once it ripens or before it is cured.
     *
     * @param law the law
     * @return the lot
     */
    public Lot breathing(RespirationLaw law) {
        return new Lot(id, massKg, item, packing, law, transpiration);
    }

    /**
     * Returns the lot in another package or at another package time.
     *
     * @param other the packing
     * @return the lot
     */
    public Lot packedIn(Packing other) {
        return new Lot(id, massKg, item, other, respiration, transpiration);
    }
}

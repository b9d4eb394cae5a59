package org.wardon.sharing.placing;

import java.util.HashSet;
import java.util.List;
import java.util.Set;
import org.wardon.errors.Require;

/**
 * A store to be filled.
 *
 * @param days length of the horizon, days
 * @param lots the lots, as the climates number them
 * @param chambers the chambers
 */
public record PlacingProblem(int days, List<LotToPlace> lots, List<ChamberToFill> chambers) {
    /** Copies the lists and checks that all speak of the same lots and days. */
    public PlacingProblem {
        Require.within("days", days, 1, 100_000, "", "");
        lots = List.copyOf(lots);
        chambers = List.copyOf(chambers);
        Set<String> ids = new HashSet<>();
        for (LotToPlace lot : lots) {
            Require.that(ids.add(lot.id()), "lot " + lot.id() + " is there twice");
            Require.within("lastDay of " + lot.id(), lot.lastDay(), 0, days - 1.0, "", "");
        }
        ids.clear();
        for (ChamberToFill chamber : chambers) {
            Require.that(ids.add(chamber.id()), "chamber " + chamber.id() + " is there twice");
            for (Offer offer : chamber.offers()) {
                check(chamber, offer, lots.size(), days);
            }
        }
    }

    private static void check(ChamberToFill chamber, Offer offer, int lots, int days) {
        Require.that(
                offer.climate().lots() == lots && offer.coolingW().size() == days,
                "climate "
                        + offer.climate().name()
                        + " of chamber "
                        + chamber.id()
                        + " speaks of other lots or days");
    }

    /**
     * Returns what a lot earns in a chamber without company: what is kept of it less the energy of
     * its heat.
     *
     * @param lot its number
     * @param offer the climate of the chamber
     * @return currency, {@link Climate#NEVER} where it must not stand there
     */
    public double earns(int lot, Offer offer) {
        double heat = 0;
        for (int day = lots.get(lot).firstDay(); day <= lots.get(lot).lastDay(); day++) {
            heat += offer.climate().heatW(lot, day);
        }
        return offer.climate().worth(lot) - heat * offer.costPerWDay();
    }
}

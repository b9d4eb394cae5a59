package org.wardon.sharing.placing;

import java.util.List;

/**
 * What stands where.
 *
 * @param chambers every chamber of the problem, in its order
 * @param unplaced numbers of lots without a place
 * @param value what is kept of the placed lots less energy and losses by company, currency
 */
public record Placing(List<Filled> chambers, List<Integer> unplaced, double value) {
    /** A chamber that is switched off. */
    public static final int RESTS = -1;

    /** Copies the lists. */
    public Placing {
        chambers = List.copyOf(chambers);
        unplaced = List.copyOf(unplaced);
    }

    /**
     * One chamber.
     *
     * @param offer number of its climate, {@link #RESTS} where it is switched off
     * @param lots numbers of its lots, rising
     */
    public record Filled(int offer, List<Integer> lots) {
        /** Copies the list. */
        public Filled {
            lots = List.copyOf(lots);
        }
    }

    /**
     * Returns where a lot stands.
     *
     * @param lot its number
     * @return number of the chamber, -1 where it has none
     */
    public int chamberOf(int lot) {
        for (int chamber = 0; chamber < chambers.size(); chamber++) {
            if (chambers.get(chamber).lots().contains(lot)) {
                return chamber;
            }
        }
        return -1;
    }
}

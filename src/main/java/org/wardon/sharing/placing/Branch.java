package org.wardon.sharing.placing;

import java.util.BitSet;

/**
 * A part of all placings: which climates each chamber may still have and which lots it may hold.
 */
final class Branch {
    /** {@code [chamber]}, climates by number. */
    final BitSet[] offers;

    /** {@code [chamber]}, lots. */
    final BitSet[] lots;

    /** {@code [lot]}, the prices that bound this part best. */
    double[] price;

    /** No placing of this part is worth more. */
    double bound;

    /** In which order it was made; among equals the older is looked into first. */
    final int number;

    private Branch(BitSet[] offers, BitSet[] lots, double[] price, double bound, int number) {
        this.offers = offers;
        this.lots = lots;
        this.price = price;
        this.bound = bound;
        this.number = number;
    }

    static Branch whole(Store store) {
        BitSet[] offers = new BitSet[store.chambers];
        BitSet[] lots = new BitSet[store.chambers];
        for (int c = 0; c < store.chambers; c++) {
            offers[c] = new BitSet();
            offers[c].set(0, store.offers(c));
            lots[c] = new BitSet();
            for (int l = 0; l < store.lots; l++) {
                lots[c].set(l, store.mayStand(c, l));
            }
        }
        return new Branch(offers, lots, new double[store.lots], Double.POSITIVE_INFINITY, 0);
    }

    Branch copy(int asNumber) {
        return new Branch(copied(offers), copied(lots), price.clone(), bound, asNumber);
    }

    private static BitSet[] copied(BitSet[] sets) {
        BitSet[] copies = new BitSet[sets.length];
        for (int i = 0; i < sets.length; i++) {
            copies[i] = (BitSet) sets[i].clone();
        }
        return copies;
    }

    /** Takes a chamber as decided: nothing else may come into it. */
    void shut(int c, int offer) {
        lots[c].clear();
        offers[c].clear();
        if (offer != Placing.RESTS) {
            offers[c].set(offer);
        }
    }

    /** Whether two lots can be exchanged in every placing of this part. */
    boolean alike(int one, int other, Likeness likeness) {
        boolean alike = likeness.alike(one, other);
        for (int c = 0; c < lots.length && alike; c++) {
            alike = lots[c].get(one) == lots[c].get(other);
        }
        return alike;
    }

    /** Lots that may stand in one chamber at most, so that nothing is left to decide of them. */
    boolean decided(int lot) {
        int places = 0;
        for (BitSet chamber : lots) {
            places += chamber.get(lot) ? 1 : 0;
        }
        return places <= 1;
    }
}

package org.wardon.sharing.placing;

import java.util.Arrays;
import java.util.BitSet;

/**
 * A part of all placings: which climates each chamber may still have and how many lots of each kind
 * it holds. Which of the like lots these are makes no difference, so it is not said. A kind goes by
 * its first lot; what is kept by kind stands there.
 */
final class Branch {
    /** {@code [chamber]}, climates by number. */
    final BitSet[] offers;

    /** {@code [chamber][kind]}, lots it holds at least. */
    final int[][] least;

    /** {@code [chamber][kind]}, lots it holds at most. */
    final int[][] most;

    /** {@code [kind]}, lots there are. */
    final int[] count;

    /** {@code [kind]}, the prices that bound this part best. */
    double[] price;

    /** No placing of this part is worth more. */
    double bound;

    /** In which order it was made; among equals the older is looked into first. */
    final int number;

    private Branch(
            BitSet[] offers,
            int[][] least,
            int[][] most,
            int[] count,
            double[] price,
            double bound,
            int number) {
        this.offers = offers;
        this.least = least;
        this.most = most;
        this.count = count;
        this.price = price;
        this.bound = bound;
        this.number = number;
    }

    static Branch whole(Store store) {
        BitSet[] offers = new BitSet[store.chambers];
        int[][] least = new int[store.chambers][store.lots];
        int[][] most = new int[store.chambers][store.lots];
        int[] count = store.likeness.count.clone();
        for (int c = 0; c < store.chambers; c++) {
            offers[c] = new BitSet();
            offers[c].set(0, store.offers(c));
            for (int l = 0; l < store.lots; l++) {
                most[c][l] = store.mayStand(c, l) ? count[l] : 0;
            }
        }
        double[] price = new double[store.lots];
        return new Branch(offers, least, most, count, price, Double.POSITIVE_INFINITY, 0);
    }

    Branch copy(int asNumber) {
        BitSet[] some =
                Arrays.stream(offers).map(set -> (BitSet) set.clone()).toArray(BitSet[]::new);
        return new Branch(
                some, copied(least), copied(most), count.clone(), price.clone(), bound, asNumber);
    }

    private static int[][] copied(int[][] rows) {
        return Arrays.stream(rows).map(int[]::clone).toArray(int[][]::new);
    }

    /** Takes a chamber as decided: nothing else may come into it. */
    void shut(int c, int offer) {
        Arrays.fill(least[c], 0);
        Arrays.fill(most[c], 0);
        offers[c].clear();
        if (offer != Placing.RESTS) {
            offers[c].set(offer);
        }
    }

    /** Takes one lot of a kind as placed: one less is left of it for any chamber. */
    void forget(int kind) {
        count[kind]--;
        if (count[kind] == 0) {
            price[kind] = 0;
        }
        for (int[] chamber : most) {
            chamber[kind] = Math.min(chamber[kind], count[kind]);
        }
    }

    /** A chamber holds this many of a kind or more; the others are left what remains. */
    void atLeast(int c, int kind, int lots) {
        least[c][kind] = lots;
        int held = 0;
        for (int[] chamber : least) {
            held += chamber[kind];
        }
        for (int other = 0; other < most.length; other++) {
            int left = count[kind] - held + least[other][kind];
            most[other][kind] = Math.min(most[other][kind], left);
        }
    }

    /** A chamber holds this many of a kind or fewer. */
    void atMost(int c, int kind, int lots) {
        most[c][kind] = lots;
    }

    /** A kind of which all chambers can have as many as they may, so that they need not vie. */
    boolean decided(int kind) {
        int sum = 0;
        for (int[] chamber : most) {
            sum += chamber[kind];
        }
        return sum <= count[kind];
    }

    /** Whether a chamber must hold anything. */
    boolean holds(int c) {
        return Arrays.stream(least[c]).anyMatch(lots -> lots > 0);
    }
}

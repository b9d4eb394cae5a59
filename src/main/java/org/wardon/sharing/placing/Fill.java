package org.wardon.sharing.placing;

import java.util.Arrays;

/** A placing in the making: what stands where, what is left of every limit, what it is worth. */
final class Fill {
    static final int NOWHERE = -1;
    private static final double ROUNDING = 1e-9;

    private final Store store;
    private final int days;

    /** {@code [lot]}. */
    final int[] chamber;

    /** {@code [chamber]}, {@link Placing#RESTS} where it is off. */
    final int[] offer;

    private final double[][] mass;
    private final double[][] volume;
    private final double[][] heat;

    Fill(Store store) {
        this.store = store;
        days = store.days;
        chamber = new int[store.lots];
        offer = new int[store.chambers];
        mass = new double[store.chambers][days];
        volume = new double[store.chambers][days];
        heat = new double[store.chambers][days];
        empty();
    }

    private void empty() {
        Arrays.fill(chamber, NOWHERE);
        for (int c = 0; c < store.chambers; c++) {
            offer[c] = store.mayRest[c] ? Placing.RESTS : cheapest(c);
            Arrays.fill(mass[c], 0);
            Arrays.fill(volume[c], 0);
            Arrays.fill(heat[c], 0);
        }
    }

    private int cheapest(int c) {
        int best = 0;
        for (int o = 1; o < store.offers(c); o++) {
            best = store.cost[c][o] < store.cost[c][best] ? o : best;
        }
        return best;
    }

    void copyFrom(Fill other) {
        System.arraycopy(other.chamber, 0, chamber, 0, chamber.length);
        System.arraycopy(other.offer, 0, offer, 0, offer.length);
        for (int c = 0; c < store.chambers; c++) {
            System.arraycopy(other.mass[c], 0, mass[c], 0, days);
            System.arraycopy(other.volume[c], 0, volume[c], 0, days);
            System.arraycopy(other.heat[c], 0, heat[c], 0, days);
        }
    }

    /** Takes all lots out of a chamber and gives it a climate. */
    void clear(int c, int toOffer) {
        for (int l = 0; l < store.lots; l++) {
            if (chamber[l] == c) {
                chamber[l] = NOWHERE;
            }
        }
        offer[c] = toOffer;
        Arrays.fill(mass[c], 0);
        Arrays.fill(volume[c], 0);
        Arrays.fill(heat[c], 0);
    }

    void put(int l, int c) {
        change(l, c, 1);
        chamber[l] = c;
    }

    void takeOut(int l) {
        change(l, chamber[l], -1);
        chamber[l] = NOWHERE;
    }

    private void change(int l, int c, int sign) {
        double[] share = store.heatShare[c][offer[c]];
        for (int d = store.first[l]; d <= store.last[l]; d++) {
            mass[c][d] += sign * store.massShare[c][l];
            volume[c][d] += sign * store.volumeShare[c][l];
            heat[c][d] += sign * share[l * days + d];
        }
    }

    /** Whether there is room, and cooling, for a lot. */
    boolean fits(int l, int c) {
        if (offer[c] == Placing.RESTS) {
            return false;
        }
        double[] share = store.heatShare[c][offer[c]];
        double full = 1 + ROUNDING;
        for (int d = store.first[l]; d <= store.last[l]; d++) {
            if (mass[c][d] + store.massShare[c][l] > full
                    || volume[c][d] + store.volumeShare[c][l] > full
                    || heat[c][d] + share[l * days + d] > full) {
                return false;
            }
        }
        return true;
    }

    /** What a lot earns, or would earn, in a chamber beside those that stand there. */
    double gain(int l, int c) {
        if (offer[c] == Placing.RESTS) {
            return Climate.NEVER;
        }
        double gain = store.earns[c][offer[c]][l];
        int[] others = store.company[c][offer[c]].others[l];
        double[] loss = store.company[c][offer[c]].loss[l];
        for (int i = 0; i < others.length && gain > Climate.NEVER; i++) {
            if (chamber[others[i]] == c) {
                gain -= loss[i];
            }
        }
        return gain;
    }

    double value(int c) {
        if (offer[c] == Placing.RESTS) {
            return 0;
        }
        double sum = -store.cost[c][offer[c]];
        for (int l = 0; l < store.lots; l++) {
            if (chamber[l] == c) {
                double alone = store.earns[c][offer[c]][l];
                sum += 0.5 * (alone + gain(l, c));
            }
        }
        return sum;
    }

    double value() {
        double sum = 0;
        for (int c = 0; c < store.chambers; c++) {
            sum += value(c);
        }
        return sum;
    }
}

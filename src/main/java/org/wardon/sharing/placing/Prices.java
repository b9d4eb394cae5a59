package org.wardon.sharing.placing;

import java.util.Arrays;

/**
 * Prices on lots, like ones at one: at given prices each chamber takes the load that earns most
 * above them, and the prices and these surpluses together exceed every placing. Moving the prices
 * towards the lots that several chambers take, or none, lowers that bound.
 */
final class Prices {
    private static final double LONGEST = 3;
    private static final double SHORTEST = 0.05;
    private static final double LONGER = 1.4;
    private static final double SHORTER = 0.7;
    private static final double GOOD = 0.3;
    private static final int PATIENCE = 3;
    private static final int MOST_FRUITLESS = 8;
    private static final double CONVERGED = 3e-5;
    private static final int LEAVE_OUT_EVERY = 8;

    private final Store store;
    private final double[] highest;

    int steps;

    /** Told of each set of loads; says the best value known. */
    interface Known {
        double best();
    }

    Prices(Store store) {
        this.store = store;
        highest = new double[store.lots];
    }

    /**
     * Lowers the bound of a branch by moving its prices, and leaves out of the branch what cannot
     * lead to anything better than what is known.
     *
     * @param branch the branch
     * @param loads how loads are found
     * @param mostSteps most steps
     * @param known called after each step
     */
    void lower(Branch branch, Loads loads, int mostSteps, Known known) {
        double[] price = branch.price.clone();
        double least = Double.POSITIVE_INFINITY;
        double promised = Double.NEGATIVE_INFINITY;
        double length = loads.bundle.length;
        int fruitless = 0;
        for (int step = 0; step < mostSteps; step++) {
            steps++;
            double bound = loads.bound(branch, price);
            double enough = PlacingSearch.enough(known.best());
            if (bound < least) {
                boolean good = step > 0 && bound <= least - GOOD * (least - promised);
                length = Math.min(LONGEST, good ? length * LONGER : length);
                least = bound;
                fruitless = 0;
                branch.price = price;
                branch.bound = Math.min(branch.bound, bound);
            } else if (++fruitless % PATIENCE == 0) {
                length *= SHORTER;
            }
            if (branch.bound <= enough || fruitless > MOST_FRUITLESS) {
                break;
            }
            leaveOut(branch, loads, price, bound - enough);
            loads.bundle.enter(branch);
            promised = loads.bundle.solve(branch.price, length);
            if (least - promised < CONVERGED * Math.abs(least)) {
                break;
            }
            price = loads.bundle.price.clone();
        }
        loads.bundle.length = Math.max(SHORTEST, length);
    }

    /**
     * Leaves out climates, and lots of chambers, with which the bound falls below what is known.
     */
    private void leaveOut(Branch branch, Loads loads, double[] price, double above) {
        for (int c = 0; c < store.chambers; c++) {
            double spare = above - loads.most[c];
            for (int o = 0; o < store.offers(c); o++) {
                if (branch.offers[c].get(o) && spare + loads.offers.ceiling[c][o] <= 0) {
                    branch.offers[c].clear(o);
                }
            }
            if (steps % LEAVE_OUT_EVERY == 0) {
                leaveOutLots(branch, loads.offers, c, price, spare);
            }
        }
    }

    private void leaveOutLots(Branch branch, Offers offers, int c, double[] price, double spare) {
        Likeness likeness = store.likeness;
        Arrays.fill(highest, Double.NEGATIVE_INFINITY);
        for (int o = 0; o < store.offers(c); o++) {
            if (branch.offers[c].get(o)) {
                Gains gains = offers.gains;
                gains.of(store, branch, c, o, price);
                Weights weights = offers.weights(c, o);
                double roof = weights.bound(gains) - store.cost[c][o];
                for (int l = 0; l < store.lots; l++) {
                    int more = likeness.rank[l] - branch.least[c][likeness.kind[l]] + 1;
                    double with = more * Math.min(0, gains.ofLot[l] - weights.ofLot[l]);
                    highest[l] = Math.max(highest[l], more > 0 ? roof + with : roof);
                }
            }
        }
        for (int l = 0; l < store.lots; l++) {
            int kind = likeness.kind[l];
            boolean free = likeness.rank[l] >= branch.least[c][kind];
            if (free && spare + highest[l] <= 0) {
                branch.atMost(c, kind, Math.min(branch.most[c][kind], likeness.rank[l]));
            }
        }
    }
}

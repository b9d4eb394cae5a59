package org.wardon.sharing.placing;

import java.util.Arrays;

/** Loads of whole lots, as good as can be found within a number of steps. */
final class WholeLoads extends Loads {
    private static final int TIGHTENING = 3;
    private static final long QUICKER = 10;

    private final long steps;
    private final double[] parts;

    /** {@code [chamber]}, the climate of the best load, {@link Placing#RESTS} for none. */
    final int[] offer;

    /** {@code [chamber][lot]}, the best load. */
    final boolean[][] load;

    WholeLoads(Store store, Offers offers, LoadSearch search, long steps) {
        super(store, offers, search);
        this.steps = steps;
        parts = new double[store.lots];
        offer = new int[store.chambers];
        load = new boolean[store.chambers][store.lots];
    }

    @Override
    double most(Branch branch, int c, double[] price) {
        double best = least(branch, c);
        double open = best;
        offer[c] = Placing.RESTS;
        Arrays.fill(load[c], false);
        for (int o : offers.ordered(branch, c, price)) {
            if (offers.ceiling[c][o] <= best) {
                break;
            }
            double cost = store.cost[c][o];
            Weights weights = offers.weights(c, o);
            Gains gains = offers.gains;
            gains.of(store, branch, c, o, price);
            boolean counts = offers.ceiling[c][o] > open;
            search.run(c, o, gains, weights, best + cost, counts ? steps : steps / QUICKER + 1);
            weights.tighten(gains, Math.max(search.value, gains.held()), TIGHTENING);
            offers.ceiling[c][o] =
                    Math.min(offers.ceiling[c][o], Math.max(search.value, search.open) - cost);
            open = Math.max(open, offers.ceiling[c][o]);
            if (search.found) {
                best = search.value - cost;
                offer[c] = o;
                System.arraycopy(search.load, 0, load[c], 0, store.lots);
                for (int l = 0; l < parts.length; l++) {
                    parts[l] = search.load[l] ? 1 : 0;
                }
                bundle.add(c, load(o, parts, best, price));
            }
        }
        return Math.max(best, open);
    }
}

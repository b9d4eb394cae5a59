package org.wardon.sharing.placing;

import java.util.Arrays;
import java.util.stream.IntStream;

/** Loads of whole lots, as good as can be found within a number of steps. */
final class WholeLoads extends Loads {
    private static final int TIGHTENING = 3;
    private static final long QUICKER = 10;

    private final long steps;

    /** {@code [chamber]}, the climate of the best load, {@link Placing#RESTS} for none. */
    final int[] offer;

    /** {@code [chamber][lot]}, the best load. */
    final boolean[][] load;

    WholeLoads(Store store, Offers offers, LoadSearch search, long steps) {
        super(store, offers, search);
        this.steps = steps;
        offer = new int[store.chambers];
        load = new boolean[store.chambers][store.lots];
    }

    @Override
    double most(Branch branch, int c, double[] price) {
        double best = least(c);
        double open = best;
        offer[c] = Placing.RESTS;
        Arrays.fill(load[c], false);
        for (int o : offers.ordered(branch, c, price)) {
            if (offers.ceiling[c][o] <= best) {
                break;
            }
            double cost = store.cost[c][o];
            Weights weights = offers.weights(c, o);
            offers.gains(branch, c, o, price);
            double toBeat = best == Double.NEGATIVE_INFINITY ? -1 : best + cost;
            boolean counts = offers.ceiling[c][o] > open;
            search.run(c, o, offers.gain, weights, toBeat, counts ? steps : steps / QUICKER + 1);
            weights.tighten(offers.gain, Math.max(search.value, 0), TIGHTENING);
            offers.ceiling[c][o] =
                    Math.min(offers.ceiling[c][o], Math.max(search.value, search.open) - cost);
            open = Math.max(open, offers.ceiling[c][o]);
            if (search.found) {
                best = search.value - cost;
                offer[c] = o;
                System.arraycopy(search.load, 0, load[c], 0, store.lots);
                bundle.add(c, load(o, best, price));
            }
        }
        return Math.max(best, open);
    }

    private Bundle.Load load(int o, double above, double[] price) {
        int[] lots = IntStream.range(0, store.lots).filter(l -> search.load[l]).toArray();
        double[] parts = new double[lots.length];
        Arrays.fill(parts, 1);
        double value = above;
        for (int l : lots) {
            value += price[l];
        }
        return new Bundle.Load(o, lots, parts, value);
    }
}

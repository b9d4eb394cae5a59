package org.wardon.sharing.placing;

import java.util.stream.IntStream;

/** Loads that may hold parts of lots: quickly found, and a bound that is seldom far too high. */
final class PartedLoads extends Loads {
    private static final int TIGHTENING = 6;

    private final double[] parts;

    PartedLoads(Store store, Offers offers, LoadSearch search) {
        super(store, offers, search);
        parts = new double[store.lots];
    }

    @Override
    double most(Branch branch, int c, double[] price) {
        double best = least(c);
        for (int o : offers.ordered(branch, c, price)) {
            if (offers.ceiling[c][o] <= best) {
                break;
            }
            double cost = store.cost[c][o];
            Weights weights = offers.weights(c, o);
            offers.gains(branch, c, o, price);
            weights.tighten(offers.gain, 0, TIGHTENING);
            double roof =
                    Math.min(weights.bound(offers.gain), search.roof(c, o, offers.gain, weights));
            offers.ceiling[c][o] = roof - cost;
            if (roof - cost > best) {
                best = roof - cost;
                double gained = search.parts(parts, weights.total);
                bundle.add(c, load(o, gained - cost, price));
            }
        }
        return best;
    }

    private Bundle.Load load(int o, double above, double[] price) {
        int[] lots = IntStream.range(0, parts.length).filter(l -> parts[l] > 0).toArray();
        double[] some = new double[lots.length];
        double value = above;
        for (int i = 0; i < lots.length; i++) {
            some[i] = parts[lots[i]];
            value += some[i] * price[lots[i]];
        }
        return new Bundle.Load(o, lots, some, value);
    }
}

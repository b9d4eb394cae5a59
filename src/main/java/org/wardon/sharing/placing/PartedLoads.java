package org.wardon.sharing.placing;

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
        double best = least(branch, c);
        for (int o : offers.ordered(branch, c, price)) {
            if (offers.ceiling[c][o] <= best) {
                break;
            }
            double cost = store.cost[c][o];
            Weights weights = offers.weights(c, o);
            Gains gains = offers.gains;
            gains.of(store, branch, c, o, price);
            weights.tighten(gains, gains.held(), TIGHTENING);
            double roof = Math.min(weights.bound(gains), search.roof(c, o, gains, weights));
            offers.ceiling[c][o] = roof - cost;
            if (roof - cost > best) {
                best = roof - cost;
                double gained = search.parts(parts);
                bundle.add(c, load(o, parts, gained - cost, price));
            }
        }
        return best;
    }
}

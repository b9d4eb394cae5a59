package org.wardon.sharing.placing;

import java.util.stream.IntStream;

/** The loads that earn most above prices, one of each chamber, and what they sum to at most. */
abstract class Loads {
    final Store store;
    final Offers offers;
    final LoadSearch search;
    final Bundle bundle;

    /** {@code [chamber]}, what it may earn above the prices at most. */
    final double[] most;

    Loads(Store store, Offers offers, LoadSearch search) {
        this.store = store;
        this.offers = offers;
        this.search = search;
        most = new double[store.chambers];
        bundle = new Bundle(store);
        for (int c = 0; c < store.chambers; c++) {
            bundle.add(c, nothing(c));
        }
    }

    private Bundle.Load nothing(int c) {
        boolean rests = store.mayRest[c];
        return new Bundle.Load(
                rests ? Placing.RESTS : 0,
                new int[0],
                new double[0],
                rests ? 0 : -store.cost[c][0]);
    }

    /** No placing of a branch is worth more; the loads met go into the bundle. */
    double bound(Branch branch, double[] price) {
        double sum = 0;
        for (int kind = 0; kind < price.length; kind++) {
            sum += branch.count[kind] * price[kind];
        }
        for (int c = 0; c < store.chambers; c++) {
            most[c] = most(branch, c, price);
            sum += most[c];
        }
        return sum;
    }

    /** What a chamber earns above the prices at most. */
    abstract double most(Branch branch, int chamber, double[] price);

    /** What a chamber earns at least, if it may take nothing and rest. */
    double least(Branch branch, int c) {
        boolean rests = store.mayRest[c] && !branch.holds(c);
        return rests ? 0 : Double.NEGATIVE_INFINITY;
    }

    /** A load by kinds, from parts of lots and what it earns above their prices. */
    Bundle.Load load(int o, double[] parts, double above, double[] price) {
        double[] ofKind = new double[parts.length];
        for (int l = 0; l < parts.length; l++) {
            ofKind[store.likeness.kind[l]] += Math.max(0, parts[l]);
        }
        int[] kinds = IntStream.range(0, parts.length).filter(k -> ofKind[k] > 0).toArray();
        double value = above;
        for (int kind : kinds) {
            value += ofKind[kind] * price[kind];
        }
        return new Bundle.Load(
                o, kinds, IntStream.of(kinds).mapToDouble(k -> ofKind[k]).toArray(), value);
    }
}

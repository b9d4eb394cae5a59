package org.wardon.sharing.placing;

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
        for (double one : price) {
            sum += one;
        }
        for (int c = 0; c < store.chambers; c++) {
            most[c] = most(branch, c, price);
            sum += most[c];
        }
        return sum;
    }

    /** What a chamber earns above the prices at most. */
    abstract double most(Branch branch, int chamber, double[] price);

    /** What a chamber earns at least, if it takes nothing. */
    double least(int c) {
        return store.mayRest[c] ? 0 : Double.NEGATIVE_INFINITY;
    }
}

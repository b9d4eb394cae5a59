package org.wardon.sharing.placing;

/** The climates of all chambers with the weights of their limits, and how high each can reach. */
final class Offers {
    private static final int FIRST_TIGHTENING = 60;

    private final Store store;
    private final Weights[][] weights;
    private final boolean[][] tightened;

    /** Earnings less prices of what a branch allows, where last asked for. */
    final Gains gains;

    /** {@code [chamber][offer]}, no load earns more above the prices last looked at. */
    final double[][] ceiling;

    Offers(Store store, boolean together) {
        this.store = store;
        gains = new Gains(store.lots);
        Cover cover = new Cover(store.lots);
        Picking picking = new Picking(store.lots);
        weights = new Weights[store.chambers][];
        ceiling = new double[store.chambers][];
        tightened = new boolean[store.chambers][];
        for (int c = 0; c < store.chambers; c++) {
            weights[c] = new Weights[store.offers(c)];
            for (int o = 0; o < store.offers(c); o++) {
                weights[c][o] =
                        new Weights(
                                store,
                                c,
                                o,
                                together ? store.company[c][o] : store.alone,
                                cover,
                                picking);
            }
            ceiling[c] = new double[store.offers(c)];
            tightened[c] = new boolean[store.offers(c)];
        }
    }

    Weights weights(int c, int o) {
        return weights[c][o];
    }

    /** Climates of a chamber that a branch allows, the most promising at these prices first. */
    int[] ordered(Branch branch, int c, double[] price) {
        int[] order = branch.offers[c].stream().toArray();
        for (int o : order) {
            gains.of(store, branch, c, o, price);
            if (!tightened[c][o]) {
                tightened[c][o] = true;
                weights[c][o].tighten(gains, gains.held(), FIRST_TIGHTENING);
            }
            ceiling[c][o] = weights[c][o].bound(gains) - store.cost[c][o];
        }
        for (int i = 1; i < order.length; i++) {
            int one = order[i];
            int at = i;
            while (at > 0 && ceiling[c][order[at - 1]] < ceiling[c][one]) {
                order[at] = order[at - 1];
                at--;
            }
            order[at] = one;
        }
        return order;
    }
}

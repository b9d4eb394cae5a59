package org.wardon.sharing.placing;

import java.util.Arrays;

/** What lots would gain in one chamber and climate, and which of them it must hold. */
final class Gains {
    /** {@code [lot]}, earnings less price, currency; not above 0 where it may not stand. */
    final double[] ofLot;

    /** {@code [lot]}, whether the chamber must hold it, whatever it gains. */
    final boolean[] must;

    Gains(int lots) {
        ofLot = new double[lots];
        must = new boolean[lots];
    }

    /** What the lots it must hold gain together, each by itself; 0 for none. */
    double held() {
        double sum = 0;
        for (int l = 0; l < must.length; l++) {
            sum += must[l] ? ofLot[l] : 0;
        }
        return sum;
    }

    /** Earnings less prices of as many lots of each kind as a branch allows a chamber. */
    void of(Store store, Branch branch, int c, int o, double[] price) {
        double[] earns = store.earns[c][o];
        Likeness likeness = store.likeness;
        for (int l = 0; l < ofLot.length; l++) {
            int kind = likeness.kind[l];
            int rank = likeness.rank[l];
            ofLot[l] = rank < branch.most[c][kind] ? earns[l] - price[kind] : Climate.NEVER;
            must[l] = rank < branch.least[c][kind];
        }
    }

    /** Earnings less what each lot earns where it stands now; nothing must be held. */
    void of(double[] earns, double[] elsewhere) {
        Arrays.fill(must, false);
        for (int l = 0; l < ofLot.length; l++) {
            ofLot[l] = earns[l] - elsewhere[l];
        }
    }
}

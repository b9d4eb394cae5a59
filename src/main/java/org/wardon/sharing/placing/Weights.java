package org.wardon.sharing.placing;

import java.util.Arrays;

/**
 * What room, mass and cooling of each day are worth in one climate of one chamber. Summed over a
 * lot's stay they make one weight of it, and the many limits become one that every load keeps: the
 * sum of the weights of a load is at most {@link #total}. The best such values make the bound of a
 * load as low as that of its linear program.
 */
final class Weights {
    private static final int KINDS = 3;
    private static final double FIRST_STEP = 1.0;

    private final Store store;
    private final int chamber;
    private final int offer;

    /** {@code [kind * days + day]}: mass, volume, cooling. */
    private final double[] day;

    private final double[] slack;
    private final Company company;
    private final Cover cover;
    private final Picking picking;

    /** {@code [lot]}, the weight of each lot. */
    final double[] ofLot;

    double total;

    Weights(Store store, int chamber, int offer, Company company, Cover cover, Picking picking) {
        this.store = store;
        this.chamber = chamber;
        this.offer = offer;
        day = new double[KINDS * store.days];
        slack = new double[KINDS * store.days];
        this.company = company;
        this.cover = cover;
        this.picking = picking;
        ofLot = new double[store.lots];
    }

    /**
     * Returns what no load of this chamber and climate can exceed.
     *
     * @param gains what lots gain there, and which must be held
     */
    double bound(Gains gains) {
        double[] gain = gains.ofLot;
        double sum = total;
        boolean alone = company == store.alone;
        for (int l = 0; l < store.lots; l++) {
            double above = gain[l] - ofLot[l];
            if (alone || gains.must[l]) {
                sum += gains.must[l] ? above : Math.max(0, above);
            }
        }
        return alone ? sum : sum + covered(gains);
    }

    private double covered(Gains gains) {
        cover.of(
                store.lots,
                company.apart,
                company.partners,
                company.partnerLoss,
                company.partnerCount,
                company.lightest);
        cover.clear();
        for (int l = 0; l < store.lots; l++) {
            double above = gains.ofLot[l] - ofLot[l];
            if (above > 0 && !gains.must[l]) {
                cover.gains(l, above);
            }
        }
        return cover.sum();
    }

    /**
     * Takes some steps towards the lowest bound; {@code reached} is a load known to be possible.
     */
    void tighten(Gains gains, double reached, int steps) {
        double[] best = day.clone();
        double least = bound(gains);
        double length = FIRST_STEP;
        for (int step = 0; step < steps; step++) {
            double square = slope(gains);
            double above = bound(gains) - reached;
            if (square <= 0 || above <= 1e-9 * Math.abs(reached)) {
                break;
            }
            double factor = length * above / square;
            for (int i = 0; i < day.length; i++) {
                day[i] = Math.max(0, day[i] - factor * slack[i]);
            }
            weigh();
            double now = bound(gains);
            if (now < least) {
                least = now;
                System.arraycopy(day, 0, best, 0, day.length);
            } else {
                length *= 0.7;
            }
        }
        System.arraycopy(best, 0, day, 0, day.length);
        weigh();
    }

    /** What the lots worth taking leave of each limit; returns the square of its length. */
    private double slope(Gains gains) {
        Arrays.fill(slack, 1);
        picking.pick(company, gains, ofLot);
        int days = store.days;
        for (int l = 0; l < store.lots; l++) {
            if (picking.taken[l]) {
                for (int d = store.first[l]; d <= store.last[l]; d++) {
                    slack[d] -= store.massShare[chamber][l];
                    slack[days + d] -= store.volumeShare[chamber][l];
                    slack[2 * days + d] -= store.heatShare[chamber][offer][l * days + d];
                }
            }
        }
        double square = 0;
        for (int i = 0; i < day.length; i++) {
            boolean stuck = day[i] <= 0 && slack[i] > 0;
            slack[i] = stuck ? 0 : slack[i];
            square += slack[i] * slack[i];
        }
        return square;
    }

    private void weigh() {
        int days = store.days;
        total = 0;
        for (double one : day) {
            total += one;
        }
        for (int l = 0; l < store.lots; l++) {
            double sum = 0;
            for (int d = store.first[l]; d <= store.last[l]; d++) {
                sum += day[d] * store.massShare[chamber][l];
                sum += day[days + d] * store.volumeShare[chamber][l];
                sum += day[2 * days + d] * store.heatShare[chamber][offer][l * days + d];
            }
            ofLot[l] = sum;
        }
    }
}

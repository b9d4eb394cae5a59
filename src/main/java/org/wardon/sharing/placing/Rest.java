package org.wardon.sharing.placing;

import java.util.Arrays;

/** What a load in the making leaves of a chamber, and what others lose by it. */
final class Rest {
    private static final double ROUNDING = 1e-9;

    private final Store store;
    private final int days;
    private final double[] mass;
    private final double[] volume;
    private final double[] heat;
    private int chamber;
    private double[] heatShare;
    private Company company = Company.NONE;

    /** {@code [lot]}, what it would lose by those taken, currency. */
    final double[] loses;

    /** {@code [lot]}. */
    final boolean[] taken;

    Rest(Store store) {
        this.store = store;
        days = store.days;
        mass = new double[days];
        volume = new double[days];
        heat = new double[days];
        heatShare = new double[0];
        loses = new double[store.lots];
        taken = new boolean[store.lots];
    }

    /** Nothing is taken yet. */
    void empty(int c, int o) {
        chamber = c;
        heatShare = store.heatShare[c][o];
        company = store.company[c][o];
        Arrays.fill(mass, 1 + ROUNDING);
        Arrays.fill(volume, 1 + ROUNDING);
        Arrays.fill(heat, 1 + ROUNDING);
        Arrays.fill(loses, 0);
        Arrays.fill(taken, false);
    }

    boolean fits(int l) {
        double m = store.massShare[chamber][l];
        double v = store.volumeShare[chamber][l];
        for (int d = store.first[l]; d <= store.last[l]; d++) {
            if (m > mass[d] || v > volume[d] || heatShare[l * days + d] > heat[d]) {
                return false;
            }
        }
        return true;
    }

    void take(int l) {
        change(l, 1);
    }

    void giveBack(int l) {
        change(l, -1);
    }

    private void change(int l, int sign) {
        taken[l] = sign > 0;
        double m = store.massShare[chamber][l];
        double v = store.volumeShare[chamber][l];
        for (int d = store.first[l]; d <= store.last[l]; d++) {
            mass[d] -= sign * m;
            volume[d] -= sign * v;
            heat[d] -= sign * heatShare[l * days + d];
        }
        int[] others = company.others[l];
        double[] loss = company.loss[l];
        for (int k = 0; k < others.length; k++) {
            if (loss[k] < Climate.APART) {
                loses[others[k]] += sign * loss[k];
            }
        }
    }
}

package org.wardon.sharing.placing;

import java.util.Arrays;

/**
 * Picks lots of which none must avoid another, those first that gain most for what they shut out.
 */
final class Picking {
    private final double[] above;
    private final double[] key;
    private final int[] order;
    private final long[] shut;

    /** {@code [lot]}, those picked. */
    final boolean[] taken;

    Picking(int lots) {
        above = new double[lots];
        key = new double[lots];
        order = new int[lots];
        shut = new long[Cover.words(lots)];
        taken = new boolean[lots];
    }

    /**
     * Picks.
     *
     * @param company who must not meet whom
     * @param gains what each gains, and those to be picked in any case
     * @param weight {@code [lot]}, what of it its room and cooling are worth
     */
    void pick(Company company, Gains gains, double[] weight) {
        double[] gain = gains.ofLot;
        Arrays.fill(taken, false);
        Arrays.fill(shut, 0);
        int count = 0;
        for (int l = 0; l < gain.length; l++) {
            above[l] = gains.must[l] ? 0 : Math.max(0, gain[l] - weight[l]);
            if (gains.must[l]) {
                take(company, l);
            }
        }
        for (int l = 0; l < gain.length; l++) {
            if (above[l] > 0) {
                insert(l, above[l] / (above[l] + shutOut(company.apart[l])), count++);
            }
        }
        for (int k = 0; k < count; k++) {
            int l = order[k];
            if ((shut[l >> 6] & 1L << l) == 0 && above[l] > lost(company, l)) {
                take(company, l);
            }
        }
    }

    private void take(Company company, int l) {
        taken[l] = true;
        for (int w = 0; w < shut.length; w++) {
            shut[w] |= company.apart[l][w];
        }
    }

    private double shutOut(long[] apart) {
        double sum = 0;
        for (int w = 0; w < apart.length; w++) {
            for (long bits = apart[w]; bits != 0; bits &= bits - 1) {
                sum += above[(w << 6) + Long.numberOfTrailingZeros(bits)];
            }
        }
        return sum;
    }

    private double lost(Company company, int l) {
        double sum = 0;
        int[] partners = company.partners[l];
        for (int k = 0; k < partners.length; k++) {
            sum += taken[partners[k]] ? company.partnerLoss[l][k] : 0;
        }
        return sum;
    }

    private void insert(int l, double ratio, int count) {
        int at = count;
        while (at > 0 && key[at - 1] < ratio) {
            key[at] = key[at - 1];
            order[at] = order[at - 1];
            at--;
        }
        key[at] = ratio;
        order[at] = l;
    }
}

package org.wardon.sharing.placing;

import java.util.Arrays;

/**
 * The lots worth looking at for one load, most gain for their weight first, and which of them shut
 * out which: two for which there is no room or cooling together, or that lose as much by each other
 * as the lesser gains.
 */
final class Listing {
    private static final double TINY = 1e-12;

    private final Store store;
    private final int[] lastOfKind;
    private final double[] shutsOut;
    private final int[] heaviest;

    /** How many; what follows is by place among them unless said otherwise. */
    int count;

    /** Words of a set of them. */
    int words;

    final int[] lot;

    /** {@code [lot]}, where it stands among them, -1 for nowhere. */
    final int[] place;

    /** Gain for its weight. */
    final double[] key;

    /** The like lot that gains next more, -1 for none. */
    final int[] before;

    /** The like lot that gains next less, -1 for none. */
    final int[] after;

    /** Bits of those it shuts out. */
    final long[][] apart;

    /** Others it may stand with and loses by, and what; as many as {@link #partnerCount}. */
    final int[][] partners;

    final double[][] losses;
    final int[] partnerCount;

    /** Those that shut out little first. */
    final int[] lightest;

    Listing(Store store) {
        this.store = store;
        int lots = store.lots;
        lastOfKind = new int[lots];
        shutsOut = new double[lots];
        heaviest = new int[lots];
        lot = new int[lots];
        place = new int[lots];
        key = new double[lots];
        before = new int[lots];
        after = new int[lots];
        apart = new long[lots][Cover.words(lots)];
        partners = new int[lots][lots];
        losses = new double[lots][lots];
        partnerCount = new int[lots];
        lightest = new int[lots];
    }

    /**
     * Lists lots that can be in a load worth looking for beside those it must hold.
     *
     * @param gains what they gain
     * @param weight {@code [lot]}, their weights
     * @param room weight there is for them
     * @param toBeat what they must gain together
     * @param shut bits of lots that must not stand beside those held
     */
    void choose(Gains gains, double[] weight, double room, double toBeat, long[] shut) {
        double[] gain = gains.ofLot;
        double all = room;
        for (int l = 0; l < store.lots; l++) {
            all += gains.must[l] ? 0 : Math.max(0, gain[l] - weight[l]);
        }
        count = 0;
        Arrays.fill(place, -1);
        for (int l = 0; l < store.lots; l++) {
            boolean may = gain[l] > 0 && !gains.must[l] && (shut[l >> 6] & 1L << l) == 0;
            if (may && all + Math.min(0, gain[l] - weight[l]) > toBeat) {
                insert(l, gain[l] / (weight[l] + TINY));
            }
        }
        words = Cover.words(count);
        Arrays.fill(lastOfKind, -1);
        for (int i = 0; i < count; i++) {
            place[lot[i]] = i;
            int kind = store.likeness.kind[lot[i]];
            before[i] = lastOfKind[kind];
            after[i] = -1;
            if (before[i] >= 0) {
                after[before[i]] = i;
            }
            lastOfKind[kind] = i;
        }
    }

    private void insert(int l, double ratio) {
        int at = count++;
        while (at > 0 && key[at - 1] < ratio) {
            key[at] = key[at - 1];
            lot[at] = lot[at - 1];
            at--;
        }
        key[at] = ratio;
        lot[at] = l;
    }

    /** Who shuts out whom in a climate, and in which order lots are covered. */
    void relate(int c, int o, double[] gain) {
        Company company = store.company[c][o];
        for (int i = 0; i < count; i++) {
            Arrays.fill(apart[i], 0, words, 0);
            shutsOut[i] = 0;
            partnerCount[i] = 0;
            int[] others = company.others[lot[i]];
            double[] loss = company.loss[lot[i]];
            for (int k = 0; k < others.length; k++) {
                int j = place[others[k]];
                if (j >= 0 && loss[k] >= Math.min(gain[lot[i]], gain[lot[j]])) {
                    apart[i][j >> 6] |= 1L << j;
                    shutsOut[i] += gain[lot[j]];
                } else if (j >= 0) {
                    partners[i][partnerCount[i]] = j;
                    losses[i][partnerCount[i]++] = loss[k];
                }
            }
            crowd(i, store.crowds[c][o][lot[i]], gain);
            int at = i;
            while (at > 0 && shutsOut[heaviest[at - 1]] < shutsOut[i]) {
                heaviest[at] = heaviest[at - 1];
                at--;
            }
            heaviest[at] = i;
        }
        for (int i = 0; i < count; i++) {
            lightest[i] = heaviest[count - 1 - i];
        }
    }

    private void crowd(int i, long[] crowd, double[] gain) {
        for (int j = 0; j < count; j++) {
            int l = lot[j];
            if ((crowd[l >> 6] & 1L << l) != 0 && (apart[i][j >> 6] & 1L << j) == 0) {
                apart[i][j >> 6] |= 1L << j;
                shutsOut[i] += gain[l];
            }
        }
    }
}

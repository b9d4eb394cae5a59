package org.wardon.sharing.placing;

import java.util.Arrays;

/**
 * Which lots are alike: equal in every number the search sees (days, mass, room, heat, what they
 * earn in each chamber and climate, by whom they lose). Where two stand can be exchanged and
 * nothing changes, so of all placings that differ by such an exchange one needs to be looked at.
 */
final class Likeness {
    /** {@code [lot]}, the first lot it is like; itself where there is none before it. */
    final int[] kind;

    /** {@code [lot]}, how many of its kind come before it. */
    final int[] rank;

    /** {@code [lot]}, how many are of its kind at the first of each, 0 at the others. */
    final int[] count;

    /** Whether any two lots are alike. */
    final boolean any;

    Likeness(Store store) {
        kind = new int[store.lots];
        rank = new int[store.lots];
        count = new int[store.lots];
        boolean found = false;
        for (int l = 0; l < store.lots; l++) {
            kind[l] = l;
            for (int first = 0; first < l && kind[l] == l; first++) {
                if (kind[first] == first && alike(store, first, l)) {
                    kind[l] = first;
                    found = true;
                }
            }
            rank[l] = count[kind[l]]++;
        }
        any = found;
    }

    boolean alike(int one, int other) {
        return kind[one] == kind[other];
    }

    private static boolean alike(Store store, int a, int b) {
        if (store.first[a] != store.first[b] || store.last[a] != store.last[b]) {
            return false;
        }
        for (int c = 0; c < store.chambers; c++) {
            if (store.massShare[c][a] != store.massShare[c][b]
                    || store.volumeShare[c][a] != store.volumeShare[c][b]) {
                return false;
            }
            for (int o = 0; o < store.offers(c); o++) {
                double[] heat = store.heatShare[c][o];
                int days = store.days;
                if (store.earns[c][o][a] != store.earns[c][o][b]
                        || !Arrays.equals(
                                heat, a * days, (a + 1) * days, heat, b * days, (b + 1) * days)
                        || !loseAlike(store.company[c][o], a, b)) {
                    return false;
                }
            }
        }
        return true;
    }

    /** Whether two lots lose as much by every third one; what they lose by each other is one. */
    private static boolean loseAlike(Company company, int a, int b) {
        int[] ofA = company.others[a];
        int[] ofB = company.others[b];
        int i = 0;
        int j = 0;
        while (true) {
            i += i < ofA.length && ofA[i] == b ? 1 : 0;
            j += j < ofB.length && ofB[j] == a ? 1 : 0;
            if (i == ofA.length || j == ofB.length) {
                return i == ofA.length && j == ofB.length;
            }
            if (ofA[i] != ofB[j] || company.loss[a][i] != company.loss[b][j]) {
                return false;
            }
            i++;
            j++;
        }
    }
}

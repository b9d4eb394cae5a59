package org.wardon.sharing.placing;

import java.util.Arrays;

/**
 * The best load of one chamber in one climate at given gains of lots, depth first. Of the lots left
 * as many are covered by groups of which only one can be taken as cannot lead to a better load by
 * themselves; a better one holds one of the rest, so only with each of these is it looked for
 * (branching on what a cover leaves, as for heaviest cliques; E. Balas and J. Xue, SIAM Journal on
 * Computing 20, 1991, from memory). Two lots for which there is no room or cooling together, or
 * that lose as much by each other as the lesser gains, are such a group too. Of like lots those
 * that gain more come first: a load that holds one without them is worth no more than the one that
 * has them exchanged. Stops after a number of steps; what it has not looked into then counts in
 * {@link #open}.
 */
final class LoadSearch {
    private static final double ROUNDING = 1e-9;
    private static final int NARROWINGS = 3;
    private static final double TINY = 1e-12;

    private final Store store;
    private final int days;
    private int chamber;
    private int offer;
    private double[] gain;
    private double[] weight;
    private Company company;

    /** Lots worth looking at, most gain for their weight first; what follows is by place here. */
    private int count;

    private int words;
    private final int[] lot;
    private final int[] place;
    private final double[] key;

    /** The like lot that gains next more, -1 for none. */
    private final int[] before;

    /** The like lot that gains next less, -1 for none. */
    private final int[] after;

    private final int[] lastOfKind;
    private final long[][] apart;
    private final double[] shutsOut;
    private final int[] heaviest;
    private final double[] loses;
    private final long[][] free;
    private final long[][] branches;
    private final boolean[] paired;
    private final int[] better;
    private final int[] lesser;
    private final int[] filled;
    private final Cover cover;
    private final int[][] partners;
    private final double[][] losses;
    private final int[] partnerCount;
    private final int[] lightest;
    private double slope;
    private int pairs;
    private int fill;

    private final double[] mass;
    private final double[] volume;
    private final double[] heat;
    private final boolean[] taken;
    private long steps;
    private long most;

    /** Loads worth no more are not looked for, nor counted as open. */
    private double goal;

    /** Value of the best load found. */
    double value;

    /** No load is worth more than the greater of this and {@link #value}. */
    double open;

    /** {@code [lot]}, the best load. */
    final boolean[] load;

    /** Whether a load better than the one asked to beat was found. */
    boolean found;

    LoadSearch(Store store) {
        this.store = store;
        int lots = store.lots;
        days = store.days;
        lot = new int[lots];
        place = new int[lots];
        key = new double[lots];
        before = new int[lots];
        after = new int[lots];
        lastOfKind = new int[lots];
        apart = new long[lots][Cover.words(lots)];
        shutsOut = new double[lots];
        heaviest = new int[lots];
        loses = new double[lots];
        free = new long[2 * lots + 2][Cover.words(lots)];
        branches = new long[2 * lots + 2][Cover.words(lots)];
        paired = new boolean[lots];
        better = new int[lots];
        lesser = new int[lots];
        filled = new int[lots];
        cover = new Cover(lots);
        partners = new int[lots][lots];
        losses = new double[lots][lots];
        partnerCount = new int[lots];
        lightest = new int[lots];
        mass = new double[days];
        volume = new double[days];
        heat = new double[days];
        taken = new boolean[lots];
        load = new boolean[lots];
        gain = new double[0];
        weight = new double[0];
        company = Company.NONE;
    }

    /**
     * Looks for the best load.
     *
     * @param c the chamber
     * @param o its climate
     * @param gains {@code [lot]}, earnings less price; not above 0 where it may not stand
     * @param weights weights of the lots
     * @param toBeat loads worth no more are not looked for
     * @param mostSteps limit of the search
     */
    void run(int c, int o, double[] gains, Weights weights, double toBeat, long mostSteps) {
        chamber = c;
        offer = o;
        gain = gains;
        weight = weights.ofLot;
        company = store.company[c][o];
        value = toBeat;
        open = Double.NEGATIVE_INFINITY;
        found = false;
        steps = 0;
        most = mostSteps;
        choose(weights.total, toBeat);
        relate();
        Arrays.fill(mass, 1 + ROUNDING);
        Arrays.fill(volume, 1 + ROUNDING);
        Arrays.fill(heat, 1 + ROUNDING);
        if (toBeat < 0) {
            value = 0;
            found = true;
            Arrays.fill(load, false);
        }
        everything();
        goal = Double.NEGATIVE_INFINITY;
        deepen(0, 0, weights.total);
        if (steps > most) {
            lowerOpen(weights.total);
        }
    }

    /** Where not all was looked into: shows of a value in between that nothing exceeds it. */
    private void lowerOpen(double total) {
        double high = open;
        double low = value;
        for (int i = 0; i < NARROWINGS && high > low; i++) {
            everything();
            goal = 0.5 * (low + high);
            open = Double.NEGATIVE_INFINITY;
            steps = 0;
            deepen(0, 0, total);
            if (steps > most) {
                low = goal;
            } else {
                high = goal;
            }
        }
        open = high;
    }

    private void everything() {
        Arrays.fill(free[0], 0);
        for (int i = 0; i < count; i++) {
            free[0][i >> 6] |= 1L << i;
        }
    }

    /**
     * Bounds a load from above, parts of lots allowed.
     *
     * @param c the chamber
     * @param o its climate
     * @param gains {@code [lot]}, earnings less price
     * @param weights weights of the lots
     * @return the bound
     */
    double roof(int c, int o, double[] gains, Weights weights) {
        chamber = c;
        offer = o;
        gain = gains;
        weight = weights.ofLot;
        company = store.company[c][o];
        choose(weights.total, 0);
        relate();
        everything();
        return bound(free[0], weights.total);
    }

    /** The parts of lots behind the bound last asked for, {@code [lot]}; returns what they gain. */
    double parts(double[] parts, double room) {
        Arrays.fill(parts, 0);
        double left = room;
        double sum = 0;
        for (int k = 0; k < pairs; k++) {
            if (above(lesser[k]) > Math.max(0, above(better[k]))) {
                parts[lot[lesser[k]]] = 1;
                parts[lot[better[k]]] = -1;
                left -= weight[lot[lesser[k]]];
                sum += gain[lot[lesser[k]]];
            }
        }
        for (int k = 0; k < fill; k++) {
            int l = lot[filled[k]];
            boolean out = parts[l] < 0;
            double part = out ? 0 : Math.max(0, Math.min(1, left / (weight[l] + TINY)));
            parts[l] = part;
            left -= part * weight[l];
            sum += part * gain[l];
        }
        return sum;
    }

    /** Lots that can be in a load worth looking for, best first. */
    private void choose(double total, double toBeat) {
        double all = total;
        for (int l = 0; l < store.lots; l++) {
            all += Math.max(0, gain[l] - weight[l]);
        }
        count = 0;
        Arrays.fill(place, -1);
        for (int l = 0; l < store.lots; l++) {
            if (gain[l] > 0 && all + Math.min(0, gain[l] - weight[l]) > toBeat) {
                insert(l, gain[l] / (weight[l] + TINY));
            }
        }
        words = Cover.words(count);
        Arrays.fill(lastOfKind, -1);
        for (int i = 0; i < count; i++) {
            place[lot[i]] = i;
            loses[i] = 0;
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

    /** Who shuts out whom, and in which order lots are covered. */
    private void relate() {
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
            crowd(i);
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
        cover.of(count, apart, partners, losses, partnerCount, lightest);
    }

    private void crowd(int i) {
        long[] crowd = store.crowds[chamber][offer][lot[i]];
        for (int j = 0; j < count; j++) {
            int l = lot[j];
            if ((crowd[l >> 6] & 1L << l) != 0 && (apart[i][j >> 6] & 1L << j) == 0) {
                apart[i][j >> 6] |= 1L << j;
                shutsOut[i] += gain[l];
            }
        }
    }

    /**
     * The bound of lots left, those that must not meet counted once, up to what is granted. Where
     * the room alone would count more than that, its price is lowered: else loads of lots worth no
     * more than their room would be taken as covered.
     */
    private double covered(long[] left, double room, double granted) {
        if (slope * room > granted) {
            slope = Math.max(0, granted) / room;
        }
        cover.clear();
        for (int w = 0; w < words; w++) {
            for (long bits = left[w]; bits != 0; bits &= bits - 1) {
                int i = (w << 6) + Long.numberOfTrailingZeros(bits);
                double above = above(i);
                if (above > 0) {
                    cover.gains(i, above);
                }
            }
        }
        double full = slope * Math.max(0, room);
        return full + cover.sum(granted - full);
    }

    private void deepen(int depth, double worth, double left) {
        double roof = worth + bound(free[depth], left);
        double toBeat = Math.max(goal, value + ROUNDING * Math.abs(value));
        if (roof <= toBeat) {
            return;
        }
        if (++steps > most) {
            double all = covered(free[depth], left, Double.POSITIVE_INFINITY);
            open = Math.max(open, Math.min(roof, worth + all));
            return;
        }
        covered(free[depth], left, toBeat - worth);
        long[] branch = branches[depth];
        for (int w = 0; w < words; w++) {
            branch[w] = cover.uncovered(w);
        }
        for (int w = 0; w < words; w++) {
            while (branch[w] != 0) {
                int i = (w << 6) + Long.numberOfTrailingZeros(branch[w]);
                include(i, depth, worth, left);
                for (int k = i; k >= 0; k = after[k]) {
                    free[depth][k >> 6] &= ~(1L << k);
                    branch[k >> 6] &= ~(1L << k);
                }
            }
        }
    }

    /** Takes a lot, with the like ones left that gain more, and looks on. */
    private void include(int i, int depth, double worth, double left) {
        System.arraycopy(free[depth], 0, free[depth + 1], 0, words);
        int best = i;
        while (before[best] >= 0 && isIn(free[depth], before[best])) {
            best = before[best];
        }
        take(best, i, depth + 1, worth, left);
    }

    /** Takes like lots from one to another, as long as there is room, and looks on. */
    private void take(int i, int upTo, int depth, double worth, double left) {
        int l = lot[i];
        long[] now = free[depth];
        if (!isIn(now, i) || !fits(l)) {
            return;
        }
        double with = worth + gain[l] - loses[i];
        change(i, 1);
        if (with > value) {
            value = with;
            found = true;
            System.arraycopy(taken, 0, load, 0, taken.length);
        }
        now[i >> 6] &= ~(1L << i);
        for (int w = 0; w < words; w++) {
            now[w] &= ~apart[i][w];
        }
        if (i == upTo) {
            narrow(now);
            deepen(depth, with, left - weight[l]);
        } else {
            take(after[i], upTo, depth, with, left - weight[l]);
        }
        change(i, -1);
    }

    /** Leaves out lots that gain nothing any more or have no room. */
    private void narrow(long[] now) {
        for (int w = 0; w < words; w++) {
            for (long bits = now[w]; bits != 0; bits &= bits - 1) {
                int j = (w << 6) + Long.numberOfTrailingZeros(bits);
                if (gain[lot[j]] <= loses[j] || !fits(lot[j])) {
                    now[w] &= ~(1L << j);
                }
            }
        }
    }

    private static boolean isIn(long[] lots, int i) {
        return (lots[i >> 6] & 1L << i) != 0;
    }

    /**
     * What the lots left can add at most: by the price of weight at which they fill what is left,
     * lots in pairs that must not meet counted once.
     */
    private double bound(long[] left, double room) {
        pairs = 0;
        fill = 0;
        double space = room;
        slope = 0;
        for (int i = 0; i < count; i++) {
            paired[i] = false;
        }
        for (int w = 0; w < words && slope == 0; w++) {
            for (long bits = left[w]; bits != 0; bits &= bits - 1) {
                int i = (w << 6) + Long.numberOfTrailingZeros(bits);
                int partner = partner(i, left);
                if (partner >= 0) {
                    paired[i] = true;
                    paired[partner] = true;
                    better[pairs] = partner;
                    lesser[pairs++] = i;
                    continue;
                }
                filled[fill++] = i;
                space -= weight[lot[i]];
                if (space < 0) {
                    slope = key[i];
                    break;
                }
            }
        }
        double sum = slope * Math.max(0, room);
        for (int k = 0; k < fill; k++) {
            sum += Math.max(0, above(filled[k]));
        }
        for (int k = 0; k < pairs; k++) {
            double one = Math.max(0, above(better[k]));
            sum += Math.max(0, above(lesser[k]) - one);
        }
        return sum;
    }

    private double above(int i) {
        return gain[lot[i]] - loses[i] - slope * weight[lot[i]];
    }

    /** A lot before this one, itself without a partner, that it must not meet. */
    private int partner(int i, long[] left) {
        int last = i >> 6;
        for (int w = 0; w <= last; w++) {
            long bits = left[w] & apart[i][w];
            if (w == last) {
                bits &= (1L << i) - 1;
            }
            for (; bits != 0; bits &= bits - 1) {
                int j = (w << 6) + Long.numberOfTrailingZeros(bits);
                if (!paired[j]) {
                    return j;
                }
            }
        }
        return -1;
    }

    private boolean fits(int l) {
        double m = store.massShare[chamber][l];
        double v = store.volumeShare[chamber][l];
        double[] q = store.heatShare[chamber][offer];
        for (int d = store.first[l]; d <= store.last[l]; d++) {
            if (m > mass[d] || v > volume[d] || q[l * days + d] > heat[d]) {
                return false;
            }
        }
        return true;
    }

    private void change(int i, int sign) {
        int l = lot[i];
        taken[l] = sign > 0;
        double[] q = store.heatShare[chamber][offer];
        for (int d = store.first[l]; d <= store.last[l]; d++) {
            mass[d] -= sign * store.massShare[chamber][l];
            volume[d] -= sign * store.volumeShare[chamber][l];
            heat[d] -= sign * q[l * days + d];
        }
        int[] others = company.others[l];
        double[] loss = company.loss[l];
        for (int k = 0; k < others.length; k++) {
            int j = place[others[k]];
            if (j >= 0 && loss[k] < Climate.APART) {
                loses[j] += sign * loss[k];
            }
        }
    }
}

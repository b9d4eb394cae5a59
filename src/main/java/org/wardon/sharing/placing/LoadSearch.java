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
    private final Listing list;
    private final Rest rest;
    private final Cover cover;
    private final long[] shut;
    private final long[][] free;
    private final long[][] branches;
    private final boolean[] paired;
    private final int[] better;
    private final int[] lesser;
    private final int[] filled;
    private double[] gain;
    private double[] weight;
    private double slope;
    private int pairs;
    private int fill;

    /** What the lots it must hold are worth together, minus infinity where they cannot be. */
    private double held;

    /** Weight left beside them. */
    private double room;

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
        list = new Listing(store);
        rest = new Rest(store);
        cover = new Cover(lots);
        shut = new long[Cover.words(lots)];
        free = new long[2 * lots + 2][Cover.words(lots)];
        branches = new long[2 * lots + 2][Cover.words(lots)];
        paired = new boolean[lots];
        better = new int[lots];
        lesser = new int[lots];
        filled = new int[lots];
        load = new boolean[lots];
        gain = new double[0];
        weight = new double[0];
    }

    /**
     * Looks for the best load.
     *
     * @param c the chamber
     * @param o its climate
     * @param gains what lots gain there, and which must be held
     * @param weights weights of the lots
     * @param toBeat loads worth no more are not looked for
     * @param mostSteps limit of the search
     */
    void run(int c, int o, Gains gains, Weights weights, double toBeat, long mostSteps) {
        hold(c, o, gains, weights);
        value = toBeat;
        open = Double.NEGATIVE_INFINITY;
        found = held > toBeat;
        if (found) {
            value = held;
            System.arraycopy(rest.taken, 0, load, 0, load.length);
        }
        if (held == Double.NEGATIVE_INFINITY) {
            value = held;
            return;
        }
        steps = 0;
        most = mostSteps;
        relate(c, o, gains, value - held);
        everything();
        goal = Double.NEGATIVE_INFINITY;
        deepen(0, held, room);
        if (steps > most) {
            lowerOpen();
        }
    }

    /** Takes the lots that must be held. */
    private void hold(int c, int o, Gains gains, Weights weights) {
        gain = gains.ofLot;
        weight = weights.ofLot;
        held = 0;
        room = weights.total;
        rest.empty(c, o);
        Arrays.fill(shut, 0);
        long[][] apart = store.company[c][o].apart;
        for (int l = 0; l < store.lots; l++) {
            if (gains.must[l]) {
                boolean can = rest.fits(l) && !isIn(shut, l);
                held = can ? held + gain[l] - rest.loses[l] : Double.NEGATIVE_INFINITY;
                room -= weight[l];
                rest.take(l);
                for (int w = 0; w < shut.length; w++) {
                    shut[w] |= apart[l][w];
                }
            }
        }
    }

    private void relate(int c, int o, Gains gains, double toBeat) {
        list.choose(gains, weight, room, toBeat, shut);
        list.relate(c, o, gain);
        cover.of(
                list.count,
                list.apart,
                list.partners,
                list.losses,
                list.partnerCount,
                list.lightest);
    }

    /** Where not all was looked into: shows of a value in between that nothing exceeds it. */
    private void lowerOpen() {
        double high = open;
        double low = value;
        for (int i = 0; i < NARROWINGS && high > low; i++) {
            everything();
            goal = 0.5 * (low + high);
            open = Double.NEGATIVE_INFINITY;
            steps = 0;
            deepen(0, held, room);
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
        for (int i = 0; i < list.count; i++) {
            free[0][i >> 6] |= 1L << i;
        }
        narrow(free[0]);
    }

    /**
     * Bounds a load from above, parts of lots allowed.
     *
     * @param c the chamber
     * @param o its climate
     * @param gains what lots gain there, and which must be held
     * @param weights weights of the lots
     * @return the bound
     */
    double roof(int c, int o, Gains gains, Weights weights) {
        hold(c, o, gains, weights);
        if (held == Double.NEGATIVE_INFINITY) {
            return held;
        }
        relate(c, o, gains, 0);
        everything();
        return held + bound(free[0], room);
    }

    /** The parts of lots behind the bound last asked for, {@code [lot]}; returns what they gain. */
    double parts(double[] parts) {
        double left = room;
        double sum = held;
        for (int l = 0; l < parts.length; l++) {
            parts[l] = rest.taken[l] ? 1 : 0;
        }
        for (int k = 0; k < pairs; k++) {
            if (above(lesser[k]) > Math.max(0, above(better[k]))) {
                parts[list.lot[lesser[k]]] = 1;
                parts[list.lot[better[k]]] = -1;
                left -= weight[list.lot[lesser[k]]];
                sum += gain[list.lot[lesser[k]]];
            }
        }
        for (int k = 0; k < fill; k++) {
            int l = list.lot[filled[k]];
            boolean out = parts[l] < 0;
            double part = out ? 0 : Math.max(0, Math.min(1, left / (weight[l] + TINY)));
            parts[l] = part;
            left -= part * weight[l];
            sum += part * gain[l];
        }
        return sum;
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
        for (int w = 0; w < list.words; w++) {
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
        for (int w = 0; w < list.words; w++) {
            branch[w] = cover.uncovered(w);
        }
        for (int w = 0; w < list.words; w++) {
            while (branch[w] != 0) {
                int i = (w << 6) + Long.numberOfTrailingZeros(branch[w]);
                include(i, depth, worth, left);
                for (int k = i; k >= 0; k = list.after[k]) {
                    free[depth][k >> 6] &= ~(1L << k);
                    branch[k >> 6] &= ~(1L << k);
                }
            }
        }
    }

    /** Takes a lot, with the like ones left that gain more, and looks on. */
    private void include(int i, int depth, double worth, double left) {
        System.arraycopy(free[depth], 0, free[depth + 1], 0, list.words);
        int best = i;
        while (list.before[best] >= 0 && isIn(free[depth], list.before[best])) {
            best = list.before[best];
        }
        take(best, i, depth + 1, worth, left);
    }

    /** Takes like lots from one to another, as long as there is room, and looks on. */
    private void take(int i, int upTo, int depth, double worth, double left) {
        int l = list.lot[i];
        long[] now = free[depth];
        if (!isIn(now, i) || !rest.fits(l)) {
            return;
        }
        double with = worth + gain[l] - rest.loses[l];
        rest.take(l);
        if (with > value) {
            value = with;
            found = true;
            System.arraycopy(rest.taken, 0, load, 0, load.length);
        }
        now[i >> 6] &= ~(1L << i);
        for (int w = 0; w < list.words; w++) {
            now[w] &= ~list.apart[i][w];
        }
        if (i == upTo) {
            narrow(now);
            deepen(depth, with, left - weight[l]);
        } else {
            take(list.after[i], upTo, depth, with, left - weight[l]);
        }
        rest.giveBack(l);
    }

    /** Leaves out lots that gain nothing any more or have no room. */
    private void narrow(long[] now) {
        for (int w = 0; w < list.words; w++) {
            for (long bits = now[w]; bits != 0; bits &= bits - 1) {
                int j = (w << 6) + Long.numberOfTrailingZeros(bits);
                if (gain[list.lot[j]] <= rest.loses[list.lot[j]] || !rest.fits(list.lot[j])) {
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
        for (int i = 0; i < list.count; i++) {
            paired[i] = false;
        }
        for (int w = 0; w < list.words && slope == 0; w++) {
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
                space -= weight[list.lot[i]];
                if (space < 0) {
                    slope = list.key[i];
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
        return gain[list.lot[i]] - rest.loses[list.lot[i]] - slope * weight[list.lot[i]];
    }

    /** A lot before this one, itself without a partner, that it must not meet. */
    private int partner(int i, long[] left) {
        int last = i >> 6;
        for (int w = 0; w <= last; w++) {
            long bits = left[w] & list.apart[i][w];
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
}

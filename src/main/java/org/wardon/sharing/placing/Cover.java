package org.wardon.sharing.placing;

import java.util.Arrays;

/**
 * What lots can gain together at most when some must not meet: groups of which at most one can be
 * taken are found, and what a lot gains is spread over the groups it is in, so that the groups
 * count instead of the lots (a weighted cover by cliques; weak duality, so every such spreading is
 * a bound). Two lots that lose by each other's company are such a group up to that loss.
 */
final class Cover {
    private long[][] apart = new long[0][];
    private int[][] others = new int[0][];
    private double[][] loss = new double[0][];
    private int[] partners = new int[0];
    private int[] order = new int[0];
    private int count;
    private int words;

    /** {@code [lot]}, what is not yet spread. */
    private final double[] rest;

    private final long[] open;
    private final long[] near;
    private final long[] kept;
    private final int[] group;
    private final long[][] never;

    Cover(int lots) {
        rest = new double[lots];
        open = new long[words(lots)];
        near = new long[words(lots)];
        kept = new long[words(lots)];
        group = new int[lots];
        never = new long[lots][words(lots)];
    }

    static int words(int lots) {
        return (lots + Long.SIZE - 1) / Long.SIZE;
    }

    /**
     * Says who must not meet whom.
     *
     * @param howMany lots, numbered from 0
     * @param apartFrom {@code [lot]}, bits of those it must not meet
     * @param losesBy {@code [lot]}, the others it loses by
     * @param losses {@code [lot][place in losesBy]}, currency
     * @param howManyOthers {@code [lot]}, how many of those count
     * @param inOrder the lots, those with few to avoid first
     */
    void of(
            int howMany,
            long[][] apartFrom,
            int[][] losesBy,
            double[][] losses,
            int[] howManyOthers,
            int[] inOrder) {
        count = howMany;
        words = words(howMany);
        apart = apartFrom;
        others = losesBy;
        loss = losses;
        partners = howManyOthers;
        order = inOrder;
    }

    /** Nobody gains anything yet. */
    void clear() {
        Arrays.fill(open, 0, words, 0);
    }

    /** A lot gains this by itself; nothing at or below 0 is told. */
    void gains(int lot, double gain) {
        rest[lot] = gain;
        open[lot >> 6] |= 1L << lot;
    }

    /** What those told of gain together at most. */
    double sum() {
        return sum(Double.POSITIVE_INFINITY);
    }

    /** Whether a lot could not be covered within what was granted. */
    long uncovered(int word) {
        return open[word] | kept[word];
    }

    /**
     * Covers lots as far as the sum stays within what is granted; those that are not covered stand
     * in {@link #uncovered}.
     */
    double sum(double granted) {
        Arrays.fill(kept, 0, words, 0);
        for (int w = 0; w < words; w++) {
            for (long bits = open[w]; bits != 0; bits &= bits - 1) {
                part((w << 6) + Long.numberOfTrailingZeros(bits));
            }
        }
        double sum = 0;
        for (int k = 0; k < count; k++) {
            int lot = order[k];
            while (isOpen(lot) && meetsOpen(lot)) {
                double more = spread(lot, granted - sum);
                if (more < 0) {
                    keep(lot);
                } else {
                    sum += more;
                }
            }
        }
        for (int k = 0; k < count; k++) {
            int lot = order[k];
            if (isOpen(lot)) {
                sum += spreadByLoss(lot, granted - sum);
            }
        }
        return sum;
    }

    /** Of two lots that lose as much as the lesser gains, only one is taken. */
    private void part(int lot) {
        System.arraycopy(apart[lot], 0, never[lot], 0, words);
        int[] by = others[lot];
        double[] losses = loss[lot];
        for (int k = 0; k < partners[lot]; k++) {
            int other = by[k];
            if (isOpen(other) && losses[k] >= Math.min(rest[lot], rest[other])) {
                never[lot][other >> 6] |= 1L << other;
            }
        }
    }

    private boolean isOpen(int lot) {
        return (open[lot >> 6] & 1L << lot) != 0;
    }

    private boolean meetsOpen(int lot) {
        boolean any = false;
        for (int w = 0; w < words; w++) {
            near[w] = open[w] & never[lot][w];
            any |= near[w] != 0;
        }
        return any;
    }

    private void keep(int lot) {
        kept[lot >> 6] |= 1L << lot;
        open[lot >> 6] &= ~(1L << lot);
    }

    /**
     * One group around a lot, of those in {@link #near}; returns what it counts, below 0 if that
     * were too much.
     */
    private double spread(int lot, double granted) {
        group[0] = lot;
        int size = 1;
        double least = rest[lot];
        for (int w = 0; w < words; w++) {
            while (near[w] != 0) {
                int one = (w << 6) + Long.numberOfTrailingZeros(near[w]);
                group[size++] = one;
                least = Math.min(least, rest[one]);
                near[w] &= near[w] - 1;
                for (int v = w; v < words; v++) {
                    near[v] &= never[one][v];
                }
            }
        }
        if (least > granted) {
            return -1;
        }
        for (int k = 0; k < size; k++) {
            take(group[k], least);
        }
        return least;
    }

    private void take(int lot, double by) {
        rest[lot] -= by;
        if (rest[lot] <= 0) {
            open[lot >> 6] &= ~(1L << lot);
        }
    }

    private double spreadByLoss(int lot, double granted) {
        double sum = 0;
        int[] by = others[lot];
        double[] losses = loss[lot];
        for (int k = 0; k < partners[lot] && isOpen(lot); k++) {
            int other = by[k];
            if (isOpen(other)) {
                double least = Math.min(Math.min(rest[lot], rest[other]), losses[k]);
                if (sum + least > granted) {
                    break;
                }
                take(lot, least);
                take(other, least);
                sum += least;
            }
        }
        if (isOpen(lot)) {
            if (sum + rest[lot] > granted) {
                keep(lot);
            } else {
                sum += rest[lot];
                open[lot >> 6] &= ~(1L << lot);
            }
        }
        return sum;
    }
}

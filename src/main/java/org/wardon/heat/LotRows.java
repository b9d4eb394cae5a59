package org.wardon.heat;

import java.util.Arrays;

/**
 * The hourly series of a lot. Most of a row stands in the lot's history; here is which sample that
 * is, and what keeping does not ask for.
 */
final class LotRows {
    private final int[] sample;
    private final double[] coreC;
    private final double[] respirationW;
    private int size;

    LotRows(int mostRows) {
        sample = new int[mostRows];
        coreC = new double[mostRows];
        respirationW = new double[mostRows];
    }

    private LotRows(LotRows first, int room) {
        sample = Arrays.copyOf(first.sample, room);
        coreC = Arrays.copyOf(first.coreC, room);
        respirationW = Arrays.copyOf(first.respirationW, room);
        size = first.size;
    }

    void add(int sampleOfHistory, double innermostC, double breathW) {
        sample[size] = sampleOfHistory;
        coreC[size] = innermostC;
        respirationW[size] = breathW;
        size++;
    }

    /** These and those of another that stand at or behind a sample of its history, renumbered. */
    LotRows then(LotRows next, int firstSample, int becomes) {
        LotRows both = new LotRows(this, size + next.size);
        for (int i = 0; i < next.size; i++) {
            if (next.sample[i] >= firstSample) {
                both.add(
                        next.sample[i] - firstSample + becomes,
                        next.coreC[i],
                        next.respirationW[i]);
            }
        }
        return both;
    }

    int size() {
        return size;
    }

    int sample(int row) {
        return sample[row];
    }

    double coreC(int row) {
        return coreC[row];
    }

    double respirationW(int row) {
        return respirationW[row];
    }
}

package org.wardon.keeping.chilling;

import java.util.Arrays;
import java.util.List;

/**
 * What trials say of the dose, on a grid: the logarithm of a crop's median, and the deviation
 * within a trial. Each trial lies off the crop's median by a normal deviation of its own, which is
 * summed over.
 */
final class DoseGrid {
    private static final double[] WITHIN = {0.25, 0.4, 0.6, 1, 1.6, 2.4};
    private static final double LEAST_LN = -5;
    private static final double STEP_LN = 0.25;
    private static final int POINTS = 57;

    /** Steps to either side over which a trial's own deviation is summed. */
    private static final int REACH = 12;

    private static final double USUAL_WITHIN_LN = 0.5;

    private final double[][] lnLikely = new double[WITHIN.length][POINTS];
    private final double[] offsets = new double[2 * REACH + 1];

    /**
     * Starts with what is known of all crops.
     *
     * @param lnMedian logarithm of the median dose between crops
     * @param betweenCrops its deviation
     * @param betweenTrials deviation of a trial from its crop
     * @param usualWithin usual deviation within a trial
     */
    DoseGrid(double lnMedian, double betweenCrops, double betweenTrials, double usualWithin) {
        for (int w = 0; w < WITHIN.length; w++) {
            double within = Math.log(WITHIN[w] / usualWithin) / USUAL_WITHIN_LN;
            for (int i = 0; i < POINTS; i++) {
                double between = (ln(i) - lnMedian) / betweenCrops;
                lnLikely[w][i] = -0.5 * (between * between + within * within);
            }
        }
        for (int k = -REACH; k <= REACH; k++) {
            double z = k * STEP_LN / betweenTrials;
            offsets[k + REACH] = Math.exp(-0.5 * z * z);
        }
        double sum = Arrays.stream(offsets).sum();
        Arrays.setAll(offsets, k -> offsets[k] / sum);
    }

    private static double ln(int i) {
        return LEAST_LN + i * STEP_LN;
    }

    /** Lets a trial bear on the crop. */
    void add(List<Bearing> trial) {
        for (int w = 0; w < WITHIN.length; w++) {
            double[] likely = likely(trial, WITHIN[w]);
            for (int i = 0; i < POINTS; i++) {
                double sum = 0;
                for (int k = -REACH; k <= REACH; k++) {
                    sum += offsets[k + REACH] * likely[inside(i + k)];
                }
                lnLikely[w][i] += Math.log(sum);
            }
        }
    }

    private static double[] likely(List<Bearing> trial, double within) {
        double[] likely = new double[POINTS];
        Arrays.setAll(
                likely,
                i -> {
                    double product = 1;
                    for (Bearing row : trial) {
                        product *= row.likelihood(ln(i), within);
                    }
                    return product;
                });
        return likely;
    }

    private static int inside(int i) {
        return Math.max(0, Math.min(POINTS - 1, i));
    }

    /**
     * Returns the dose of a lot of a trial.
     *
     * @param trial what is published of it; empty for a lot of no trial
     * @return mean and deviation of the logarithm of the dose
     */
    Moments moments(List<Bearing> trial) {
        double most = Arrays.stream(lnLikely).flatMapToDouble(Arrays::stream).max().orElse(0);
        double weight = 0;
        double first = 0;
        double second = 0;
        for (int w = 0; w < WITHIN.length; w++) {
            double[] likely = likely(trial, WITHIN[w]);
            for (int j = 0; j < POINTS; j++) {
                double share = 0;
                for (int k = -REACH; k <= REACH; k++) {
                    int i = j - k;
                    if (i >= 0 && i < POINTS) {
                        share += offsets[k + REACH] * Math.exp(lnLikely[w][i] - most);
                    }
                }
                share *= likely[j];
                weight += share;
                first += share * ln(j);
                second += share * (ln(j) * ln(j) + WITHIN[w] * WITHIN[w]);
            }
        }
        double mean = first / weight;
        return new Moments(mean, Math.sqrt(second / weight - mean * mean));
    }

    /**
     * Mean and deviation of the logarithm of a dose.
     *
     * @param mean of the logarithm, K d
     * @param deviation of the logarithm
     */
    record Moments(double mean, double deviation) {}
}

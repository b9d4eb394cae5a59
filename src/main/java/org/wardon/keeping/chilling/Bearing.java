package org.wardon.keeping.chilling;

import org.apache.commons.math3.distribution.NormalDistribution;
import org.wardon.produce.rows.ChillingExposure;

/**
 * A published exposure that bears on the dose, with its severity.
 *
 * @param row the exposure
 * @param kelvins how far below the top of the zone it lies, K
 */
record Bearing(ChillingExposure row, double kelvins) {
    private static final double STRAY_SHARE = 0.002;
    private static final double MEASURING_ERROR = 0.2;
    private static final NormalDistribution NORMAL = new NormalDistribution(null, 0, 1);

    boolean rewarmed() {
        return row.visible().equals("after-rewarming");
    }

    /** Its source and variant: exposures of one trial share fruit, season and eyes. */
    String trial() {
        return trial(row);
    }

    static String trial(ChillingExposure row) {
        return row.days().sourceId() + " " + row.variant();
    }

    /**
     * Returns how likely the exposure is.
     *
     * @param lnMedian logarithm of the median dose of unripe lots seen on the spot, K d
     * @param within deviation of the logarithm within a trial
     * @return 0 to 1, ends excluded
     */
    double likelihood(double lnMedian, double within) {
        double median =
                DoseFit.shifted(lnMedian, row.ripeness().equals("ripe"), rewarmed())
                        - Math.log(kelvins);
        double low = (Math.log(row.days().lowest()) - median) / within;
        double high = (Math.log(row.days().highest()) - median) / within;
        double error = MEASURING_ERROR / within;
        double share =
                switch (row.kind()) {
                    case "safe" -> NORMAL.cumulativeProbability(-high);
                    case "by" -> NORMAL.cumulativeProbability(high);
                    default ->
                            NORMAL.cumulativeProbability(high + error)
                                    - NORMAL.cumulativeProbability(low - error);
                };
        return STRAY_SHARE + (1 - STRAY_SHARE) * share;
    }
}

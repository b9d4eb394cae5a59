package org.wardon.keeping.chilling;

import java.util.List;
import org.apache.commons.math3.distribution.NormalDistribution;
import org.wardon.produce.Commodity;
import org.wardon.produce.Ripeness;
import org.wardon.produce.rows.ChillingExposure;

/**
 * The dose, in kelvin-days below the top of the zone, at which injury shows: lognormal over
 * sources, cultivars and seasons, fitted as censored data. First injury at an exposure gives the
 * dose itself or a span of it; injured by then bounds it from above, safe until then from below.
 * Only injuries that can be seen count, on the spot or after rewarming.
 *
 * <p>That the days times the kelvins stay about constant is seen in the rows of papaya (20 d at 7.5
 * °C, 10 d at 2 °C below a floor of 13 °C: 110 both) and sweet potato (42 d at 6 °C, 70 d at 9 °C:
 * 294 and 280). The prior is the spread of all first-injury rows of the table, worked out here.
 *
 * @param lnMedian logarithm of the median dose, K d
 * @param deviation standard deviation of the logarithm
 * @param rows number of exposures that bear on it
 * @param afterRewarming whether most of them show only after rewarming
 */
record DoseFit(double lnMedian, double deviation, int rows, boolean afterRewarming) {
    /** Median of the first-injury rows over all crops, K d. */
    static final double CLASS_MEDIAN_KD = 37;

    /** Standard deviation of the logarithm over all crops. */
    static final double CLASS_DEVIATION = 1.2;

    /** Usual deviation within a crop and its tightness (assumption). */
    private static final double USUAL_WITHIN = 0.8;

    private static final double USUAL_WITHIN_DEVIATION = 0.3;

    private static final double LEAST_K = 0.25;
    private static final double BELOW_MEANS_K = 1;
    private static final double MEASURING_ERROR = 0.15;
    private static final double LEAST_LIKELY = 1e-6;
    private static final NormalDistribution NORMAL = new NormalDistribution(null, 0, 1);

    /**
     * Fits the dose of a commodity.
     *
     * @param commodity the commodity
     * @param ripeness ripeness of the lot
     * @param zone the zone that counts for it
     * @param shiftK how far the top lies lower than printed, K
     * @return the fit; the class where no exposure bears on it
     */
    static DoseFit of(Commodity commodity, Ripeness ripeness, Zone zone, double shiftK) {
        List<ChillingExposure> rows =
                commodity.keeping().exposures().stream()
                        .filter(row -> bears(row, ripeness, zone, shiftK))
                        .toList();
        double best = Double.NEGATIVE_INFINITY;
        DoseFit fit = new DoseFit(Math.log(CLASS_MEDIAN_KD), CLASS_DEVIATION, 0, false);
        if (rows.isEmpty()) {
            return fit;
        }
        long rewarmed =
                rows.stream().filter(row -> row.visible().equals("after-rewarming")).count();
        for (double deviation = 0.3; deviation < 1.65; deviation += 0.15) {
            for (double mean = -2; mean < 7.5; mean += 0.1) {
                double likely = prior(mean, deviation);
                for (ChillingExposure row : rows) {
                    likely += lnLikelihood(row, zone, shiftK, mean, deviation);
                }
                if (likely > best) {
                    best = likely;
                    fit = new DoseFit(mean, deviation, rows.size(), 2 * rewarmed > rows.size());
                }
            }
        }
        return fit;
    }

    private static double prior(double mean, double deviation) {
        double m = (mean - Math.log(CLASS_MEDIAN_KD)) / CLASS_DEVIATION;
        double d = (deviation - USUAL_WITHIN) / USUAL_WITHIN_DEVIATION;
        return -0.5 * (m * m + d * d);
    }

    private static boolean bears(
            ChillingExposure row, Ripeness ripeness, Zone zone, double shiftK) {
        boolean injured = !row.kind().equals("safe");
        if (injured && row.visible().equals("no")) {
            return false;
        }
        boolean green = row.ripeness().equals("mature-green") || row.ripeness().equals("turning");
        boolean ripe = row.ripeness().equals("ripe");
        if (ripeness == Ripeness.RIPE ? green : ripe) {
            return false;
        }
        return kelvins(row, zone, shiftK) > LEAST_K && row.days().highest() > 0;
    }

    private static double kelvins(ChillingExposure row, Zone zone, double shiftK) {
        double lower = row.bound().equals("below-temperature") ? BELOW_MEANS_K : 0;
        return zone.severityK(row.temperatureC() - lower, shiftK);
    }

    private static double lnLikelihood(
            ChillingExposure row, Zone zone, double shiftK, double mean, double deviation) {
        double kelvins = kelvins(row, zone, shiftK);
        double low = (Math.log(row.days().lowest() * kelvins) - mean) / deviation;
        double high = (Math.log(row.days().highest() * kelvins) - mean) / deviation;
        double width = MEASURING_ERROR / deviation;
        double share =
                switch (row.kind()) {
                    case "safe" -> 1 - NORMAL.cumulativeProbability(high);
                    case "by" -> NORMAL.cumulativeProbability(high);
                    default ->
                            NORMAL.cumulativeProbability(high + width)
                                    - NORMAL.cumulativeProbability(low - width);
                };
        return Math.log(Math.max(share, LEAST_LIKELY));
    }
}

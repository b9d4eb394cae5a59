package org.wardon.keeping.chilling;

import java.util.List;
import java.util.Set;
import org.apache.commons.math3.distribution.NormalDistribution;
import org.wardon.keeping.life.LifeLevel;
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
 * 294 and 280). Where sources contradict each other the deviation grows with them (banana at 10 °C:
 * from an hour to days); one row in two hundred may speak of something else altogether.
 *
 * @param lnMedian logarithm of the median dose at which injury shows in the commodity, K d
 * @param deviation standard deviation of the logarithm, what is not known of the median included
 * @param rows number of exposures that bear on it
 * @param afterRewarming whether most of them show only after rewarming
 */
record DoseFit(double lnMedian, double deviation, int rows, boolean afterRewarming) {
    /**
     * Median over all crops, K d, of injury seen on the spot in unripe fruit, roots and tubers.
     * This and the following are round figures near which the rows of all crops are likeliest when
     * each is left out in turn.
     */
    static final double CLASS_MEDIAN_KD = 40;

    /** Pods, leaves and fruit used as vegetables are injured by so much less, ln. */
    private static final double TENDER_PART_LN = -1;

    private static final Set<String> TENDER_PARTS =
            Set.of("fruit-vegetable", "seed-pod", "herb", "leafy");

    /** Ripe fruit bears so much more, ln. */
    private static final double RIPE_LN = 0.8;

    /** What only shows after rewarming takes so much less, ln. */
    private static final double REWARMED_LN = -1;

    /** Standard deviation of the logarithm of the median between crops. */
    private static final double BETWEEN_CROPS = 0.9;

    /** Usual deviation within a crop, and the deviation of its logarithm. */
    private static final double USUAL_WITHIN = 0.5;

    private static final double USUAL_WITHIN_LN = 0.5;
    private static final double[] WITHIN = {0.25, 0.4, 0.6, 1, 1.6, 2.4};

    private static final double STRAY_SHARE = 0.005;

    private static final double HALF_K = 0.5;
    private static final double LEAST_K = 0.1;
    private static final double BELOW_MEANS_K = 1;
    private static final double MEASURING_ERROR = 0.2;
    private static final double LEAST_LN = -2;
    private static final double MOST_LN = 8;
    private static final double STEP_LN = 0.25;
    private static final NormalDistribution NORMAL = new NormalDistribution(null, 0, 1);

    /**
     * Fits the dose of a commodity.
     *
     * @param commodity the commodity
     * @param zone the zone that counts for it
     * @param exposures the exposures to fit, all ripenesses together
     * @return the fit for unripe lots; the class where no exposure bears on it
     */
    static DoseFit of(Commodity commodity, Zone zone, List<ChillingExposure> exposures) {
        List<Bearing> rows =
                exposures.stream()
                        .filter(DoseFit::bears)
                        .map(row -> new Bearing(row, kelvins(commodity, zone, row)))
                        .filter(row -> row.kelvins() > LEAST_K)
                        .toList();
        boolean tender = TENDER_PARTS.contains(commodity.plantPart());
        double prior = Math.log(CLASS_MEDIAN_KD) + (tender ? TENDER_PART_LN : 0);
        Moments moments = new Moments();
        for (double within : WITHIN) {
            double w = Math.log(within / USUAL_WITHIN) / USUAL_WITHIN_LN;
            for (double ln = LEAST_LN; ln < MOST_LN; ln += STEP_LN) {
                double m = (ln - prior) / BETWEEN_CROPS;
                double likely = -0.5 * (m * m + w * w);
                for (Bearing row : rows) {
                    likely += Math.log(row.likelihood(ln, within));
                }
                moments.add(Math.exp(likely), ln, within);
            }
        }
        long rewarmed = rows.stream().filter(Bearing::rewarmed).count();
        return new DoseFit(
                moments.mean(), moments.deviation(), rows.size(), 2 * rewarmed > rows.size());
    }

    /** Severity of the worst temperature the handbook advises, K. */
    static double worstK(Zone zone, LifeLevel handbook) {
        double worst = zone.severityK(handbook.atHighC());
        for (double t = handbook.atLowC(); t < handbook.atHighC(); t += HALF_K) {
            worst = Math.max(worst, zone.severityK(t));
        }
        return worst;
    }

    /** Logarithm of the dose by how ripe the lot is and where the injury is looked for. */
    double lnMedian(boolean ripe, boolean rewarmed) {
        return lnMedian + (ripe ? RIPE_LN : 0) + (rewarmed ? REWARMED_LN : 0);
    }

    /** Logarithm of the dose of visible injury in a lot, after rewarming where mostly so named. */
    double lnMedian(Ripeness ripeness) {
        return lnMedian(ripeness == Ripeness.RIPE, afterRewarming);
    }

    /** Sums of a posterior over a grid. */
    private static final class Moments {
        private double weight;
        private double first;
        private double second;

        void add(double share, double ln, double within) {
            weight += share;
            first += share * ln;
            second += share * (ln * ln + within * within);
        }

        double mean() {
            return first / weight;
        }

        double deviation() {
            return Math.sqrt(second / weight - mean() * mean());
        }
    }

    static boolean bears(ChillingExposure row) {
        boolean seen = row.kind().equals("safe") || !row.visible().equals("no");
        return seen && row.days().highest() > 0;
    }

    /**
     * How far below the top an exposure lies, K; the top of its own variant where one is printed.
     */
    static double kelvins(Commodity commodity, Zone zone, ChillingExposure row) {
        double lower = row.bound().equals("below-temperature") ? BELOW_MEANS_K : 0;
        return zone.ofVariant(commodity, row.variant()).severityK(row.temperatureC() - lower);
    }

    /** An exposure with its severity. */
    private record Bearing(ChillingExposure row, double kelvins) {
        boolean rewarmed() {
            return row.visible().equals("after-rewarming");
        }

        double likelihood(double lnMedian, double within) {
            double shift =
                    (row.ripeness().equals("ripe") ? RIPE_LN : 0) + (rewarmed() ? REWARMED_LN : 0);
            double median = lnMedian + shift - Math.log(kelvins);
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
}

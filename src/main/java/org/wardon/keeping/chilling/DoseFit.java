package org.wardon.keeping.chilling;

import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.TreeMap;
import java.util.stream.Collectors;
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
 * 294 and 280). Exposures of one trial share what it was off by; where sources contradict each
 * other the deviation grows with them (banana at 10 °C: from an hour to days); one row in five
 * hundred may speak of something else altogether.
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
    static final double CLASS_MEDIAN_KD = 30;

    /** Pods, leaves and fruit used as vegetables are injured by so much less, ln. */
    private static final double TENDER_PART_LN = -1;

    private static final Set<String> TENDER_PARTS =
            Set.of("fruit-vegetable", "seed-pod", "herb", "leafy");

    /** Ripe fruit bears so much more, ln. */
    private static final double RIPE_LN = 1.5;

    /**
     * What only shows after rewarming takes so much less, ln: printed side by side are 4 and 10
     * days for papaya, 7 and 28 for pineapple, -0.9 and -1.4; rows left out would have it at -1.8.
     */
    private static final double REWARMED_LN = -1.3;

    /** Deviations of the logarithm of the median between crops, and of a trial from its crop. */
    private static final double BETWEEN_CROPS = 0.5;

    private static final double BETWEEN_TRIALS = 1;

    /** Usual deviation of the logarithm within a trial. */
    private static final double USUAL_WITHIN = 0.8;

    private static final double LEAST_K = 0.1;
    private static final double BELOW_MEANS_K = 1;

    /**
     * Fits the dose of a commodity.
     *
     * @param commodity the commodity
     * @param zone the zone that counts for it
     * @param exposures the exposures to fit, all ripenesses together
     * @param trial the trial whose fruit is asked about, {@link Bearing#trial}; empty for a lot of
     *     no trial
     * @return the fit for unripe lots; the class where no exposure bears on it
     */
    static DoseFit of(
            Commodity commodity, Zone zone, List<ChillingExposure> exposures, String trial) {
        List<Bearing> rows =
                exposures.stream()
                        .filter(DoseFit::bears)
                        .map(row -> new Bearing(row, kelvins(commodity, zone, row)))
                        .filter(row -> row.kelvins() > LEAST_K)
                        .toList();
        Map<String, List<Bearing>> trials =
                rows.stream()
                        .collect(
                                Collectors.groupingBy(
                                        Bearing::trial, TreeMap::new, Collectors.toList()));
        List<Bearing> asked = trials.getOrDefault(trial, List.of());
        trials.remove(trial);
        boolean tender = TENDER_PARTS.contains(commodity.plantPart());
        double prior = Math.log(CLASS_MEDIAN_KD) + (tender ? TENDER_PART_LN : 0);
        DoseGrid grid = new DoseGrid(prior, BETWEEN_CROPS, BETWEEN_TRIALS, USUAL_WITHIN);
        trials.values().forEach(grid::add);
        DoseGrid.Moments dose = grid.moments(asked);
        long rewarmed = rows.stream().filter(Bearing::rewarmed).count();
        return new DoseFit(dose.mean(), dose.deviation(), rows.size(), 2 * rewarmed > rows.size());
    }

    /** Logarithm of the dose by how ripe the lot is and where the injury is looked for. */
    double lnMedian(boolean ripe, boolean rewarmed) {
        return shifted(lnMedian, ripe, rewarmed);
    }

    /** Logarithm of the dose of visible injury in a lot, after rewarming where mostly so named. */
    double lnMedian(Ripeness ripeness) {
        return lnMedian(ripeness == Ripeness.RIPE, afterRewarming);
    }

    static double shifted(double lnMedian, boolean ripe, boolean rewarmed) {
        return lnMedian + (ripe ? RIPE_LN : 0) + (rewarmed ? REWARMED_LN : 0);
    }

    static boolean bears(ChillingExposure row) {
        boolean seen = row.kind().equals("safe") || !row.visible().equals("no");
        return seen && row.days().highest() > 0;
    }

    /**
     * How far below the top an exposure lies, K; the top of its own variant where one is printed.
     */
    static double kelvins(Commodity commodity, Zone zone, ChillingExposure row) {
        return zone.ofVariant(commodity, row.variant()).severityK(temperatureC(row));
    }

    /** Temperature of an exposure; "below" one is taken a kelvin below it. */
    static double temperatureC(ChillingExposure row) {
        double lower = row.bound().equals("below-temperature") ? BELOW_MEANS_K : 0;
        return row.temperatureC() - lower;
    }
}

package org.wardon.files.forecast;

import java.util.List;
import java.util.Optional;

/**
 * The answer of {@code keep}.
 *
 * @param commodity its id
 * @param daysLeft days left
 * @param hangsOn what its range hangs on most; absent where nothing stands out
 * @param lifeUsedPct life used, percent
 * @param limitedBy the mechanism that ends it first
 * @param chillingRisk risk of chilling injury
 * @param mechanisms days left by each mechanism alone
 * @param ripeFrom days until ripe; absent where no times of ripening are printed
 * @param edibleLeft days until overripe; absent unless it ripens
 * @param ripeOn whether it is ripe after the days asked for; absent where nobody asked
 */
public record KeepAnswer(
        String commodity,
        Quantiles daysLeft,
        Optional<HangsOn> hangsOn,
        double lifeUsedPct,
        String limitedBy,
        ChillingRisk chillingRisk,
        List<Mechanism> mechanisms,
        Optional<Quantiles> ripeFrom,
        Optional<Quantiles> edibleLeft,
        Optional<RipeOn> ripeOn) {
    /** Copies the list. */
    public KeepAnswer {
        mechanisms = List.copyOf(mechanisms);
    }

    /**
     * Returns the answer with other days.
     *
     * @param days days left
     * @param each days left by each mechanism alone
     * @return the copy
     */
    public KeepAnswer with(Quantiles days, List<Mechanism> each) {
        return new KeepAnswer(
                commodity,
                days,
                hangsOn,
                lifeUsedPct,
                limitedBy,
                chillingRisk,
                each,
                ripeFrom,
                edibleLeft,
                ripeOn);
    }

    /**
     * One mechanism alone.
     *
     * @param name its name
     * @param daysLeft days left if nothing else acted
     */
    public record Mechanism(String name, Quantiles daysLeft) {}
}

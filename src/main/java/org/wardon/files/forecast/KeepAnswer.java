package org.wardon.files.forecast;

import java.util.List;

/**
 * The answer of {@code keep}.
 *
 * @param commodity its id
 * @param daysLeft days left
 * @param lifeUsedPct life used, percent
 * @param limitedBy the mechanism that ends it first
 * @param chillingRisk risk of chilling injury
 * @param mechanisms days left by each mechanism alone
 */
public record KeepAnswer(
        String commodity,
        Quantiles daysLeft,
        double lifeUsedPct,
        String limitedBy,
        ChillingRisk chillingRisk,
        List<Mechanism> mechanisms) {
    /** Copies the list. */
    public KeepAnswer {
        mechanisms = List.copyOf(mechanisms);
    }

    /**
     * One mechanism alone.
     *
     * @param name its name
     * @param daysLeft days left if nothing else acted
     */
    public record Mechanism(String name, Quantiles daysLeft) {}
}

package org.wardon.sharing.placing;

/**
 * The best placing found and what no placing can exceed.
 *
 * @param placing the placing
 * @param bound no placing is worth more, currency
 * @param proven whether the placing is known to be a best one, but for rounding
 * @param branches branches looked into
 * @param priceSteps steps of prices taken in all
 */
public record PlacingAnswer(
        Placing placing, double bound, boolean proven, int branches, int priceSteps) {
    /**
     * Returns how far the value can be below the best.
     *
     * @return percent of the bound, 0 where nothing can be kept
     */
    public double gapPct() {
        return bound > 0 ? 100 * Math.max(0, bound - placing.value()) / bound : 0;
    }
}

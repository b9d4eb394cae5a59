package org.wardon.advice;

import org.wardon.files.forecast.HangsOn;
import org.wardon.files.forecast.Quantiles;
import org.wardon.keeping.Spread;

/** Ranges of the model as answers write them. */
public final class Ranges {
    private Ranges() {}

    /**
     * Returns a range over draws.
     *
     * @param spread the range
     * @return the same as it is written
     */
    public static Quantiles told(Spread spread) {
        return new Quantiles(spread.p10(), spread.p50(), spread.p90());
    }

    /**
     * Returns what a range hangs on most.
     *
     * @param most the published range and its share
     * @return the same as it is written
     */
    public static HangsOn told(org.wardon.keeping.HangsOn most) {
        return new HangsOn(most.range().word(), 100 * most.share());
    }
}

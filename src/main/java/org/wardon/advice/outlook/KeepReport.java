package org.wardon.advice.outlook;

import java.util.List;
import org.wardon.files.forecast.KeepAnswer;
import org.wardon.produce.Commodity;
import org.wardon.produce.Reason;

/**
 * How long a lot keeps, and why.
 *
 * @param commodity what was asked for
 * @param answer the figures
 * @param restsOn what the life rests on, a code
 * @param reasons why, and what to know
 * @param ripe whether it is ripe after the days asked for, and what would make it so; empty where
 *     nobody asked
 */
public record KeepReport(
        Commodity commodity,
        KeepAnswer answer,
        String restsOn,
        List<Reason> reasons,
        List<Reason> ripe) {
    /** Copies the lists. */
    public KeepReport {
        reasons = List.copyOf(reasons);
        ripe = List.copyOf(ripe);
    }
}

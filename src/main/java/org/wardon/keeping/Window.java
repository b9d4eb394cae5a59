package org.wardon.keeping;

import org.wardon.air.Timeline;
import org.wardon.errors.Require;
import org.wardon.lots.LotHistory;

/**
 * The hours of a history at whose mean rate each mechanism goes on beyond its end.
 *
 * @param fromS start, s
 * @param toS end, s, after the start
 */
public record Window(double fromS, double toS) {
    /** Refuses a window that is not above 0 s long. */
    public Window {
        Require.that(toS > fromS, "a window ends after it starts, found " + fromS + " to " + toS);
    }

    /**
     * Returns the last 24 hours of a history, or all of it if it is shorter.
     *
     * @param history the history
     * @return the window
     */
    public static Window lastDay(LotHistory history) {
        double end = history.timeS(history.size() - 1);
        return new Window(Math.max(history.timeS(0), end - Timeline.DAY_S), end);
    }
}

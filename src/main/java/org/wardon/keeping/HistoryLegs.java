package org.wardon.keeping;

import org.wardon.air.Timeline;
import org.wardon.errors.Require;
import org.wardon.lots.LotHistory;

/** Histories cut and carried on. */
public final class HistoryLegs {
    /** Time in which a lot is taken to reach the condition of its next leg (assumption), s. */
    private static final double CHANGE_S = 3_600;

    private HistoryLegs() {}

    /**
     * Returns a history up to a time, carried on in a constant condition. Mass is carried on as it
     * was at the cut; use it where the loss of the further leg does not count, or join histories of
     * your own.
     *
     * @param history the history
     * @param untilS where it is cut, s, after its first sample; beyond its end the last sample
     *     holds
     * @param temperatureC condition of the further leg, °C
     * @param humidityFraction its humidity, 0 to 1
     * @param ethylenePpm its ethylene, µL/L
     * @param days its length, days, at least an hour
     * @return the joined history
     */
    public static LotHistory then(
            LotHistory history,
            double untilS,
            double temperatureC,
            double humidityFraction,
            double ethylenePpm,
            double days) {
        Require.that(untilS > history.timeS(0), "a history is cut after its start, not " + untilS);
        Require.that(days * Timeline.DAY_S > CHANGE_S, "a further leg lasts over an hour");
        LotHistory.Builder joined = new LotHistory.Builder(history.size() + 3);
        copyUntil(history, untilS, joined);
        for (double t : new double[] {untilS + CHANGE_S, untilS + days * Timeline.DAY_S}) {
            joined.add(
                    t,
                    temperatureC,
                    temperatureC,
                    temperatureC,
                    humidityFraction,
                    ethylenePpm,
                    false);
            if (history.knowsMass()) {
                joined.mass(massAt(history, untilS));
            }
        }
        return joined.build();
    }

    private static void copyUntil(LotHistory history, double untilS, LotHistory.Builder joined) {
        int i = 0;
        while (i < history.size() && history.timeS(i) < untilS) {
            add(history, i, i, 0, history.timeS(i), joined);
            i++;
        }
        int left = i - 1;
        int right = Math.min(i, history.size() - 1);
        double width = history.timeS(right) - history.timeS(left);
        double share = width == 0 ? 0 : (untilS - history.timeS(left)) / width;
        add(history, left, right, share, untilS, joined);
    }

    private static void add(
            LotHistory h, int left, int right, double share, double atS, LotHistory.Builder to) {
        to.add(
                atS,
                between(h.meanC(left), h.meanC(right), share),
                between(h.surfaceC(left), h.surfaceC(right), share),
                between(h.coldestC(left), h.coldestC(right), share),
                between(h.humidityFraction(left), h.humidityFraction(right), share),
                between(h.ethylenePpm(left), h.ethylenePpm(right), share),
                h.wet(left));
        if (h.knowsMass()) {
            to.mass(between(h.massKg(left), h.massKg(right), share));
        }
    }

    private static double massAt(LotHistory h, double atS) {
        int i = 0;
        while (i < h.size() - 1 && h.timeS(i + 1) < atS) {
            i++;
        }
        int next = Math.min(i + 1, h.size() - 1);
        double width = h.timeS(next) - h.timeS(i);
        double share = width == 0 ? 0 : Math.min(1, (atS - h.timeS(i)) / width);
        return between(h.massKg(i), h.massKg(next), share);
    }

    private static double between(double a, double b, double share) {
        return a + share * (b - a);
    }
}

package org.wardon.keeping;

import java.util.Arrays;
import org.wardon.air.Timeline;
import org.wardon.lots.LotHistory;

/**
 * The use of a limit along a history: a share at each sample, straight between, and a rate beyond
 * the end.
 */
final class Track {
    private static final double PANEL_K = 1;

    /** Over so small a change a rate runs straight: of Q10 5 to 1 in 7000. */
    private static final double STRAIGHT_K = 0.25;

    private final double[] timeS;
    private final double[] used;
    private final double beyondPerDay;

    /** From here on {@link #lift} counts as used besides; s. */
    private final double jumpS;

    private final double lift;

    private Track(double[] timeS, double[] used, double beyondPerDay, double jumpS, double lift) {
        this.timeS = timeS;
        this.used = used;
        this.beyondPerDay = beyondPerDay;
        this.jumpS = jumpS;
        this.lift = lift;
    }

    /** Integrates a rate by Simpson's rule in panels of at most a kelvin. */
    static Track of(LotHistory history, Wear wear, double start, Window window) {
        int n = history.size();
        double[] timeS = new double[n];
        double[] used = new double[n];
        timeS[0] = history.timeS(0);
        used[0] = start;
        double before = rate(history, wear, 0, 0);
        for (int i = 1; i < n; i++) {
            timeS[i] = history.timeS(i);
            double after = rate(history, wear, i, 0);
            double days = (timeS[i] - timeS[i - 1]) / Timeline.DAY_S;
            used[i] = used[i - 1] + days * meanRate(history, wear, i, before, after);
            before = after;
        }
        return new Track(timeS, used, slope(timeS, used, window), Double.POSITIVE_INFINITY, 0);
    }

    /** Takes shares that were worked out elsewhere. */
    static Track given(double[] timeS, double[] used, Window window) {
        return new Track(
                timeS, used, Math.max(0, slope(timeS, used, window)), Double.POSITIVE_INFINITY, 0);
    }

    /** Takes shares that were worked out elsewhere with the rate beyond their end, 1/day. */
    static Track on(double[] timeS, double[] used, double beyondPerDay) {
        return new Track(timeS, used, beyondPerDay, Double.POSITIVE_INFINITY, 0);
    }

    private static double meanRate(
            LotHistory history, Wear wear, int i, double before, double after) {
        double meanK = Math.abs(history.meanC(i) - history.meanC(i - 1));
        double skinK = Math.abs(history.surfaceC(i) - history.surfaceC(i - 1));
        double mostK = Math.max(meanK, skinK);
        if (mostK < STRAIGHT_K) {
            return 0.5 * (before + after);
        }
        int panels = (int) Math.ceil(mostK / PANEL_K);
        double sum = 0;
        double left = before;
        for (int p = 1; p <= panels; p++) {
            double right = p == panels ? after : rate(history, wear, i - 1, (double) p / panels);
            double middle = rate(history, wear, i - 1, (p - 0.5) / panels);
            sum += (left + 4 * middle + right) / 6;
            left = right;
        }
        return sum / panels;
    }

    private static double rate(LotHistory history, Wear wear, int i, double share) {
        if (share == 0) {
            return wear.perDay(
                    history.meanC(i),
                    history.surfaceC(i),
                    history.humidityFraction(i),
                    history.ethylenePpm(i));
        }
        return wear.perDay(
                between(history.meanC(i), history.meanC(i + 1), share),
                between(history.surfaceC(i), history.surfaceC(i + 1), share),
                between(history.humidityFraction(i), history.humidityFraction(i + 1), share),
                between(history.ethylenePpm(i), history.ethylenePpm(i + 1), share));
    }

    private static double between(double a, double b, double share) {
        return a + share * (b - a);
    }

    private static double slope(double[] timeS, double[] used, Window window) {
        double days = (window.toS() - window.fromS()) / Timeline.DAY_S;
        return (at(timeS, used, window.toS()) - at(timeS, used, window.fromS())) / days;
    }

    private static double at(double[] timeS, double[] used, double atS) {
        int last = timeS.length - 1;
        if (atS <= timeS[0]) {
            return used[0];
        }
        if (atS >= timeS[last]) {
            return used[last];
        }
        int found = Arrays.binarySearch(timeS, atS);
        int i = found >= 0 ? found : -found - 2;
        return between(used[i], used[i + 1], (atS - timeS[i]) / (timeS[i + 1] - timeS[i]));
    }

    /** Returns the track with at least a share used from a time on; the rates stay. */
    Track jumpedTo(double share, double atS) {
        double missing = Math.max(0, share - at(timeS, used, atS));
        return new Track(timeS, used, beyondPerDay, atS, missing);
    }

    /** Share used at a time, s; goes on beyond the end. */
    double usedAt(double atS) {
        double end = timeS[timeS.length - 1];
        double beyond = Math.max(0, atS - end) / Timeline.DAY_S * beyondPerDay;
        return at(timeS, used, atS) + beyond + (atS >= jumpS ? lift : 0);
    }

    double used(int sample) {
        return used[sample] + (timeS[sample] >= jumpS ? lift : 0);
    }

    /** Time at which a share is reached, s; infinite where it never is. */
    double reachesS(double share) {
        double unlifted = reachesWithoutJumpS(share);
        if (unlifted <= jumpS) {
            return unlifted;
        }
        return Math.max(jumpS, reachesWithoutJumpS(share - lift));
    }

    private double reachesWithoutJumpS(double share) {
        if (used[0] >= share) {
            return timeS[0];
        }
        int last = used.length - 1;
        for (int i = 1; i <= last; i++) {
            if (used[i] >= share) {
                double part = (share - used[i - 1]) / (used[i] - used[i - 1]);
                return between(timeS[i - 1], timeS[i], part);
            }
        }
        if (beyondPerDay <= 0) {
            return Double.POSITIVE_INFINITY;
        }
        return timeS[last] + (share - used[last]) / beyondPerDay * Timeline.DAY_S;
    }

    /** A track of at most two samples that starts and reaches the whole at the same times. */
    Track brief() {
        double end = reachesS(1);
        double first = timeS[0];
        if (end <= first) {
            return new Track(new double[] {first}, new double[] {1}, 0, end, 0);
        }
        int last = timeS.length - 1;
        boolean never = Double.isInfinite(end);
        double[] times = {first, never ? timeS[last] : end};
        double[] shares = {used(0), never ? used(last) : 1};
        return new Track(times, shares, 0, Double.POSITIVE_INFINITY, 0);
    }
}

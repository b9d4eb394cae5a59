package org.wardon.keeping.ripening;

import java.util.Arrays;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;
import org.wardon.errors.Require;
import org.wardon.keeping.life.GenericCurve;
import org.wardon.produce.Fact;
import org.wardon.produce.rows.RipeningRow;

/**
 * Days that a leg of ripening takes, by temperature. Between the printed temperatures the logarithm
 * of the days is straight. Where sources contradict each other, so that warmer would take longer,
 * the neighbours' logarithms are pooled until none does (least squares under order: Ayer and others
 * 1955). Below the coldest print days go on by the handbook's general curve, id ah66-2002-tab.
 *
 * <p>A range is at least what lives of the same crop at the same temperature differ by between
 * sources, 1.4 times (decision 4), about its middle. A figure printed as "up to" reaches down to
 * half of it (assumption).
 */
final class LegDays {
    private static final double BETWEEN_SOURCES = 1.4;
    private static final double LEAST_OF_MOST = 0.5;
    private static final GenericCurve BEYOND = new GenericCurve(1);

    private final double[] atC;
    private final double[] lnLow;
    private final double[] lnHigh;
    private final boolean shortensBeyond;

    private LegDays(double[] atC, double[] lnLow, double[] lnHigh, boolean shortensBeyond) {
        this.atC = atC;
        this.lnLow = lnLow;
        this.lnHigh = lnHigh;
        this.shortensBeyond = shortensBeyond;
    }

    /**
     * Takes printed rows.
     *
     * @param rows rows with days, at least one, in any order
     * @param shortensBeyond whether the days go on shrinking above the warmest print, or stay
     * @return the leg
     */
    static LegDays of(List<RipeningRow> rows, boolean shortensBeyond) {
        Require.that(!rows.isEmpty(), "a leg of ripening needs a printed row");
        TreeMap<Double, double[]> printed = new TreeMap<>();
        for (RipeningRow row : rows) {
            printed.merge(
                    row.middleC(),
                    bounds(row.days().orElseThrow()),
                    (a, b) -> new double[] {Math.min(a[0], b[0]), Math.max(a[1], b[1])});
        }
        int n = printed.size();
        double[] at = new double[n];
        double[] low = new double[n];
        double[] high = new double[n];
        int i = 0;
        for (Map.Entry<Double, double[]> point : printed.entrySet()) {
            double middle = 0.5 * Math.log(point.getValue()[0] * point.getValue()[1]);
            double half = 0.5 * Math.log(BETWEEN_SOURCES);
            at[i] = point.getKey();
            low[i] = Math.min(Math.log(point.getValue()[0]), middle - half);
            high[i] = Math.max(Math.log(point.getValue()[1]), middle + half);
            i++;
        }
        return new LegDays(at, neverRising(low), neverRising(high), shortensBeyond);
    }

    private static double[] bounds(Fact days) {
        double low = days.low().isPresent() ? days.lowest() : LEAST_OF_MOST * days.highest();
        return new double[] {low, days.highest()};
    }

    /** The nearest values that never rise: neighbours that do are put at their mean. */
    private static double[] neverRising(double[] values) {
        double[] mean = new double[values.length];
        int[] count = new int[values.length];
        int blocks = 0;
        for (double value : values) {
            mean[blocks] = value;
            count[blocks++] = 1;
            while (blocks > 1 && mean[blocks - 1] > mean[blocks - 2]) {
                int both = count[blocks - 2] + count[blocks - 1];
                mean[blocks - 2] =
                        (count[blocks - 2] * mean[blocks - 2]
                                        + count[blocks - 1] * mean[blocks - 1])
                                / both;
                count[blocks - 2] = both;
                blocks--;
            }
        }
        double[] pooled = new double[values.length];
        int from = 0;
        for (int b = 0; b < blocks; b++) {
            Arrays.fill(pooled, from, from + count[b], mean[b]);
            from += count[b];
        }
        return pooled;
    }

    /**
     * Returns the days.
     *
     * @param temperatureC temperature of the fruit, °C
     * @param share along the printed range, 0 short to 1 long
     * @return days, never more when warmer
     */
    double days(double temperatureC, double share) {
        int last = atC.length - 1;
        if (temperatureC <= atC[0]) {
            return Math.exp(at(0, share) + slower(temperatureC, atC[0]));
        }
        if (temperatureC >= atC[last]) {
            double faster = shortensBeyond ? slower(atC[last], temperatureC) : 0;
            return Math.exp(at(last, share) - faster);
        }
        int found = Arrays.binarySearch(atC, temperatureC);
        int i = found >= 0 ? found : -found - 2;
        double part = (temperatureC - atC[i]) / (atC[i + 1] - atC[i]);
        return Math.exp(at(i, share) + part * (at(i + 1, share) - at(i, share)));
    }

    private double at(int point, double share) {
        return lnLow[point] + share * (lnHigh[point] - lnLow[point]);
    }

    /** Logarithm of how many times longer it takes at the colder of two temperatures. */
    private static double slower(double colderC, double warmerC) {
        return BEYOND.lnRate(warmerC) - BEYOND.lnRate(colderC);
    }
}

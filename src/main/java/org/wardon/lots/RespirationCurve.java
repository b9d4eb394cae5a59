package org.wardon.lots;

import java.util.Map;
import java.util.NavigableMap;
import java.util.TreeMap;
import org.wardon.errors.Require;
import org.wardon.produce.Fact;

/**
 * Heat of respiration straight in the logarithm between printed temperatures.
 *
 * <p>Outside the printed temperatures, down to 0 and up to 30 °C, the curve goes on with the
 * handbook's class Q10 ({@link HandbookQ10}) rather than with the last printed slope: single
 * figures beside ranges give slopes up to Q10 11. From 30 (or the highest printed temperature, if
 * above) to 38 °C the Q10 is 1.5; below and above the curve is flat, until from 44 °C on the tissue
 * dies of heat and its breathing ceases. What microbes then do to a heap is not reckoned with.
 */
public final class RespirationCurve implements RespirationLaw {
    private static final double COLDEST_C = 0;
    private static final double WARM_C = 30;
    private static final double FLAT_FROM_C = 38;
    private static final double Q10_ABOVE_WARM = 1.5;

    /** Tissue is killed by heat above 42 °C; its breathing ceases over these °C (assumption). */
    private static final double DYING_FROM_C = 44;

    private static final double DEAD_C = 50;

    /** What is left of the rate in dead tissue, in the logarithm: a thousandth (assumption). */
    private static final double LN_DEAD = -7;

    private static final double[] HANDBOOK_KNOTS_C = {0, 10, 20, 30};

    private final double[] knotC;
    private final double[] lnLow;
    private final double[] lnHigh;
    private final double[] ln;

    private RespirationCurve(double[] knotC, double[] lnLow, double[] lnHigh, double share) {
        Require.within("share of the respiration range", share, 0, 1, "1", "0 low, 1 high.");
        this.knotC = knotC;
        this.lnLow = lnLow;
        this.lnHigh = lnHigh;
        ln = new double[knotC.length];
        for (int i = 0; i < ln.length; i++) {
            ln[i] = lnLow[i] + share * (lnHigh[i] - lnLow[i]);
        }
    }

    /**
     * Returns the curve through rates.
     *
     * @param wattsPerTonne rates by temperature in °C, at least one, all above 0
     * @param share share of the range, 0 low to 1 high, even in the logarithm
     * @return the curve
     */
    static RespirationCurve through(Map<Double, Fact> wattsPerTonne, double share) {
        Require.that(!wattsPerTonne.isEmpty(), "a respiration curve needs at least one rate");
        NavigableMap<Double, double[]> knots = new TreeMap<>();
        wattsPerTonne.forEach((c, fact) -> knots.put(c, lnRange(fact)));
        extend(knots);
        int n = knots.size();
        double[][] columns = new double[3][n];
        int i = 0;
        for (Map.Entry<Double, double[]> knot : knots.entrySet()) {
            columns[0][i] = knot.getKey();
            columns[1][i] = knot.getValue()[0];
            columns[2][i] = knot.getValue()[1];
            i++;
        }
        return new RespirationCurve(columns[0], columns[1], columns[2], share);
    }

    private static double[] lnRange(Fact wattsPerTonne) {
        Require.that(wattsPerTonne.lowest() > 0, "a respiration rate must be above 0 W/t");
        return new double[] {
            Math.log(wattsPerTonne.lowest() / 1000), Math.log(wattsPerTonne.highest() / 1000)
        };
    }

    private static void extend(NavigableMap<Double, double[]> knots) {
        double first = knots.firstKey();
        double last = knots.lastKey();
        for (double c : HANDBOOK_KNOTS_C) {
            if (c < first && c >= COLDEST_C) {
                knots.put(c, stepped(knots, first, handbookStep(first, c)));
            } else if (c > last) {
                knots.put(c, stepped(knots, last, handbookStep(last, c)));
            }
        }
        double warm = Math.max(WARM_C, last);
        if (warm < FLAT_FROM_C) {
            double rise = Math.log(Q10_ABOVE_WARM) * (FLAT_FROM_C - warm) / 10;
            knots.put(FLAT_FROM_C, stepped(knots, warm, rise));
        }
        double flat = knots.lastKey();
        knots.put(DYING_FROM_C, stepped(knots, flat, 0));
        knots.put(DEAD_C, stepped(knots, flat, LN_DEAD));
    }

    private static double handbookStep(double fromC, double toC) {
        return Math.log(HandbookQ10.relativeRate(toC) / HandbookQ10.relativeRate(fromC));
    }

    private static double[] stepped(
            NavigableMap<Double, double[]> knots, double fromC, double step) {
        double[] from = knots.getOrDefault(fromC, new double[2]);
        return new double[] {from[0] + step, from[1] + step};
    }

    @Override
    public double wattsPerKg(double temperatureC) {
        int last = knotC.length - 1;
        if (temperatureC <= knotC[0]) {
            return Math.exp(ln[0]);
        }
        if (temperatureC >= knotC[last]) {
            return Math.exp(ln[last]);
        }
        int i = segment(temperatureC);
        return Math.exp(ln[i] + slope(i) * (temperatureC - knotC[i]));
    }

    @Override
    public double slopeWattsPerKgK(double temperatureC) {
        if (temperatureC < knotC[0] || temperatureC >= knotC[knotC.length - 1]) {
            return 0;
        }
        return slope(segment(temperatureC)) * wattsPerKg(temperatureC);
    }

    @Override
    public RespirationCurve fresh() {
        return withShare(1);
    }

    /**
     * Returns the curve at another share of its range.
     *
     * @param share 0 low to 1 high, even in the logarithm
     * @return the curve
     */
    public RespirationCurve withShare(double share) {
        return new RespirationCurve(knotC, lnLow, lnHigh, share);
    }

    private int segment(double temperatureC) {
        int i = knotC.length - 2;
        while (temperatureC < knotC[i]) {
            i--;
        }
        return i;
    }

    private double slope(int i) {
        return (ln[i + 1] - ln[i]) / (knotC[i + 1] - knotC[i]);
    }
}

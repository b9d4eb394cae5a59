package org.wardon.heat.network;

import org.wardon.air.SaturatedAir;

/**
 * Saturation pressure for states that a refused step may reach: beyond the range of the formulas it
 * goes on as a straight line, and what is not a number stays so, to be refused.
 */
final class Saturation {
    private static final double LOW_C = SaturatedAir.LOWEST_C + 0.01;
    private static final double HIGH_C = SaturatedAir.HIGHEST_C - 0.01;

    private static final double SLOPE_K = 1e-4;

    /** A cubic over this much to either side is exact to 2e-7. */
    static final double REACH_K = 1;

    private Saturation() {}

    static double pressurePa(double t) {
        if (Double.isNaN(t)) {
            return t;
        }
        double inside = Math.min(Math.max(t, LOW_C), HIGH_C);
        double p = SaturatedAir.pressurePa(inside);
        return t == inside ? p : p + (t - inside) * SaturatedAir.slopePaPerK(inside);
    }

    static double slopePaPerK(double t) {
        if (Double.isNaN(t)) {
            return t;
        }
        return SaturatedAir.slopePaPerK(Math.min(Math.max(t, LOW_C), HIGH_C));
    }

    /**
     * Over water at all temperatures: produce is not frozen where its skin is a little below 0 °C.
     */
    static double overWaterPa(double t) {
        if (Double.isNaN(t)) {
            return t;
        }
        double inside = Math.min(Math.max(t, LOW_C), HIGH_C);
        double p = SaturatedAir.overWaterPa(inside);
        return t == inside ? p : p + (t - inside) * overWaterSlopePaPerK(inside);
    }

    static double overWaterSlopePaPerK(double t) {
        if (!(t <= SaturatedAir.TRIPLE_POINT_C)) {
            return slopePaPerK(t);
        }
        double inside = Math.max(t, LOW_C);
        return (SaturatedAir.overWaterPa(inside + SLOPE_K)
                        - SaturatedAir.overWaterPa(inside - SLOPE_K))
                / (2 * SLOPE_K);
    }

    static LocalCurve overWater(boolean plain) {
        return new LocalCurve(
                Saturation::overWaterPa,
                Saturation::overWaterSlopePaPerK,
                REACH_K,
                Double.NaN,
                plain);
    }

    static LocalCurve curve(boolean plain) {
        return new LocalCurve(
                Saturation::pressurePa,
                Saturation::slopePaPerK,
                REACH_K,
                SaturatedAir.TRIPLE_POINT_C,
                plain);
    }
}

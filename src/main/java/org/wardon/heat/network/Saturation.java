package org.wardon.heat.network;

import org.wardon.air.SaturatedAir;

/**
 * Saturation pressure for states that a refused step may reach: beyond the range of the formulas it
 * goes on as a straight line, and what is not a number stays so, to be refused.
 */
final class Saturation {
    private static final double LOW_C = SaturatedAir.LOWEST_C + 0.01;
    private static final double HIGH_C = SaturatedAir.HIGHEST_C - 0.01;

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

    static LocalCurve curve(boolean plain) {
        return new LocalCurve(Saturation::pressurePa, Saturation::slopePaPerK, plain);
    }
}

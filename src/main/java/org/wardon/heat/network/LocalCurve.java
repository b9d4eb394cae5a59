package org.wardon.heat.network;

import java.util.function.DoubleUnaryOperator;

/**
 * A dear function of one temperature, met again and again near the same place: a cubic through four
 * points around it, renewed when the temperature has moved away. Between renewals it is one smooth
 * function, so a step's stages and its Jacobian see the same curve.
 */
final class LocalCurve {
    /** The cubic is renewed when the temperature has moved this share of its reach. */
    private static final double RENEW_SHARE = 2.0 / 3;

    private static final double STEP_K = 1e-4;

    private final DoubleUnaryOperator law;
    private final DoubleUnaryOperator slope;
    private final double reachK;
    private final boolean plain;
    private double centre = Double.NaN;
    private double c0;
    private double c1;
    private double c2;
    private double c3;

    /** Makes a curve trusted as far as its reach, K; {@code plain} always asks the law itself. */
    LocalCurve(DoubleUnaryOperator law, DoubleUnaryOperator slope, double reachK, boolean plain) {
        this.reachK = reachK;
        this.law = law;
        this.slope = slope;
        this.plain = plain;
    }

    /** Renews the cubic where need be; called once at the start of a step. */
    void near(double t) {
        if (plain || Math.abs(t - centre) <= RENEW_SHARE * reachK) {
            return;
        }
        centre = t;
        double third = reachK / 3;
        double far = law.applyAsDouble(t - reachK);
        double mid = law.applyAsDouble(t - third);
        double midUp = law.applyAsDouble(t + third);
        double farUp = law.applyAsDouble(t + reachK);
        double evenMid = 0.5 * (mid + midUp);
        double evenFar = 0.5 * (far + farUp);
        double oddMid = 0.5 * (midUp - mid) / third;
        double oddFar = 0.5 * (farUp - far) / reachK;
        double spread = reachK * reachK - third * third;
        c2 = (evenFar - evenMid) / spread;
        c0 = evenMid - c2 * third * third;
        c3 = (oddFar - oddMid) / spread;
        c1 = oddMid - c3 * third * third;
    }

    double value(double t) {
        double d = t - centre;
        if (Math.abs(d) <= reachK) {
            return c0 + d * (c1 + d * (c2 + d * c3));
        }
        return law.applyAsDouble(t);
    }

    double slope(double t) {
        double d = t - centre;
        if (Math.abs(d) <= reachK) {
            return c1 + d * (2 * c2 + d * 3 * c3);
        }
        return plain
                ? slope.applyAsDouble(t)
                : (law.applyAsDouble(t + STEP_K) - law.applyAsDouble(t - STEP_K)) / (2 * STEP_K);
    }
}

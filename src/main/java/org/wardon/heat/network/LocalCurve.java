package org.wardon.heat.network;

import java.util.function.DoubleUnaryOperator;

/**
 * A dear function of one temperature, met again and again near the same place: a cubic through four
 * points around it, renewed when the temperature has moved away. Between renewals it is one smooth
 * function, so a step's stages and its Jacobian see the same curve.
 */
final class LocalCurve {
    private static final double STEP_K = 1e-4;

    private final DoubleUnaryOperator law;
    private final DoubleUnaryOperator slope;
    private final double reachK;
    private final boolean plain;
    private final LocalCubics cubic;

    /** Makes a curve trusted as far as its reach, K; {@code plain} always asks the law itself. */
    LocalCurve(DoubleUnaryOperator law, DoubleUnaryOperator slope, double reachK, boolean plain) {
        this.reachK = reachK;
        this.law = law;
        this.slope = slope;
        this.plain = plain;
        cubic = new LocalCubics(1, reachK);
        cubic.centre[0] = Double.NaN; // known nowhere yet
    }

    /** Renews the cubic where need be; called once at the start of a step. */
    void near(double t) {
        if (!plain && cubic.stale(0, t)) {
            cubic.renew(0, t, 1, law);
        }
    }

    double value(double t) {
        return within(t) ? cubic.value(0, t) : law.applyAsDouble(t);
    }

    double slope(double t) {
        if (within(t)) {
            return cubic.slope(0, t);
        }
        return plain
                ? slope.applyAsDouble(t)
                : (law.applyAsDouble(t + STEP_K) - law.applyAsDouble(t - STEP_K)) / (2 * STEP_K);
    }

    private boolean within(double t) {
        return Math.abs(t - cubic.centre[0]) <= reachK;
    }
}

package org.wardon.heat.network;

import java.util.function.DoubleUnaryOperator;

/**
 * A dear function of one temperature, met again and again near the same place: a cubic through four
 * points around it, renewed when the temperature has moved away. Between renewals it is one smooth
 * function, so a step's stages and its Jacobian see the same curve. A cubic never reaches across a
 * bend of the law, which it would round off.
 */
final class LocalCurve {
    private static final double STEP_K = 1e-4;

    private final DoubleUnaryOperator law;
    private final DoubleUnaryOperator slope;
    private final double reachK;
    private final double bendC;
    private final boolean plain;
    private final LocalCubics cubic;

    /**
     * Makes a curve.
     *
     * @param reachK trusted so far from where it is taken, K
     * @param bendC where the law bends, °C; not a number where it does not
     * @param plain whether the law itself is always asked
     */
    LocalCurve(
            DoubleUnaryOperator law,
            DoubleUnaryOperator slope,
            double reachK,
            double bendC,
            boolean plain) {
        this.reachK = reachK;
        this.bendC = bendC;
        this.law = law;
        this.slope = slope;
        this.plain = plain;
        cubic = new LocalCubics(1, reachK);
        cubic.centre[0] = Double.NaN; // known nowhere yet
    }

    /** Renews the cubic where need be; called once at the start of a step. */
    void near(double t) {
        double from = besideBend(t);
        if (!plain && cubic.stale(0, from)) {
            cubic.renew(0, from, 1, law);
        }
    }

    /** Where a cubic that is to know t is taken: its reach ends at the bend. */
    private double besideBend(double t) {
        if (!(Math.abs(t - bendC) < reachK)) {
            return t;
        }
        return t > bendC ? bendC + reachK : bendC - reachK;
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

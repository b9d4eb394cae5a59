package org.wardon.heat.network;

import java.util.function.DoubleUnaryOperator;

/**
 * A dear function of temperature for many neighbours at once: for each a cubic around where it was
 * when a step started, renewed when it has moved away. Between renewals it is one smooth function,
 * so a step's stages and its Jacobian see the same curve. Entry j reads {@code d = t - centre[j]},
 * {@code c0[j] + d (c1[j] + d (c2[j] + d c3[j]))}.
 *
 * <p>Beyond its reach a cubic goes on: what moves on within one step by three times its reach meets
 * an error of 1e-4 of a function that grows by a tenth a kelvin.
 */
final class LocalCubics {
    /** A cubic is renewed when the temperature has moved this share of its reach. */
    private static final double RENEW_SHARE = 2.0 / 3;

    final double[] centre;
    final double[] c0;
    final double[] c1;
    final double[] c2;
    final double[] c3;
    private final double reachK;

    LocalCubics(int entries, double reachK) {
        this.reachK = reachK;
        centre = new double[entries];
        c0 = new double[entries];
        c1 = new double[entries];
        c2 = new double[entries];
        c3 = new double[entries];
    }

    /** Whether an entry has moved away from where it is known. */
    boolean stale(int j, double t) {
        return !(Math.abs(t - centre[j]) <= RENEW_SHARE * reachK);
    }

    /** Fits a cubic through four points around t. */
    void renew(int j, double t, double factor, DoubleUnaryOperator law) {
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
        double square = (evenFar - evenMid) / spread;
        double cube = (oddFar - oddMid) / spread;
        centre[j] = t;
        c0[j] = factor * (evenMid - square * third * third);
        c1[j] = factor * (oddMid - cube * third * third);
        c2[j] = factor * square;
        c3[j] = factor * cube;
    }

    /** Takes value and slope at t as the law has them, for a law that is asked each time. */
    void exact(int j, double t, double value, double slope) {
        centre[j] = t;
        c0[j] = value;
        c1[j] = slope;
        c2[j] = 0;
        c3[j] = 0;
    }

    double value(int j, double t) {
        double d = t - centre[j];
        return c0[j] + d * (c1[j] + d * (c2[j] + d * c3[j]));
    }

    double slope(int j, double t) {
        double d = t - centre[j];
        return c1[j] + d * (2 * c2[j] + d * 3 * c3[j]);
    }
}

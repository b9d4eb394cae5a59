package org.wardon.heat.solver;

/**
 * RODAS3: a stiffly accurate Rosenbrock method of four stages and third order with an embedded
 * second-order one, three evaluations of the rates a step. For runs whose steps are long beside the
 * fast modes: these end where the slow ones put them.
 *
 * <p>Source: Sandu, Verwer, Blom, Spee, Carmichael and Potra 1997, Benchmarking stiff ODE solvers
 * for atmospheric chemistry problems II, Atmospheric Environment 31 (coefficients from memory of
 * it; {@code RosenbrockOrderTest} guards them): γ = 1/2; a31 = 2, a41 = 2, a43 = 1, other a 0; c21
 * = 4, c31 = 1, c32 = -1, c41 = 1, c42 = -1, c43 = -8/3; α = 0 0 1 1; γ_i = 1/2 3/2 0 0; new state
 * y + 2 u_1 + u_3 + u_4; error u_4. Flows: b = 5/6, -1/6, -1/6, 1/2 and g_1 = g_2.
 */
final class StifflyAccurate extends Rosenbrock {
    private static final double GAMMA = 0.5;
    private static final double B1 = 5.0 / 6;
    private static final double B2 = -1.0 / 6;
    private static final double B3 = -1.0 / 6;
    private static final double B4 = 0.5;

    private final double[] flow3;
    private final double[] flow4;

    StifflyAccurate(TreeSystem system) {
        super(system);
        flow3 = new double[flows];
        flow4 = new double[flows];
    }

    /** The stages share one place that solves, as those of {@link FourthOrder} do. */
    @Override
    double tryStep(double t, double[] y, double h) {
        tree.factor(1 / (h * GAMMA));
        for (int s = 0; s < stages.length; s++) {
            if (s < 2) {
                fromStart(s, h);
            } else {
                fromEnd(s, t + h, y, h);
            }
            tree.solve(stages[s]);
        }
        for (int i = 0; i < n; i++) {
            end[i] = stage[i] + u4[i];
        }
        return error(u4);
    }

    @Override
    double root(double times) {
        return Math.cbrt(times);
    }

    @Override
    double power(double times) {
        return times * times * times;
    }

    /** Right-hand sides of the first two stages, which see the rates at the start. */
    private void fromStart(int s, double h) {
        if (s == 0) {
            double byTime = 0.5 * h;
            for (int i = 0; i < n; i++) {
                u1[i] = f0[i] + byTime * ft[i];
            }
        } else {
            double byTime = 1.5 * h;
            double four = 4 / h;
            for (int i = 0; i < n; i++) {
                u2[i] = f0[i] + four * u1[i] + byTime * ft[i];
            }
        }
    }

    /** Right-hand sides of the last two, which see the rates at the end. */
    private void fromEnd(int s, double until, double[] y, double h) {
        double[] u = stages[s];
        boolean third = s == 2;
        for (int i = 0; i < n; i++) {
            stage[i] = third ? y[i] + 2 * u1[i] : stage[i] + u3[i];
        }
        system.rates(until, stage, u, third ? flow3 : flow4);
        double inverse = 1 / h;
        for (int i = 0; i < n; i++) {
            u[i] += (u1[i] - u2[i]) * inverse;
        }
        if (!third) {
            double more = -8.0 / 3 * inverse;
            for (int i = 0; i < n; i++) {
                u[i] += more * u3[i];
            }
        }
    }

    @Override
    void along(double[] into) {
        for (int i = 0; i < n; i++) {
            into[i] = B1 * u1[i] + B2 * u2[i] + B3 * u3[i] + B4 * u4[i];
        }
    }

    @Override
    void addFlows(double h, double[] flowAlong, double[] totals) {
        double byTime = h * (0.5 * B1 + 1.5 * B2);
        for (int i = 0; i < flows; i++) {
            totals[i] +=
                    h
                            * ((B1 + B2) * flow0[i]
                                    + B3 * flow3[i]
                                    + B4 * flow4[i]
                                    + byTime * flowSlope[i]
                                    + flowAlong[i]);
        }
    }
}

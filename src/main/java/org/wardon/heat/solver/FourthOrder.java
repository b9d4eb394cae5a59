package org.wardon.heat.solver;

/**
 * Shampine's Rosenbrock method of four stages and fourth order with an embedded third-order one:
 * three evaluations of the rates a step, the first of which the linearisation shares. For runs
 * whose steps follow the fast modes. Stable wherever the modes of J decay; an infinitely fast one
 * is taken down to a third a step.
 *
 * <p>Source: Shampine 1982, Implementation of Rosenbrock methods, ACM Transactions on Mathematical
 * Software 8, 93-113 (coefficients from memory of it; {@code RosenbrockOrderTest} guards them): γ =
 * 1/2; a21 = 2, a31 = a41 = 48/25, a32 = a42 = 6/25, a43 = 0; c21 = -8, c31 = 372/25, c32 = 12/5,
 * c41 = -112/125, c42 = -54/125, c43 = -2/5; α = 0 1 3/5 3/5; γ_i = 1/2 -3/2 121/50 29/250; new
 * state y + 19/9 u_1 + 1/2 u_2 + 25/108 u_3 + 125/108 u_4; error 17/54 u_1 + 7/36 u_2 + 125/108
 * u_4. Flows: b = 8/27, 1/8, 0, 125/216 and g_3 = g_4.
 */
final class FourthOrder extends Rosenbrock {
    private static final double GAMMA = 0.5;
    private static final double B1 = 8.0 / 27;
    private static final double B2 = 1.0 / 8;
    private static final double B4 = 125.0 / 216;
    private static final double G1 = 1.0 / 2;
    private static final double G2 = -3.0 / 2;
    private static final double G3 = 121.0 / 50;
    private static final double G4 = 29.0 / 250;

    private final double[] f2;
    private final double[] f3;
    private final double[] miss;
    private final double[] flow2;
    private final double[] flow3;

    FourthOrder(TreeSystem system) {
        super(system);
        f2 = new double[n];
        f3 = new double[n];
        miss = new double[n];
        flow2 = new double[flows];
        flow3 = new double[flows];
    }

    /**
     * The stages share one place that solves: a short run ends before the compiler has got through
     * four copies of the tree.
     */
    @Override
    double tryStep(double t, double[] y, double h) {
        tree.factor(1 / (h * GAMMA));
        for (int s = 0; s < stages.length; s++) {
            if (s == 1) {
                reach(y, 2, 0);
                system.rates(t + h, stage, f2, flow2);
            } else if (s == 2) {
                reach(y, 48.0 / 25, 6.0 / 25);
                system.rates(t + 0.6 * h, stage, f3, flow3);
            }
            side(s, h);
            tree.solve(stages[s]);
        }
        finish(y);
        return error(miss);
    }

    /** In loops of a few arrays each, which the compiler makes vectors of. */
    private void finish(double[] y) {
        for (int i = 0; i < n; i++) {
            end[i] = y[i] + 19.0 / 9 * u1[i] + 0.5 * u2[i];
        }
        for (int i = 0; i < n; i++) {
            end[i] += 25.0 / 108 * u3[i] + 125.0 / 108 * u4[i];
        }
        for (int i = 0; i < n; i++) {
            miss[i] = 17.0 / 54 * u1[i] + 7.0 / 36 * u2[i] + 125.0 / 108 * u4[i];
        }
    }

    @Override
    double root(double times) {
        return Math.sqrt(Math.sqrt(times));
    }

    @Override
    double power(double times) {
        return times * times * times * times;
    }

    private void reach(double[] y, double first, double second) {
        for (int i = 0; i < n; i++) {
            stage[i] = y[i] + first * u1[i] + second * u2[i];
        }
    }

    /** Writes the right-hand side of a stage. */
    private void side(int s, double h) {
        double per = 1 / h;
        switch (s) {
            case 0 -> {
                double byTime = G1 * h;
                for (int i = 0; i < n; i++) {
                    u1[i] = f0[i] + byTime * ft[i];
                }
            }
            case 1 -> {
                double byTime = G2 * h;
                double c1 = -8 * per;
                for (int i = 0; i < n; i++) {
                    u2[i] = f2[i] + c1 * u1[i] + byTime * ft[i];
                }
            }
            case 2 -> {
                double byTime = G3 * h;
                double c1 = 372.0 / 25 * per;
                double c2 = 12.0 / 5 * per;
                for (int i = 0; i < n; i++) {
                    u3[i] = f3[i] + c1 * u1[i] + c2 * u2[i] + byTime * ft[i];
                }
            }
            default -> {
                double byTime = G4 * h;
                double c1 = -112.0 / 125 * per;
                double c2 = -54.0 / 125 * per;
                double c3 = -2.0 / 5 * per;
                for (int i = 0; i < n; i++) {
                    u4[i] = f3[i] + c1 * u1[i] + c2 * u2[i] + c3 * u3[i] + byTime * ft[i];
                }
            }
        }
    }

    @Override
    void along(double[] into) {
        for (int i = 0; i < n; i++) {
            into[i] = B1 * u1[i] + B2 * u2[i] + B4 * u4[i];
        }
    }

    @Override
    void addFlows(double h, double[] flowAlong, double[] totals) {
        double byTime = h * (B1 * G1 + B2 * G2 + B4 * G4);
        for (int i = 0; i < flows; i++) {
            totals[i] +=
                    h
                            * (B1 * flow0[i]
                                    + B2 * flow2[i]
                                    + B4 * flow3[i]
                                    + byTime * flowSlope[i]
                                    + flowAlong[i]);
        }
    }
}

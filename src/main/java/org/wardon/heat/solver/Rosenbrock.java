package org.wardon.heat.solver;

import java.util.Arrays;

/**
 * One step of RODAS3: a stiffly accurate Rosenbrock method of four stages and third order with an
 * embedded second-order one, three evaluations of the rates a step.
 *
 * <p>Source: Sandu, Verwer, Blom, Spee, Carmichael and Potra 1997, Benchmarking stiff ODE solvers
 * for atmospheric chemistry problems II, Atmospheric Environment 31 (coefficients from memory of
 * it; {@code RosenbrockOrderTest} guards them). Written in the form without matrix products: {@code
 * (1/(h γ) I - J) u_i = f(t + α_i h, y + Σ a_ij u_j) + Σ c_ij/h u_j + h γ_i f_t}, with γ = 1/2; a31
 * = 2, a41 = 2, a43 = 1, other a 0; c21 = 4, c31 = 1, c32 = -1, c41 = 1, c42 = -1, c43 = -8/3; α =
 * 0 0 1 1; γ_i = 1/2 3/2 0 0; new state y + 2 u_1 + u_3 + u_4; error u_4.
 *
 * <p>Flows g are integrated as if they were further unknowns, which needs no linear algebra: their
 * stages sum to {@code h (Σ b_i (g_i + h γ_i g_t) + g_y · Σ b_i u_i)} with b = 5/6, -1/6, -1/6, 1/2
 * and g_1 = g_2.
 */
final class Rosenbrock {
    private static final int STAGES = 4;
    private static final double GAMMA = 0.5;
    private static final double B1 = 5.0 / 6;
    private static final double B2 = -1.0 / 6;
    private static final double B3 = -1.0 / 6;
    private static final double B4 = 0.5;

    private final TreeSystem system;
    private final Tree tree;
    private final int n;
    private final int flows;
    private final TreeSystem.Change start;
    private final TreeSystem.Change slope;
    private final double[] f0;
    private final double[] ft;
    private final double[] u1;
    private final double[] u2;
    private final double[] u3;
    private final double[] u4;
    private final double[][] stages;
    private final double[] stage;
    private final double[] along;
    private final double[] flow0;
    private final double[] flowSlope;
    private final double[] flow3;
    private final double[] flow4;
    private final double[] flowAlong;

    /** Where the error of the step tried last was largest: a hub node, or a branch's first. */
    int worstNode;

    /** The state at the end of the step tried last. */
    final double[] end;

    Rosenbrock(TreeSystem system) {
        this.system = system;
        tree = system.tree();
        n = tree.size();
        flows = system.flows();
        start = new TreeSystem.Change(n, flows);
        slope = new TreeSystem.Change(n, flows);
        f0 = start.rates();
        ft = slope.rates();
        flow0 = start.flows();
        flowSlope = slope.flows();
        u1 = new double[n];
        u2 = new double[n];
        u3 = new double[n];
        u4 = new double[n];
        stages = new double[][] {u1, u2, u3, u4};
        stage = new double[n];
        along = new double[n];
        end = new double[n];
        flow3 = new double[flows];
        flow4 = new double[flows];
        flowAlong = new double[flows];
    }

    /** Prepares steps of any length from one state. */
    void startFrom(double t, double[] y) {
        system.linearise(t, y, start, slope);
    }

    /**
     * Tries a step of length h from the state last started from; returns its error, 1 allowed. The
     * stages share one place that solves: a short run ends before the compiler has got through four
     * copies of the tree.
     */
    double tryStep(double t, double[] y, double h) {
        tree.factor(1 / (h * GAMMA));
        for (int s = 0; s < STAGES; s++) {
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
        return error();
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

    /** Each node of the hub counts for itself, each branch by its root mean square. */
    private double error() {
        double[] weights = system.weights();
        double worst = 0;
        for (int i = 0; i < tree.hub(); i++) {
            double e = Math.abs(u4[i] * weights[i]);
            if (!(e <= worst)) {
                worst = e;
                worstNode = i;
            }
        }
        for (Branch branch : tree.branches()) {
            double sum = 0;
            for (int i = branch.start; i < branch.start + branch.size(); i++) {
                double share = u4[i] * weights[i];
                sum += share * share;
            }
            double e = Math.sqrt(sum / branch.size());
            if (!(e <= worst)) {
                worst = e;
                worstNode = branch.start;
            }
        }
        for (Bank bank : tree.banks()) {
            double e = bank.worst(u4, weights);
            if (!(e <= worst)) {
                worst = e;
                worstNode = bank.at(0, bank.worstMember);
            }
        }
        return worst;
    }

    /** Adds the integrals of the flows over the step tried last. */
    void addFlows(double h, double[] totals) {
        if (flows == 0) {
            return;
        }
        for (int i = 0; i < n; i++) {
            along[i] = B1 * u1[i] + B2 * u2[i] + B3 * u3[i] + B4 * u4[i];
        }
        Arrays.fill(flowAlong, 0);
        system.flowsAlong(along, flowAlong);
        for (int i = 0; i < flows; i++) {
            totals[i] +=
                    h
                            * ((B1 + B2) * flow0[i]
                                    + B3 * flow3[i]
                                    + B4 * flow4[i]
                                    + h * (0.5 * B1 + 1.5 * B2) * flowSlope[i]
                                    + flowAlong[i]);
        }
    }
}

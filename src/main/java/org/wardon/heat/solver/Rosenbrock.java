package org.wardon.heat.solver;

import java.util.Arrays;

/**
 * One step of a Rosenbrock method: stages that each solve one linear system with the same matrix,
 * written in the form without matrix products: {@code (1/(h γ) I - J) u_i = f(t + α_i h, y + Σ a_ij
 * u_j) + Σ c_ij/h u_j + h γ_i f_t}.
 *
 * <p>Flows g are integrated as if they were further unknowns, which needs no linear algebra: their
 * stages sum to {@code h (Σ b_i (g_i + h γ_i g_t) + g_y · Σ b_i u_i)}.
 */
abstract class Rosenbrock {
    final TreeSystem system;
    final Tree tree;
    final int n;
    final int flows;

    /** Rates and flows where the step starts, and their slopes in time. */
    final double[] f0;

    final double[] ft;
    final double[] flow0;
    final double[] flowSlope;

    /** What the stages solve for. */
    final double[] u1;

    final double[] u2;
    final double[] u3;
    final double[] u4;
    final double[][] stages;

    /** The state a stage asks the rates of. */
    final double[] stage;

    /** The state at the end of the step tried last. */
    final double[] end;

    /** Where the error of the step tried last was largest: a hub node, or a branch's first. */
    int worstNode;

    private final TreeSystem.Change start;
    private final TreeSystem.Change slope;
    private final double[] along;
    private final double[] flowAlong;

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
        end = new double[n];
        along = new double[n];
        flowAlong = new double[flows];
    }

    /** Prepares steps of any length from one state. */
    void startFrom(double t, double[] y) {
        system.linearise(t, y, start, slope);
    }

    /** Tries a step of length h from the state last started from; returns its error, 1 allowed. */
    abstract double tryStep(double t, double[] y, double h);

    /** How much longer a step may be for an error so much larger. */
    abstract double root(double times);

    /** How much larger the error is of a step so much longer. */
    abstract double power(double times);

    /** Writes Σ b_i u_i. */
    abstract void along(double[] into);

    /** Adds {@code h Σ b_i (g_i + h γ_i g_t)} and h times what flows along. */
    abstract void addFlows(double h, double[] flowAlong, double[] totals);

    /** Adds the integrals of the flows over the step tried last. */
    final void addFlows(double h, double[] totals) {
        if (flows == 0) {
            return;
        }
        along(along);
        Arrays.fill(flowAlong, 0);
        system.flowsAlong(along, flowAlong);
        addFlows(h, flowAlong, totals);
    }

    /**
     * Each node of the hub counts for itself, each branch by its root mean square; not a number
     * where any of them is none.
     */
    final double error(double[] miss) {
        double[] weights = system.weights();
        double worst = 0;
        for (int i = 0; i < tree.hub(); i++) {
            double e = Math.abs(miss[i] * weights[i]);
            if (e > worst || Double.isNaN(e)) {
                worst = e;
                worstNode = i;
            }
        }
        for (Branch branch : tree.branches()) {
            double sum = 0;
            for (int i = branch.start; i < branch.start + branch.size(); i++) {
                double share = miss[i] * weights[i];
                sum += share * share;
            }
            double e = Math.sqrt(sum / branch.size());
            if (e > worst || Double.isNaN(e)) {
                worst = e;
                worstNode = branch.start;
            }
        }
        for (Bank bank : tree.banks()) {
            double e = bank.worst(miss, weights);
            if (e > worst || Double.isNaN(e)) {
                worst = e;
                worstNode = bank.at(0, bank.worstMember);
            }
        }
        return worst;
    }
}

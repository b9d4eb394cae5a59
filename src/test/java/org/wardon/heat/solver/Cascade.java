package org.wardon.heat.solver;

/**
 * A small system for tests: nonlinear, driven in time, stiff at will. Hub a, b; a branch of one run
 * node c and one block node d. {@code a' = -a b + sin t + d - a, b' = a^2 - b, c' = k (d^2 - c), d'
 * = c - 2 d + a b}. Flows: a^2 t and the sum of the rates' linear part, whose integral must be the
 * change of the state itself.
 */
final class Cascade implements TreeSystem {
    private final Tree tree = new Tree(2);
    private final Branch branch = tree.addBranch(1, 1);
    private final double stiffness;
    private final double[] weights = new double[4];
    private double flowA;
    private final double[] flowRow = new double[4];

    Cascade(double stiffness, double tolerance) {
        this.stiffness = stiffness;
        java.util.Arrays.fill(weights, 1 / tolerance);
    }

    @Override
    public Tree tree() {
        return tree;
    }

    @Override
    public int flows() {
        return 2;
    }

    void plain(double t, double[] y, double[] f) {
        f[0] = -y[0] * y[1] + Math.sin(t) + y[3] - y[0];
        f[1] = y[0] * y[0] - y[1];
        f[2] = stiffness * (y[3] * y[3] - y[2]);
        f[3] = y[2] - 2 * y[3] + y[0] * y[1];
    }

    @Override
    public void rates(double t, double[] y, double[] rates, double[] flows) {
        plain(t, y, rates);
        flows[0] = y[0] * y[0] * t;
        flows[1] = rates[0];
    }

    @Override
    public void linearise(double t, double[] y, Change now, Change slope) {
        rates(t, y, now.rates(), now.flows());
        double[] rateSlope = slope.rates();
        double[] flowSlope = slope.flows();
        tree.hubByHub[0] = flowRow[0] = -y[1] - 1;
        tree.hubByHub[1] = flowRow[1] = -y[0];
        tree.hubByHub[2] = 2 * y[0];
        tree.hubByHub[3] = -1;
        branch.onHub[0] = flowRow[3] = 1;
        branch.self[0] = -stiffness;
        branch.after[0] = 2 * stiffness * y[3];
        branch.blockByRun = 1;
        branch.inner[0] = -2;
        branch.byHub[0] = y[1];
        branch.byHub[1] = y[0];
        flowA = 2 * y[0] * t;
        java.util.Arrays.fill(rateSlope, 0);
        rateSlope[0] = Math.cos(t);
        flowSlope[0] = y[0] * y[0];
        flowSlope[1] = Math.cos(t);
    }

    @Override
    public void flowsAlong(double[] direction, double[] change) {
        change[0] = flowA * direction[0];
        change[1] =
                flowRow[0] * direction[0] + flowRow[1] * direction[1] + flowRow[3] * direction[3];
    }

    @Override
    public double[] weights() {
        return weights;
    }
}

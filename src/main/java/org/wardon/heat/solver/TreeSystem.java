package org.wardon.heat.solver;

/**
 * Rates of a state whose Jacobian is a {@link Tree}, and flows: quantities whose integral over time
 * is wanted, carried by the method's own stages so that a balance of flows and states holds to
 * rounding wherever rates and flows are built from the same terms.
 */
public interface TreeSystem {
    /**
     * Returns the tree, whose J parts {@link #linearise} writes.
     *
     * @return always the same tree
     */
    Tree tree();

    /**
     * Returns how many flows there are.
     *
     * @return 0 or more
     */
    int flows();

    /**
     * Writes rates and flows of a state. Smooth between two events.
     *
     * @param t time
     * @param y state
     * @param rates filled, {@code [node]}; 0 for nodes of branches that stand still
     * @param flows filled, {@code [flow]}
     */
    void rates(double t, double[] y, double[] rates, double[] flows);

    /**
     * Writes J into the tree and keeps what {@link #flowsAlong} needs.
     *
     * @param t time of the start of a step
     * @param y state there
     * @param rateSlope filled with the partial derivative of the rates by time
     * @param flowSlope filled with the partial derivative of the flows by time
     */
    void linearise(double t, double[] y, double[] rateSlope, double[] flowSlope);

    /**
     * Writes the change of the flows along a direction, linearised where {@link #linearise} was
     * called last.
     *
     * @param direction a change of the state
     * @param change filled, {@code [flow]}
     */
    void flowsAlong(double[] direction, double[] change);

    /**
     * Returns what error of a node counts as 1.
     *
     * @return {@code [node]}, above 0; may change from step to step
     */
    double[] tolerances();
}

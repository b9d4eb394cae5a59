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
     * @param rates filled, {@code [node]}; 0 for members of a bank that take no part
     * @param flows filled, {@code [flow]}
     */
    void rates(double t, double[] y, double[] rates, double[] flows);

    /**
     * Starts a step: writes rates and flows as {@link #rates} does, J into the tree, and keeps what
     * {@link #flowsAlong} needs.
     *
     * @param t time of the start of a step
     * @param y state there
     * @param now filled with rates and flows
     * @param slope filled with their partial derivatives by time
     */
    void linearise(double t, double[] y, Change now, Change slope);

    /**
     * Writes the change of the flows along a direction, linearised where {@link #linearise} was
     * called last.
     *
     * @param direction a change of the state
     * @param change filled, {@code [flow]}
     */
    void flowsAlong(double[] direction, double[] change);

    /**
     * Returns what error of a node counts as 1, the other way round.
     *
     * @return {@code [node]}, one over the error, above 0; may change from step to step
     */
    double[] weights();

    /**
     * Tells whether a state can be. A step into one that cannot is refused however small its error
     * seems: where rates bend sharply, the method may see past the bend.
     *
     * @param y state
     * @return true where it can
     */
    default boolean possible(double[] y) {
        return true;
    }

    /**
     * Rates and flows, or their derivatives.
     *
     * @param rates {@code [node]}
     * @param flows {@code [flow]}
     */
    @SuppressWarnings("ArrayRecordComponent") // a place to write to, shared by solver and system
    record Change(double[] rates, double[] flows) {
        /**
         * Makes room for a system.
         *
         * @param nodes nodes of its tree
         * @param flows its flows
         */
        public Change(int nodes, int flows) {
            this(new double[nodes], new double[flows]);
        }
    }
}

package org.wardon.heat.solver;

/**
 * The error control asks for a step shorter than makes sense: the rates are not smooth, or huge.
 */
public final class StepTooShort extends RuntimeException {
    private static final long serialVersionUID = 1L;

    private final double time;
    private final int node;

    /**
     * Stops the integration.
     *
     * @param time where it stood
     * @param step the step asked for
     * @param node where the error was largest
     */
    StepTooShort(double time, double step, int node) {
        super("at time " + time + " the step would have to be " + step);
        this.time = time;
        this.node = node;
    }

    /**
     * Returns where the integration stood.
     *
     * @return time
     */
    public double time() {
        return time;
    }

    /**
     * Returns where the error was largest.
     *
     * @return a node of the hub, or the first of a branch
     */
    public int node() {
        return node;
    }
}

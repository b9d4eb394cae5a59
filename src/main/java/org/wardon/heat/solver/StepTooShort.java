package org.wardon.heat.solver;

/**
 * The error control asks for a step shorter than makes sense: the rates are not smooth, or huge.
 */
public final class StepTooShort extends RuntimeException {
    private static final long serialVersionUID = 1L;

    private final double time;

    /**
     * Stops the integration.
     *
     * @param time where it stood
     * @param step the step asked for
     */
    StepTooShort(double time, double step) {
        super("at time " + time + " the step would have to be " + step);
        this.time = time;
    }

    /**
     * Returns where the integration stood.
     *
     * @return time
     */
    public double time() {
        return time;
    }
}

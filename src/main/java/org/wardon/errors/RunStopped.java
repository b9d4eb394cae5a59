package org.wardon.errors;

import java.util.Locale;

/** A run met a state that cannot be. */
public final class RunStopped extends RuntimeException {
    private static final long serialVersionUID = 1L;

    private final double timeS;
    private final String chamber;
    private final String term;

    /**
     * Stops the run.
     *
     * @param timeS seconds since the start of the run
     * @param chamber the chamber
     * @param term the quantity that went wrong, with its value
     */
    public RunStopped(double timeS, String chamber, String term) {
        super(
                String.format(
                        Locale.ROOT,
                        "chamber %s, %.2f h after the start: %s",
                        chamber,
                        timeS / 3600,
                        term));
        this.timeS = timeS;
        this.chamber = chamber;
        this.term = term;
    }

    /**
     * Returns when.
     *
     * @return seconds since the start of the run
     */
    public double timeS() {
        return timeS;
    }

    /**
     * Returns where.
     *
     * @return chamber id
     */
    public String chamber() {
        return chamber;
    }

    /**
     * Returns what.
     *
     * @return the quantity with its value
     */
    public String term() {
        return term;
    }
}

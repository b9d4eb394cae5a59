package org.wardon.cooling;

import org.wardon.errors.Require;

/**
 * A span without power.
 *
 * @param startS start, s since the start of the run
 * @param endS end, s since the start of the run, after the start
 */
public record Outage(double startS, double endS) {
    /** Checks the order. */
    public Outage {
        Require.that(startS < endS, "an outage must end after it starts");
    }
}

package org.wardon.plan;

import java.time.LocalDateTime;
import org.wardon.errors.Require;

/**
 * Hours without power.
 *
 * @param from local time the power fails
 * @param hours how long, h
 */
public record OutagePlan(LocalDateTime from, double hours) {
    /** Checks the bounds. */
    public OutagePlan {
        Require.within("outages.hours", hours, 0.01, 8_760, "h", "");
    }

    /**
     * Returns when the power comes back.
     *
     * @return local time, to the second
     */
    public LocalDateTime to() {
        return from.plusSeconds(Math.round(hours * 3_600));
    }
}

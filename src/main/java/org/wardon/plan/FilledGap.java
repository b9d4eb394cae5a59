package org.wardon.plan;

import java.time.LocalDateTime;
import org.wardon.errors.Require;

/**
 * A gap in a file of readings that was filled by a straight line.
 *
 * @param from last reading before it
 * @param to first reading after it
 * @param column the column that is silent, or {@code time} where whole lines are missing
 */
public record FilledGap(LocalDateTime from, LocalDateTime to, String column) {
    /** Refuses a gap that ends before it starts. */
    public FilledGap {
        Require.that(from.isBefore(to), "a gap from " + from + " must end later, found " + to);
    }
}

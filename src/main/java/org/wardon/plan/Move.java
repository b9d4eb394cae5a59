package org.wardon.plan;

import java.time.LocalDateTime;
import org.wardon.errors.Require;

/**
 * A lot goes to another chamber.
 *
 * @param at local time
 * @param to id of the chamber it goes to
 */
public record Move(LocalDateTime at, String to) {
    /** Refuses a blank id. */
    public Move {
        Require.text("moves.to", to);
    }
}

package org.wardon.plan;

import org.wardon.errors.Require;

/**
 * What stands in for a number that a plan leaves out.
 *
 * @param value the number
 * @param unit its unit
 * @param mark what it rests on: a source id with {@code from memory} where so, {@code common
 *     practice, no source} or {@code assumption}
 */
public record Default(double value, String unit, String mark) {
    /** Refuses a number that rests on nothing. */
    public Default {
        Require.text("mark of a default", mark);
    }
}

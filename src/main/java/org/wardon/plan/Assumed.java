package org.wardon.plan;

import org.wardon.errors.Require;

/**
 * A value the keeper did not give and the program put in, so that the advice can say so.
 *
 * @param path where the value would stand in the plan, such as {@code
 *     $.chambers[0].door.openingsPerDay}
 * @param value the value put in, as a plan would write it
 * @param unit its unit, empty for a word
 * @param mark what it rests on: a source id, {@code common practice, no source} or {@code
 *     assumption}
 */
public record Assumed(String path, String value, String unit, String mark) {
    /** Refuses a value that rests on nothing. */
    public Assumed {
        Require.text("path of a default", path);
        Require.text("mark of " + path, mark);
    }
}

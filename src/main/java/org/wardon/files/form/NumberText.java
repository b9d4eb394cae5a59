package org.wardon.files.form;

import java.util.Optional;

/** How a person reads and writes numbers: units of their own, a decimal comma. */
public interface NumberText {
    /**
     * Returns a number as the person reads it.
     *
     * @param written as the plan writes it
     * @param unit unit of the plan, such as {@code °C}; may be empty
     * @return the number in the person's unit, without it
     */
    String shown(String written, String unit);

    /**
     * Reads a number as the person writes it.
     *
     * @param typed what was typed
     * @param unit unit of the plan
     * @return as the plan writes it, in its own unit; absent where it is no number
     */
    Optional<String> read(String typed, String unit);
}

package org.wardon.errors;

import java.util.Locale;

/** Checks of a programmer's arguments: the value found, the range allowed, the way out. */
public final class Require {
    private Require() {}

    /**
     * Returns the value if it lies in the range.
     *
     * @param name what the value is, with its owner
     * @param value the value found
     * @param low lowest allowed
     * @param high highest allowed
     * @param unit unit of value and range
     * @param remedy what to do when it does not fit
     * @return the value
     * @throws IllegalArgumentException outside the range or not a number
     */
    public static double within(
            String name, double value, double low, double high, String unit, String remedy) {
        if (!(value >= low && value <= high)) {
            throw new IllegalArgumentException(
                    String.format(
                            Locale.ROOT,
                            "%s is %s%s; accepted is %s to %s%s.%s",
                            name,
                            value,
                            after(unit),
                            low,
                            high,
                            after(unit),
                            after(remedy)));
        }
        return value;
    }

    private static String after(String text) {
        return text.isBlank() ? "" : " " + text;
    }

    /**
     * Returns the text if it is not blank.
     *
     * @param name what the text is
     * @param value the text found
     * @return the text
     * @throws IllegalArgumentException when it is blank
     */
    public static String text(String name, String value) {
        if (value.isBlank()) {
            throw new IllegalArgumentException(name + " is blank; give a text.");
        }
        return value;
    }

    /**
     * Passes if the condition holds.
     *
     * @param holds the condition
     * @param message what is wrong, with the value found and what is accepted
     * @throws IllegalArgumentException when it does not hold
     */
    public static void that(boolean holds, String message) {
        if (!holds) {
            throw new IllegalArgumentException(message);
        }
    }
}

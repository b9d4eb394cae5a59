package org.wardon.produce;

import java.util.Locale;

/** What keeps a lot out of a chamber or away from another lot, unless its keeper accepts it. */
public enum Conflict {
    /** Ethylene of one lot shortens the life of another, or starts its ripening. */
    ETHYLENE,
    /** One lot takes the smell of another. */
    ODOUR,
    /** A lot that is not cured comes into the cold. */
    UNCURED;

    /**
     * Returns its word, as a plan and an answer have it.
     *
     * @return lower case
     */
    public String word() {
        return name().toLowerCase(Locale.ROOT);
    }
}

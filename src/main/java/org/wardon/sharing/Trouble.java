package org.wardon.sharing;

import java.util.Locale;

/** What lots do to each other beside the setting, and a keeper may accept. */
public enum Trouble {
    /** Ethylene of one shortens the life of another, starts its ripening or harms it. */
    ETHYLENE,
    /** One takes the smell of another. */
    ODOUR;

    /**
     * Returns its word.
     *
     * @return lower case
     */
    public String word() {
        return name().toLowerCase(Locale.ROOT);
    }
}

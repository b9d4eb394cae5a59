package org.wardon.keeping;

/** What the life of a lot rests on, strongest first. */
public enum RestsOn {
    /** The keeper's own figure sets the level. */
    KNOWN_LIFE("known-life"),
    /** Lots of the keeper's own set the level. */
    OWN_LOTS("own-lots"),
    /** Published lives of this commodity at several temperatures set the slope. */
    OWN_CURVE("own-curve"),
    /** Few lives of its own; the slope leans on that of all crops. */
    POOLED_SLOPE("pooled-slope"),
    /** One life in the handbook's condition and the generic curve. */
    HANDBOOK_LIFE("handbook-life"),
    /** Printed times of ripening. */
    RIPENING_TIMES("ripening-times"),
    /** No life printed; that of its plant part or kin. */
    CLASS("class"),
    /** Mostly judged at temperatures above the highest published one. */
    EXTRAPOLATED("extrapolated");

    private final String word;

    RestsOn(String word) {
        this.word = word;
    }

    /**
     * Returns the word used in forecasts.
     *
     * @return lower-case word
     */
    public String word() {
        return word;
    }
}

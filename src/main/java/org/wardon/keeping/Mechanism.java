package org.wardon.keeping;

/** The ways a lot comes to its end. */
public enum Mechanism {
    /** Ageing. */
    SENESCENCE("senescence"),
    /** A green fruit begins to ripen. */
    RIPENING("ripening"),
    /** Loses more water than it may. */
    WATER_LOSS("water-loss"),
    /** Injury by cold above freezing. */
    CHILLING("chilling"),
    /** Ice in the tissue. */
    FREEZING("freezing"),
    /** Ageing or ripening hastened by ethylene. */
    ETHYLENE("ethylene"),
    /** Sprouts or roots grow. */
    SPROUTING("sprouting"),
    /** Mould and rot. */
    DECAY("decay");

    private final String word;

    Mechanism(String word) {
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

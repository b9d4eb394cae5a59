package org.wardon.keeping;

/** What the keeper wants a ripening fruit for. */
public enum Purpose {
    /** To leave the store still green; days left end when ripening can no longer be held. */
    SHIP_GREEN("ship-green"),
    /** To be sold ripe; days left end when it is overripe. */
    SELL_RIPE("sell-ripe");

    private final String word;

    Purpose(String word) {
        this.word = word;
    }

    /**
     * Returns the word used in plans.
     *
     * @return lower-case word
     */
    public String word() {
        return word;
    }
}

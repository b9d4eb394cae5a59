package org.wardon.produce;

/** How a figure reached us. */
public enum Evidence {
    /** Read in the source or an excerpt of it. */
    SEEN("seen"),
    /** Recalled from the named source; check before relying on it. */
    MEMORY("memory"),
    /** Part seen, part recalled; the note says which. */
    MIXED("mixed"),
    /** Arithmetic on seen figures. */
    DERIVED("derived"),
    /** Worked out from published inputs or coefficients. */
    COMPUTED("computed"),
    /** The keeper's own. */
    OWN("own"),
    /** A fact of the trade without a published source. */
    PRACTICE("common practice, no source"),
    /** Assumed here; shown as such. */
    ASSUMPTION("assumption");

    private final String word;

    Evidence(String word) {
        this.word = word;
    }

    /**
     * Returns the word used in tables and answers.
     *
     * @return lower-case word
     */
    public String word() {
        return word;
    }
}

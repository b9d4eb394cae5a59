package org.wardon.sharing;

/** Whether lots may share, worst first. */
public enum Verdict {
    /** They may not. */
    NO("no"),
    /** They may, at a price that is said. */
    TOLERABLE("tolerable"),
    /** They may. */
    GOOD("good");

    private final String word;

    Verdict(String word) {
        this.word = word;
    }

    /**
     * Returns the word used in answers.
     *
     * @return lower-case word
     */
    public String word() {
        return word;
    }

    /**
     * Returns the worse of two verdicts.
     *
     * @param other the other
     * @return the worse
     */
    public Verdict worse(Verdict other) {
        return compareTo(other) <= 0 ? this : other;
    }
}

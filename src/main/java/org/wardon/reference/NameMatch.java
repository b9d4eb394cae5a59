package org.wardon.reference;

/**
 * A commodity that a text may mean.
 *
 * @param id its id
 * @param name the name of it that was met
 * @param how in what way
 */
public record NameMatch(String id, String name, How how) {
    /** In what way a text meets a name, surest first. */
    public enum How {
        /** It is the name, but for case, accents, hyphens or the plural. */
        NAME("its name"),
        /** It is a whole word of the name, or several. */
        WORD("a word of its name"),
        /** The name begins so. */
        BEGINNING("begins so"),
        /** Every word typed stands somewhere in the name. */
        PART("part of its name"),
        /** A few letters are wrong. */
        SLIP("spelt almost so"),
        /** It shares many runs of three letters with the name. */
        ALIKE("sounds alike");

        private final String words;

        How(String words) {
            this.words = words;
        }

        /**
         * Returns the reason for a person.
         *
         * @return a few words
         */
        public String words() {
            return words;
        }
    }
}

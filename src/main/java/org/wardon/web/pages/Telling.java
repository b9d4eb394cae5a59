package org.wardon.web.pages;

import java.util.List;
import java.util.Locale;

/**
 * A sentence with what it is about.
 *
 * @param level {@code danger}, {@code caution}, {@code note}; blank for a reason
 * @param code its code: sentences of one code say the same of others
 * @param about lots or chambers it is said of
 * @param text the sentence
 * @param source id of what it rests on; blank where nothing is cited
 */
public record Telling(String level, String code, List<String> about, String text, String source) {
    /** Copies the list. */
    public Telling {
        about = List.copyOf(about);
    }

    /**
     * Returns the sentence as it stands beside the lot it begins with.
     *
     * @param lot a lot
     * @return the sentence without that beginning
     */
    public Telling without(String lot) {
        String bare = bare(lot);
        return bare.equals(text) ? this : new Telling(level, code, about, capital(bare), source);
    }

    /** The sentence without the lot it is about first; itself where it begins with none. */
    String bare() {
        return about.isEmpty() ? text : bare(about.get(0));
    }

    private String bare(String lot) {
        String begins = lot + ": ";
        return text.startsWith(begins) ? text.substring(begins.length()) : text;
    }

    private static String capital(String sentence) {
        return sentence.substring(0, 1).toUpperCase(Locale.ROOT) + sentence.substring(1);
    }
}

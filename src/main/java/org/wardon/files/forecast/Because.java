package org.wardon.files.forecast;

import java.util.List;

/**
 * One reason of a verdict on sharing.
 *
 * @param code its code
 * @param lots ids of the lots, or of the commodities where no lots are given
 * @param text the sentence
 * @param source what it rests on
 */
public record Because(String code, List<String> lots, String text, String source) {
    /** Copies the list. */
    public Because {
        lots = List.copyOf(lots);
    }
}

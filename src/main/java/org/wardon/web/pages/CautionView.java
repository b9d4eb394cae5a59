package org.wardon.web.pages;

import java.util.Optional;

/**
 * Something to beware of, or a reason.
 *
 * @param level {@code danger}, {@code caution} or {@code note}; blank for a reason
 * @param text the sentence
 * @param source id of what it rests on
 * @param more others it stands for; absent where it stands for itself
 */
public record CautionView(String level, String text, String source, Optional<MoreView> more) {
    /** The sentence as one that stands for others. */
    CautionView with(MoreView others) {
        return new CautionView(level, text, source, Optional.of(others));
    }
}

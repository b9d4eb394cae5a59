package org.wardon.web.pages;

import java.util.List;
import java.util.Optional;

/**
 * Lots on a page of many things.
 *
 * @param cards those shown, first to leave first
 * @param more what is left out; absent where all are shown
 */
public record LotsView(List<LotCardView> cards, Optional<MoreView> more) {
    /** Copies the list. */
    public LotsView {
        cards = List.copyOf(cards);
    }
}

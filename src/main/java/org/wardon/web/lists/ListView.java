package org.wardon.web.lists;

import java.util.List;
import org.wardon.web.pages.CautionView;
import org.wardon.web.pages.LinkView;
import org.wardon.web.pages.Paging;

/**
 * A long list of sentences.
 *
 * @param title what it is
 * @param told which of how many are shown, in words
 * @param numbered whether their order counts
 * @param sentences those shown
 * @param paging which part it is
 * @param ways links back and to what stands beside it
 */
public record ListView(
        String title,
        String told,
        boolean numbered,
        List<CautionView> sentences,
        Paging paging,
        List<LinkView> ways) {
    /** Copies the lists. */
    public ListView {
        sentences = List.copyOf(sentences);
        ways = List.copyOf(ways);
    }
}

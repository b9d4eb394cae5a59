package org.wardon.web.lists;

import java.util.List;
import java.util.Optional;
import org.wardon.web.pages.CautionView;
import org.wardon.web.pages.LinkView;
import org.wardon.web.pages.LotCardView;
import org.wardon.web.pages.Paging;

/**
 * The lots of a store or a chamber.
 *
 * @param title whose they are
 * @param told which of how many are shown, in words
 * @param lots those shown, first to leave first
 * @param paging which part it is
 * @param groups links to the lots of each chamber and of the whole store
 * @param back a link back
 */
public record LotsSheet(
        String title,
        String told,
        List<Lot> lots,
        Paging paging,
        List<Group> groups,
        LinkView back) {
    /** Copies the lists. */
    public LotsSheet {
        lots = List.copyOf(lots);
        groups = List.copyOf(groups);
    }

    /**
     * A lot with all that is told of it.
     *
     * @param card it at a glance
     * @param chamber where it stands, in words
     * @param cautions what to beware of
     * @param notes what is good to know
     * @param hours its temperatures hour by hour; absent where it stands nowhere
     */
    public record Lot(
            LotCardView card,
            String chamber,
            List<CautionView> cautions,
            List<CautionView> notes,
            Optional<LinkView> hours) {
        /** Copies the lists. */
        public Lot {
            cautions = List.copyOf(cautions);
            notes = List.copyOf(notes);
        }
    }

    /**
     * A way to other lots.
     *
     * @param link where and whose
     * @param here whether they are those shown
     */
    public record Group(LinkView link, boolean here) {}
}

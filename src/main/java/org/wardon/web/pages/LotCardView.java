package org.wardon.web.pages;

import java.util.List;
import java.util.Optional;

/**
 * A lot at a glance.
 *
 * @param id its id
 * @param crop name of its crop
 * @param mass its mass with unit
 * @param leaveBy when it should leave by
 * @param daysLeft days left
 * @param limit what ends it
 * @param gained what the chamber gains or loses it
 * @param notes more to know, in sentences
 * @param cautions a link to its cautions; absent where it has none or they stand beside it
 * @param urgent whether it should leave within a day
 */
public record LotCardView(
        String id,
        String crop,
        String mass,
        String leaveBy,
        RangeView daysLeft,
        String limit,
        String gained,
        List<String> notes,
        Optional<LinkView> cautions,
        boolean urgent) {
    /** Copies the list. */
    public LotCardView {
        notes = List.copyOf(notes);
    }
}

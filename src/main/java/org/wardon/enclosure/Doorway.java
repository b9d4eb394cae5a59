package org.wardon.enclosure;

import java.util.Optional;
import org.wardon.produce.Fact;

/**
 * What protects a door against exchange of air.
 *
 * @param id id used as a door's protection
 * @param type what it is
 * @param effectiveness share of the exchange kept back, 0 to 1; empty where print gives none or the
 *     row is no protection
 * @param typical the usual figure, 0 to 1; empty where print gives none
 * @param note the note of the table
 */
public record Doorway(
        String id, String type, Optional<Fact> effectiveness, Optional<Fact> typical, String note) {
    /**
     * Returns the figure to reckon with where the plan gives none.
     *
     * @return the usual figure, else the middle of the range; empty where print gives neither
     */
    public Optional<Fact> usual() {
        return typical.isPresent() ? typical : effectiveness;
    }
}

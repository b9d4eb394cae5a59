package org.wardon.web.pages;

import java.util.List;
import org.wardon.errors.Fault;

/**
 * All kept plans.
 *
 * @param plans the last changed first
 * @param faults what was wrong with a file just brought
 */
public record PlansView(List<Row> plans, List<Fault> faults) {
    /** Copies the lists. */
    public PlansView {
        plans = List.copyOf(plans);
        faults = List.copyOf(faults);
    }

    /**
     * A plan.
     *
     * @param id its number
     * @param version the version that counts
     * @param name its name
     * @param note what was last done
     * @param changed when, in words
     */
    public record Row(long id, int version, String name, String note, String changed) {}
}

package org.wardon.web.api.told;

import java.util.List;
import org.wardon.logbook.PlanVersion;

/**
 * All versions of a plan.
 *
 * @param versions what each was made from and what was done
 */
public record History(List<PlanVersion> versions) {
    /** Copies the list. */
    public History {
        versions = List.copyOf(versions);
    }
}

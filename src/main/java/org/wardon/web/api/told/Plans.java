package org.wardon.web.api.told;

import java.util.List;
import org.wardon.logbook.KeptPlan;

/**
 * All kept plans.
 *
 * @param plans the last changed first
 */
public record Plans(List<KeptPlan> plans) {
    /** Copies the list. */
    public Plans {
        plans = List.copyOf(plans);
    }
}

package org.wardon.web.api.told;

import java.util.List;
import java.util.Map;
import java.util.TreeMap;
import org.jspecify.annotations.Nullable;
import org.wardon.logbook.KeptPlan;
import org.wardon.web.pages.Problem;
import tools.jackson.databind.util.RawValue;

/**
 * A plan in a version, with what reading it gave.
 *
 * @param kept where it stands in the book of plans
 * @param good whether it can be run
 * @param faults its faults
 * @param plan the store plan as it was typed; null where its text is no JSON
 * @param files texts of the files kept with it, by the name the plan gives them
 */
public record PlanSheet(
        KeptPlan kept,
        boolean good,
        List<Problem.OneFault> faults,
        @Nullable RawValue plan,
        Map<String, String> files) {
    /** Copies the lists. */
    public PlanSheet {
        faults = List.copyOf(faults);
        files = java.util.Collections.unmodifiableMap(new TreeMap<>(files));
    }
}

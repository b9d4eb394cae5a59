package org.wardon.web.work;

import java.util.List;
import org.wardon.errors.Fault;
import org.wardon.plan.StorePlan;

/** What reading a kept plan gave. */
public sealed interface Reading {
    /**
     * A plan that can be run.
     *
     * @param plan the plan
     */
    record Good(StorePlan plan) implements Reading {}

    /**
     * A plan with faults.
     *
     * @param faults all of them, with their JSON paths
     */
    record Faulty(List<Fault> faults) implements Reading {
        /** Copies the list. */
        public Faulty {
            faults = List.copyOf(faults);
        }
    }
}

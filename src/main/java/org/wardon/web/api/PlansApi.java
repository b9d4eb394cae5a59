package org.wardon.web.api;

import java.util.List;
import org.wardon.logbook.KeptPlan;
import org.wardon.web.pages.Call;
import org.wardon.web.work.Workbench;

/** Kept plans as JSON. */
public final class PlansApi {
    private final Workbench bench;

    /**
     * Makes the resource.
     *
     * @param bench what it works with
     */
    public PlansApi(Workbench bench) {
        this.bench = bench;
    }

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

    /**
     * Lists the plans.
     *
     * @param call the request
     */
    public void list(Call call) {
        call.http().json(new Plans(bench.plans().list()));
    }
}

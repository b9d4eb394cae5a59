package org.wardon.plan;

import java.util.List;
import java.util.Optional;
import org.wardon.cooling.solar.SolarSupply;

/**
 * Where the electricity of a chamber comes from, beside its single outages.
 *
 * @param daily hours without power every day
 * @param solar panels and battery; absent where a grid feeds it
 */
public record PowerPlan(List<DailyOutage> daily, Optional<SolarSupply> solar) {
    /** A grid that fails at most now and then. */
    public static final PowerPlan GRID = new PowerPlan(List.of(), Optional.empty());

    /** Copies the list. */
    public PowerPlan {
        daily = List.copyOf(daily);
    }
}

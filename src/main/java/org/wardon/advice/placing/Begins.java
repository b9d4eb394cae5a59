package org.wardon.advice.placing;

import java.util.Optional;
import java.util.OptionalDouble;
import org.wardon.cooling.Cooler;
import org.wardon.plan.ChamberPlan;
import org.wardon.plan.StartAir;

/**
 * The air a chamber begins in that is set otherwise than its plan has it: as it stands now. A plan
 * alone starts at its setting, which would give the way there for nothing.
 */
final class Begins {
    private static final double STEPS_PER_K = 10;

    private Begins() {}

    /**
     * A chamber switched on, to be set otherwise.
     *
     * @param planned as the plan has it
     * @param outdoorC air outdoors at the start, where one that is off begins, °C
     */
    static ChamberPlan asItStands(ChamberPlan planned, double outdoorC) {
        ChamberPlan on = planned.switchedOn();
        boolean atSetting = on.coolers().stream().anyMatch(Cooler::startsAtSetting);
        if (planned.starts().isPresent() || !atSetting) {
            return on;
        }
        double nowC =
                planned.off()
                        ? Math.rint(outdoorC * STEPS_PER_K) / STEPS_PER_K
                        : planned.setting().temperatureC();
        return on.starting(Optional.of(new StartAir(nowC, OptionalDouble.empty())));
    }

    /**
     * A chamber of the plan as an option sets it; nothing is said of a start that it has anyway.
     */
    static ChamberPlan as(ChamberPlan planned, ChamberPlan option) {
        ChamberPlan set =
                planned.switchedOn().withSetting(option.setting()).changing(option.use().changes());
        boolean same =
                !planned.off()
                        && planned.setting().temperatureC() == option.setting().temperatureC();
        return same ? set : set.starting(option.starts());
    }

    /**
     * Warmest mean of a day that is no overload because the chamber is still on the way down: that
     * of its start, on the first day. What it does to lots is left to the air they are judged in.
     *
     * @return °C; minus infinity where it is on no way
     */
    static double onTheWayC(ChamberPlan set, int day) {
        return day == 0
                ? set.starts()
                        .map(StartAir::temperatureC)
                        .filter(c -> c > set.setting().temperatureC())
                        .orElse(Double.NEGATIVE_INFINITY)
                : Double.NEGATIVE_INFINITY;
    }

    /** Whether its air has to warm before it comes to its setting. */
    static boolean warmsUp(ChamberPlan set) {
        return set.starts()
                .filter(air -> air.temperatureC() < set.setting().temperatureC())
                .isPresent();
    }
}

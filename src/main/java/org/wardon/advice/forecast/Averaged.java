package org.wardon.advice.forecast;

import org.wardon.cooling.Cooler;
import org.wardon.enclosure.Enclosure;
import org.wardon.enclosure.Gains;
import org.wardon.heat.ChamberRun;

/**
 * Spreads timed defrosts evenly over the day, as averaged doors spread openings: the unit has its
 * capacity less the share of time it rests, the heater's mean warms the air. For draws and
 * sketches.
 */
final class Averaged {
    private Averaged() {}

    static ChamberRun of(ChamberRun run) {
        double heatersW =
                run.coolers().stream()
                        .flatMap(cooler -> cooler.defrost().stream())
                        .mapToDouble(defrost -> defrost.share() * defrost.heaterW())
                        .sum();
        ChamberRun even =
                run.withCoolers(run.coolers().stream().map(Cooler::withDefrostSpread).toList());
        return heatersW > 0 ? even.withEnclosure(warmed(run.enclosure(), heatersW)) : even;
    }

    /** The same enclosure with so much more heat in it at all times, W. */
    static Enclosure warmed(Enclosure built, double heatersW) {
        Gains g = built.gains();
        Gains more =
                new Gains(
                        g.lightsW(),
                        g.lightsHoursPerDay(),
                        g.peopleHoursPerDay(),
                        g.fansW() + heatersW);
        return new Enclosure(
                built.box(),
                built.faces(),
                built.thermalBridgePct(),
                built.door(),
                built.leakageAirChangesPerDay(),
                built.freshAirM3PerHour(),
                more,
                built.structureCapacityJK(),
                built.computedFilms(),
                built.zones());
    }
}

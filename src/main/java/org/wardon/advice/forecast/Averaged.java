package org.wardon.advice.forecast;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.wardon.cooling.Compressor;
import org.wardon.cooling.Compressor.Defrost;
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
    private static final double MINUTES = 60;

    private Averaged() {}

    static ChamberRun of(ChamberRun run) {
        double heatersW = 0;
        List<Cooler> coolers = new ArrayList<>();
        for (Cooler cooler : run.coolers()) {
            if (cooler instanceof Compressor unit && unit.defrost().isPresent()) {
                Defrost defrost = unit.defrost().get();
                double share = defrost.minutes() / (MINUTES * defrost.everyHours());
                heatersW += share * defrost.heaterW();
                coolers.add(resting(unit, share));
            } else {
                coolers.add(cooler);
            }
        }
        return heatersW > 0
                ? run.withCoolers(coolers).withEnclosure(warmed(run.enclosure(), heatersW))
                : run.withCoolers(coolers);
    }

    private static Compressor resting(Compressor unit, double share) {
        return new Compressor(
                unit.ratedCapacityW() * (1 - share),
                unit.ratedPowerW() * (1 - share),
                unit.ratedAirC(),
                unit.ratedOutdoorC(),
                unit.fanW(),
                unit.fanAlways(),
                unit.coilUaWK(),
                unit.airFlowM3s(),
                unit.control(),
                unit.minRunMinutes(),
                unit.minRestMinutes(),
                unit.condenserRiseK(),
                unit.lowestC(),
                Optional.empty(),
                unit.dailyEnergyKWh());
    }

    private static Enclosure warmed(Enclosure built, double heatersW) {
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
                built.computedFilms());
    }
}

package org.wardon.heat;

import java.util.List;
import java.util.Optional;
import org.wardon.produce.Reason;

/**
 * What a run returns.
 *
 * @param chamberId id of the chamber
 * @param hours the chamber's series
 * @param lots one a stay, in the order of the run
 * @param events what went on for a while, by start
 * @param counts what was counted
 * @param coolers what each cooler did, in their order; none with an ideal one
 * @param heat heat by term
 * @param water water by term
 * @param sand water of wetted walls
 * @param layersErrorShare error of the heat balance of the faces' layers, share of what entered
 *     them
 * @param solar what panels and battery did, where they feed the chamber
 * @param reasons what had to be estimated, with an empty subject
 */
public record Course(
        String chamberId,
        Hours hours,
        List<LotCourse> lots,
        List<CourseEvent> events,
        Counts counts,
        List<CoolerTotals> coolers,
        HeatLedger heat,
        WaterLedger water,
        SandLedger sand,
        double layersErrorShare,
        Optional<SolarLedger> solar,
        List<Reason> reasons) {
    /** Copies the lists. */
    public Course {
        lots = List.copyOf(lots);
        events = List.copyOf(events);
        coolers = List.copyOf(coolers);
        reasons = List.copyOf(reasons);
    }

    /**
     * What was counted in a run.
     *
     * @param thermostatSwitches times a thermostat switched on or off
     * @param doorOpenings openings of the door
     * @param co2HighestPpm highest carbon dioxide, ppm
     * @param co2AtFirstOpeningPpm highest carbon dioxide met at the first opening of a day, ppm; 0
     *     where the door never opens
     * @param steps steps of the solver
     * @param stepsRefused steps tried and refused
     */
    public record Counts(
            long thermostatSwitches,
            long doorOpenings,
            double co2HighestPpm,
            double co2AtFirstOpeningPpm,
            long steps,
            long stepsRefused) {}

    /**
     * Returns the water all coolers used up.
     *
     * @return kg
     */
    public double waterUsedKg() {
        return coolers.stream().mapToDouble(CoolerTotals::waterKg).sum();
    }

    /**
     * Returns the worst error of the balances of heat, of water, of the water of wetted walls and
     * of ice and of solar energy.
     *
     * @return percent
     */
    public double balanceErrorPct() {
        double worst = Math.max(heat.errorShare(), water.errorShare());
        worst = Math.max(Math.max(worst, sand.errorShare()), layersErrorShare);
        for (CoolerTotals cooler : coolers) {
            worst = Math.max(worst, cooler.ice().map(IceLedger::errorShare).orElse(0.0));
        }
        worst = Math.max(worst, solar.map(SolarLedger::errorShare).orElse(0.0));
        return 100 * worst;
    }

    /**
     * Returns the lot of an id.
     *
     * @param id lot id
     * @return its course
     * @throws java.util.NoSuchElementException where there is none
     */
    public LotCourse lot(String id) {
        return lots.stream()
                .filter(lot -> lot.stay().lot().id().equals(id))
                .findFirst()
                .orElseThrow(
                        () -> new java.util.NoSuchElementException("no lot " + id + " in the run"));
    }
}

package org.wardon.advice.forecast;

import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;
import java.util.stream.IntStream;
import org.wardon.air.Timeline;
import org.wardon.files.forecast.HourlySeries;
import org.wardon.heat.Course;
import org.wardon.heat.Hours;
import org.wardon.keeping.Fate;
import org.wardon.keeping.Outlook;
import org.wardon.lots.LotHistory;
import org.wardon.plan.ChamberPlan;
import org.wardon.produce.Caution;
import org.wardon.produce.Reason;
import org.wardon.sharing.ChamberVerdict;

/** One chamber tried: its air, its lots, whether it holds. */
public final class ChamberTrial {
    private final StoreOutcome outcome;
    private final ChamberPlan chamber;
    private final List<Visit> visits;
    private final Holding holding;
    private final ChamberVerdict company;

    ChamberTrial(StoreOutcome outcome, String chamberId) {
        this.outcome = outcome;
        chamber = outcome.model().plan().getChamber(chamberId);
        visits =
                outcome.model().visitsIn(chamberId).stream()
                        .filter(visit -> outcome.has(visit.id()))
                        .filter(visit -> visit.arrivesS() < outcome.horizonS())
                        .toList();
        holding = Holding.of(chamber, outcome);
        company = Company.together(outcome, chamberId, visits);
    }

    /**
     * Returns the chamber.
     *
     * @return as it was tried
     */
    public ChamberPlan chamber() {
        return chamber;
    }

    /**
     * Returns whether the chamber holds its setting.
     *
     * @return true if so
     */
    public boolean holds() {
        return holding.holds();
    }

    /**
     * Returns why it does not hold.
     *
     * @return reasons, empty where it holds
     */
    public List<Reason> whyNotHeld() {
        return holding.reasons();
    }

    /**
     * Returns what the chamber's air does to its lots.
     *
     * @return verdicts and reasons
     */
    public ChamberVerdict company() {
        return company;
    }

    /**
     * Returns the chamber's series to the plan's end.
     *
     * @return the middle draw's
     */
    public Hours hours() {
        return course().hours();
    }

    /**
     * Returns the chamber hour by hour to the plan's end.
     *
     * @return the columns of {@link ChamberView#air}
     */
    public HourlySeries series() {
        return new StoreSeries(outcome).chamber(chamber.id());
    }

    private Course course() {
        return outcome.course(chamber.id());
    }

    /**
     * Returns the lots that stand there at some time between two.
     *
     * @param fromS from, s since the plan's start
     * @param toS to, s
     * @return their ids, in the order of the plan
     */
    public List<String> lots(double fromS, double toS) {
        return visits.stream()
                .filter(visit -> visit.hereFromS() < toS && visit.leavesS() > fromS)
                .map(Visit::id)
                .distinct()
                .toList();
    }

    /**
     * Returns the largest mass that stands there at one time between two.
     *
     * @param fromS from, s since the plan's start
     * @param toS to, s
     * @return net, kg
     */
    public double mostKg(double fromS, double toS) {
        List<Double> times = new ArrayList<>(List.of(fromS));
        visits.stream()
                .map(Visit::hereFromS)
                .filter(atS -> atS > fromS && atS < toS)
                .forEach(times::add);
        return times.stream().mapToDouble(this::standingKg).max().orElseThrow();
    }

    private double standingKg(double atS) {
        return visits.stream()
                .filter(visit -> visit.hereFromS() <= atS && visit.leavesS() > atS)
                .mapToDouble(visit -> visit.sheet().plan().massKg())
                .sum();
    }

    /**
     * Returns the days a lot has left, staying there.
     *
     * @param lotId its id
     * @param fromS counted from here, s since the plan's start
     * @return {@code [draw]}, days
     */
    public double[] daysLeft(String lotId, double fromS) {
        return outcome.fates(lotId).staying().stream()
                .mapToDouble((Fate fate) -> fate.daysLeft(fromS))
                .toArray();
    }

    /**
     * Returns the days a lot has left from its arrival or the plan's start, staying there.
     *
     * @param lotId its id
     * @return {@code [draw]}, days
     */
    public double[] daysLeft(String lotId) {
        return daysLeft(lotId, sheet(lotId).clock().hereFromS());
    }

    /**
     * Returns what is told of a lot staying there.
     *
     * @param lotId its id
     * @return days from its arrival, what limits it, its risk of chilling, what it rests on
     */
    public Outlook outlook(String lotId) {
        return figures(lotId).outlook();
    }

    private LotSheet sheet(String lotId) {
        return visits.stream()
                .map(Visit::sheet)
                .filter(sheet -> sheet.id().equals(lotId))
                .findFirst()
                .orElseThrow();
    }

    private LotFigures figures(String lotId) {
        return new LotFigures(sheet(lotId), chamber, outcome);
    }

    /**
     * Returns the value of a lot when it is sold.
     *
     * @param lotId its id
     * @return price times mass left times share of draws in which it is sound, currency
     */
    public double valueKept(String lotId) {
        return figures(lotId).valueKept();
    }

    /**
     * Returns the risk of visible injury by cold by the end of the market leg.
     *
     * @param lotId its id
     * @return 0 to 1
     */
    public double chillingProbability(String lotId) {
        return LotRisk.chilling(outcome.fates(lotId), sheet(lotId).soldS());
    }

    /**
     * Returns the time until a lot is half cooled.
     *
     * @param lotId its id
     * @return h; empty where it came cold or does not get there
     */
    public OptionalDouble coolHalfHours(String lotId) {
        return cooling(lotId).halfHours();
    }

    /**
     * Returns the time until a lot is seven-eighths cooled.
     *
     * @param lotId its id
     * @return h; empty where it came cold or does not get there
     */
    public OptionalDouble coolSevenEighthsHours(String lotId) {
        return cooling(lotId).sevenEighthsHours();
    }

    private Cooling cooling(String lotId) {
        return Cooling.of(outcome.history(lotId), sheet(lotId), chamber, outcome);
    }

    /**
     * Returns what a lot goes through in the middle draw.
     *
     * @param lotId its id
     * @return to the plan's end
     */
    public LotHistory history(String lotId) {
        return outcome.history(lotId);
    }

    /**
     * Returns the mean ethylene of the air over a span.
     *
     * @param fromS from, s since the plan's start
     * @param toS to, s
     * @return µL/L
     */
    public double ethylenePpm(double fromS, double toS) {
        var level = outcome.ethylene(chamber.id());
        Hours hours = hours();
        return IntStream.range(0, hours.size())
                .filter(i -> hours.atS(i) > fromS && hours.atS(i) <= toS + Timeline.HOUR_S)
                .mapToDouble(i -> level.ppmAt(hours.atS(i)))
                .average()
                .orElse(level.ppmAt(fromS));
    }

    /**
     * Returns the lots that stand too warm at the door end of a chamber whose air is two.
     *
     * @return their ids
     */
    public List<String> tooWarmByDoor() {
        return DoorEnd.of(outcome, chamber).stream()
                .map(Caution::reason)
                .filter(reason -> reason.code().equals("door-end-too-warm"))
                .map(reason -> reason.subjects().get(0))
                .toList();
    }

    /**
     * Returns what carbon dioxide, oxygen and ethylene mean for people there.
     *
     * @return cautions, none where the air is good
     */
    public List<Caution> gasCautions() {
        return GasCautions.ofPeople(chamber.id(), course());
    }

    /**
     * Returns the electricity used to the plan's end.
     *
     * @return kWh
     */
    public double energyKWh() {
        return course().heat().electricity() / ChamberFigures.J_PER_KWH;
    }

    /**
     * Returns what that costs.
     *
     * @return currency; 0 where the sun feeds the chamber
     */
    public double energyCost() {
        return chamber.power().solar().isPresent()
                ? 0
                : energyKWh() * outcome.model().plan().prices().energyPerKWh();
    }
}

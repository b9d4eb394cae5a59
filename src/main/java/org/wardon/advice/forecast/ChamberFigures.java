package org.wardon.advice.forecast;

import java.util.Arrays;
import java.util.List;
import java.util.OptionalDouble;
import java.util.function.IntToDoubleFunction;
import java.util.stream.IntStream;
import org.wardon.air.Timeline;
import org.wardon.cooling.SettingCourse;
import org.wardon.files.forecast.ChamberForecast;
import org.wardon.files.forecast.ChamberForecast.AirC;
import org.wardon.files.forecast.ChamberForecast.LoadKWh;
import org.wardon.files.forecast.ChamberForecast.MeanMax;
import org.wardon.files.forecast.ChamberForecast.OfCooler;
import org.wardon.files.forecast.ChamberForecast.Solar;
import org.wardon.files.forecast.MeanMinMax;
import org.wardon.heat.CoolerTotals;
import org.wardon.heat.Course;
import org.wardon.heat.HeatLedger;
import org.wardon.heat.Hours;
import org.wardon.heat.SolarLedger;
import org.wardon.plan.ChamberPlan;
import org.wardon.plan.StorePlan;

/** Figures of one chamber over the course. */
final class ChamberFigures {
    static final double J_PER_KWH = 3.6e6;
    private static final double AIR_O2_PCT = 20.9;

    private final ChamberPlan chamber;
    private final StoreOutcome outcome;
    private final Course course;

    ChamberFigures(ChamberPlan chamber, StoreOutcome outcome) {
        this.chamber = chamber;
        this.outcome = outcome;
        this.course = outcome.course(chamber.id());
    }

    ChamberForecast forecast(Holding holding, Course ideal, OptionalDouble intake) {
        Hours hours = course.hours();
        double energyKWh = course.heat().electricity() / J_PER_KWH;
        double co2 = course.counts().co2HighestPpm();
        return new ChamberForecast(
                chamber.id(),
                holding.holds(),
                air(hours),
                meanMinMax(hours, i -> StoreSeries.humidityPct(hours, i)),
                holding.hoursOutside(),
                holding.hoursDisturbed(),
                holding.pullDownHours(),
                changes(holding),
                peakW(ideal.hours()),
                max(hours, hours::coolingW),
                intake,
                new MeanMax(mean(hours, hours::respirationW), max(hours, hours::respirationW)),
                AIR_O2_PCT - co2 / 1e4,
                load(course.heat()),
                course.heat().removed() / J_PER_KWH,
                energyKWh,
                energyCost(chamber, course, outcome.model().plan()),
                course.waterUsedKg(),
                co2,
                ethylenePpm(),
                course.balanceErrorPct(),
                course.coolers().stream().map(ChamberFigures::cooler).toList(),
                course.solar().map(this::solar),
                chamber.enclosure().zones().map(zones -> doorEnd(hours)),
                CleanerAir.figures(chamber, outcome));
    }

    private List<ChamberForecast.SettingChange> changes(Holding holding) {
        SettingCourse settings = outcome.model().settings(chamber);
        return holding.stretches().stream()
                .filter(stretch -> settings.sinceS(stretch.fromS()) > 0)
                .map(
                        stretch ->
                                new ChamberForecast.SettingChange(
                                        outcome.model().plan().timeline().localAt(stretch.fromS()),
                                        stretch.setting().temperatureC(),
                                        stretch.setting().humidityPct(),
                                        stretch.hoursToReach()))
                .toList();
    }

    /**
     * The highest load, but for the hours after a later setting in which walls and racks follow,
     * which may take their time: up to the next arrival, three at least and twelve at most.
     */
    private double peakW(Hours ideal) {
        SettingCourse settings = outcome.model().settings(chamber);
        double most = 0;
        for (int i = 0; i < ideal.size(); i++) {
            double at = ideal.atS(i);
            double sinceS = settings.sinceS(Math.nextDown(at));
            if (sinceS <= 0 || at > sinceS + leftOutS(sinceS)) {
                most = Math.max(most, ideal.coolingW(i));
            }
        }
        return most;
    }

    private double leftOutS(double changeS) {
        double most = Holding.DISTURBED_HOURS * Timeline.HOUR_S;
        double least = Holding.PULLED_DOWN_HOURS * Timeline.HOUR_S;
        double next =
                outcome.model().visitsIn(chamber.id()).stream()
                        .mapToDouble(visit -> visit.arrivesS() - changeS)
                        .filter(after -> after >= 0)
                        .min()
                        .orElse(most);
        return Math.min(Math.max(next, least), most);
    }

    /** What the grid's electricity costs; that of panels is had for nothing. */
    static double energyCost(ChamberPlan chamber, Course course, StorePlan plan) {
        return chamber.power().solar().isPresent()
                ? 0
                : course.heat().electricity() / J_PER_KWH * plan.prices().energyPerKWh();
    }

    private static ChamberForecast.DoorEnd doorEnd(Hours hours) {
        return new ChamberForecast.DoorEnd(
                meanMinMax(hours, hours::doorEndC),
                meanMinMax(hours, i -> StoreSeries.doorEndHumidityPct(hours, i)),
                meanMinMax(hours, i -> hours.doorEndC(i) - hours.airC(i)));
    }

    private static OfCooler cooler(CoolerTotals did) {
        return new OfCooler(
                did.kind(),
                did.ranS() / Timeline.HOUR_S,
                did.removedJ() / J_PER_KWH,
                did.electricityJ() / J_PER_KWH,
                did.waterKg(),
                did.ice()
                        .map(
                                ice ->
                                        new ChamberForecast.Ice(
                                                ice.meltedKg(),
                                                ice.refrozenKg(),
                                                Math.max(ice.endKg(), 0))));
    }

    private double ethylenePpm() {
        var level = outcome.ethylene(chamber.id());
        Hours hours = course.hours();
        return max(hours, i -> level.ppmAt(hours.atS(i)));
    }

    private Solar solar(SolarLedger did) {
        return new Solar(
                did.panelJ() / J_PER_KWH,
                did.usedJ() / J_PER_KWH,
                did.spilledJ() / J_PER_KWH,
                did.lostJ() / J_PER_KWH,
                did.startJ() / J_PER_KWH,
                did.endJ() / J_PER_KWH,
                100 * did.lowestShare(),
                did.withoutS() / Timeline.HOUR_S,
                BatteryNights.first(course).map(event -> BatteryNights.time(event, outcome)));
    }

    private static LoadKWh load(HeatLedger heat) {
        return new LoadKWh(
                heat.walls() / J_PER_KWH,
                heat.door() / J_PER_KWH,
                heat.leakage() / J_PER_KWH,
                heat.freshAir() / J_PER_KWH,
                heat.fieldHeat() / J_PER_KWH,
                heat.respiration() / J_PER_KWH,
                heat.fans() / J_PER_KWH,
                heat.lights() / J_PER_KWH,
                heat.people() / J_PER_KWH,
                heat.packages() / J_PER_KWH,
                heat.defrost() / J_PER_KWH,
                heat.humidifier() / J_PER_KWH,
                heat.heater() / J_PER_KWH,
                heat.pumps() / J_PER_KWH,
                heat.air() / J_PER_KWH);
    }

    private static AirC air(Hours hours) {
        double[] sorted =
                IntStream.range(0, hours.size()).mapToDouble(hours::airC).sorted().toArray();
        double place = 0.95 * (sorted.length - 1);
        int below = (int) place;
        int above = Math.min(below + 1, sorted.length - 1);
        double p95 = sorted[below] + (place - below) * (sorted[above] - sorted[below]);
        return new AirC(
                Arrays.stream(sorted).average().orElseThrow(),
                min(hours, hours::airLowestC),
                max(hours, hours::airHighestC),
                p95);
    }

    private static MeanMinMax meanMinMax(Hours hours, IntToDoubleFunction value) {
        return new MeanMinMax(mean(hours, value), min(hours, value), max(hours, value));
    }

    private static double mean(Hours hours, IntToDoubleFunction value) {
        return IntStream.range(0, hours.size()).mapToDouble(value).average().orElseThrow();
    }

    private static double min(Hours hours, IntToDoubleFunction value) {
        return IntStream.range(0, hours.size()).mapToDouble(value).min().orElseThrow();
    }

    private static double max(Hours hours, IntToDoubleFunction value) {
        return IntStream.range(0, hours.size()).mapToDouble(value).max().orElseThrow();
    }
}

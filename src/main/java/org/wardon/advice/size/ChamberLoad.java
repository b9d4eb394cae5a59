package org.wardon.advice.size;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Objects;
import org.wardon.advice.size.DesignLoad.Term;
import org.wardon.air.MoistAir;
import org.wardon.cooling.Compressor;
import org.wardon.cooling.Cooler;
import org.wardon.cooling.Defrost;
import org.wardon.enclosure.Beyond;
import org.wardon.enclosure.Box;
import org.wardon.enclosure.Enclosure;
import org.wardon.enclosure.Face;
import org.wardon.enclosure.Films;
import org.wardon.enclosure.Gains;
import org.wardon.enclosure.GroundFloor;
import org.wardon.enclosure.HeatFlow;
import org.wardon.enclosure.PeopleHeat;
import org.wardon.enclosure.UValue;
import org.wardon.errors.Require;
import org.wardon.lots.Lot;
import org.wardon.plan.ChamberPlan;

/** The design load of a chamber as it stands in a plan, on a design day. */
public final class ChamberLoad {
    /** Share of a heater's heat that stays in the room (assumption). */
    private static final double DEFROST_STAYS = 0.3;

    private static final double DAY_H = 24;

    private ChamberLoad() {}

    /**
     * The day the chamber is designed for.
     *
     * @param outdoorC outdoor air, °C
     * @param outdoorHumidityPct its relative humidity, percent
     * @param groundC deep ground, the yearly mean outdoors, °C
     * @param latitudeDeg latitude of the site, north positive
     * @param pressurePa air pressure, Pa
     * @param neighbourC air of other chambers by id, °C
     */
    public record DesignDay(
            double outdoorC,
            double outdoorHumidityPct,
            double groundC,
            double latitudeDeg,
            double pressurePa,
            Map<String, Double> neighbourC) {
        /** Copies the neighbours and checks the bounds. */
        public DesignDay {
            neighbourC = Map.copyOf(neighbourC);
            Require.within("outdoorC", outdoorC, -60, 60, "°C", "");
            Require.within("outdoorHumidityPct", outdoorHumidityPct, 0, 100, "%", "");
            Require.within("groundC", groundC, -30, 40, "°C", "");
            Require.within("latitudeDeg", latitudeDeg, -90, 90, "°", "");
            Require.within("pressurePa", pressurePa, 40_000, 120_000, "Pa", "");
        }
    }

    /**
     * Produce of a design day.
     *
     * @param lot what it is; its own mass is not heard
     * @param storedKg cold produce in the room, kg
     * @param incomingKg warm produce that comes in, kg
     * @param arrivesC its flesh then, °C
     * @param pullDownHours hours in which it is to be cold, h
     * @param sourceId where its breathing is printed
     */
    public record Intake(
            Lot lot,
            double storedKg,
            double incomingKg,
            double arrivesC,
            double pullDownHours,
            String sourceId) {
        /** Checks the bounds. */
        public Intake {
            Require.within("storedKg of " + lot.id(), storedKg, 0, 1e7, "kg", "");
            Require.within("incomingKg of " + lot.id(), incomingKg, 0, 1e7, "kg", "");
            Require.within("arrivesC of " + lot.id(), arrivesC, -5, 55, "°C", "");
            Require.within("pullDownHours of " + lot.id(), pullDownHours, 0.1, 1_000, "h", "");
        }
    }

    /**
     * Sums the load at the chamber's setting.
     *
     * @param chamber the chamber
     * @param day the day it is designed for
     * @param intakes produce of that day
     * @param safetyPct margin on the sum, percent
     * @return the load, its running hours by the defrost of the chamber's compressors
     */
    public static DesignLoad of(
            ChamberPlan chamber, DesignDay day, List<Intake> intakes, double safetyPct) {
        double roomC = chamber.setting().temperatureC();
        List<Term> terms = new ArrayList<>();
        for (Face face : chamber.enclosure().faces()) {
            terms.add(through(chamber.enclosure(), face, day, roomC));
        }
        terms.add(air(chamber, day));
        for (Intake intake : intakes) {
            produce(intake, roomC, terms);
        }
        inside(chamber, terms);
        boolean heaters =
                chamber.coolers().stream()
                        .anyMatch(c -> c instanceof Compressor unit && defrostW(unit) > 0);
        return new DesignLoad(terms, safetyPct, DesignLoad.runningHours(heaters));
    }

    private static Term through(Enclosure enclosure, Face face, DesignDay day, double roomC) {
        double beyondC = beyondC(face.beyond(), day);
        HeatFlow flow = HeatFlow.through(face.name(), beyondC, roomC);
        double inside = Films.insideM2KW(flow);
        double layers = UValue.resistanceM2KW(face.asBuilt());
        boolean outdoors = face.beyond() instanceof Beyond.Outdoors;
        boolean open = outdoors || face.beyond() instanceof Beyond.Shade;
        double wattsM2K =
                face.beyond() instanceof Beyond.Ground
                        ? GroundFloor.under(enclosure).wattsM2K(layers, inside)
                        : UValue.ofResistance(
                                inside + layers + (open ? Films.OUTSIDE_M2KW : inside));
        double sunK =
                outdoors
                        ? SunAllowance.of(face.solarAbsorptance())
                                .kelvin(face.name(), day.latitudeDeg())
                        : 0;
        return LoadTerms.transmission(
                face.name().name().toLowerCase(java.util.Locale.ROOT),
                wattsM2K * (1 + enclosure.thermalBridgePct() / 100),
                enclosure.box().areaM2(face.name()),
                beyondC - roomC,
                sunK);
    }

    private static double beyondC(Beyond beyond, DesignDay day) {
        if (beyond instanceof Beyond.Ground) {
            return day.groundC();
        }
        if (beyond instanceof Beyond.Space space) {
            return space.temperatureC();
        }
        if (beyond instanceof Beyond.SpaceAboveOutdoor space) {
            return day.outdoorC() + space.aboveOutdoorK();
        }
        if (beyond instanceof Beyond.Neighbour neighbour) {
            Require.that(
                    day.neighbourC().containsKey(neighbour.chamberId()),
                    "the air of chamber " + neighbour.chamberId() + " is not given");
            return Objects.requireNonNull(day.neighbourC().get(neighbour.chamberId()));
        }
        return day.outdoorC();
    }

    /** Door and leakage by the table of air changes, and fresh air as it is set. */
    private static Term air(ChamberPlan chamber, DesignDay day) {
        Box box = chamber.enclosure().box();
        double fresh = chamber.enclosure().freshAirM3PerHour() * DAY_H / box.volumeM3();
        return LoadTerms.airChange(
                chamber.id(),
                AirChanges.perDay(box.volumeM3()) + fresh,
                box.volumeM3(),
                heatJm3(chamber, day));
    }

    /**
     * Returns the enthalpy that a cubic metre of room air gains when outdoor air replaces it.
     *
     * @param chamber the chamber, at its setting
     * @param day the day
     * @return J/m3
     */
    static double heatJm3(ChamberPlan chamber, DesignDay day) {
        double roomC = chamber.setting().temperatureC();
        double p = day.pressurePa();
        double room = MoistAir.humidityRatioAt(roomC, chamber.setting().humidityPct() / 100, p);
        double out = MoistAir.humidityRatioAt(day.outdoorC(), day.outdoorHumidityPct() / 100, p);
        return (MoistAir.enthalpyJkg(day.outdoorC(), out) - MoistAir.enthalpyJkg(roomC, room))
                / MoistAir.specificVolumeM3kg(roomC, room, p);
    }

    private static void produce(Intake intake, double roomC, List<Term> terms) {
        Lot lot = intake.lot();
        double fallK = intake.arrivesC() - roomC;
        double hours = intake.pullDownHours();
        double kg = intake.incomingKg();
        if (kg > 0) {
            double specific = lot.item().specificHeatJkgK();
            terms.add(LoadTerms.product(lot.id(), kg, specific, fallK, hours));
            // Tare is told a kilogram of produce; its heat capacity stands for mass x specific
            // heat.
            terms.add(LoadTerms.packages(lot.id(), kg, lot.packing().tareJPerKgK(), fallK, hours));
            double between = 0.5 * (intake.arrivesC() + roomC);
            terms.add(
                    LoadTerms.respiration(
                            lot.id(),
                            kg,
                            lot.respiration().wattsPerKg(between),
                            intake.sourceId()));
        }
        if (intake.storedKg() > 0) {
            terms.add(
                    LoadTerms.respiration(
                            lot.id(),
                            intake.storedKg(),
                            lot.respiration().wattsPerKg(roomC),
                            intake.sourceId()));
        }
    }

    private static void inside(ChamberPlan chamber, List<Term> terms) {
        Gains gains = chamber.enclosure().gains();
        String id = chamber.id();
        double eachW = PeopleHeat.watts(chamber.setting().temperatureC());
        terms.add(LoadTerms.lights(id, gains.lightsW(), gains.lightsHoursPerDay()));
        terms.add(LoadTerms.people(id, gains.peopleHoursPerDay(), eachW));
        if (gains.fansW() > 0) {
            terms.add(LoadTerms.fans(id, gains.fansW(), DAY_H));
        }
        for (Cooler cooler : chamber.coolers()) {
            if (cooler instanceof Compressor unit) {
                double hours =
                        unit.fanAlways() ? DAY_H : DesignLoad.runningHours(defrostW(unit) > 0);
                terms.add(LoadTerms.fans(id, unit.fanW(), hours));
                unit.defrost()
                        .filter(defrost -> defrost.heaterW() > 0)
                        .ifPresent(
                                defrost ->
                                        terms.add(
                                                LoadTerms.defrost(
                                                        id,
                                                        defrost.heaterW(),
                                                        DAY_H
                                                                / defrost.everyHours()
                                                                * defrost.minutes()
                                                                / 60,
                                                        DEFROST_STAYS)));
            }
        }
    }

    private static double defrostW(Compressor unit) {
        return unit.defrost().map(Defrost::heaterW).orElse(0.0);
    }
}

package org.wardon.advice.forecast;

import java.time.temporal.ChronoUnit;
import java.util.ArrayList;
import java.util.HashSet;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Set;
import java.util.stream.IntStream;
import org.wardon.air.StandardAtmosphere;
import org.wardon.air.Timeline;
import org.wardon.air.Weather;
import org.wardon.cooling.Cooler;
import org.wardon.cooling.CoolerCautions;
import org.wardon.cooling.Setting;
import org.wardon.cooling.solar.Inverter;
import org.wardon.cooling.solar.SolarSupply;
import org.wardon.heat.Course;
import org.wardon.heat.CourseEvent;
import org.wardon.plan.Assumed;
import org.wardon.plan.ChamberPlan;
import org.wardon.plan.FilledGap;
import org.wardon.plan.StorePlan;
import org.wardon.plan.WeatherSource;
import org.wardon.produce.Caution;
import org.wardon.produce.Caution.Level;
import org.wardon.produce.Reason;
import org.wardon.produce.Reason.Argument;

/** What a person must hear of beside the figures: first what can hurt people, then produce. */
final class Cautions {
    private static final String OWN_RULE = "assumption";
    private static final String PRACTICE = "common-practice";

    private final StoreOutcome outcome;
    private final List<Caution> cautions = new ArrayList<>();
    private final Set<Reason> told = new HashSet<>();

    Cautions(StoreOutcome outcome) {
        this.outcome = outcome;
    }

    List<Caution> all() {
        StorePlan plan = outcome.model().plan();
        for (ChamberPlan chamber : plan.chambers()) {
            GasCautions.ofPeople(chamber.id(), outcome.course(chamber.id()))
                    .forEach(c -> add(c.level(), c.reason()));
        }
        add(Level.NOTE, Reason.about("never-alone", "store", "OSHA-1910"));
        if (plan.chambers().stream().anyMatch(c -> !c.coolers().isEmpty())) {
            add(Level.NOTE, Reason.about("licensed-work", "store", "ASHRAE-34"));
        }
        for (ChamberPlan chamber : plan.chambers()) {
            chamber(chamber);
            new Deliveries(outcome, chamber).all().forEach(c -> add(c.level(), c.reason()));
            new ColdBlast(outcome, chamber).all().forEach(c -> add(c.level(), c.reason()));
            StillChamber.wide(outcome, chamber).ifPresent(c -> add(c.level(), c.reason()));
            CleanerAir.told(chamber, outcome).ifPresent(reason -> add(Level.NOTE, reason));
        }
        List<Caution> carried = new Carried(outcome).all();
        carried.forEach(c -> add(c.level(), c.reason()));
        GasCautions.ofScrubbers(outcome).forEach(c -> add(c.level(), c.reason()));
        for (LotSheet sheet : outcome.model().sheets()) {
            lot(sheet);
            new Sweating(sheet, outcome)
                    .all(Carried.sweatsIn(sheet.id(), carried))
                    .forEach(c -> add(c.level(), c.reason()));
        }
        weather(plan);
        defaults(plan);
        add(Level.NOTE, Reason.about("keeping-not-safety", "store", PRACTICE));
        return List.copyOf(cautions);
    }

    private void add(Level level, Reason reason) {
        if (told.add(reason)) {
            cautions.add(new Caution(level, reason));
        }
    }

    private void chamber(ChamberPlan chamber) {
        Course course = outcome.course(chamber.id());
        double most = OtherChambers.mostKg(outcome.model().visitsIn(chamber.id()));
        if (most > chamber.capacityKg()) {
            add(
                    Level.CAUTION,
                    Reason.about(
                            "over-capacity",
                            chamber.id(),
                            "own",
                            Argument.of(most, "kg"),
                            Argument.of(chamber.capacityKg(), "kg")));
        }
        for (CourseEvent.Kind kind : CourseEvent.Kind.values()) {
            double hours =
                    course.events().stream()
                                    .filter(event -> event.kind() == kind)
                                    .mapToDouble(event -> event.untilS() - event.fromS())
                                    .sum()
                            / Timeline.HOUR_S;
            if (hours > 0) {
                event(chamber, kind, hours, course);
            }
        }
        double pressurePa =
                StandardAtmosphere.pressurePa(outcome.model().plan().site().elevationM());
        Set<Caution> ofCoolers = new LinkedHashSet<>();
        for (Setting set : outcome.model().settings(chamber).within(0, outcome.horizonS())) {
            for (Cooler cooler : chamber.coolers()) {
                ofCoolers.addAll(CoolerCautions.of(cooler, set, chamber.id(), pressurePa));
            }
        }
        ofCoolers.forEach(caution -> add(caution.level(), caution.reason()));
        new Stretches(
                        chamber,
                        outcome.model().settings(chamber),
                        course.hours(),
                        outcome.horizonS())
                .told(firstS(chamber), outcome)
                .forEach(c -> add(c.level(), c.reason()));
        DoorEnd.of(outcome, chamber).forEach(c -> add(c.level(), c.reason()));
        FaceMoisture.of(chamber, outcome).forEach(c -> add(c.level(), c.reason()));
        CoolersAtWork.of(outcome, chamber).forEach(c -> add(c.level(), c.reason()));
        chamber.power().solar().ifPresent(supply -> solar(chamber, supply));
        for (Reason reason : course.reasons()) {
            add(
                    Level.NOTE,
                    new Reason(
                            reason.code(),
                            List.of(chamber.id()),
                            reason.arguments(),
                            reason.sourceId()));
        }
    }

    private double firstS(ChamberPlan chamber) {
        return outcome.model().visitsIn(chamber.id()).stream()
                .mapToDouble(Visit::hereFromS)
                .filter(from -> from < outcome.horizonS())
                .min()
                .orElse(0);
    }

    private void solar(ChamberPlan chamber, SolarSupply supply) {
        add(Level.CAUTION, Reason.about("solar-hazards", chamber.id(), PRACTICE));
        Weather weather = outcome.model().weather();
        if (IntStream.range(0, weather.hours()).anyMatch(h -> Double.isNaN(weather.globalWm2(h)))) {
            add(Level.NOTE, Reason.about("sun-from-temperature-range", chamber.id(), "FAO56"));
        }
        List<Boolean> carried =
                Inverter.carries(
                        supply.inverterW(),
                        Inverter.othersW(
                                chamber.enclosure().gains(),
                                chamber.heaterW(),
                                chamber.humidifierKgH()),
                        chamber.coolers());
        for (int i = 0; i < carried.size(); i++) {
            if (!carried.get(i)) {
                add(
                        Level.CAUTION,
                        Reason.about(
                                "inverter-small",
                                chamber.id(),
                                OWN_RULE,
                                Argument.of(i + 1, "1"),
                                Argument.of(chamber.coolers().get(i).mostElectricW(), "W"),
                                Argument.of(supply.inverterW().orElseThrow(), "W")));
            }
        }
    }

    private void event(ChamberPlan chamber, CourseEvent.Kind kind, double hours, Course course) {
        Argument told = Argument.of(hours, "h");
        switch (kind) {
            case WET_LOT -> {
                // Told lot by lot.
            }
            case WET_FACES ->
                    add(Level.NOTE, Reason.about("wet-faces", chamber.id(), PRACTICE, told));
            case TRIPPED -> add(Level.CAUTION, Reason.about("trips", chamber.id(), PRACTICE, told));
            case ICES_UP ->
                    add(Level.CAUTION, Reason.about("coil-iced", chamber.id(), PRACTICE, told));
            case DRY_WALL -> dryWall(chamber, told, course);
            case ENERGY_USED_UP ->
                    add(Level.CAUTION, Reason.about("energy-used-up", chamber.id(), "own", told));
            case ICE_GONE -> {
                // Told with the hour among what coolers do.
            }
            case BATTERY_EMPTY ->
                    add(
                            Level.CAUTION,
                            Reason.about(
                                    "battery-empty",
                                    chamber.id(),
                                    "own",
                                    told,
                                    BatteryNights.at(
                                            BatteryNights.first(course).orElseThrow(), outcome)));
            case OUTAGE -> add(Level.NOTE, Reason.about("outage", chamber.id(), "own", told));
        }
    }

    private void dryWall(ChamberPlan chamber, Argument told, Course course) {
        double firstS =
                course.events().stream()
                        .filter(event -> event.kind() == CourseEvent.Kind.DRY_WALL)
                        .mapToDouble(CourseEvent::fromS)
                        .min()
                        .orElse(0);
        String first =
                outcome.model()
                        .plan()
                        .timeline()
                        .localAt(firstS)
                        .truncatedTo(ChronoUnit.MINUTES)
                        .toString()
                        .replace('T', ' ');
        add(
                Level.CAUTION,
                Reason.about("dry-wall", chamber.id(), "own", told, Argument.text(first)));
    }

    private void lot(LotSheet sheet) {
        if (outcome.has(sheet.id())) {
            for (Reason reason : outcome.fates(sheet.id()).basis().reasons()) {
                // Sweat is told by where and when; only water it came with is told by its length.
                if (!reason.code().equals("wet-long") || Sweating.cameWet(sheet)) {
                    add(level(reason.code()), reason);
                }
            }
        }
        GasCautions.ofLot(sheet, outcome).forEach(c -> add(c.level(), c.reason()));
        SelfHeating.of(sheet, outcome).ifPresent(c -> add(c.level(), c.reason()));
        RipeWanted.of(sheet, outcome)
                .ifPresent(w -> w.told().forEach(c -> add(c.level(), c.reason())));
        for (Reason reason : sheet.restsOn()) {
            if (reason.code().endsWith("-class")
                    || reason.code().endsWith("-broad")
                    || reason.code().equals("variant-facts")) {
                add(
                        Level.NOTE,
                        new Reason(
                                reason.code(),
                                List.of(sheet.id()),
                                reason.arguments(),
                                reason.sourceId()));
            }
        }
    }

    private static Level level(String code) {
        return switch (code) {
            case "freezes", "heat-killed" -> Level.DANGER;
            case "cure-first",
                    "too-damp",
                    "wet-long",
                    "cold-sweetening",
                    "ethylene-harms",
                    "ripening-in-heat" ->
                    Level.CAUTION;
            default -> Level.NOTE;
        };
    }

    private void weather(StorePlan plan) {
        if (plan.weatherSource() instanceof WeatherSource.Normals made) {
            Argument seed = Argument.text(String.valueOf(plan.seed()));
            add(Level.NOTE, Reason.about("weather-from-normals", "weather", OWN_RULE, seed));
            if (made.normals().globalKWhM2Day().isEmpty()) {
                add(Level.NOTE, Reason.about("sun-from-normals", "weather", "FAO56"));
            }
        }
        if (plan.weatherSource() instanceof WeatherSource.Csv csv) {
            for (FilledGap gap : csv.filled()) {
                add(
                        Level.NOTE,
                        Reason.about(
                                "weather-gap-filled",
                                csv.file(),
                                "own",
                                Argument.text(gap.column()),
                                Argument.text(gap.from().toString()),
                                Argument.text(gap.to().toString())));
            }
        }
    }

    private void defaults(StorePlan plan) {
        for (Assumed assumed : plan.assumed()) {
            add(
                    Level.NOTE,
                    Reason.about(
                            "default-taken",
                            assumed.path(),
                            sourceOf(assumed.mark()),
                            Argument.text((assumed.value() + " " + assumed.unit()).strip()),
                            Argument.text(assumed.mark())));
        }
    }

    private static String sourceOf(String mark) {
        return mark.startsWith("common practice")
                ? PRACTICE
                : mark.startsWith("assumption") ? OWN_RULE : mark;
    }
}

package org.wardon.advice.forecast;

import java.time.LocalDate;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.OptionalDouble;
import java.util.TreeMap;
import java.util.stream.Collectors;
import org.wardon.advice.size.ChamberLoad;
import org.wardon.advice.size.DesignLoad;
import org.wardon.advice.wording.Words;
import org.wardon.air.StandardAtmosphere;
import org.wardon.air.Weather;
import org.wardon.air.YearWave;
import org.wardon.cooling.Compressor;
import org.wardon.cooling.Setting;
import org.wardon.enclosure.Surroundings;
import org.wardon.errors.BadInput;
import org.wardon.errors.Fault;
import org.wardon.files.forecast.SizeAnswer;
import org.wardon.lots.Lot;
import org.wardon.plan.ChamberPlan;
import org.wardon.plan.StorePlan;
import org.wardon.produce.Reason;
import org.wardon.reference.ReferenceBook;

/**
 * Answers what cooling a chamber asks for by the hand method: in the warmest hour of the plan's
 * weather, on the day on which most heat comes in with the lots.
 */
public final class SizeAdvice {
    private final ForecastAdvice forecast;
    private final Words words;

    /**
     * Prepares for questions.
     *
     * @param book the reference book
     * @param words words of the formulas
     */
    public SizeAdvice(ReferenceBook book, Words words) {
        forecast = new ForecastAdvice(book, words);
        this.words = words;
    }

    /**
     * A question.
     *
     * @param chamber id of the chamber
     * @param outdoorC outdoor air to design for, °C, -60 to 60; none for the plan's warmest hour
     * @param outdoorHumidityPct its humidity, percent, 0 to 100; none for that of that hour
     * @param pullDownHours hours in which what comes in is to be cold, 0.1 to 1000
     * @param marginPct margin on the sum, percent, 0 to 100
     */
    public record Question(
            String chamber,
            OptionalDouble outdoorC,
            OptionalDouble outdoorHumidityPct,
            double pullDownHours,
            double marginPct) {}

    /**
     * Answers.
     *
     * @param plan the plan; lots without a chamber are placed as the forecast places them
     * @param asked the question
     * @return the answer
     * @throws BadInput where there is no such chamber or a figure is out of its range
     */
    public SizeAnswer ask(StorePlan plan, Question asked) {
        check(plan, asked);
        StoreModel model = forecast.prepare(plan).model();
        // Designed for the coldest it is to be.
        ChamberPlan chamber = coldest(model, model.plan().getChamber(asked.chamber()));
        ChamberLoad.DesignDay day = day(model, asked);
        Map<LocalDate, List<Visit>> byDay = arrivals(model, chamber);
        LocalDate busiest =
                byDay.entrySet().stream()
                        .max(Comparator.comparingDouble(e -> fieldJ(e.getValue(), model, chamber)))
                        .map(Map.Entry::getKey)
                        .orElse(plan.from().toLocalDate());
        DesignLoad load =
                ChamberLoad.of(
                        chamber,
                        day,
                        intakes(model, chamber, byDay, busiest, asked.pullDownHours()),
                        asked.marginPct());
        return answer(chamber, day, busiest, asked, load);
    }

    private static void check(StorePlan plan, Question asked) {
        List<Fault> faults = new ArrayList<>();
        Asked.chamber(plan, asked.chamber(), faults);
        asked.outdoorC().ifPresent(c -> within("--outdoor-c", c, -60, 60, faults));
        asked.outdoorHumidityPct()
                .ifPresent(pct -> within("--outdoor-humidity-pct", pct, 0, 100, faults));
        within("--pull-down-hours", asked.pullDownHours(), 0.1, 1_000, faults);
        within("--margin-pct", asked.marginPct(), 0, 100, faults);
        if (!faults.isEmpty()) {
            throw new BadInput(faults);
        }
    }

    private static void within(
            String option, double value, double low, double high, List<Fault> faults) {
        if (!(value >= low && value <= high)) {
            faults.add(
                    new Fault(
                            option,
                            "",
                            String.format(Locale.ROOT, "is %s, out of range", value),
                            String.format(Locale.ROOT, "accepted: %s to %s", low, high)));
        }
    }

    private static ChamberLoad.DesignDay day(StoreModel model, Question asked) {
        StorePlan plan = model.plan();
        Weather weather = model.weather();
        int warmest = 0;
        for (int h = 1; h <= plan.days() * 24; h++) {
            warmest = weather.temperatureC(h) > weather.temperatureC(warmest) ? h : warmest;
        }
        return new ChamberLoad.DesignDay(
                asked.outdoorC().orElse(weather.temperatureC(warmest)),
                asked.outdoorHumidityPct().orElse(weather.humidityPct(warmest)),
                groundC(model),
                plan.site().latitudeDeg(),
                StandardAtmosphere.pressurePa(plan.site().elevationM()),
                plan.chambers().stream()
                        .collect(Collectors.toMap(ChamberPlan::id, c -> warmestC(model, c))));
    }

    private static ChamberPlan coldest(StoreModel model, ChamberPlan chamber) {
        return model.settings(chamber).within(0, model.plan().durationS()).stream()
                .min(Comparator.comparingDouble(Setting::temperatureC))
                .map(chamber::withSetting)
                .orElse(chamber);
    }

    private static double warmestC(StoreModel model, ChamberPlan chamber) {
        return model.settings(chamber).warmestC(0, model.plan().durationS());
    }

    /** The mean of the year where it is known, else that of the plan's weather. */
    private static double groundC(StoreModel model) {
        StorePlan plan = model.plan();
        Surroundings around =
                Surroundings.of(
                        plan.site(),
                        plan.timeline(),
                        model.weather(),
                        (int) Math.ceil(plan.days() * 24),
                        0);
        return around.year().map(YearWave::meanC).orElseGet(around::meanOutdoorC);
    }

    /** Lots by the day they come in; what stands there at the start comes in with it. */
    private static Map<LocalDate, List<Visit>> arrivals(StoreModel model, ChamberPlan chamber) {
        return model.visitsIn(chamber.id()).stream()
                .filter(visit -> visit.leavesS() > 0)
                .collect(
                        Collectors.groupingBy(
                                visit -> arrivesOn(model, visit),
                                TreeMap::new,
                                Collectors.toList()));
    }

    private static LocalDate arrivesOn(StoreModel model, Visit visit) {
        return model.plan().timeline().localAt(Math.max(visit.arrivesS(), 0)).toLocalDate();
    }

    /** Flesh of a lot when it comes in; from another chamber it comes as cold as that is set. */
    private static double arrivesC(Visit visit, StoreModel model) {
        return visit.from()
                .map(from -> model.settings(model.plan().getChamber(from)))
                .map(set -> set.until(Math.max(visit.arrivesS(), 1)).temperatureC())
                .orElse(visit.sheet().plan().temperatureC());
    }

    private static double fieldJ(List<Visit> visits, StoreModel model, ChamberPlan chamber) {
        double roomC = chamber.setting().temperatureC();
        return visits.stream()
                .mapToDouble(
                        visit ->
                                body(visit).massKg()
                                        * body(visit).item().specificHeatJkgK()
                                        * Math.max(arrivesC(visit, model) - roomC, 0))
                .sum();
    }

    private static Lot body(Visit visit) {
        return visit.sheet().bodies().middle();
    }

    private static List<ChamberLoad.Intake> intakes(
            StoreModel model,
            ChamberPlan chamber,
            Map<LocalDate, List<Visit>> byDay,
            LocalDate busiest,
            double hours) {
        List<ChamberLoad.Intake> intakes = new ArrayList<>();
        for (Map.Entry<LocalDate, List<Visit>> arrived : byDay.entrySet()) {
            for (Visit visit : arrived.getValue()) {
                boolean comes = arrived.getKey().equals(busiest);
                boolean stands =
                        arrived.getKey().isBefore(busiest)
                                && !model.plan()
                                        .timeline()
                                        .localAt(
                                                Math.min(visit.leavesS(), model.plan().durationS()))
                                        .toLocalDate()
                                        .isBefore(busiest);
                if (comes || stands) {
                    double kg = body(visit).massKg();
                    intakes.add(
                            new ChamberLoad.Intake(
                                    body(visit),
                                    stands ? kg : 0,
                                    comes ? kg : 0,
                                    comes
                                            ? arrivesC(visit, model)
                                            : chamber.setting().temperatureC(),
                                    hours,
                                    breathingSource(visit)));
                }
            }
        }
        return intakes;
    }

    private static String breathingSource(Visit visit) {
        return visit.sheet().restsOn().stream()
                .filter(reason -> reason.code().startsWith("respiration"))
                .map(Reason::sourceId)
                .filter(source -> !source.isEmpty())
                .findFirst()
                .orElse("");
    }

    private SizeAnswer answer(
            ChamberPlan chamber,
            ChamberLoad.DesignDay day,
            LocalDate busiest,
            Question asked,
            DesignLoad load) {
        double rated =
                chamber.coolers().stream()
                        .filter(Compressor.class::isInstance)
                        .mapToDouble(cooler -> ((Compressor) cooler).ratedCapacityW())
                        .sum();
        return new SizeAnswer(
                chamber.id(),
                chamber.setting().temperatureC(),
                day.outdoorC(),
                day.outdoorHumidityPct(),
                day.groundC(),
                busiest,
                asked.pullDownHours(),
                load.terms().stream().map(this::term).toList(),
                load.meanW(),
                load.safetyPct(),
                load.kilowattHoursPerDay(),
                load.runningHoursPerDay(),
                load.requiredW(),
                rated > 0 ? OptionalDouble.of(rated) : OptionalDouble.empty());
    }

    private SizeAnswer.Term term(DesignLoad.Term term) {
        Reason formula = term.formula();
        return new SizeAnswer.Term(
                term.kind().name().toLowerCase(Locale.ROOT).replace('_', '-'),
                String.join(", ", formula.subjects()),
                term.meanW(),
                words.sentence(formula),
                formula.sourceId());
    }
}

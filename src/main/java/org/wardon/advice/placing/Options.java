package org.wardon.advice.placing;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.Comparator;
import java.util.HashMap;
import java.util.LinkedHashMap;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Objects;
import java.util.Set;
import java.util.stream.IntStream;
import org.wardon.advice.forecast.LotInAir;
import org.wardon.advice.forecast.StoreTrial;
import org.wardon.advice.forecast.TrialLot;
import org.wardon.air.Timeline;
import org.wardon.cooling.Cooler;
import org.wardon.cooling.Setting;
import org.wardon.cooling.SettingCourse;
import org.wardon.heat.AirSeries;
import org.wardon.heat.Course;
import org.wardon.heat.Hours;
import org.wardon.keeping.KeepingModel;
import org.wardon.keeping.Paces;
import org.wardon.plan.ChamberPlan;
import org.wardon.plan.Place;
import org.wardon.produce.Conflict;

/** Works out what each chamber can make and what each lot comes to in it. */
final class Options {
    private static final double J_PER_KWH = 3.6e6;
    private static final double W_DAY_J = 86_400;

    /** Lots that stand for all where the humidity of a loaded chamber is sketched. */
    private static final int TYPICAL_LOTS = 10;

    /** Share of its capacity that a chamber is loaded with there. */
    private static final double TYPICAL_LOAD = 0.5;

    /** Chambers whose humidity differs by less are one air to lots, percent. */
    private static final double HUMIDITY_STEP_PCT = 2.5;

    /** A mean of a day may stand so far above the setting beside the band and still hold, K. */
    private static final double BESIDE_BAND_K = 0.5;

    /** How much warmer lots may make a chamber that keeps no temperature, K. */
    private static final double[] RISES_K = {0.5, 1.5, 3, 6};

    private final StoreTrial trial;
    private final Temperatures temperatures;
    private final Map<String, List<Paces>> paces = new LinkedHashMap<>();
    private final Map<String, Reach> reaches = new LinkedHashMap<>();
    private final Map<String, ChamberPlan> now = new HashMap<>();
    private final Map<Air, Lazily<Cell.Alone>> airs = new HashMap<>();
    private final Task task;
    private final List<Double> prices;

    Options(StoreTrial trial, Task task) {
        this.trial = trial;
        this.task = task;
        temperatures = Temperatures.of(trial);
        prices = Worth.prices(trial.lots());
        List<List<Paces>> all =
                trial.lots().parallelStream()
                        .map(lot -> trial.draws().stream().map(lot.model()::paces).toList())
                        .toList();
        for (int i = 0; i < all.size(); i++) {
            paces.put(trial.lots().get(i).id(), all.get(i));
        }
        double outdoorC = trial.outdoorAtStartC();
        for (ChamberPlan chamber : trial.plan().chambers()) {
            now.put(chamber.id(), Begins.asItStands(chamber, outdoorC));
        }
        List<Reach> found = trial.plan().chambers().parallelStream().map(this::reach).toList();
        for (int c = 0; c < found.size(); c++) {
            reaches.put(trial.plan().chambers().get(c).id(), found.get(c));
        }
    }

    private Reach reach(ChamberPlan chamber) {
        return Reach.of(
                trial,
                asItStands(chamber),
                temperatures.coldestC(chamber.setting().temperatureC()));
    }

    private ChamberPlan asItStands(ChamberPlan chamber) {
        return Objects.requireNonNull(now.get(chamber.id()), chamber.id());
    }

    Reach reach(String chamberId) {
        return Objects.requireNonNull(reaches.get(chamberId), chamberId);
    }

    /** All options of all chambers, those of one chamber by temperature. */
    Map<String, List<Option>> all() {
        List<Dial> dials = new ArrayList<>();
        for (ChamberPlan chamber : trial.plan().chambers()) {
            ChamberPlan on = asItStands(chamber);
            double nowC = on.setting().temperatureC();
            List<Double> tried =
                    keeps(on) ? temperatures.in(nowC, reach(on.id()).lowestC()) : List.of(nowC);
            tried.forEach(c -> dials.add(Dial.at(on, c)));
            if (!on.use().changes().isEmpty()) {
                dials.add(new Dial(on));
            }
        }
        Map<String, List<Option>> steady = byChamber(dials);
        return withCourses(steady);
    }

    /** Adds courses of two settings where they promise more than one setting. */
    private Map<String, List<Option>> withCourses(Map<String, List<Option>> steady) {
        Courses courses = new Courses(trial, task);
        List<Dial> dials = new ArrayList<>();
        for (ChamberPlan chamber : trial.plan().chambers()) {
            if (keeps(chamber.switchedOn())) {
                List<Option> single =
                        Objects.requireNonNull(steady.get(chamber.id())).stream()
                                .filter(option -> !option.changes() && option.riseK() == 0)
                                .toList();
                courses.of(single).stream()
                        .filter(set -> !set.use().changes().equals(chamber.use().changes()))
                        .forEach(set -> dials.add(new Dial(set)));
            }
        }
        Map<String, List<Option>> all = new LinkedHashMap<>(steady);
        for (Option option : of(dials)) {
            Objects.requireNonNull(all.get(option.chamber().id())).add(option);
        }
        return all;
    }

    /** What the chambers that run make at the settings of the plan. */
    Map<String, List<Option>> asSet() {
        return byChamber(
                trial.plan().chambers().stream()
                        .filter(chamber -> !chamber.off())
                        .map(Dial::new)
                        .toList());
    }

    private Map<String, List<Option>> byChamber(List<Dial> dials) {
        Map<String, List<Option>> options = new LinkedHashMap<>();
        trial.plan().chambers().forEach(c -> options.put(c.id(), new ArrayList<>()));
        for (Option option : of(dials)) {
            Objects.requireNonNull(options.get(option.chamber().id())).add(option);
        }
        return options;
    }

    /** A chamber to be tried as it is set. */
    record Dial(ChamberPlan set) {
        /** At one setting throughout. */
        static Dial at(ChamberPlan on, double settingC) {
            Setting now = on.setting();
            return new Dial(
                    on.withSetting(
                            new Setting(settingC, now.bandK(), now.humidityPct(), now.stageK())));
        }
    }

    /** The options of chambers at settings, in their order. */
    List<Option> of(List<Dial> dials) {
        List<Sketch> sketches =
                dials.parallelStream().flatMap(dial -> sketches(dial).stream()).toList();
        List<Option> options = sketches.stream().map(this::option).toList();
        learn(options);
        return options;
    }

    /** What is known of an option before lots are put into it. */
    private record Sketch(
            ChamberPlan set,
            double riseK,
            boolean held,
            AirSeries air,
            Option.Figures figures,
            List<Double> takesW) {
        Air like() {
            return new Air(figures.meanC(), humidityStep(figures));
        }
    }

    private List<Sketch> sketches(Dial dial) {
        ChamberPlan set = dial.set();
        Course empty = trial.sketch(set, List.of(), 1, 0);
        Loaded loaded = loaded(set, empty);
        List<Sketch> sketches = new ArrayList<>();
        for (double riseK : holds(set) ? new double[] {0} : RISES_K) {
            sketches.add(sketch(set, empty, loaded, riseK));
        }
        return sketches;
    }

    private static boolean keeps(ChamberPlan chamber) {
        return chamber.coolers().stream().anyMatch(cooler -> cooler.following().isPresent());
    }

    private static boolean holds(ChamberPlan chamber) {
        return chamber.coolers().stream().anyMatch(Cooler::holdsBand);
    }

    /** Puts the lots that may stand there into the air of an option. */
    Option learnt(Option option) {
        learn(List.of(option));
        return option;
    }

    /** All at once, lot by lot, so that two threads share the work whatever it is. */
    private void learn(List<Option> options) {
        Set<Asked> asked = new LinkedHashSet<>();
        for (Option option : options) {
            for (int lot : task.mayStand(option.chamber().id())) {
                asked.add(new Asked(option.cells().alone(), lot));
            }
        }
        List.copyOf(asked).parallelStream().forEach(one -> one.alone().of(one.lot()));
        options.parallelStream()
                .forEach(option -> task.mayStand(option.chamber().id()).forEach(option::cell));
    }

    /** A lot in an air; the same of two options whose chambers make the same air. */
    private record Asked(Lazily<Cell.Alone> alone, int lot) {}

    private Option option(Sketch sketch) {
        Lazily<Cell.Alone> alone =
                sketch.held()
                        ? airs.computeIfAbsent(sketch.like(), air -> alone(air.series(), air.atC()))
                        : alone(sketch.air(), sketch.figures().meanC());
        return new Option(
                sketch.set(),
                sketch.riseK(),
                sketch.air(),
                sketch.figures(),
                sketch.takesW(),
                cells(sketch.set(), sketch.figures(), alone));
    }

    /** A chamber with lots in it, for humidity and for what a watt of them costs. */
    private record Loaded(Course course, double costPerWDay) {}

    private Loaded loaded(ChamberPlan set, Course empty) {
        List<TrialLot> typical =
                trial.lots().stream()
                        .filter(lot -> lot.leavesS() > 0)
                        .filter(lot -> lot.hereFromS() < trial.plan().durationS())
                        .sorted(
                                Comparator.comparingDouble((TrialLot lot) -> -lot.plan().massKg())
                                        .thenComparing(TrialLot::id))
                        .limit(TYPICAL_LOTS)
                        .toList();
        double mass = typical.stream().mapToDouble(lot -> lot.plan().massKg()).sum();
        if (mass <= 0) {
            return new Loaded(empty, 0);
        }
        double share = Math.min(1, TYPICAL_LOAD * set.capacityKg() / mass);
        Course course = trial.sketch(set, typical, share, 0);
        double heat = course.heat().fieldHeat() + course.heat().respiration();
        double more = course.heat().electricity() - empty.heat().electricity();
        double perJ = heat > 0 ? Math.max(0, more) / heat : 0;
        return new Loaded(course, perJ * W_DAY_J / J_PER_KWH * price(set));
    }

    private double price(ChamberPlan chamber) {
        return chamber.power().solar().isPresent() ? 0 : trial.plan().prices().energyPerKWh();
    }

    private Sketch sketch(ChamberPlan set, Course empty, Loaded loaded, double riseK) {
        Course shown = holds(set) && Begins.warmsUp(set) ? loaded.course() : empty;
        Hours hours = shown.hours();
        double[] mean = DayMeans.of(empty, trial.days());
        boolean held = held(set, mean);
        double meanC =
                held ? set.setting().temperatureC() : DayMeans.whole(hours, hours::airC) + riseK;
        Option.Figures figures =
                new Option.Figures(
                        meanC,
                        humidityPct(loaded.course()),
                        StoreTrial.exchangeM3h(set, empty),
                        Math.max(0, empty.heat().electricity()) / J_PER_KWH * price(set),
                        loaded.costPerWDay(),
                        StoreTrial.blastBelowK(loaded.course()));
        AirSeries air =
                held
                        ? new Air(meanC, humidityStep(figures)).series()
                        : StoreTrial.air(shown, loaded.course(), riseK);
        return new Sketch(set, riseK, held, air, figures, takes(set, mean, riseK));
    }

    /** Whether the chamber keeps its setting all the time while it is empty. */
    private static boolean held(ChamberPlan set, double[] mean) {
        double off = set.setting().bandK() + BESIDE_BAND_K;
        double settingC = set.setting().temperatureC();
        return holds(set)
                && set.use().changes().isEmpty()
                && Arrays.stream(mean).allMatch(c -> c <= settingC + off)
                && Arrays.stream(mean).average().orElse(settingC) >= settingC - off;
    }

    private static long humidityStep(Option.Figures figures) {
        return Math.round(figures.humidityPct() / HUMIDITY_STEP_PCT);
    }

    /**
     * A steady air. Chambers that keep the same setting at much the same humidity are one air to
     * lots.
     */
    private record Air(double atC, long humidityStep) {
        AirSeries series() {
            return AirSeries.steady(atC, Math.min(1, humidityStep * HUMIDITY_STEP_PCT / 100));
        }
    }

    static double humidityPct(Course course) {
        return 100 * DayMeans.whole(course.hours(), i -> course.hours().humidityFraction(i));
    }

    private List<Double> takes(ChamberPlan set, double[] emptyC, double riseK) {
        boolean keeps = keeps(set);
        boolean holds = holds(set);
        Reach reach = reach(set.id());
        SettingCourse settings = set.settings(trial.plan().timeline());
        return IntStream.range(0, trial.days())
                .mapToObj(
                        day -> {
                            double settingC =
                                    settings.coldestC(
                                            day * Timeline.DAY_S, (day + 1) * Timeline.DAY_S);
                            double at = keeps ? Math.max(emptyC[day], settingC) : emptyC[day];
                            double beside = holds ? set.setting().bandK() + BESIDE_BAND_K : riseK;
                            double most = Math.max(at + beside, Begins.onTheWayC(set, day));
                            return Math.max(0, reach.takesW(day, most));
                        })
                .toList();
    }

    /** What every lot comes to in air. */
    Lazily<Cell.Alone> alone(AirSeries air, double meanC) {
        List<TrialLot> lots = trial.lots();
        return new Lazily<>(lots.size(), lot -> alone(lots.get(lot), air, meanC));
    }

    private Cell.Alone alone(TrialLot lot, AirSeries air, double meanC) {
        double clean = trial.plan().ethylene().outdoorPpm();
        LotInAir there = trial.in(lot, air, clean);
        Taking taking =
                Taking.of(
                        lot,
                        Objects.requireNonNull(paces.get(lot.id())),
                        there,
                        clean,
                        meanC,
                        ppm -> trial.in(lot, air, ppm));
        return new Cell.Alone(lot, there, taking);
    }

    /** What every lot comes to in a chamber. */
    Cells cells(ChamberPlan set, Option.Figures figures, Lazily<Cell.Alone> alone) {
        return new Cells(
                alone,
                new Lazily<>(
                        trial.lots().size(),
                        lot -> {
                            Cell.Alone one = alone.of(lot);
                            GivenHere giving = GivenHere.of(one.lot(), trial.draws(), figures);
                            Cell.Forbidden forbidden =
                                    forbidden(one.lot(), one.there(), set, figures);
                            return Cell.of(one, prices.get(lot), forbidden, giving);
                        }));
    }

    private Cell.Forbidden forbidden(
            TrialLot lot, LotInAir there, ChamberPlan set, Option.Figures figures) {
        if (lot.model().uncured() && !set.coolers().isEmpty() && !accepts(set, Conflict.UNCURED)) {
            return Cell.Forbidden.UNCURED;
        }
        if (coldestAirC(lot, set, figures)
                < lot.model().freezingC() + KeepingModel.FREEZING_MARGIN_K) {
            return Cell.Forbidden.FREEZING;
        }
        return there.shareSound() > 0 ? Cell.Forbidden.NO : Cell.Forbidden.LOST;
    }

    /** The coldest air it meets: the thermostat lets it fall below the setting, the blast more. */
    private double coldestAirC(TrialLot lot, ChamberPlan set, Option.Figures figures) {
        double hereC = set.use().changes().isEmpty() ? figures.meanC() : coldestC(lot, set);
        double blastK = lot.plan().place() == Place.NEAR_COOLER ? figures.blastK() : 0;
        return hereC - Option.swingK(set) - blastK;
    }

    /** Lowest setting while a lot is here, °C. */
    private double coldestC(TrialLot lot, ChamberPlan set) {
        double fromS = Math.max(0, lot.hereFromS());
        double untilS = Math.max(fromS, Math.min(lot.leavesS(), trial.plan().durationS()));
        return set.settings(trial.plan().timeline()).coldestC(fromS, untilS);
    }

    boolean accepts(ChamberPlan chamber, Conflict conflict) {
        return trial.plan().accepts(chamber, conflict);
    }
}

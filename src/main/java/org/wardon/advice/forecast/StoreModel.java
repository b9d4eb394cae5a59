package org.wardon.advice.forecast;

import static java.util.stream.Collectors.toSet;

import java.time.LocalDateTime;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.Set;
import java.util.TreeSet;
import java.util.concurrent.ConcurrentHashMap;
import java.util.function.ToDoubleFunction;
import org.wardon.air.Timeline;
import org.wardon.air.Weather;
import org.wardon.cooling.Cooler;
import org.wardon.cooling.Outage;
import org.wardon.cooling.SettingCourse;
import org.wardon.enclosure.Beyond;
import org.wardon.enclosure.Enclosure;
import org.wardon.enclosure.Surroundings;
import org.wardon.errors.Progress;
import org.wardon.heat.AirSeries;
import org.wardon.heat.ChamberRun;
import org.wardon.heat.ControlMode;
import org.wardon.heat.Course;
import org.wardon.heat.DoorMode;
import org.wardon.heat.Factors;
import org.wardon.heat.HeatModel;
import org.wardon.heat.LotCourse;
import org.wardon.heat.Start;
import org.wardon.heat.Stay;
import org.wardon.keeping.Draw;
import org.wardon.lots.LotHistory;
import org.wardon.plan.ChamberPlan;
import org.wardon.plan.Corrections;
import org.wardon.plan.DailyOutage;
import org.wardon.plan.LotPlan;
import org.wardon.plan.OutagePlan;
import org.wardon.plan.StorePlan;
import org.wardon.plan.WithoutChamber;

/**
 * A store plan ready for the heat model: each chamber as a run, the lots of a draw in it, the air
 * of neighbours handed on until it agrees.
 */
final class StoreModel {
    /** Neighbours have agreed when no hour differs by more, K. */
    private static final double AGREED_K = 0.1;

    private static final int MOST_PASSES = 6;

    private final StorePlan plan;
    private final Weather weather;
    private final List<LotSheet> sheets;
    private final Timeline timeline;
    private final AirSeries withoutAir;
    private final AirSeries sketchedAir;
    private final Map<String, Start> warmed;
    private final Map<Double, Surroundings> around;

    StoreModel(StorePlan plan, Weather weather, List<LotSheet> sheets) {
        this(plan, weather, sheets, new ConcurrentHashMap<>(), new ConcurrentHashMap<>());
    }

    private StoreModel(
            StorePlan plan,
            Weather weather,
            List<LotSheet> sheets,
            Map<String, Start> warmed,
            Map<Double, Surroundings> around) {
        this.plan = plan;
        this.weather = weather;
        this.sheets = List.copyOf(sheets);
        this.timeline = plan.timeline();
        this.warmed = warmed;
        this.around = around;
        if (plan.without() instanceof WithoutChamber.Steady steady) {
            withoutAir = AirSeries.steady(steady.temperatureC(), steady.humidityPct() / 100);
            sketchedAir = withoutAir;
        } else {
            withoutAir = AirSeries.outdoors(weather);
            sketchedAir = withoutAir.sketched();
        }
    }

    /** The same store with its lots in the chambers of another plan. */
    StoreModel placed(StorePlan otherwise) {
        Map<String, LotPlan> lots = new HashMap<>();
        otherwise.lots().forEach(lot -> lots.put(lot.id(), lot));
        return new StoreModel(
                otherwise,
                weather,
                sheets.stream().map(sheet -> sheet.planned(ById.get(lots, sheet.id()))).toList());
    }

    /** The same store with one more lot; chambers are warmed before any lot, so for all alike. */
    StoreModel with(LotSheet more) {
        List<LotPlan> lots = new ArrayList<>(plan.lots());
        lots.add(more.plan());
        List<LotSheet> all = new ArrayList<>(sheets);
        all.add(more);
        return new StoreModel(plan.withLots(lots), weather, all, warmed, around);
    }

    /** The same lots in a store one chamber of which is built or set otherwise. */
    StoreModel rebuilt(ChamberPlan other) {
        return new StoreModel(
                plan.withChamber(other), weather, sheets, new ConcurrentHashMap<>(), around);
    }

    /** The same store with other lots, which stand where their sheets say. */
    StoreModel holding(List<LotSheet> other) {
        return new StoreModel(
                plan.withLots(other.stream().map(LotSheet::plan).toList()),
                weather,
                other,
                warmed,
                around);
    }

    StorePlan plan() {
        return plan;
    }

    Weather weather() {
        return weather;
    }

    List<LotSheet> sheets() {
        return sheets;
    }

    /** Lots that stand in a chamber at some time. */
    List<LotSheet> sheetsIn(String chamberId) {
        return visitsIn(chamberId).stream().map(Visit::sheet).distinct().toList();
    }

    /** Visits of lots to a chamber. */
    List<Visit> visitsIn(String chamberId) {
        return sheets.stream()
                .flatMap(sheet -> sheet.visits().stream())
                .filter(visit -> visit.chamber().equals(chamberId))
                .toList();
    }

    /**
     * Runs all chambers in full. The air of neighbours is handed on until it agrees in runs with
     * averaged doors, which have no cycles of their own to disagree about.
     */
    Map<String, Course> plain(double durationS, Progress progress) {
        Map<String, AirSeries> air =
                agreedAir(durationS, (stage, done) -> progress.at("forecast", 0));
        progress.at("forecast", 0.5);
        Map<String, Course> courses =
                pass(
                        everyChamber(),
                        Draw.MEDIAN,
                        id -> durationS,
                        air,
                        DoorMode.PULSES,
                        ControlMode.AS_BUILT,
                        (stage, done) -> progress.at("forecast", 0.5));
        progress.at("forecast", 1);
        return courses;
    }

    /** One chamber exactly as the plain run has it, to be run again. */
    ChamberRun asInPlain(ChamberPlan chamber, double durationS) {
        Map<String, AirSeries> air = agreedAir(durationS);
        ChamberRun run = run(chamber, Draw.MEDIAN, durationS, air);
        if (run.stays().stream().allMatch(stay -> stay.berth().from().isEmpty())) {
            return run;
        }
        Map<String, Course> plain =
                pass(Draw.MEDIAN, id -> durationS, air, DoorMode.PULSES, ControlMode.AS_BUILT);
        return run.withStays(run.stays().stream().map(stay -> known(stay, plain)).toList());
    }

    /** Air of all chambers as their neighbours feel it, handed on until it agrees. */
    Map<String, AirSeries> agreedAir(double durationS) {
        return agreedAir(durationS, Progress.SILENT);
    }

    private Map<String, AirSeries> agreedAir(double durationS, Progress progress) {
        Map<String, AirSeries> air = startAir();
        boolean coupled = plan.chambers().stream().anyMatch(StoreModel::hasNeighbour);
        for (int pass = 0; coupled && pass < MOST_PASSES; pass++) {
            Map<String, AirSeries> next =
                    airOf(
                            pass(
                                    everyChamber(),
                                    Draw.MEDIAN,
                                    id -> durationS,
                                    air,
                                    DoorMode.AVERAGED,
                                    ControlMode.MODULATING,
                                    progress));
            boolean agreed = apartK(air, next, durationS) < AGREED_K;
            air = next;
            if (agreed) {
                break;
            }
        }
        return air;
    }

    /**
     * Runs all chambers in one draw with averaged doors, each to its own end in seconds, in the
     * neighbours' air of the plain run.
     */
    Map<String, Course> drawn(Draw draw, ToDoubleFunction<String> endS, Map<String, Course> plain) {
        return pass(draw, endS, airOf(plain), DoorMode.SKETCHED, ControlMode.MODULATING);
    }

    /**
     * Runs some chambers in full, each opening of a door and each run of a cooler, in air of
     * neighbours that is there.
     */
    Map<String, Course> plain(
            Set<String> chambers, double endS, Map<String, AirSeries> neighbours) {
        return pass(
                chambers,
                Draw.MEDIAN,
                id -> endS,
                neighbours,
                DoorMode.PULSES,
                ControlMode.AS_BUILT);
    }

    /** Runs some chambers in one draw with averaged doors, in air of neighbours that is there. */
    Map<String, Course> drawn(
            Set<String> chambers, Draw draw, double endS, Map<String, AirSeries> neighbours) {
        return pass(
                chambers, draw, id -> endS, neighbours, DoorMode.SKETCHED, ControlMode.MODULATING);
    }

    /** A chamber with all that lots are carried to it from, or from it to, near and far. */
    Set<String> linked(String chamberId) {
        Set<String> linked = new TreeSet<>(Set.of(chamberId));
        boolean grown = true;
        while (grown) {
            grown = false;
            for (LotSheet sheet : sheets) {
                List<String> where = sheet.visits().stream().map(Visit::chamber).toList();
                if (where.stream().anyMatch(linked::contains)) {
                    grown |= linked.addAll(where);
                }
            }
        }
        return linked;
    }

    /** Runs all chambers with averaged doors, each neighbour taken to stand at its setting. */
    Map<String, Course> sketch(double durationS) {
        return pass(
                Draw.MEDIAN,
                id -> durationS,
                startAir(),
                DoorMode.SKETCHED,
                ControlMode.MODULATING);
    }

    /** Runs one chamber with averaged doors, in the neighbours' air of the plain run. */
    Course sketch(ChamberPlan chamber, double durationS, Map<String, Course> plain) {
        ChamberRun run =
                asPlanned(chamber, durationS, plain)
                        .withDoorMode(DoorMode.SKETCHED)
                        .withControlMode(ControlMode.MODULATING);
        return HeatModel.run(Averaged.of(run), Progress.SILENT);
    }

    /**
     * Sketches one chamber otherwise set, with other lots and more heat in it than the plan says,
     * its neighbours at their settings.
     *
     * @param as the chamber
     * @param stays what stands in it
     * @param heatW more heat in it at all times, W
     */
    Course sketch(ChamberPlan as, List<Stay> stays, double heatW) {
        ChamberRun run =
                run(as, Draw.MEDIAN, plan.durationS(), startAir())
                        .withStays(stays)
                        .withDoorMode(DoorMode.SKETCHED)
                        .withControlMode(ControlMode.MODULATING);
        ChamberRun warmer = run.withEnclosure(Averaged.warmed(run.enclosure(), heatW));
        ChamberRun even = Averaged.of(warmer);
        return HeatModel.run(even.withStart(warmed(even)), Progress.SILENT);
    }

    /** Runs one chamber with the air held ideally at its setting: what it takes is the load. */
    Course ideal(ChamberPlan chamber, double durationS, Map<String, Course> plain) {
        ChamberRun run =
                asPlanned(chamber, durationS, plain)
                        .withDoorMode(DoorMode.AVERAGED)
                        .withControlMode(ControlMode.IDEAL);
        return HeatModel.run(run, Progress.SILENT);
    }

    /** The plain run of one chamber, to be varied. */
    ChamberRun asPlanned(ChamberPlan chamber, double durationS, Map<String, Course> plain) {
        ChamberRun run = run(chamber, Draw.MEDIAN, durationS, airOf(plain));
        return run.withStays(run.stays().stream().map(stay -> known(stay, plain)).toList());
    }

    /** A lot that is carried in comes as it left the other chamber in the plain run. */
    private static Stay known(Stay stay, Map<String, Course> plain) {
        if (stay.berth().from().isEmpty()) {
            return stay;
        }
        return ById.get(plain, stay.berth().from().get()).lots().stream()
                .filter(lot -> lot.stay().lot().id().equals(stay.lot().id()))
                .filter(lot -> lot.stay().leavesS() == stay.arrivesS())
                .findFirst()
                .flatMap(LotCourse::carriedOut)
                .map(stay::carriedInAs)
                .orElseThrow();
    }

    /** Runs one lot without a chamber in one draw. */
    LotCourse without(LotSheet sheet, Draw draw, double durationS) {
        return inAir(sheet.stay(draw), sketchedAir, durationS);
    }

    /** Runs one lot in the air of a chamber that is there already. */
    LotCourse inAirOf(LotSheet sheet, Course chamber, double durationS) {
        return inAir(sheet.stay(Draw.MEDIAN), series(chamber).sketched(), durationS);
    }

    /** Runs one visit in the blast of the cooler, from a temperature of the flesh on. */
    LotHistory inBlast(Visit visit, double startC, AirSeries blast, double durationS) {
        Stay stay =
                new Stay(
                        visit.stay(Draw.MEDIAN).lot(),
                        visit.hereFromS(),
                        Double.POSITIVE_INFINITY,
                        startC);
        return inAir(stay, blast, durationS).history();
    }

    LotCourse inAir(Stay stay, AirSeries air, double durationS) {
        return HeatModel.runInGivenAir(stay, air, plan.site(), Factors.PLAIN, durationS);
    }

    /** The air a lot would stand in without a chamber. */
    AirSeries withoutAir() {
        return withoutAir;
    }

    private Map<String, Course> pass(
            Draw draw,
            ToDoubleFunction<String> endS,
            Map<String, AirSeries> air,
            DoorMode door,
            ControlMode control) {
        return pass(everyChamber(), draw, endS, air, door, control);
    }

    private Set<String> everyChamber() {
        return plan.chambers().stream().map(ChamberPlan::id).collect(toSet());
    }

    private Map<String, Course> pass(
            Set<String> chambers,
            Draw draw,
            ToDoubleFunction<String> endS,
            Map<String, AirSeries> air,
            DoorMode door,
            ControlMode control) {
        return pass(chambers, draw, endS, air, door, control, Progress.SILENT);
    }

    private Map<String, Course> pass(
            Set<String> chambers,
            Draw draw,
            ToDoubleFunction<String> endS,
            Map<String, AirSeries> air,
            DoorMode door,
            ControlMode control,
            Progress progress) {
        List<ChamberRun> runs =
                plan.chambers().stream()
                        .filter(chamber -> chambers.contains(chamber.id()))
                        .map(chamber -> run(chamber, draw, endS.applyAsDouble(chamber.id()), air))
                        .map(run -> run.withDoorMode(door).withControlMode(control))
                        .map(run -> door == DoorMode.PULSES ? run : Averaged.of(run))
                        .map(run -> door == DoorMode.SKETCHED ? run.withStart(warmed(run)) : run)
                        .toList();
        List<Course> ran = HeatModel.runTogether(runs, progress);
        Map<String, Course> courses = new LinkedHashMap<>();
        ran.forEach(course -> courses.put(course.chamberId(), course));
        return courses;
    }

    /** All draws of a chamber start alike. */
    private Start warmed(ChamberRun run) {
        return warmed.computeIfAbsent(run.chamberId(), id -> HeatModel.warmed(run));
    }

    private ChamberRun run(
            ChamberPlan chamber, Draw draw, double durationS, Map<String, AirSeries> air) {
        List<Stay> stays =
                visitsIn(chamber.id()).stream()
                        .filter(visit -> visit.arrivesS() < durationS)
                        .filter(visit -> visit.leavesS() > 0)
                        .map(visit -> visit.stay(draw))
                        .toList();
        ChamberRun run =
                ChamberRun.of(
                                chamber.id(),
                                plan.site(),
                                timeline,
                                weather,
                                chamber.enclosure(),
                                chamber.setting(),
                                durationS)
                        .withSettings(settings(chamber))
                        .withCoolers(chamber.coolers())
                        .withOutages(outages(chamber))
                        .withStays(stays)
                        .withFactors(factors(chamber.corrections()))
                        .withStart(start(chamber))
                        .withExtras(
                                new ChamberRun.Extras(
                                        chamber.heaterW(),
                                        chamber.humidifierKgH(),
                                        air,
                                        chamber.power().solar()));
        return run.withExtras(run.extras().under(around(run)));
    }

    /** The surroundings of all runs of a span have one sun. */
    private Surroundings around(ChamberRun run) {
        return around.computeIfAbsent(run.durationS(), any -> HeatModel.around(run));
    }

    /** What a chamber is set to, and when. */
    SettingCourse settings(ChamberPlan chamber) {
        return chamber.settings(timeline);
    }

    /** All spans without power of a chamber, to the end of the longest run, none overlapping. */
    List<Outage> outages(ChamberPlan chamber) {
        LocalDateTime end = timeline.localAt(plan.durationS()).plusDays(StoreRun.MOST_BEYOND_DAYS);
        List<Outage> all = new ArrayList<>(singleOutages(chamber));
        for (DailyOutage daily : chamber.power().daily()) {
            daily.within(plan.from(), end).forEach(outage -> all.add(span(outage)));
        }
        return Outage.joined(all);
    }

    /** Spans without power that do not come back every day, in order. */
    List<Outage> singleOutages(ChamberPlan chamber) {
        return chamber.outages().stream().map(this::span).toList();
    }

    private Outage span(OutagePlan outage) {
        return new Outage(timeline.secondsAt(outage.from()), timeline.secondsAt(outage.to()));
    }

    private static Factors factors(Corrections c) {
        return new Factors(
                c.wallFactor(),
                c.exchangeFactor(),
                c.capacityFactor(),
                1,
                1,
                1,
                c.thermostatOffsetK());
    }

    private static Start start(ChamberPlan chamber) {
        return chamber.starts()
                .map(
                        air ->
                                new Start(
                                        OptionalDouble.of(air.temperatureC()),
                                        air.humidityPct(),
                                        Optional.empty()))
                .orElse(Start.USUAL);
    }

    private static boolean hasNeighbour(ChamberPlan chamber) {
        Enclosure built = chamber.enclosure();
        return built.faces().stream().anyMatch(face -> face.beyond() instanceof Beyond.Neighbour)
                || built.door()
                        .map(door -> door.beyond() instanceof Beyond.Neighbour)
                        .orElse(false);
    }

    /** Before the first pass a chamber is taken to stand at its setting, or at outdoors. */
    private Map<String, AirSeries> startAir() {
        Map<String, AirSeries> air = new HashMap<>();
        for (ChamberPlan chamber : plan.chambers()) {
            air.put(
                    chamber.id(),
                    chamber.coolers().stream().anyMatch(Cooler::startsAtSetting)
                            ? AirSeries.steady(
                                    chamber.setting().temperatureC(),
                                    chamber.setting().humidityPct() / 100)
                            : AirSeries.outdoors(weather));
        }
        return air;
    }

    private static Map<String, AirSeries> airOf(Map<String, Course> courses) {
        Map<String, AirSeries> air = new HashMap<>();
        courses.forEach((id, course) -> air.put(id, series(course)));
        return air;
    }

    private static AirSeries series(Course course) {
        int n = course.hours().size();
        double[] time = new double[n];
        double[] temperature = new double[n];
        double[] humidity = new double[n];
        for (int i = 0; i < n; i++) {
            time[i] = course.hours().atS(i);
            temperature[i] = course.hours().airC(i);
            humidity[i] = Math.min(1, course.hours().humidityFraction(i));
        }
        return new AirSeries(time, temperature, humidity);
    }

    private static double apartK(
            Map<String, AirSeries> before, Map<String, AirSeries> after, double durationS) {
        double most = 0;
        for (Map.Entry<String, AirSeries> entry : after.entrySet()) {
            AirSeries old = before.get(entry.getKey());
            for (double t = 0; old != null && t <= durationS; t += Timeline.HOUR_S) {
                most =
                        Math.max(
                                most,
                                Math.abs(old.temperatureC(t) - entry.getValue().temperatureC(t)));
            }
        }
        return most;
    }
}

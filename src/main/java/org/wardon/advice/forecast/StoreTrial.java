package org.wardon.advice.forecast;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.HashMap;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Objects;
import java.util.Optional;
import java.util.Set;
import org.wardon.air.Timeline;
import org.wardon.air.Weather;
import org.wardon.errors.Progress;
import org.wardon.heat.AirSeries;
import org.wardon.heat.Course;
import org.wardon.heat.Hours;
import org.wardon.heat.LotCourse;
import org.wardon.heat.Stay;
import org.wardon.keeping.Draw;
import org.wardon.keeping.Draws;
import org.wardon.keeping.Fate;
import org.wardon.lots.Lot;
import org.wardon.lots.LotHistory;
import org.wardon.plan.ChamberPlan;
import org.wardon.plan.EthyleneScrub;
import org.wardon.plan.StorePlan;
import org.wardon.reference.ReferenceBook;

/**
 * A store under question: its chambers tried at other settings and loads, its lots in other air,
 * and the whole of it with other chambers or another placing.
 */
public final class StoreTrial {
    private static final double LEAST_KG = 0.1;
    private static final double LEAST_EXCHANGE_M3H = 0.05;

    private final StoreModel model;
    private final Progress progress;
    private final Fates fates;
    private final List<TrialLot> lots;
    private final List<Draw> draws;

    /** The draw whose body stands for each draw's. */
    private final List<Draw> standsFor;

    private final Set<Draw> typical;

    private StoreTrial(StoreModel model, Progress progress) {
        this.model = model;
        this.progress = progress;
        fates = new Fates(model);
        lots = model.sheets().stream().map(TrialLot::new).toList();
        draws = Draws.seeded(model.plan().seed(), StoreRun.DRAWS);
        standsFor = TypicalBodies.of(draws, TypicalBodies.FEW);
        typical = new LinkedHashSet<>(standsFor);
    }

    /**
     * Prepares a plan to be asked about.
     *
     * @param plan the plan; lots may be without a chamber
     * @param book the reference book
     * @return the store
     */
    public static StoreTrial of(StorePlan plan, ReferenceBook book) {
        return of(plan, book, Progress.SILENT);
    }

    /**
     * Prepares a plan to be asked about for as long as nobody stops it.
     *
     * @param plan the plan; lots may be without a chamber
     * @param book the reference book
     * @param progress hears of every trial before it is made, and may stop the work
     * @return the store
     */
    public static StoreTrial of(StorePlan plan, ReferenceBook book, Progress progress) {
        Weather weather =
                PlanWeather.prolonged(
                        plan.weatherSource().weather(),
                        plan.durationS(),
                        StoreRun.MOST_BEYOND_DAYS);
        return new StoreTrial(
                new StoreModel(plan, weather, new LotSheets(plan, weather, book).all()), progress);
    }

    static StoreTrial of(StoreModel model) {
        return new StoreTrial(model, Progress.SILENT);
    }

    /**
     * Returns the plan asked about.
     *
     * @return the plan
     */
    public StorePlan plan() {
        return model.plan();
    }

    /**
     * Returns who hears of the work and may stop it.
     *
     * @return the hearer
     */
    public Progress progress() {
        return progress;
    }

    /**
     * Returns its lots.
     *
     * @return all, in the order of the plan
     */
    public List<TrialLot> lots() {
        return lots;
    }

    /**
     * Returns the draws it is judged by, those of a forecast.
     *
     * @return the draws
     */
    public List<Draw> draws() {
        return draws;
    }

    /**
     * Sketches one chamber over the horizon, the air next door at its setting.
     *
     * @param as the chamber, set and built as it is to be tried
     * @param with lots in it, as they come and go
     * @param share share of each lot's mass that stands there, above 0
     * @param heatW more heat in it at all times, W
     * @return what it comes to, a row every five hours
     */
    public Course sketch(ChamberPlan as, List<TrialLot> with, double share, double heatW) {
        progress.at("trial", 0);
        List<Stay> stays = new ArrayList<>();
        for (TrialLot one : with) {
            Stay whole = one.sheet().stay(Draw.MEDIAN);
            stays.add(
                    new Stay(
                            ofMass(whole.lot(), share),
                            whole.arrivesS(),
                            whole.leavesS(),
                            whole.pulpC(),
                            whole.freshUntilS(),
                            0));
        }
        return model.sketch(as, stays, heatW);
    }

    /**
     * Returns the air that carries ethylene out of a chamber: fresh air, leakage and door, and what
     * a scrubber cleans.
     *
     * @param as the chamber as it is set
     * @param course what it comes to
     * @return mean of the horizon, m3/h, above 0
     */
    public static double exchangeM3h(ChamberPlan as, Course course) {
        Hours hours = course.hours();
        double exchangedM3 = 0;
        double beforeS = 0;
        for (int i = 0; i < hours.size(); i++) {
            exchangedM3 += (hours.atS(i) - beforeS) * hours.exchangeM3s(i);
            beforeS = hours.atS(i);
        }
        double meanM3s = beforeS > 0 ? exchangedM3 / beforeS : 0;
        double scrubbedM3s = as.ethyleneScrub().map(EthyleneScrub::cleanedM3s).orElse(0.0);
        return Math.max(LEAST_EXCHANGE_M3H, Timeline.HOUR_S * (meanM3s + scrubbedM3s));
    }

    /**
     * Returns the same of a chamber that is sketched for it, empty.
     *
     * @param as the chamber as it is set
     * @return mean of the horizon, m3/h, above 0
     */
    public double exchangeM3h(ChamberPlan as) {
        return exchangeM3h(as, sketch(as, List.of(), 1, 0));
    }

    private static Lot ofMass(Lot lot, double share) {
        return new Lot(
                lot.id(),
                Math.max(LEAST_KG, share * lot.massKg()),
                lot.item(),
                lot.packing(),
                lot.respiration(),
                lot.transpiration());
    }

    /**
     * Puts a lot into air.
     *
     * @param lot the lot
     * @param air the air, over the horizon
     * @param ppm ethylene in it, µL/L
     * @return what it comes to
     */
    public LotInAir in(TrialLot lot, AirSeries air, double ppm) {
        progress.at("trial", 0);
        LotSheet sheet = lot.sheet();
        double endS = model.plan().durationS();
        LotCourse middle = model.inAir(sheet.stay(Draw.MEDIAN), air, endS);
        Map<Draw, LotHistory> bodies = new HashMap<>();
        for (Draw draw : typical) {
            bodies.put(draw, model.inAir(sheet.stay(draw), air, endS).history());
        }
        List<Fate> sold = new ArrayList<>();
        for (int d = 0; d < draws.size(); d++) {
            LotHistory here = Objects.requireNonNull(bodies.get(standsFor.get(d)));
            LotHistory there = fates.inOtherAir(sheet, here, ppm);
            sold.add(sheet.model().follow(there, draws.get(d)).brief());
        }
        return new LotInAir(sheet, middle, sold);
    }

    /**
     * Returns the air a chamber made, as lots are put into it.
     *
     * @param course the chamber, whose temperature is taken
     * @param loaded a run of it with like rows, whose humidity is taken
     * @param warmerK how much warmer it is taken to be, K, at the same water in it
     * @return the air in rows of five hours
     */
    public static AirSeries air(Course course, Course loaded, double warmerK) {
        return TrialAir.of(course, loaded, warmerK);
    }

    /**
     * Runs the store in full, with other chambers or its lots placed otherwise.
     *
     * @param otherwise a plan of the same lots and times
     * @return what is kept and what it costs, as the forecast tells it
     */
    public Tried run(StorePlan otherwise) {
        return new TrialRun(model.placed(otherwise), progress).run();
    }

    /**
     * Returns the hours of outdoor weather of the horizon, as means of days.
     *
     * @return {@code [day]}, °C
     */
    public double[] outdoorC() {
        int days = days();
        double[] mean = new double[days];
        int[] count = new int[days];
        for (int h = 0; h < plan().durationS() / Timeline.HOUR_S; h++) {
            mean[h / 24] += model.weather().temperatureC(h);
            count[h / 24]++;
        }
        Arrays.setAll(mean, day -> mean[day] / Math.max(1, count[day]));
        return mean;
    }

    /**
     * Returns the air outdoors when the run starts.
     *
     * @return °C
     */
    public double outdoorAtStartC() {
        return model.weather().temperatureC(0);
    }

    /**
     * Returns how much colder than its chamber the air is that a lot meets in the blast of a
     * cooler.
     *
     * @param course the chamber
     * @return mean while it blows, K, 0 where nothing does
     */
    public static double blastBelowK(Course course) {
        return ColdBlast.SHARE * ColdBlast.supplyBelowK(course.hours());
    }

    /**
     * Returns the days of the horizon.
     *
     * @return count, the last perhaps not whole
     */
    public int days() {
        return (int) Math.ceil(plan().durationS() / Timeline.DAY_S - 1e-9);
    }

    /**
     * Returns a lot.
     *
     * @param id its id
     * @return the lot; empty where the plan has none of that id
     */
    public Optional<TrialLot> lot(String id) {
        return lots.stream().filter(lot -> lot.id().equals(id)).findFirst();
    }
}

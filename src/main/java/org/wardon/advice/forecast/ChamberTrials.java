package org.wardon.advice.forecast;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.function.Predicate;
import org.wardon.advice.wording.Words;
import org.wardon.air.Timeline;
import org.wardon.cooling.Outage;
import org.wardon.heat.AirSeries;
import org.wardon.heat.Course;
import org.wardon.keeping.Draw;
import org.wardon.keeping.Draws;
import org.wardon.keeping.Fate;
import org.wardon.keeping.StoreEthylene;
import org.wardon.lots.LotHistory;
import org.wardon.plan.ChamberPlan;
import org.wardon.plan.LotPlan;
import org.wardon.plan.StorePlan;
import org.wardon.reference.ReferenceBook;

/**
 * Tries chambers of a store quickly: as they stand, with one more lot, and built or set otherwise.
 * As in a forecast, one run follows each opening of a door, and the draws take doors and defrosts
 * averaged, of which the bodies of sixteen stand for all ({@link TypicalBodies}); only the chamber
 * in question runs, with those that lots are carried to or from, its neighbours as they are in the
 * plan. May be asked by several threads at once.
 */
public final class ChamberTrials {
    private final StoreModel model;
    private final LotSheets sheets;
    private final List<Draw> draws;
    private final List<Draw> standsFor;
    private final Map<String, AirSeries> neighbours;
    private final Map<String, ChamberTrial> standing;

    private ChamberTrials(
            ForecastAdvice.Prepared prepared, int count, Predicate<ChamberPlan> wanted) {
        model = prepared.model();
        sheets = prepared.lots();
        draws = Draws.seeded(model.plan().seed(), count);
        standsFor = TypicalBodies.of(draws, TypicalBodies.MANY);
        neighbours = model.agreedAir(model.plan().durationS());
        Map<String, StoreModel> all = new LinkedHashMap<>();
        model.plan().chambers().stream()
                .filter(wanted)
                .forEach(chamber -> all.put(chamber.id(), model));
        standing = run(all);
    }

    /**
     * Works out the chambers as they stand.
     *
     * @param plan the plan; lots without a chamber are placed as a forecast places them
     * @param book the reference book
     * @param words words, for the forecast that prepares the plan
     * @param draws how many draws, 1 to 32, the first of those a forecast takes
     * @return the trials
     * @throws org.wardon.errors.RunStopped where a chamber meets a state that cannot be
     */
    public static ChamberTrials of(StorePlan plan, ReferenceBook book, Words words, int draws) {
        return new ChamberTrials(
                new ForecastAdvice(book, words).prepare(plan), draws, chamber -> true);
    }

    /**
     * Works out one chamber as it stands.
     *
     * @param plan the plan; lots without a chamber are placed as a forecast places them
     * @param chamberId the chamber
     * @param book the reference book
     * @param words words, for the forecast that prepares the plan
     * @param draws how many draws, 1 to 32, the first of those a forecast takes
     * @return the trials, of that chamber alone
     * @throws org.wardon.errors.RunStopped where the chamber meets a state that cannot be
     */
    public static ChamberTrials of(
            StorePlan plan, String chamberId, ReferenceBook book, Words words, int draws) {
        return new ChamberTrials(
                new ForecastAdvice(book, words).prepare(plan),
                draws,
                chamber -> chamber.id().equals(chamberId));
    }

    /**
     * Returns the plan, every lot placed.
     *
     * @return the plan
     */
    public StorePlan plan() {
        return model.plan();
    }

    /**
     * Returns outdoor air at a time.
     *
     * @param atS time, s since the plan's start
     * @return °C
     */
    public double outdoorC(double atS) {
        return model.weather().temperatureC((int) Math.floor(atS / Timeline.HOUR_S));
    }

    /**
     * Returns a chamber as it stands.
     *
     * @param chamberId its id
     * @return what was worked out once
     */
    public ChamberTrial standing(String chamberId) {
        return ById.get(standing, chamberId);
    }

    /**
     * Puts one more lot into each chamber in turn, and into none.
     *
     * @param lot the lot, of an id the plan has not
     * @return what it comes to
     * @throws org.wardon.errors.RunStopped where a chamber meets a state that cannot be
     */
    public OneMoreLot with(LotPlan lot) {
        LotSheet sheet = sheets.sheet(lot);
        Map<String, StoreModel> joined = new LinkedHashMap<>();
        for (ChamberPlan chamber : model.plan().chambers()) {
            joined.put(
                    chamber.id(), model.with(sheet.planned(sheet.plan().placedIn(chamber.id()))));
        }
        return new OneMoreLot(run(joined), sheet, outside(sheet), shade(sheet));
    }

    /** The lot without a chamber in the middle draw. */
    private LotHistory shade(LotSheet sheet) {
        return model.without(sheet, Draw.MEDIAN, lastS()).history();
    }

    private double lastS() {
        return model.plan().durationS() + StoreRun.MOST_BEYOND_DAYS * Timeline.DAY_S;
    }

    /**
     * Tries a chamber built, cooled, set or filled otherwise; its neighbours stay as they are.
     *
     * @param other taken for the chamber of its id
     * @param loadFactor how many times heavier each lot that is ever there is
     * @return what was worked out
     * @throws org.wardon.errors.RunStopped where the chamber meets a state that cannot be
     */
    public ChamberTrial changed(ChamberPlan other, double loadFactor) {
        StoreModel store = model.rebuilt(other);
        if (loadFactor != 1) {
            store = store.holding(heavier(store, other.id(), loadFactor));
        }
        return ById.get(run(Map.of(other.id(), store)), other.id());
    }

    private List<LotSheet> heavier(StoreModel store, String chamberId, double factor) {
        List<LotSheet> there = store.sheetsIn(chamberId);
        return store.sheets().parallelStream()
                .map(
                        sheet ->
                                there.contains(sheet)
                                        ? sheets.sheet(
                                                sheet.plan()
                                                        .weighing(factor * sheet.plan().massKg()))
                                        : sheet)
                .toList();
    }

    /** Fates of a lot without a chamber, a draw each. */
    private List<Fate> outside(LotSheet sheet) {
        double horizonS = model.plan().durationS();
        double untilS = Settling.withoutS(model, sheet, horizonS, lastS());
        Fates alone = new Fates(model.with(sheet));
        return draws.parallelStream().map(draw -> alone.outside(sheet, draw, untilS)).toList();
    }

    /** One chamber to be run with the lots of a store. */
    private record Setup(
            StoreModel model,
            String chamberId,
            Set<String> chambers,
            Fates fates,
            Map<String, Course> plain,
            double endS) {}

    /**
     * Chambers side by side, and the draws of each as soon as it is set up: a processor that is
     * through with its chamber helps with the draws of another.
     */
    private Map<String, ChamberTrial> run(Map<String, StoreModel> models) {
        List<ChamberTrial> trials =
                models.entrySet().parallelStream()
                        .map(entry -> tried(setup(entry.getValue(), entry.getKey())))
                        .toList();
        Map<String, ChamberTrial> byId = new LinkedHashMap<>();
        trials.forEach(trial -> byId.put(trial.chamber().id(), trial));
        return byId;
    }

    private ChamberTrial tried(Setup setup) {
        return trial(
                setup,
                inOrder(
                        standsFor.parallelStream()
                                .distinct()
                                .map(body -> drawn(setup, body))
                                .toList()));
    }

    private Setup setup(StoreModel store, String chamberId) {
        double horizonS = store.plan().durationS();
        Set<String> chambers = store.linked(chamberId);
        Map<String, Course> plain = store.plain(chambers, horizonS, neighbours);
        return new Setup(
                store,
                chamberId,
                chambers,
                new Fates(store),
                plain,
                settledS(store, chambers, plain, horizonS));
    }

    /** How far the draws have to follow the chambers, s: as in a forecast, until lots settle. */
    private double settledS(
            StoreModel store, Set<String> chambers, Map<String, Course> plain, double horizonS) {
        double lastS = lastS();
        double atS = horizonS;
        Map<String, Course> longer = plain;
        while (atS < lastS && !settled(store, chambers, longer, atS)) {
            if (longer == plain) {
                longer = store.drawn(chambers, Draw.MEDIAN, lastS, neighbours);
            }
            atS += Timeline.DAY_S;
        }
        return Math.min(atS, lastS);
    }

    private static boolean settled(
            StoreModel store, Set<String> chambers, Map<String, Course> courses, double atS) {
        return chambers.stream()
                .allMatch(
                        id -> {
                            List<Outage> single = store.singleOutages(store.plan().getChamber(id));
                            return Settling.settled(ById.get(courses, id).lots(), single, atS);
                        });
    }

    /** What comes of the draws that the body of one stands for; the heat runs for that one. */
    private Map<Draw, Map<String, Fates.Two>> drawn(Setup setup, Draw body) {
        Map<String, Course> courses =
                setup.model().drawn(setup.chambers(), body, setup.endS(), neighbours);
        Map<Draw, Map<String, Fates.Two>> ends = new HashMap<>();
        for (int i = 0; i < draws.size(); i++) {
            if (standsFor.get(i).equals(body)) {
                Draw draw = draws.get(i);
                Map<String, LotHistory> there = setup.fates().ethylene(courses, draw).histories();
                ends.put(draw, followed(setup, there, draw, true));
            }
        }
        return ends;
    }

    private List<Map<String, Fates.Two>> inOrder(List<Map<Draw, Map<String, Fates.Two>>> parts) {
        Map<Draw, Map<String, Fates.Two>> all = new HashMap<>();
        parts.forEach(all::putAll);
        return draws.stream().map(all::get).toList();
    }

    private static Map<String, Fates.Two> followed(
            Setup setup, Map<String, LotHistory> histories, Draw draw, boolean brief) {
        Map<String, Fates.Two> ends = new HashMap<>();
        for (LotSheet sheet : setup.model().sheets()) {
            LotHistory history = histories.get(sheet.id());
            if (history != null) {
                Fates.Two two = setup.fates().inside(sheet, history, draw);
                ends.put(sheet.id(), brief ? two.brief() : two);
            }
        }
        return ends;
    }

    private ChamberTrial trial(Setup setup, List<Map<String, Fates.Two>> drawn) {
        StoreEthylene ethylene = setup.fates().ethylene(setup.plain(), Draw.MEDIAN);
        Map<String, LotHistory> histories = ethylene.histories();
        Map<String, Fates.Two> plain = followed(setup, histories, Draw.MEDIAN, false);
        Map<String, LotFates> fates = new HashMap<>();
        for (LotSheet sheet : setup.model().sheets()) {
            Fates.Two middle = plain.get(sheet.id());
            if (middle == null) {
                continue;
            }
            List<Fate> staying = new ArrayList<>();
            List<Fate> sold = new ArrayList<>();
            for (Map<String, Fates.Two> draw : drawn) {
                staying.add(ById.get(draw, sheet.id()).staying());
                sold.add(ById.get(draw, sheet.id()).sold());
            }
            LotHistory history = ById.get(histories, sheet.id());
            fates.put(
                    sheet.id(),
                    new LotFates(
                            middle.staying(),
                            staying,
                            sold,
                            List.of(),
                            sheet.model().basis(history)));
        }
        StoreOutcome outcome =
                new StoreOutcome(
                        setup.model(),
                        setup.model().plan().durationS(),
                        setup.plain(),
                        ethylene.chambers(),
                        histories,
                        fates,
                        Map.of());
        return new ChamberTrial(outcome, setup.chamberId());
    }
}

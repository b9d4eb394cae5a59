package org.wardon.advice.placing;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertNotEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.HashSet;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import java.util.SplittableRandom;
import java.util.concurrent.CancellationException;
import java.util.concurrent.atomic.AtomicInteger;
import org.junit.jupiter.api.AfterAll;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import org.wardon.advice.PlanLookups;
import org.wardon.advice.forecast.ForecastAdvice;
import org.wardon.advice.forecast.StoreTrial;
import org.wardon.advice.wording.Units;
import org.wardon.advice.wording.Words;
import org.wardon.errors.BadInput;
import org.wardon.errors.Progress;
import org.wardon.files.PlanReader;
import org.wardon.files.forecast.ChamberForecast;
import org.wardon.files.forecast.Forecast;
import org.wardon.files.forecast.LotForecast;
import org.wardon.files.forecast.PlaceAnswer;
import org.wardon.plan.ChamberPlan;
import org.wardon.plan.LotPlan;
import org.wardon.plan.PlaceWish;
import org.wardon.plan.StorePlan;
import org.wardon.reference.ReferenceBook;

/** Placing whole plans: what holds of every answer, whatever is drawn. */
class PlaceAdviceTest {
    private static final PlaceQuestion ALL = new PlaceQuestion(true, Set.of());
    private static final double ROUNDING = 1e-6;

    private static ReferenceBook book;

    @TempDir Path folder;

    @BeforeAll
    static void open() {
        book = ReferenceBook.open();
    }

    @AfterAll
    static void close() {
        book.close();
    }

    private static PlaceReport place(StorePlan plan, PlaceQuestion question) {
        return new PlaceAdvice(book, Words.english(Units.METRIC))
                .place(plan, question, Progress.SILENT);
    }

    /** The placing by what is assumed, before the full model has its word. */
    private Sought sought(StorePlan plan, PlaceQuestion question) {
        StoreTrial trial = StoreTrial.of(plan, book);
        Task task = new Task(trial, question);
        Options options = new Options(trial, task);
        Draft draft = new Draft(trial, task, new Companions(trial, options));
        Sought sought = draft.seek(plan.chambers(), options.all(), plan.wish().aim(), 1);
        assertTrue(sought.proven(), "not proven");
        return sought;
    }

    @ParameterizedTest(name = "seed {0}")
    @ValueSource(ints = {1, 2, 3})
    void forecastTellsTheSameValueAndItIsNeverWorseThanThePlan(int seed) {
        DrawnStore store = DrawnStore.of(seed, 4);
        store.lot("P1", "carrot-topped", new SplittableRandom(seed), ", \"chamber\": \"warm\"");
        PlaceReport report = place(store.plan(folder, book), PlaceQuestion.NONE_MOVES);
        PlaceAnswer answer = report.answer();
        Forecast forecast =
                new ForecastAdvice(book, Words.english(Units.METRIC))
                        .advise(report.proposed(), Progress.SILENT)
                        .forecast();
        double net = forecast.value().net();
        assertEquals(net, answer.value(), 1e-9 * Math.abs(net), "value.net of the forecast");
        assertEquals(answer.presentValue(), report.present().net(), ROUNDING);
        bothTellTheSame(report.then(), forecast);
        assertTrue(answer.value() >= answer.presentValue(), answer.toString());
        assertTrue(answer.bound() >= answer.value() && answer.gapPct() >= 0, answer.toString());
        assertEquals(Optional.of("warm"), report.proposed().lots().get(4).chamber(), "the pin");
        everyLotIsTold(report);
        capacityHolds(report.proposed());
    }

    private static void bothTellTheSame(Arrangement then, Forecast forecast) {
        for (Arrangement.There chamber : then.chambers()) {
            boolean holds =
                    forecast.chambers().stream()
                            .filter(one -> one.id().equals(chamber.id()))
                            .allMatch(ChamberForecast::holds);
            if (!chamber.off() && !chamber.lots().isEmpty()) {
                assertEquals(holds, chamber.notHeld().isEmpty(), chamber.toString());
            }
            var filled = chamber.filled();
            assertTrue(filled.massKg() <= filled.capacityKg(), chamber.toString());
            assertTrue(filled.volumeM3() <= filled.roomM3(), chamber.toString());
        }
        for (LotForecast lot : forecast.lots()) {
            var there = then.lots().get(lot.id());
            if (there != null) {
                assertEquals(lot.daysLeft().p50(), there.daysLeft().p50(), 1e-6, lot.id());
                assertEquals(lot.limitedBy(), there.limitedBy(), lot.id());
            }
        }
    }

    @Test
    void workIsStoppedWhereverItStands() {
        StorePlan plan = DrawnStore.of(2, 2).plan(folder, book);
        PlaceAdvice advice = new PlaceAdvice(book, Words.english(Units.METRIC));
        AtomicInteger heard = new AtomicInteger();
        advice.place(plan, ALL, (stage, done) -> heard.incrementAndGet());
        assertTrue(heard.get() > 1_000, "heard " + heard.get());
        for (double share : List.of(0.05, 0.6)) {
            AtomicInteger left = new AtomicInteger((int) (share * heard.get()));
            Progress impatient =
                    (stage, done) -> {
                        if (left.getAndDecrement() <= 0) {
                            throw new CancellationException(stage);
                        }
                    };
            assertThrows(
                    CancellationException.class,
                    () -> advice.place(plan, ALL, impatient),
                    "" + share);
        }
    }

    private static void everyLotIsTold(PlaceReport report) {
        Set<String> told = new HashSet<>();
        for (PlaceAnswer.Placed chamber : report.answer().chambers()) {
            for (String lot : chamber.lots()) {
                assertTrue(told.add(lot), lot + " stands twice");
            }
            assertFalse(chamber.off() && !chamber.lots().isEmpty(), chamber.toString());
        }
        report.answer().unplaced().forEach(lot -> assertTrue(told.add(lot.lot()), lot.lot()));
        assertEquals(
                report.asked().lots().stream()
                        .map(LotPlan::id)
                        .collect(java.util.stream.Collectors.toSet()),
                told);
    }

    private static void capacityHolds(StorePlan plan) {
        for (ChamberPlan chamber : plan.chambers()) {
            for (LotPlan at : plan.lots()) {
                double mass = 0;
                for (LotPlan lot : plan.lots()) {
                    boolean here = lot.chamber().equals(Optional.of(chamber.id()));
                    boolean then =
                            !lot.arrives().isAfter(at.arrives())
                                    && lot.leaves().isAfter(at.arrives());
                    mass += here && then ? lot.massKg() : 0;
                }
                assertTrue(mass <= chamber.capacityKg(), chamber.id() + " holds " + mass);
            }
        }
    }

    @ParameterizedTest(name = "seed {0}")
    @ValueSource(ints = {11, 12, 13, 14})
    void conflictsHoldAndAcceptingThemNeverCosts(int seed) {
        Sought strict = sought(DrawnStore.of(seed, 7).plan(folder, book), ALL);
        for (int c = 0; c < strict.chambers().size(); c++) {
            List<Task.Item> items = strict.in(c);
            for (Task.Item one : items) {
                for (Task.Item other : items) {
                    double loss =
                            one.equals(other)
                                    ? 0
                                    : strict.companions()
                                            .loss(strict.chosen().get(c).orElseThrow(), one, other);
                    assertTrue(Double.isFinite(loss), one + " stands with " + other);
                }
            }
        }
        DrawnStore bearing =
                DrawnStore.of(seed, 7).with("\"accept\": [\"ethylene\", \"odour\", \"uncured\"]");
        double relaxed = sought(bearing.plan(folder, book), ALL).assumed();
        assertTrue(relaxed >= strict.assumed() - ROUNDING, relaxed + " < " + strict.assumed());
    }

    @ParameterizedTest(name = "seed {0}")
    @ValueSource(ints = {21, 22, 23})
    void orderChangesNothingAndOneMoreChamberNeverCosts(int seed) {
        double value = sought(DrawnStore.of(seed, 6).plan(folder, book), ALL).assumed();
        double turned = sought(DrawnStore.of(seed, 6).turned().plan(folder, book), ALL).assumed();
        assertEquals(value, turned, 1e-6 * Math.abs(value));
        DrawnStore more = DrawnStore.of(seed, 6).chamber("more", 8, 2000, 1000);
        double with = sought(more.plan(folder, book), ALL).assumed();
        assertTrue(with >= value - ROUNDING, with + " < " + value);
    }

    @Test
    void daysOfANamedLotComeFirstWhereTheyAreWished() {
        DrawnStore store = DrawnStore.of(31, 4);
        store.lot("S1", "carrot-topped", new SplittableRandom(5), "");
        StorePlan plan = store.plan(folder, book);
        PlaceWish wish = new PlaceWish(PlaceWish.Aim.MOST_DAYS, List.of("S1"), Set.of());
        StoreTrial trial = StoreTrial.of(plan, book);
        double usual = days(trial, place(plan, PlaceQuestion.NONE_MOVES));
        double wished = days(trial, place(plan.wishing(wish), PlaceQuestion.NONE_MOVES));
        assertTrue(wished >= usual, wished + " < " + usual);
        assertTrue(wished > 0, "the lot has no days");
    }

    private static double days(StoreTrial trial, PlaceReport report) {
        var lot = trial.run(report.proposed()).lots().get("S1");
        return lot == null ? 0 : lot.daysLeft().p50();
    }

    @Test
    void fewChambersRunWhereThatIsWished() {
        StorePlan plan = DrawnStore.of(41, 3).plan(folder, book);
        PlaceWish wish = new PlaceWish(PlaceWish.Aim.FEWEST_CHAMBERS, List.of(), Set.of());
        StoreTrial trial = StoreTrial.of(plan, book);
        PlaceReport few = place(plan.wishing(wish), ALL);
        PlaceReport most = place(plan, ALL);
        long running = Ranked.running(trial.run(few.proposed()));
        assertTrue(running <= Ranked.running(trial.run(most.proposed())));
        assertTrue(running >= 1, "nothing runs, yet lots are placed");
        assertTrue(few.answer().unplaced().size() <= most.answer().unplaced().size());
    }

    /**
     * The demo cut after its last arrivals: what lots are worth later is reckoned on from there.
     */
    @Test
    void demoIsNeverWorseThanItsArrangement() throws IOException {
        String whole = Files.readString(Path.of("demo-data/landing.json"));
        String cut = whole.replace("\"days\": 10,", "\"days\": 5,");
        assertNotEquals(whole, cut, "the demo has another length");
        Files.copy(Path.of("demo-data/weather.csv"), folder.resolve("weather.csv"));
        StorePlan demo =
                PlanReader.read(
                        Files.writeString(folder.resolve("landing.json"), cut),
                        PlanLookups.of(book));
        PlaceReport kept = place(demo, PlaceQuestion.NONE_MOVES);
        assertTrue(kept.answer().value() >= kept.answer().presentValue());
        for (int i = 0; i < demo.lots().size(); i++) {
            Optional<String> pinned = demo.lots().get(i).chamber();
            if (pinned.isPresent()) {
                assertEquals(pinned, kept.proposed().lots().get(i).chamber());
            }
        }
        PlaceReport moved = place(demo, ALL);
        assertTrue(moved.answer().value() >= kept.answer().value(), "moving may help");
        assertTrue(
                moved.answer().moves().stream().anyMatch(move -> move.subject().equals("ONI1"))
                        || moved.answer().moves().stream()
                                .anyMatch(move -> move.subject().equals("BAN1")),
                "the onions stand in the heat, the bananas in the cold");
    }

    @Test
    void storeWithoutLotsIsSwitchedOff() {
        PlaceReport report = place(DrawnStore.of(1, 0).plan(folder, book), ALL);
        assertTrue(report.proposed().getChamber("cold").off());
        assertEquals(0, report.answer().value(), ROUNDING);
    }

    @Test
    void questionsThatNameNothingAreRefusedWhole() {
        StorePlan plan = DrawnStore.of(1, 2).plan(folder, book);
        BadInput refused =
                assertThrows(
                        BadInput.class, () -> place(plan, new PlaceQuestion(false, Set.of("L7"))));
        assertEquals(
                "--may-move: is 'L7', no lot of this plan; did you mean 'L0'? accepted: L0, L1",
                refused.getMessage());
        PlaceWish none = new PlaceWish(PlaceWish.Aim.MOST_DAYS, List.of(), Set.of());
        BadInput silent = assertThrows(BadInput.class, () -> place(plan.wishing(none), ALL));
        assertEquals(
                "--wish: is 'most-days' for no lot; accepted: --lots given beside it, with at"
                        + " least one lot",
                silent.getMessage());
    }
}

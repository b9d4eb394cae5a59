package org.wardon.advice.receiving;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.function.Function;
import java.util.stream.Collectors;
import java.util.stream.IntStream;
import java.util.stream.Stream;
import org.junit.jupiter.api.AfterAll;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.wardon.advice.forecast.ForecastAdvice;
import org.wardon.errors.BadInput;
import org.wardon.errors.Fault;
import org.wardon.errors.Progress;
import org.wardon.files.forecast.Because;
import org.wardon.files.forecast.LotForecast;
import org.wardon.files.forecast.Quantiles;
import org.wardon.files.forecast.ReceiveAnswer;
import org.wardon.files.forecast.ReceiveAnswer.Choice;
import org.wardon.plan.LotPlan;
import org.wardon.plan.Purpose;
import org.wardon.plan.StorePlan;
import org.wardon.produce.Ripeness;
import org.wardon.reference.ReferenceBook;

/** Lots at the door of invented stores. */
class ReceivingTest {
    private static final ReferenceBook BOOK = ReferenceBook.open();

    @TempDir private static Path folder;

    private static StorePlan two;
    private static Receiving atTwo;

    @BeforeAll
    static void preparesTwoChambers() throws IOException {
        two = Stores.plan(folder.resolve("two"), BOOK, twoChambers(List.of("warm", "cold")));
        atTwo = Receiving.of(two, BOOK, Stores.WORDS);
    }

    @AfterAll
    static void closesTheBook() {
        BOOK.close();
    }

    private static String twoChambers(List<String> order) {
        Map<String, String> chambers =
                Map.of(
                        "warm", Stores.chamber("warm", 13, 6_000),
                        "cold", Stores.chamber("cold", 1, 6_000));
        return Stores.json(
                8,
                order.stream().map(chambers::get).toList(),
                List.of(
                        Stores.lot("M1", "mango", "warm", 10, 900),
                        Stores.lot("C1", "carrot-topped", "cold", 9, 700),
                        Stores.lot("B1", "broccoli", "cold", 12, 300)));
    }

    private static NewLot coming(StorePlan plan, String crop, double kg, double pulpC) {
        return NewLot.of(crop, kg)
                .seen(NewLot.Fruit.UNSEEN.at(pulpC).harvested(6))
                .wished(NewLot.Wish.UNSAID.coming(plan.from().plusHours(50)).wanting(5).worth(2));
    }

    private static Choice in(ReceiveAnswer answer, String chamber) {
        return answer.choices().stream()
                .filter(choice -> choice.chamber().equals(Optional.of(chamber)))
                .findFirst()
                .orElseThrow();
    }

    private static Map<String, ReceiveAnswer.OfLot> lots(ReceiveAnswer answer, String chamber) {
        return in(answer, chamber).inside().orElseThrow().lots().stream()
                .collect(Collectors.toMap(ReceiveAnswer.OfLot::id, Function.identity()));
    }

    private static void agree(Quantiles quick, Quantiles full, String what) {
        // The quick answer knows the neighbours as they stand without the lot and runs doors
        // averaged where the forecast's neighbours had theirs in pulses: what is left of that must
        // be small beside what the published ranges leave open.
        double width = full.p90() - full.p10();
        double most = 0.05 * width + 0.05;
        String told = what + ": " + quick + " against " + full;
        assertEquals(full.p10(), quick.p10(), most, told);
        assertEquals(full.p50(), quick.p50(), most, told);
        assertEquals(full.p90(), quick.p90(), most, told);
    }

    @Test
    void agreesWithTheForecastOfThePlanWithTheLotPutIn() {
        StorePlan demo = Stores.demo(BOOK);
        Receiving receiving = Receiving.of(demo, BOOK, Stores.WORDS);
        assertEquals(32, receiving.draws());
        List<NewLot> comers =
                List.of(
                        coming(demo, "papaya", 500, 29),
                        coming(demo, "broccoli", 400, 24),
                        coming(demo, "onion-dry", 1_000, 28));
        List<String> chambers = List.of("fruit", "cold", "shed");
        for (int i = 0; i < comers.size(); i++) {
            String chamber = chambers.get(i);
            LotPlan lot = receiving.placed(comers.get(i), chamber);
            List<LotPlan> lots = new ArrayList<>(receiving.plan().lots());
            lots.add(lot);
            LotForecast full =
                    new ForecastAdvice(BOOK, Stores.WORDS)
                            .advise(receiving.plan().withLots(lots), Progress.SILENT)
                            .forecast()
                            .lots()
                            .get(lots.size() - 1);
            assertEquals(lot.id(), full.id());
            ReceiveAnswer answer = receiving.answer(comers.get(i));
            String what = lot.commodity() + " in " + chamber;
            agree(in(answer, chamber).keeps().daysLeft(), full.daysLeft(), what);
            Choice shade = ofKind(answer, ReceiveAnswer.SHADE);
            agree(shade.keeps().daysLeft(), full.daysLeftWithout(), what + ", outside");
        }
    }

    private static Choice ofKind(ReceiveAnswer answer, String kind) {
        return answer.choices().stream()
                .filter(choice -> choice.kind().equals(kind))
                .findFirst()
                .orElseThrow();
    }

    @Test
    void sendsEachCropWhereItKeeps() {
        ReceiveAnswer mango = atTwo.answer(coming(two, "mango", 600, 29));
        assertEquals(Optional.of("warm"), mango.choices().get(0).chamber());
        assertEquals("no", in(mango, "cold").verdict());
        assertTrue(in(mango, "cold").keeps().chillingRisk().probability() > 0.15);
        NewLot nearby = coming(two, "lettuce-crisphead", 300, 20);
        ReceiveAnswer lettuce = atTwo.answer(nearby.wished(nearby.wish().travelling(0.3)));
        assertEquals(Optional.of("cold"), lettuce.choices().get(0).chamber());
        assertEquals(lettuce.sentence(), lettuce.choices().get(0).text());
        assertTrue(
                lettuce.sentence()
                        .startsWith(
                                "Put the 300 kg of lettuce-crisphead into cold, the best there is,"
                                        + " not a good one: there it keeps"),
                lettuce.sentence());
        assertTrue(lettuce.choices().stream().noneMatch(choice -> choice.text().isBlank()));
    }

    @Test
    void sellsAtOnceWhatNoChamberKeepsLongEnough() {
        NewLot mango = coming(two, "mango", 300, 29);
        ReceiveAnswer sale = atTwo.answer(mango.wished(mango.wish().wanting(60)));
        assertEquals(ReceiveAnswer.SELL_NOW, sale.choices().get(0).kind());
        assertTrue(
                sale.sentence()
                        .startsWith(
                                "Sell the 300 kg of mango now: no chamber keeps it for 60 days in"
                                        + " store and 2 days to the market; in the shade it keeps"),
                sale.sentence());
        NewLot okra = coming(two, "okra", 300, 33);
        ReceiveAnswer lost = atTwo.answer(okra.wished(okra.wish().wanting(60)));
        assertEquals(ReceiveAnswer.SELL_NOW, lost.choices().get(0).kind());
        assertTrue(
                lost.sentence().startsWith("Nothing keeps the 300 kg of okra until it is sold:"),
                lost.sentence());
    }

    @Test
    void aHeavierLotNeverMakesThoseBesideItKeepLonger() {
        // Lots that end by loss of water are left out: a fuller chamber is damper.
        double before = Double.POSITIVE_INFINITY;
        double warmed = -1;
        double lost = Double.NEGATIVE_INFINITY;
        for (double kg : new double[] {100, 500, 1_500, 4_000}) {
            ReceiveAnswer answer = atTwo.answer(coming(two, "papaya", kg, 30));
            ReceiveAnswer.OfLot mango = lots(answer, "warm").get("M1");
            assertTrue(mango.daysLeft().p50() <= before, kg + " kg: " + mango);
            assertTrue(mango.warmsK() > warmed, kg + " kg: " + mango);
            assertTrue(mango.ethylenePpm() > mango.ethylenePpmBefore(), kg + " kg: " + mango);
            double others = in(answer, "warm").worth().othersLose();
            assertTrue(others >= lost, kg + " kg: " + others);
            before = mango.daysLeft().p50();
            warmed = mango.warmsK();
            lost = others;
        }
    }

    @Test
    void aColderLotIsNeverWorseWhereNothingChills() {
        double days = 0;
        double rise = Double.POSITIVE_INFINITY;
        for (double pulpC : new double[] {32, 24, 16, 8, 2}) {
            Choice cold = in(atTwo.answer(coming(two, "lettuce-crisphead", 600, pulpC)), "cold");
            assertTrue(cold.keeps().daysLeft().p50() >= days, pulpC + " °C: " + cold.keeps());
            double rises = cold.inside().orElseThrow().airRisesK();
            assertTrue(rises <= rise, pulpC + " °C: " + rises);
            days = cold.keeps().daysLeft().p50();
            rise = rises;
        }
    }

    @Test
    void theOrderOfChambersChangesNothing() throws IOException {
        StorePlan other =
                Stores.plan(folder.resolve("turned"), BOOK, twoChambers(List.of("cold", "warm")));
        NewLot lot = coming(two, "papaya", 700, 28);
        ReceiveAnswer turned = Receiving.of(other, BOOK, Stores.WORDS).answer(lot);
        assertEquals(atTwo.answer(lot), turned);
    }

    @Test
    void answersAlikeFromManyThreads() {
        List<NewLot> lots =
                IntStream.range(0, 8)
                        .mapToObj(i -> coming(two, i % 2 == 0 ? "mango" : "broccoli", 200 + i, 25))
                        .toList();
        List<ReceiveAnswer> alone = lots.stream().map(atTwo::answer).toList();
        assertEquals(alone, lots.parallelStream().map(atTwo::answer).toList());
    }

    @Test
    void whatHasNoRoomIsRefusedThere() {
        Choice warm = in(atTwo.answer(coming(two, "mango", 7_500, 25)), "warm");
        assertEquals("no", warm.verdict());
        assertEquals(-400, warm.inside().orElseThrow().freeKg(), 1e-9);
        assertTrue(
                warm.reasons().stream()
                        .map(Because::text)
                        .anyMatch(
                                "warm has room for 7 100 kg more while it would stand there; 7 500 kg come in."
                                        ::equals),
                warm.reasons().toString());
    }

    @Test
    void whatIsNotCuredGoesIntoNoColdChamber() {
        ReceiveAnswer answer = atTwo.answer(coming(two, "sweet-potato", 500, 28));
        for (String chamber : List.of("warm", "cold")) {
            Choice choice = in(answer, chamber);
            assertEquals("no", choice.verdict(), chamber);
            assertTrue(
                    choice.reasons().stream()
                            .anyMatch(reason -> reason.code().equals("uncured-in-cold")),
                    choice.reasons().toString());
        }
    }

    @Test
    void tellsWhatItTookForABareLot() {
        ReceiveAnswer answer = atTwo.answer(NewLot.of("mangoes", 400));
        assertEquals("mango", answer.commodity());
        assertEquals("MAN1", answer.lot());
        assertEquals(two.from(), answer.at());
        assertEquals(
                List.of(
                        "took-start",
                        "took-outdoor-temperature",
                        "took-wanted",
                        "took-package",
                        "took-ripeness",
                        "took-age",
                        "took-market",
                        "took-price-of-crop"),
                answer.assumed().stream().map(Because::code).toList());
    }

    @Test
    void greenFruitForSaleIsAskedForItsPurpose() {
        NewLot lot = coming(two, "mango", 400, 28);
        NewLot green = lot.seen(lot.fruit().ripened(Ripeness.GREEN));
        List<String> asked = atTwo.answer(green).assumed().stream().map(Because::code).toList();
        assertTrue(asked.contains("took-purpose"), asked.toString());
        NewLot told = green.wished(green.wish().keptFor(Purpose.SELL_RIPE));
        List<String> known = atTwo.answer(told).assumed().stream().map(Because::code).toList();
        assertEquals(List.of("took-package", "took-market"), known);
    }

    @Test
    void tellsEveryFaultAtOnce() {
        NewLot lot =
                new NewLot(
                        "mangoo",
                        -3,
                        new NewLot.Fruit(
                                OptionalDouble.of(80),
                                Ripeness.UNKNOWN,
                                OptionalDouble.of(-1),
                                Optional.empty(),
                                Optional.of("shoe-box"),
                                Optional.empty()),
                        new NewLot.Wish(
                                Optional.of(two.from().minusDays(1)),
                                OptionalDouble.of(0),
                                OptionalDouble.of(90),
                                Optional.empty(),
                                OptionalDouble.of(-2)));
        BadInput refused = assertThrows(BadInput.class, () -> atTwo.answer(lot));
        List<String> told =
                refused.faults().stream()
                        .map(Fault::sentence)
                        .map(text -> text.replaceAll("one of \\[.*]", "one of [...]"))
                        .toList();
        assertEquals(
                Stream.of(
                                "--commodity: 'mangoo': no commodity is called so; perhaps mango?"
                                        + " 'look' without a name lists all commodities",
                                "--mass: is -3; accepted: 0.1 to 500000 kg, net",
                                "--temperature: is 80; accepted: -5 to 55 °C, measured in the flesh",
                                "--harvested: is -1; accepted: 0 to 8760 hours ago",
                                "--days: is 0; accepted: 0.1 to 730 days",
                                "--market-days: is 90; accepted: 0 to 60 days",
                                "--price: is -2; accepted: 0 to 1000000 a kilogram",
                                "--package: 'shoe-box': no package is called so; one of [...]",
                                "--at: is 2026-03-01T00:00, outside the plan; accepted:"
                                        + " 2026-03-02T00:00 to 2026-03-09T23:00; or give the plan"
                                        + " more days")
                        .toList(),
                told);
    }
}

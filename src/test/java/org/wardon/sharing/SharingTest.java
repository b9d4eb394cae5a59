package org.wardon.sharing;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.Map;
import java.util.Objects;
import java.util.OptionalDouble;
import java.util.Set;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.wardon.keeping.Crops;
import org.wardon.keeping.Draw;
import org.wardon.keeping.Draws;
import org.wardon.keeping.Fate;
import org.wardon.keeping.KeepingModel;
import org.wardon.lots.LotHistory;
import org.wardon.produce.Conflict;
import org.wardon.produce.Reason;

class SharingTest {
    private static final List<Draw> DRAWS = Draws.seeded(1, 32);
    private static final double DAY_S = 86_400;

    private static SharingAnswer share(double days, String... ids) {
        return share(Circumstances.usual(), days, ids);
    }

    private static SharingAnswer share(Circumstances at, double days, String... ids) {
        return Sharing.of(
                Stream.of(ids).map(id -> Wish.of(Crops.lot(Crops.get(id)), days)).toList(),
                DRAWS,
                at);
    }

    private static Reason reason(PairVerdict pair, String code) {
        return pair.reasons().stream()
                .filter(r -> r.code().equals(code))
                .findFirst()
                .orElseThrow(() -> new AssertionError(code + " not in " + pair));
    }

    @Test
    void bananaAndLettuceArePulledApartByTemperature() {
        SharingAnswer answer = share(14, "banana-green", "lettuce-crisphead");
        assertEquals(Verdict.NO, answer.verdict());
        assertTrue(answer.workableC().isEmpty());
        Reason gap = reason(answer.pairs().get(0), "temperature-gap");
        assertEquals(List.of("lettuce-crisphead", "banana-green"), gap.subjects());
        assertTrue(gap.arguments().get(0).value() > 8, gap.toString());
        assertFalse(gap.sourceId().isBlank());
    }

    @Test
    void broccoliAndCauliflowerShareNearFreezingAndDamp() {
        SharingAnswer answer = share(7, "broccoli", "cauliflower");
        assertEquals(Verdict.GOOD, answer.verdict());
        SettingRange range = answer.workableC().orElseThrow();
        assertTrue(range.low() <= 0.5 && range.high() < 5, range.toString());
        assertTrue(answer.workableHumidityPct().orElseThrow().high() == 100);
    }

    @Test
    void applesShortenTheLifeOfBroccoli() {
        PairVerdict pair = share(14, "apple", "broccoli").pairs().get(0);
        assertEquals(Verdict.NO, pair.verdict());
        assertEquals(List.of("broccoli", "apple"), reason(pair, "ethylene-shortens").subjects());
    }

    @Test
    void whatIsAcceptedForbidsNothingAndIsPricedByTheModel() {
        Circumstances accepting = Circumstances.accepting(Set.of(Conflict.ETHYLENE));
        Circumstances both = Circumstances.accepting(Set.of(Conflict.ETHYLENE, Conflict.ODOUR));
        SharingAnswer day = share(accepting, 1, "apple", "broccoli");
        SharingAnswer two = share(both, 2, "apple", "broccoli");
        assertEquals(Verdict.TOLERABLE, two.verdict());
        reason(two.pairs().get(0), "ethylene-shortens-accepted");
        Price price = two.prices().get(0);
        assertEquals("broccoli", price.id());
        assertEquals("apple", price.from());
        double lostInTwo = price.daysLost().orElseThrow();
        double lostInOne = day.prices().get(0).daysLost().orElseThrow();
        assertTrue(
                lostInOne > 1 && lostInTwo > 1.8 * lostInOne && lostInTwo < 2.2 * lostInOne,
                lostInOne + " then " + lostInTwo);
        assertEquals(List.of(), share(14, "apple", "broccoli").prices());
        assertEquals(
                Verdict.NO,
                share(accepting, 14, "leek", "grape").verdict(),
                "smell is another matter");
        SharingAnswer smell =
                share(Circumstances.accepting(Set.of(Conflict.ODOUR)), 14, "leek", "grape");
        assertEquals(Conflict.ODOUR, smell.prices().get(0).conflict());
        assertTrue(smell.prices().get(0).daysLost().isEmpty());
    }

    private static Circumstances dated(Map<String, Circumstances.Stay> stays) {
        return new Circumstances(
                id -> Objects.requireNonNull(stays.get(id)),
                (id, atC) -> OptionalDouble.empty(),
                Set.of());
    }

    @Test
    void lotsThatNeverMeetNeedNotAgree() {
        var first = new Circumstances.Stay(0, 5 * DAY_S);
        var then = new Circumstances.Stay(6 * DAY_S, 11 * DAY_S);
        var over = new Circumstances.Stay(4 * DAY_S, 9 * DAY_S);
        String[] ids = {"lettuce-crisphead", "banana-green"};
        SharingAnswer apart = share(dated(Map.of(ids[0], first, ids[1], then)), 5, ids);
        assertTrue(apart.verdict() != Verdict.NO, apart.toString());
        assertEquals(List.of(), apart.pairs());
        assertTrue(apart.workableC().isEmpty() && apart.compromise().isEmpty());
        assertEquals(2, apart.spells().size());
        assertEquals(List.of("banana-green"), apart.spells().get(1).ids());
        assertTrue(apart.spells().get(1).temperatureC().orElseThrow().low() > 8);
        SharingAnswer meeting = share(dated(Map.of(ids[0], first, ids[1], over)), 5, ids);
        assertEquals(Verdict.NO, meeting.verdict());
        assertEquals(List.of(), meeting.spells());
        reason(meeting.pairs().get(0), "temperature-gap");
    }

    @Test
    void theSwingOfTheThermostatKeepsTheSettingFurtherFromFrost() {
        Wish lettuce = Wish.of(Crops.lot(Crops.get("lettuce-crisphead")), 7);
        KeepingModel model = KeepingModel.of(lettuce.lot());
        Workable still = Workable.of(lettuce, model, DRAWS);
        Workable swings = Workable.in(1.5, lettuce, model, DRAWS);
        assertEquals(still.frostC() + 1.5, swings.frostC(), 1e-12);
        double setC = model.freezingC() + 1.5;
        assertTrue(still.safe(setC) && !swings.safe(setC), "air falls to the freezing point");
    }

    @Test
    void ripeJackfruitStartsGreenBananasRipening() {
        PairVerdict pair = share(7, "banana-green", "jackfruit").pairs().get(0);
        assertEquals(Verdict.NO, pair.verdict());
        reason(pair, "ethylene-starts-ripening");
    }

    @Test
    void smellIsBorneForTwoDaysAndNoLonger() {
        PairVerdict brief = share(2, "leek", "grape").pairs().get(0);
        PairVerdict week = share(7, "leek", "grape").pairs().get(0);
        assertEquals(Verdict.TOLERABLE, brief.verdict(), brief.toString());
        assertEquals(Verdict.NO, week.verdict(), week.toString());
        reason(week, "odour");
    }

    @Test
    void onionsAndLettuceSplitOverHumidity() {
        PairVerdict pair = share(30, "onion-dry", "celery").pairs().get(0);
        assertEquals(Verdict.NO, pair.verdict());
        reason(pair, "humidity-split");
    }

    @Test
    void everyPairIsListedAndEveryReasonHasASource() {
        SharingAnswer answer = share(7, "mango", "okra", "onion-dry", "celery", "apple");
        assertEquals(10, answer.pairs().size());
        for (PairVerdict pair : answer.pairs()) {
            assertTrue(
                    pair.verdict() == Verdict.GOOD || !pair.reasons().isEmpty(), pair.toString());
        }
    }

    @Test
    void withoutTheBananasTheOthersMayShare() {
        SharingAnswer answer = share(7, "broccoli", "cauliflower", "banana-green");
        assertEquals("banana-green", answer.takeOut().orElseThrow());
        Compromise nearest = answer.compromise().orElseThrow();
        assertTrue(nearest.atC() >= 8 && nearest.atC() <= 16, nearest.toString());
        assertTrue(nearest.daysLost().get("broccoli") > 0, nearest.toString());
        SharingAnswer fine = share(7, "broccoli", "cauliflower");
        assertTrue(fine.compromise().isEmpty() && fine.takeOut().isEmpty());
    }

    @Test
    void theOrderOfLotsChangesNothingAndAnotherLotNeverWidens() {
        List<String> ids = List.of("mango", "okra", "celery", "apple");
        SharingAnswer one = share(4, ids.toArray(String[]::new));
        SharingAnswer other = share(4, "apple", "celery", "okra", "mango");
        assertEquals(one.verdict(), other.verdict());
        assertEquals(one.workableC(), other.workableC());
        assertEquals(one.takeOut(), other.takeOut());
        assertEquals(one.compromise(), other.compromise());
        List<Workable> lots =
                ids.stream()
                        .map(id -> Workable.of(Wish.of(Crops.lot(Crops.get(id)), 4), DRAWS))
                        .toList();
        for (int n = 1; n < lots.size(); n++) {
            Common few = Common.of(lots.subList(0, n));
            Common more = Common.of(lots.subList(0, n + 1));
            assertTrue(more.verdict().compareTo(few.verdict()) <= 0, ids.get(n));
            if (more.verdict() == few.verdict() && few.verdict() != Verdict.NO) {
                SettingRange wide = few.temperatureC().orElseThrow();
                SettingRange narrow = more.temperatureC().orElseThrow();
                assertTrue(narrow.low() >= wide.low() && narrow.high() <= wide.high());
            }
        }
    }

    @Test
    void warmMarketNarrowsTheSettings() {
        Wish cool = Wish.of(Crops.lot(Crops.get("broccoli")), 5);
        Wish warm = new Wish(cool.lot(), 5, 2, OptionalDouble.of(28));
        Workable ofCool = Workable.of(cool, DRAWS);
        Workable ofWarm = Workable.of(warm, DRAWS);
        assertTrue(ofWarm.tenthDays(2, 97.5) < ofCool.tenthDays(2, 97.5));
    }

    private static Together together(String id, double atC, double humidity, double ppm) {
        KeepingModel model = Crops.model(id);
        LotHistory history = LotHistory.constant(atC, humidity, ppm, 7 * DAY_S);
        List<Fate> fates = DRAWS.stream().map(draw -> model.follow(history, draw)).toList();
        Together.Span span = Together.Span.only(0, 7 * DAY_S);
        return new Together(
                Wish.of(model.lot(), 7),
                model,
                fates,
                500,
                span,
                new Together.Felt(atC, atC, ppm),
                List.of());
    }

    @Test
    void chamberIsJudgedByTheAirItReallyHas() {
        ChamberVerdict cold =
                ChamberSharing.of(
                        List.of(
                                together("banana-green", 5, 0.9, 0.01),
                                together("lettuce-crisphead", 5, 0.99, 0.01)),
                        Set.of());
        assertEquals(Verdict.NO, cold.verdict());
        assertTrue(
                cold.reasons().stream()
                        .anyMatch(
                                r ->
                                        r.code().equals("chilling-risk")
                                                && r.subjects().contains("banana-green")));
        ChamberVerdict apart =
                ChamberSharing.of(List.of(together("broccoli", 0, 0.98, 0.01)), Set.of());
        assertEquals(Verdict.GOOD, apart.verdict(), apart.toString());
        ChamberVerdict foul =
                ChamberSharing.of(List.of(together("broccoli", 0, 0.98, 5)), Set.of());
        assertEquals(Verdict.NO, foul.verdict());
    }

    @Test
    void whatIsAcceptedRefusesNoChamberAndTellsItsPrice() {
        Together apples = together("apple", 0, 0.95, 3);
        Together sprouts = together("broccoli", 0, 0.98, 3);
        List<Double> clean = sprouts.fates().stream().map(fate -> 15.0).toList();
        Together judged =
                new Together(
                        sprouts.wish(),
                        sprouts.model(),
                        sprouts.fates(),
                        sprouts.massKg(),
                        sprouts.span(),
                        sprouts.felt(),
                        clean);
        List<Together> both = List.of(apples, judged);
        ChamberVerdict strict = ChamberSharing.of(both, Set.of());
        ChamberVerdict borne = ChamberSharing.of(both, Set.of(Conflict.ETHYLENE));
        assertEquals(Verdict.NO, strict.each().get("broccoli"));
        assertEquals(Verdict.TOLERABLE, borne.each().get("broccoli"));
        assertEquals(List.of(), strict.borne());
        assertEquals("apple", borne.borne().get(0).from());
        assertEquals(15, borne.borne().get(0).daysLost().orElseThrow(), 1e-9);
        assertTrue(
                borne.reasons().stream()
                        .anyMatch(one -> one.code().equals("ethylene-shortens-accepted")));
    }
}

package org.wardon.advice.outlook;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.LocalDateTime;
import java.util.Optional;
import java.util.OptionalDouble;
import org.junit.jupiter.api.AfterAll;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.wardon.errors.BadInput;
import org.wardon.files.forecast.KeepAnswer;
import org.wardon.files.forecast.Quantiles;
import org.wardon.produce.Ripeness;
import org.wardon.reference.ReferenceBook;

/** One lot in one condition, or along a history. */
class KeepingAdviceTest {
    private static final ReferenceBook BOOK = ReferenceBook.open();
    private static final KeepingAdvice ADVICE = new KeepingAdvice(BOOK);
    private static final String CROP = "broccoli";

    /** Days are told to six digits and a step of a history to a quarter of an hour. */
    private static final double ROUNDING = 1e-3;

    @TempDir Path folder;

    @AfterAll
    static void close() {
        BOOK.close();
    }

    private static KeepRequest request(
            String crop, KeepRequest.Condition condition, double usedPct, String knownLife) {
        return new KeepRequest(
                crop,
                condition,
                OptionalDouble.of(95),
                usedPct == 0 ? OptionalDouble.empty() : OptionalDouble.of(usedPct),
                Optional.of(knownLife).filter(text -> !text.isEmpty()),
                Ripeness.UNKNOWN,
                Optional.empty(),
                OptionalDouble.empty(),
                OptionalDouble.empty(),
                Optional.empty());
    }

    private static KeepAnswer at(double atC, double days, double usedPct, String knownLife) {
        KeepRequest request = request(CROP, new KeepRequest.Steady(atC, days), usedPct, knownLife);
        return ADVICE.ask(request).answer();
    }

    private KeepAnswer along(double atC, int hours, OptionalDouble thenC) throws IOException {
        StringBuilder csv = new StringBuilder("time,temperatureC,humidityPct\n");
        LocalDateTime start = LocalDateTime.parse("2026-03-02T00:00");
        for (int hour = 0; hour <= hours; hour++) {
            csv.append(start.plusHours(hour)).append(',').append(atC).append(",95\n");
        }
        Path file = Files.writeString(folder.resolve("history.csv"), csv);
        return ADVICE.ask(request(CROP, new KeepRequest.Logged(file, thenC), 0, "")).answer();
    }

    private static Quantiles ageing(KeepAnswer answer) {
        return answer.mechanisms().stream()
                .filter(mechanism -> mechanism.name().equals("senescence"))
                .findFirst()
                .orElseThrow()
                .daysLeft();
    }

    private static void same(double expected, double found) {
        assertEquals(expected, found, ROUNDING * Math.abs(expected));
    }

    @Test
    void aSteadyHistoryIsJudgedLikeTheSameSteadyCondition() throws IOException {
        KeepAnswer steady = at(5, 2, 0, "");
        KeepAnswer logged = along(5, 48, OptionalDouble.empty());
        same(steady.lifeUsedPct(), logged.lifeUsedPct());
        same(ageing(steady).p10() - 2, ageing(logged).p10());
        same(ageing(steady).p50() - 2, ageing(logged).p50());
        same(ageing(steady).p90() - 2, ageing(logged).p90());
        assertEquals(steady.limitedBy(), logged.limitedBy());
        same(steady.daysLeft().p50() - 2, logged.daysLeft().p50());
    }

    @Test
    void halfOfItsLifeUsedLeavesTheOtherHalf() {
        same(0.5 * ageing(at(2, 7, 0, "")).p50(), ageing(at(2, 7, 50, "")).p50());
        // Ageing carries the use of before; mango in damp air is ended by ageing.
        KeepRequest.Steady damp = new KeepRequest.Steady(13, 5);
        KeepAnswer fresh = ADVICE.ask(request("mango", damp, 0, "")).answer();
        KeepAnswer half = ADVICE.ask(request("mango", damp, 50, "")).answer();
        assertEquals("senescence", fresh.limitedBy());
        same(50 + fresh.lifeUsedPct(), half.lifeUsedPct());
        assertEquals(0, at(2, 7, 100, "").daysLeft().p90(), 1e-9);
    }

    @Test
    void aKnownLifeShiftsTheLevel() {
        double published = ageing(at(10, 7, 0, "")).p50();
        double known = ageing(at(10, 7, 0, "4@10")).p50();
        assertTrue(published > 1.1 * 4 || published < 0.9 * 4, "the test needs another life");
        assertEquals(4, known, 0.05 * 4);
        // Longer where colder, as the curve runs; that its shape stays is held where single draws
        // are.
        assertTrue(ageing(at(2, 7, 0, "4@10")).p50() > 2 * known);
        KeepRequest told = request(CROP, new KeepRequest.Steady(2, 7), 0, "4@10");
        assertEquals("known-life", ADVICE.ask(told).restsOn());
    }

    @Test
    void afterAHistoryItGoesOnAtTheTemperatureGiven() throws IOException {
        KeepAnswer warm = along(20, 24, OptionalDouble.empty());
        KeepAnswer cooled = along(20, 24, OptionalDouble.of(2));
        same(warm.lifeUsedPct(), cooled.lifeUsedPct());
        double fresh = ageing(at(2, 7, 0, "")).p50();
        assertTrue(ageing(cooled).p50() > 3 * ageing(warm).p50(), "20 °C costs life");
        assertTrue(ageing(cooled).p50() < fresh);
    }

    @Test
    void theAnswerIsTheSameEachTime() {
        assertEquals(at(7, 5, 10, ""), at(7, 5, 10, ""));
    }

    @Test
    void everyFaultOfAQuestionIsToldAtOnce() {
        BadInput bad =
                assertThrows(
                        BadInput.class,
                        () ->
                                ADVICE.ask(
                                        request(
                                                CROP,
                                                new KeepRequest.Steady(99, 0),
                                                -1,
                                                "9 at 10")));
        assertEquals(
                "--at: 99.0 is out of range; accepted: -5.0 to 50.0 °C\n"
                        + "--days: 0.0 is out of range; accepted: 0.05 to 730.0 days\n"
                        + "--used: -1.0 is out of range; accepted: 0.0 to 100.0 %\n"
                        + "--known-life: '9 at 10' is not DAYS@C; accepted: days, @ and °C, such"
                        + " as 9@10",
                bad.getMessage());
    }

    @Test
    void aKnownLifeBeyondTheModelIsRefusedNotStumbledOver() {
        for (String life : new String[] {"9@41", "9@-3", "0@10", "731@10"}) {
            KeepRequest wild = request(CROP, new KeepRequest.Steady(5, 7), 0, life);
            BadInput bad = assertThrows(BadInput.class, () -> ADVICE.ask(wild), life);
            assertTrue(bad.getMessage().startsWith("--known-life "), bad.getMessage());
        }
    }

    @Test
    void anUnknownCropIsToldItsNeighbours() {
        KeepRequest odd = request("brocoli", new KeepRequest.Steady(5, 7), 0, "");
        BadInput bad = assertThrows(BadInput.class, () -> ADVICE.ask(odd));
        assertTrue(bad.getMessage().contains("perhaps broccoli"), bad.getMessage());
    }
}

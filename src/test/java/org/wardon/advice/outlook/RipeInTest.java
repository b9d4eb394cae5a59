package org.wardon.advice.outlook;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import org.junit.jupiter.api.AfterAll;
import org.junit.jupiter.api.Test;
import org.wardon.advice.wording.Units;
import org.wardon.advice.wording.Words;
import org.wardon.errors.BadInput;
import org.wardon.files.forecast.RipeOn;
import org.wardon.produce.Reason;
import org.wardon.produce.Ripeness;
import org.wardon.reference.ReferenceBook;

/** Ripe on the day? The keeper asks of one lot. */
class RipeInTest {
    private static final ReferenceBook BOOK = ReferenceBook.open();
    private static final KeepingAdvice ADVICE = new KeepingAdvice(BOOK);
    private static final Words WORDS = Words.english(Units.METRIC);

    /** The temperature is looked for to a twentieth of a kelvin; a banana's day is a kelvin's. */
    private static final double TO_DAYS = 0.1;

    @AfterAll
    static void close() {
        BOOK.close();
    }

    private static KeepReport ask(
            String crop, double atC, Ripeness ripeness, double ppm, double inDays) {
        return ADVICE.ask(
                new KeepRequest(
                        crop,
                        new KeepRequest.Steady(atC, 7),
                        OptionalDouble.empty(),
                        OptionalDouble.empty(),
                        Optional.empty(),
                        ripeness,
                        Optional.empty(),
                        OptionalDouble.of(ppm),
                        OptionalDouble.of(inDays),
                        Optional.empty()));
    }

    private static RipeOn answer(KeepReport report) {
        return report.answer().ripeOn().orElseThrow();
    }

    private static List<String> codes(KeepReport report) {
        return report.ripe().stream().map(Reason::code).toList();
    }

    @Test
    void atTheTemperatureToldHalfOfTheDrawsAreRipeThatDay() {
        for (double days : new double[] {5.5, 7, 9}) {
            RipeOn told = answer(ask("banana", 16, Ripeness.GREEN, 100, days));
            double atC = told.atC().orElseThrow();
            KeepReport there = ask("banana", atC, Ripeness.GREEN, 100, days);
            assertEquals(days, there.answer().ripeFrom().orElseThrow().p50(), TO_DAYS);
            assertEquals(0.5, answer(there).probability(), 0.1, "at " + atC + " °C");
        }
    }

    @Test
    void aWarmerRoomForAnEarlierDay() {
        double late = answer(ask("mango", 20, Ripeness.GREEN, 100, 9)).atC().orElseThrow();
        double early = answer(ask("mango", 20, Ripeness.GREEN, 100, 8)).atC().orElseThrow();
        assertTrue(early > late + 0.5, early + " for 8 days, " + late + " for 9");
    }

    @Test
    void sharesOfRipeUnripeAndOverripeMakeTheWhole() {
        KeepReport report = ask("avocado", 20, Ripeness.GREEN, 100, 6);
        RipeOn told = answer(report);
        List<Reason.Argument> shares = report.ripe().get(0).arguments();
        double sum = shares.stream().skip(1).mapToDouble(Reason.Argument::value).sum();
        assertEquals(100, sum, 1e-9);
        assertTrue(told.probability() > 0 && told.overripe() > 0, told.toString());
    }

    @Test
    void saysWhenNoSafeSettingHoldsItBack() {
        KeepReport report = ask("banana", 16, Ripeness.TURNING, 0.01, 14);
        assertTrue(answer(report).atC().isEmpty());
        assertEquals(
                "banana-green: even at 13.0 °C, the coldest that is safe, it is most likely ripe"
                        + " before then. Bring it in later, or plan an earlier day.",
                WORDS.sentence(report.ripe().get(1)));
    }

    @Test
    void saysWhenNoSafeSettingIsQuickEnoughAndWarnsOfTheGas() {
        KeepReport report = ask("banana", 16, Ripeness.GREEN, 0.01, 4);
        assertEquals(0, answer(report).probability());
        assertEquals(
                "banana-green: no safe temperature is likely to make it ripe by then, not even"
                        + " 30.0 °C. Ripening gas, where it is not used yet, starts it within a"
                        + " day; else plan a later day.",
                WORDS.sentence(report.ripe().get(1)));
        assertEquals(List.of("ripe-in-days", "ripe-not-by-then", "ripening-gas"), codes(report));
    }

    @Test
    void aRipeLotNeedsNoSetting() {
        KeepReport report = ask("mango", 12, Ripeness.RIPE, 0.01, 2);
        assertTrue(answer(report).probability() > 0.5, answer(report).toString());
        assertEquals(List.of("ripe-in-days"), codes(report));
        assertEquals(0, report.answer().ripeFrom().orElseThrow().p90());
    }

    private static String refused(String crop, double ppm, double inDays) {
        BadInput bad =
                assertThrows(BadInput.class, () -> ask(crop, 20, Ripeness.UNKNOWN, ppm, inDays));
        return bad.getMessage();
    }

    @Test
    void refusesWhatNobodyCanTell() {
        assertEquals(
                "--ripe-in: nobody said how ripe the mango is; accepted: --ripeness green, turning"
                        + " or ripe with it",
                refused("mango", 0.01, 4));
        assertEquals(
                "--ripe-in: no days to ripe are printed for broccoli; accepted for: banana-green,"
                        + " mango, papaya, avocado, tomato-mature-green, tomato-pink",
                refused("broccoli", 0.01, 4));
        assertEquals(
                "--ethylene: 2000.0 is out of range; accepted: 0.0 to 1000.0 ppm\n"
                        + "--ripe-in: 400.0 is out of range; accepted: 0.0 to 120.0 days",
                refused("mango", 2000, 400));
    }
}

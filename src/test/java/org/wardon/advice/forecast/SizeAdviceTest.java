package org.wardon.advice.forecast;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Path;
import java.time.LocalDate;
import java.util.List;
import java.util.OptionalDouble;
import org.junit.jupiter.api.AfterAll;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.wardon.advice.wording.Units;
import org.wardon.advice.wording.Words;
import org.wardon.errors.BadInput;
import org.wardon.files.forecast.SizeAnswer;
import org.wardon.plan.StorePlan;
import org.wardon.reference.ReferenceBook;

/** The design load of a planned chamber against the sum on paper. */
class SizeAdviceTest {
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

    private StorePlan plan() throws IOException {
        return SmallStores.plan(
                folder,
                book,
                List.of(SmallStores.chamber("north", 2), SmallStores.chamber("south", 13)),
                List.of(
                        SmallStores.lot(
                                "B", "broccoli", "2026-03-02T12:00", 12, "\"chamber\": \"north\""),
                        SmallStores.lot(
                                "C",
                                "carrot-topped",
                                "2026-03-04T08:00",
                                30,
                                "\"chamber\": \"north\""),
                        SmallStores.lot(
                                "M", "mango", "2026-03-03T12:00", 29, "\"chamber\": \"south\"")));
    }

    private SizeAnswer ask(String chamber, double outdoorC, double hours) throws IOException {
        OptionalDouble outdoors =
                Double.isNaN(outdoorC) ? OptionalDouble.empty() : OptionalDouble.of(outdoorC);
        return new SizeAdvice(book, Words.english(Units.METRIC))
                .ask(
                        plan(),
                        new SizeAdvice.Question(
                                chamber, outdoors, OptionalDouble.empty(), hours, 10));
    }

    private static double sum(SizeAnswer answer, String kind, String of) {
        return answer.terms().stream()
                .filter(term -> term.kind().equals(kind) && term.of().equals(of))
                .mapToDouble(SizeAnswer.Term::meanW)
                .sum();
    }

    @Test
    void theDayOfTheWarmestIntakeIsSummedWithWhatStandsThere() throws IOException {
        SizeAnswer answer = ask("north", Double.NaN, 20);
        assertEquals(LocalDate.of(2026, 3, 4), answer.day());
        assertEquals(28, answer.outdoorC(), 1e-9);
        double carrotJkgK = answerHeat("carrot-topped");
        assertEquals(300 * carrotJkgK * 28 / (20 * 3_600), sum(answer, "product", "C"), 0.5);
        assertEquals(0, sum(answer, "product", "B"), 0, "it came two days before");
        assertTrue(sum(answer, "respiration", "B") > 0, "but it breathes");
        assertEquals(0, sum(answer, "respiration", "M"), 0, "that is another chamber's");
        // 80 mm of 0.028 W/(m K), films 0.13 and 0.04 m2K/W, bridges 10 %, a wall of 4 m x 2.5 m.
        double wall = 1.1 * 4 * 2.5 * 26 / (0.13 + 0.08 / 0.028 + 0.04);
        assertEquals(wall, sum(answer, "transmission", "north"), 1e-9);
        double all = answer.terms().stream().mapToDouble(SizeAnswer.Term::meanW).sum();
        assertEquals(all, answer.meanW(), 1e-9);
        assertEquals(all * 1.1 * 24 / 1_000, answer.kWhPerDay(), 1e-9);
        assertEquals(
                answer.kWhPerDay() * 1_000 / answer.runningHoursPerDay(), answer.requiredW(), 1e-9);
        assertEquals(3_500, answer.installedW().orElseThrow(), 1e-9);
    }

    /** Specific heat of the flesh by the reference book, J/(kg K). */
    private static double answerHeat(String crop) {
        return org.wardon.lots.LotRange.of(
                        "X",
                        book.get(crop),
                        300,
                        book.packageKind("room-cooling-any"),
                        org.wardon.produce.Ripeness.UNKNOWN,
                        org.wardon.lots.ClassValues.of(book.all()))
                .at(org.wardon.lots.Shares.MIDDLE)
                .value()
                .item()
                .specificHeatJkgK();
    }

    @Test
    void hotterOutdoorsAndLessTimeAskForMore() throws IOException {
        double usual = ask("north", 28, 24).requiredW();
        assertTrue(ask("north", 38, 24).requiredW() > usual);
        assertTrue(ask("north", 28, 12).requiredW() > usual);
    }

    @Test
    void eachFaultIsToldWithWhatIsAccepted() {
        BadInput told = assertThrows(BadInput.class, () -> ask("nort", 99, 0));
        assertEquals(
                "--chamber: is 'nort', no chamber of this plan; did you mean 'north'? accepted:"
                        + " north, south\n"
                        + "--outdoor-c: is 99.0, out of range; accepted: -60.0 to 60.0\n"
                        + "--pull-down-hours: is 0.0, out of range; accepted: 0.1 to 1000.0",
                String.join(
                        "\n",
                        told.faults().stream().map(org.wardon.errors.Fault::sentence).toList()));
    }
}

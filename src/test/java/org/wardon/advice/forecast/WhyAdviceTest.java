package org.wardon.advice.forecast;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Path;
import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.AfterAll;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.wardon.advice.wording.Units;
import org.wardon.advice.wording.Words;
import org.wardon.errors.BadInput;
import org.wardon.errors.Progress;
import org.wardon.files.forecast.WhyAnswer;
import org.wardon.heat.Hours;
import org.wardon.heat.LotCourse;
import org.wardon.plan.StorePlan;
import org.wardon.reference.ReferenceBook;

/** Why an hour of a plan is as it is. */
class WhyAdviceTest {
    private static final Words WORDS = Words.english(Units.METRIC);

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
                                "B",
                                "broccoli",
                                "2026-03-02T12:00",
                                20,
                                "\"chamber\": \"north\", \"moves\": [{\"at\":"
                                        + " \"2026-03-04T09:30\", \"to\": \"south\"}]"),
                        SmallStores.lot(
                                "M", "mango", "2026-03-03T12:00", 29, "\"chamber\": \"south\"")));
    }

    private WhyAnswer ask(String chamber, String at, String face, String lot) throws IOException {
        return new WhyAdvice(book, WORDS)
                .ask(
                        plan(),
                        new WhyAdvice.Question(
                                chamber,
                                at,
                                Optional.of(face).filter(f -> !f.isEmpty()),
                                Optional.of(lot).filter(l -> !l.isEmpty())));
    }

    @Test
    void theHourIsThatOfTheForecastAndItsTermsAddUp() throws IOException {
        StoreOutcome outcome =
                new ForecastAdvice(book, WORDS).advise(plan(), Progress.SILENT).outcome();
        Hours hours = outcome.course("south").hours();
        for (String at : List.of("2026-03-02T01:00", "2026-03-03T13:00", "2026-03-04T10:00")) {
            WhyAnswer why = ask("south", at, "west", "");
            int row = (why.until().getDayOfMonth() - 2) * 24 + why.until().getHour() - 1;
            assertEquals(
                    hours.coolingW(row), why.removedW(), 1e-6 * Math.abs(why.removedW()) + 1e-6);
            assertEquals(100 * hours.humidityFraction(row), why.after().humidityPct(), 1e-6);
            WhyAnswer.HeatW t = why.heatW();
            double sum =
                    t.walls()
                            + t.door()
                            + t.leakage()
                            + t.freshAir()
                            + t.fieldHeat()
                            + t.respiration()
                            + t.fans()
                            + t.lights()
                            + t.people()
                            + t.packages()
                            + t.defrost()
                            + t.humidifier()
                            + t.heater()
                            + t.pumps()
                            + t.air();
            assertEquals(why.heatSumW(), sum, 1e-6);
            assertEquals(why.removedW(), sum, 1e-3 * Math.abs(sum), at);
            assertTrue(why.heatErrorPct() < 0.1 && why.waterErrorPct() < 0.1, at);
            WhyAnswer.OfFace face = why.face().orElseThrow();
            assertEquals("west", face.face());
            assertTrue(face.outerC() > face.innerC() && face.innerC() > face.airC());
            assertEquals(80, face.points().get(face.points().size() - 1).depthMm(), 1e-9);
        }
    }

    @Test
    void aLotThatWasCarriedInIsToldFromCoreToAir() throws IOException {
        LotCourse moved =
                new ForecastAdvice(book, WORDS).advise(plan(), Progress.SILENT).outcome().lot("B");
        WhyAnswer.OfLot lot = ask("south", "2026-03-04T11:00", "", "B").lot().orElseThrow();
        assertTrue(lot.there());
        int row = 0;
        while (moved.atS(row) < 59 * 3600) {
            row++;
        }
        assertEquals(moved.coreC(row), lot.shellsC().get(0), 1e-6);
        assertEquals(moved.surfaceC(row), lot.shellsC().get(4), 1e-6);
        assertEquals(moved.massKg(row), lot.massKg(), 1e-6);
        assertTrue(lot.shellsC().get(4) < lot.packageC() && lot.packageC() < lot.airC());
        assertEquals(
                lot.respirationW() + lot.fleshW() + lot.vapourW() + lot.packageW(),
                lot.toAirW(),
                1e-3 * Math.abs(lot.toAirW()) + 0.01);
        assertTrue(lot.fleshW() < 0, "it warms");
    }

    private String refused(String chamber, String at, String face, String lot) {
        return assertThrows(BadInput.class, () -> ask(chamber, at, face, lot)).getMessage();
    }

    @Test
    void whatIsNotThereIsRefusedWithWhatThereIs() {
        assertEquals(
                "--chamber: is 'nort', no chamber of this plan; did you mean 'north'? accepted:"
                        + " north, south\n--face: is 'attic', no face of a chamber; accepted: roof,"
                        + " floor, north, east, south, west\n--at: is '3 pm', no local time;"
                        + " accepted: such as 2026-03-02T15:00",
                refused("nort", "3 pm", "attic", ""));
        assertEquals(
                "--at: is 2026-03-02T00:30, where no hour of the plan ends; accepted:"
                        + " 2026-03-02T01:00 to 2026-03-08T00:00",
                refused("north", "2026-03-02T00:30", "", ""));
        assertEquals(
                "--lot: is 'M', no lot that stands in north then; did you mean 'B'? accepted: B",
                refused("north", "2026-03-03T15:00", "", "M"));
        assertEquals(
                "--lot: is 'B', no lot that stands in north then; accepted: none, no lot stands"
                        + " there then",
                refused("north", "2026-03-04T15:00", "", "B"));
    }
}

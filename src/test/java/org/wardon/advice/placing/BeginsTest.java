package org.wardon.advice.placing;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Set;
import org.junit.jupiter.api.AfterAll;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.wardon.advice.PlanLookups;
import org.wardon.advice.forecast.StoreTrial;
import org.wardon.advice.forecast.Tried;
import org.wardon.advice.wording.Units;
import org.wardon.advice.wording.Words;
import org.wardon.errors.Progress;
import org.wardon.files.PlacedPlan;
import org.wardon.files.PlanReader;
import org.wardon.plan.ChamberPlan;
import org.wardon.plan.StorePlan;
import org.wardon.reference.ReferenceBook;

/** A chamber that is set otherwise begins as it stands, and has to get there. */
class BeginsTest {
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

    private static DrawnStore store(String crop, int kg) {
        return new DrawnStore()
                .chamber("only", 20, 1_300, 3_000)
                .lot(
                        "{\"id\": \"L\", \"commodity\": \"%s\", \"massKg\": %d, \"package\": \"room-cooling-any\", \"arrives\": \"2026-03-01T20:00\", \"harvested\": \"2026-03-01T18:00\", \"temperatureC\": 26, \"wantedDays\": 5, \"marketDays\": 0.3, \"pricePerKg\": 3, \"chamber\": \"only\"}"
                                .formatted(crop, kg));
    }

    private Tried setTo(double settingC, int kg) {
        StorePlan plan = store("broccoli", kg).plan(folder, book);
        StoreTrial trial = StoreTrial.of(plan, book);
        ChamberPlan stands = Begins.asItStands(plan.chambers().get(0), trial.outdoorAtStartC());
        return trial.run(plan.with(List.of(Options.Dial.at(stands, settingC).set()), plan.lots()));
    }

    @Test
    void aLoadAloneMayKeepItFromComingToItsSetting() {
        Tried light = setTo(3, 60);
        double hours = light.reachedH().get("only");
        assertTrue(hours > 0.5 && hours < 48, hours + " h");
        assertEquals(List.of(), light.notHeld().get("only"));
        Tried heavy = setTo(3, 2_800);
        assertFalse(heavy.reachedH().containsKey("only"), "its heat is more than is taken");
        assertTrue(
                heavy.notHeld().get("only").stream()
                        .anyMatch(why -> why.code().equals("never-pulled-down")),
                heavy.notHeld().toString());
    }

    @Test
    void whatIsProposedSaysTheWayAndKeepsItWhenWritten() throws IOException {
        StorePlan plan = store("lettuce-crisphead", 300).plan(folder, book);
        PlaceReport report =
                new PlaceAdvice(book, Words.english(Units.METRIC))
                        .place(plan, new PlaceQuestion(true, Set.of()), Progress.SILENT);
        ChamberPlan then = report.proposed().chambers().get(0);
        assertTrue(then.setting().temperatureC() < 20, then.setting().toString());
        assertEquals(20, then.starts().orElseThrow().temperatureC());
        assertTrue(
                report.answer().notes().stream()
                        .anyMatch(note -> note.code().equals("place-reached")),
                report.answer().notes().toString());
        String changed =
                PlacedPlan.changed(
                        Files.readString(folder.resolve("plan.json")),
                        report.asked(),
                        report.proposed());
        Path written = Files.writeString(folder.resolve("placed.json"), changed);
        StorePlan read = PlanReader.read(written, PlanLookups.of(book));
        assertEquals(then.starts(), read.chambers().get(0).starts());
        assertEquals(
                report.answer().value(), StoreTrial.of(read, book).run(read).net(), 1e-6, changed);
    }
}

package org.wardon.advice.placing;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.file.Path;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import org.junit.jupiter.api.AfterAll;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.wardon.advice.forecast.ForecastAdvice;
import org.wardon.advice.forecast.StoreTrial;
import org.wardon.advice.wording.Units;
import org.wardon.advice.wording.Words;
import org.wardon.errors.Progress;
import org.wardon.files.forecast.PlaceAnswer;
import org.wardon.plan.SettingChange;
import org.wardon.plan.StorePlan;
import org.wardon.reference.ReferenceBook;

/** One chamber, bananas first, then crops that want cold: when a course of settings pays. */
class CoursesTest {
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

    private static String lot(String id, String crop, int kg, String more) {
        return "{\"id\": \"%s\", \"commodity\": \"%s\", \"massKg\": %d, \"package\": \"room-cooling-any\", \"temperatureC\": 20, \"marketDays\": 0.3, %s}"
                .formatted(id, crop, kg, more);
    }

    private StorePlan store(double bananaDays, int watts) {
        return new DrawnStore()
                .days(11)
                .chamber("only", 13, watts, 3_000)
                .lot(
                        lot(
                                "BAN",
                                "banana-green",
                                900,
                                "\"arrives\": \"2026-03-02T08:00\", \"harvested\": \"2026-03-01T18:00\", \"pricePerKg\": 2,"
                                        + " \"ripeness\": \"green\", \"wantedDays\": "
                                        + bananaDays))
                .lot(
                        lot(
                                "LET",
                                "lettuce-crisphead",
                                600,
                                "\"arrives\": \"2026-03-04T12:00\", \"harvested\": \"2026-03-04T06:00\", \"pricePerKg\": 6,"
                                        + " \"wantedDays\": 6"))
                .plan(folder, book);
    }

    private static PlaceReport place(StorePlan plan) {
        return new PlaceAdvice(book, Words.english(Units.METRIC))
                .place(plan, new PlaceQuestion(true, Set.of()), Progress.SILENT);
    }

    @Test
    void warmForBananasThenColdForLettuceKeepsMoreThanAnyOneSetting() {
        StorePlan plan = store(2, 3_000);
        PlaceReport report = place(plan);
        PlaceAnswer answer = report.answer();
        List<SettingChange> later = report.proposed().chambers().get(0).use().changes();
        assertEquals(1, later.size(), answer.toString());
        double first = report.proposed().chambers().get(0).setting().temperatureC();
        assertTrue(first >= 12 && later.get(0).temperatureC() <= 4, later.toString());
        assertTrue(answer.unplaced().isEmpty(), answer.unplaced().toString());
        double net =
                new ForecastAdvice(book, Words.english(Units.METRIC))
                        .advise(report.proposed(), Progress.SILENT)
                        .forecast()
                        .value()
                        .net();
        assertEquals(net, answer.value(), 1e-9 * Math.abs(net), "value.net of the forecast");
        assertTrue(answer.value() > 1.05 * bestAtOneSetting(report.proposed()), "it pays");
        assertTrue(
                answer.changes().stream()
                        .anyMatch(
                                c ->
                                        c.text()
                                                .startsWith(
                                                        "From "
                                                                + Changes.when(later.get(0))
                                                                        .text())),
                answer.changes().toString());
        // What it proposes is kept when it is asked again.
        assertTrue(place(report.proposed()).answer().value() >= answer.value() - 1e-6);
    }

    private static double bestAtOneSetting(StorePlan placed) {
        StoreTrial trial = StoreTrial.of(placed, book);
        double best = Double.NEGATIVE_INFINITY;
        for (double c : new double[] {1, 2, 4, 7, 10, 12, 13, 14, 15}) {
            StorePlan steady =
                    placed.with(
                            List.of(Options.Dial.at(placed.chambers().get(0), c).set()),
                            placed.lots());
            best = Math.max(best, trial.run(steady).net());
        }
        return best;
    }

    @Test
    void noneIsOfferedWhereBananasStayOrItsCoolerCannotMakeTheCold() {
        for (StorePlan plan : List.of(store(10, 3_000), store(2, 300))) {
            StoreTrial trial = StoreTrial.of(plan, book);
            Options options =
                    new Options(trial, new Task(trial, new PlaceQuestion(true, Set.of())));
            List<Option> all = options.all().get("only");
            double lowestC = options.reach("only").lowestC();
            for (Option option : all) {
                Optional<SettingChange> later =
                        option.chamber().use().changes().stream().findFirst();
                assertTrue(
                        later.isEmpty() || later.get().temperatureC() >= lowestC,
                        later + ", lowest " + lowestC);
            }
            PlaceReport report = place(plan);
            assertTrue(
                    report.proposed().chambers().get(0).use().changes().isEmpty(),
                    report.answer().toString());
        }
    }
}

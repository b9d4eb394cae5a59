package org.wardon.advice.forecast;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.LocalDateTime;
import java.util.List;
import java.util.Locale;
import org.junit.jupiter.api.AfterAll;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.wardon.advice.PlanLookups;
import org.wardon.advice.wording.Units;
import org.wardon.advice.wording.Words;
import org.wardon.errors.Progress;
import org.wardon.files.PlanReader;
import org.wardon.files.forecast.ChamberForecast;
import org.wardon.files.forecast.Forecast;
import org.wardon.reference.ReferenceBook;

/** A chamber on panels and a battery, and one whose grid fails every night, as advice. */
class SolarAdviceTest {
    private static final Path PLAN = Path.of("src/test/resources/plans/solar/plan.json");
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

    private StoreAdvice advise(String text) throws IOException {
        Path file = Files.writeString(folder.resolve("plan.json"), text);
        return new ForecastAdvice(book, Words.english(Units.METRIC))
                .advise(PlanReader.read(file, PlanLookups.of(book)), Progress.SILENT);
    }

    private static String plan(String supply) throws IOException {
        String text = Files.readString(PLAN);
        int from = text.indexOf("\"supply\"");
        int to = text.indexOf("\"lots\"");
        return text.substring(0, from) + supply + "}], " + text.substring(to);
    }

    private static String solar(double panelWp, double batteryKWh) {
        return String.format(
                Locale.ROOT,
                "\"supply\": {\"solar\": {\"panelWp\": %.0f, \"batteryKWh\": %.1f}}",
                panelWp,
                batteryKWh);
    }

    private static List<String> codes(Forecast forecast) {
        return forecast.warnings().stream().map(Forecast.Warning::code).toList();
    }

    @Test
    void aSmallBatteryRunsOutAtAnHourOfTheNightAndThatIsTheVerdict() throws IOException {
        StoreAdvice advice = advise(plan(solar(900, 0.8)));
        ChamberForecast chamber = advice.forecast().chambers().get(0);
        ChamberForecast.Solar solar = chamber.solar().orElseThrow();
        assertTrue(!chamber.holds() && solar.hoursWithout() > 10, solar.toString());
        LocalDateTime first = solar.firstWithout().orElseThrow();
        assertTrue(first.getHour() < 6, "in the night, at " + first);
        assertEquals(
                "battery-runs-out", advice.whyNotHeld("north").get(0).code(), "said before all");
        Forecast.Warning told =
                advice.forecast().warnings().stream()
                        .filter(warning -> warning.code().equals("battery-empty"))
                        .findFirst()
                        .orElseThrow();
        String hours = Units.METRIC.figure(solar.hoursWithout(), "h");
        assertEquals(
                "north: the battery runs out, first on "
                        + first.toString().replace("T", " at ")
                        + "; for "
                        + hours
                        + " in all nothing runs. More panel, a larger battery, thicker walls or ice"
                        + " made by day carry it through the night.",
                told.text());
        assertTrue(codes(advice.forecast()).contains("solar-hazards"));
        double in = solar.panelKWh() + solar.startKWh();
        double out = solar.usedKWh() + solar.lossesKWh() + solar.spilledKWh() + solar.endKWh();
        assertEquals(in, out, 1e-9 * in);
        assertEquals(chamber.energyKWh(), solar.usedKWh(), 1e-9);
        assertEquals(0, chamber.energyCost());
        assertEquals(0, solar.batteryLowPct());
    }

    @Test
    void anAmpleOneHoldsThroughEveryNight() throws IOException {
        StoreAdvice advice = advise(plan(solar(4_000, 12)));
        ChamberForecast chamber = advice.forecast().chambers().get(0);
        ChamberForecast.Solar solar = chamber.solar().orElseThrow();
        assertEquals(0, solar.hoursWithout());
        assertTrue(solar.firstWithout().isEmpty() && solar.batteryLowPct() > 0);
        assertTrue(!codes(advice.forecast()).contains("battery-empty"));
        advice.writeSeries(folder.resolve("series"));
        List<String> rows = Files.readAllLines(folder.resolve("series/chamber-north.csv"));
        assertTrue(rows.get(0).endsWith(",panelW,batteryPct"), rows.get(0));
        assertEquals(1 + 5 * 24, rows.size());
    }

    @Test
    void nightsWithoutGridAreToldInHoursAndGoOnBeyondThePlan() throws IOException {
        String nights = "\"outages\": [{\"daily\": {\"from\": \"18:00\", \"to\": \"06:00\"}}]";
        StoreAdvice advice = advise(plan(nights));
        Forecast.Warning told =
                advice.forecast().warnings().stream()
                        .filter(warning -> warning.code().equals("outage"))
                        .findFirst()
                        .orElseThrow();
        assertEquals("north: without power for 60 h. Keep the door shut.", told.text());
        ChamberForecast grid = advise(plan("\"supply\": \"grid\"")).forecast().chambers().get(0);
        ChamberForecast failing = advice.forecast().chambers().get(0);
        assertTrue(failing.airC().max() > grid.airC().max() + 2);
        assertTrue(failing.solar().isEmpty() && grid.solar().isEmpty());
        double days = advice.forecast().lots().get(0).daysLeft().p50();
        assertTrue(
                days
                        < advise(plan("\"supply\": \"grid\""))
                                .forecast()
                                .lots()
                                .get(0)
                                .daysLeft()
                                .p50());
    }

    @Test
    void aScrubberStandsStillWithTheRestWhenTheBatteryIsEmpty() throws IOException {
        String scrub = ", \"ethyleneScrub\": {\"airM3PerHour\": 30}";
        ChamberForecast fed = advise(plan(solar(4_000, 12) + scrub)).forecast().chambers().get(0);
        ChamberForecast hungry = advise(plan(solar(900, 0.8) + scrub)).forecast().chambers().get(0);
        assertTrue(
                hungry.ethylenePpmMax() > 1.5 * fed.ethylenePpmMax(),
                hungry.ethylenePpmMax() + " and " + fed.ethylenePpmMax());
    }

    @Test
    void aFileWithoutSunshineIsSaidToBeGuessedFrom() throws IOException {
        StringBuilder csv = new StringBuilder("time,temperatureC,humidityPct\n");
        LocalDateTime from = LocalDateTime.parse("2026-01-28T00:00");
        for (int h = 0; h <= 5 * 24; h++) {
            double airC = 24 - 6 * Math.cos(2 * Math.PI * (h - 3) / 24);
            csv.append(from.plusHours(h)).append(String.format(Locale.ROOT, ",%.1f,60%n", airC));
        }
        Files.writeString(folder.resolve("weather.csv"), csv);
        String text = plan(solar(4_000, 12));
        int start = text.indexOf("\"weather\"");
        int end = text.indexOf("\"from\"", start);
        Forecast forecast =
                advise(
                                text.substring(0, start)
                                        + "\"weather\": {\"csv\": \"weather.csv\"}, "
                                        + text.substring(end))
                        .forecast();
        assertTrue(codes(forecast).contains("sun-from-temperature-range"));
        assertTrue(forecast.chambers().get(0).solar().orElseThrow().panelKWh() > 20);
    }
}

package org.wardon.advice.forecast;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.AfterAll;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.wardon.advice.wording.Units;
import org.wardon.advice.wording.Words;
import org.wardon.errors.Progress;
import org.wardon.files.forecast.ChamberForecast;
import org.wardon.files.forecast.Forecast;
import org.wardon.files.forecast.LotForecast;
import org.wardon.files.forecast.WhyAnswer;
import org.wardon.plan.StorePlan;
import org.wardon.reference.ReferenceBook;

/** A chamber whose air is two, as advice: a busy door, and one lot of a crop at each end. */
class DoorEndAdviceTest {
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

    private StoreAdvice advise(String zones) throws IOException {
        return new ForecastAdvice(book, WORDS).advise(plan(zones), Progress.SILENT);
    }

    private StorePlan plan(String zones) throws IOException {
        String chamber =
                SmallStores.chamber("cold", 1)
                        .replace(
                                "\"cooling\"",
                                zones
                                        + "\"door\": {\"widthM\": 1, \"heightM\": 2, \"openingsPerDay\":"
                                        + " 80, \"secondsOpen\": 60}, \"cooling\"");
        List<String> lots =
                List.of(
                        lot("D", "\"chamber\": \"cold\", \"place\": \"door\""),
                        lot("M", "\"chamber\": \"cold\", \"place\": \"middle\""));
        return SmallStores.plan(folder, book, List.of(chamber), lots);
    }

    private static String lot(String id, String rest) {
        return SmallStores.lot(id, "broccoli", "2026-03-02T06:00", 3, rest);
    }

    private static final String ZONES =
            "\"airZones\": {\"doorEnd\": \"west\", \"doorEndShare\": 0.3, \"exchangeM3PerHour\": 250},";

    private static Optional<Forecast.Warning> told(StoreAdvice advice, String code) {
        return advice.forecast().warnings().stream()
                .filter(warning -> warning.code().equals(code))
                .findFirst();
    }

    private static LotForecast lot(StoreAdvice advice, String id) {
        return advice.forecast().lots().stream()
                .filter(lot -> lot.id().equals(id))
                .findFirst()
                .orElseThrow();
    }

    @Test
    void theWarmCornerIsTellableAndCostsTheLotInItDays() throws IOException {
        StoreAdvice advice = advise(ZONES);
        ChamberForecast chamber = advice.forecast().chambers().get(0);
        ChamberForecast.DoorEnd end = chamber.doorEnd().orElseThrow();
        assertTrue(end.warmerK().mean() > 1, end.toString());
        assertEquals(end.airC().mean() - chamber.airC().mean(), end.warmerK().mean(), 1e-9);
        LotForecast door = lot(advice, "D");
        LotForecast middle = lot(advice, "M");
        assertTrue(door.temperatureC().atEnd() > middle.temperatureC().atEnd() + 0.5);
        assertTrue(door.daysLeft().p50() < middle.daysLeft().p50() - 0.5, door.daysLeft() + "");
        assertEquals(
                "cold: its door end is "
                        + Units.METRIC.figure(end.warmerK().mean(), "K")
                        + " warmer than its coil end on average, "
                        + Units.METRIC.figure(end.warmerK().max(), "K")
                        + " in the worst hour ("
                        + Units.METRIC.figure(end.airC().mean(), "C")
                        + " against "
                        + Units.METRIC.figure(chamber.airC().mean(), "C")
                        + "). The thermostat feels the coil end.",
                told(advice, "door-end-warmer").orElseThrow().text());
        Forecast.Warning warm = told(advice, "door-end-too-warm").orElseThrow();
        assertEquals("caution", warm.level());
        assertTrue(warm.text().startsWith("D: by the door of cold it stands at "), warm.text());
        assertTrue(chamber.balanceErrorPct() < 1e-6, chamber.balanceErrorPct() + " %");
    }

    @Test
    void whyTellsWhatTheEndsChangeAndItsTermsStillAddUp() throws IOException {
        WhyAnswer why =
                new WhyAdvice(book, WORDS)
                        .ask(
                                plan(ZONES),
                                new WhyAdvice.Question(
                                        "cold",
                                        "2026-03-05T12:00",
                                        Optional.of("roof"),
                                        Optional.of("D")));
        WhyAnswer.Ends ends = why.ends().orElseThrow();
        assertEquals(250, ends.exchangeM3H(), 1e-6);
        // 250 m3/h of air of 1 °C and 1013 hPa: 0.0895 kg/s; vapour adds to 1.006 kJ/(kg K).
        double dryW = 89.5 * 1.006 * (ends.doorEndC() - ends.coilEndC());
        assertTrue(ends.toCoilEndW() > 0.8 * dryW && ends.toCoilEndW() < 4 * dryW, ends + "");
        assertEquals(ends.doorEndC(), why.lot().orElseThrow().airC(), 1e-9);
        assertTrue(why.after().airC() > ends.coilEndC() && why.after().airC() < ends.doorEndC());
        assertEquals(why.removedW(), why.heatSumW(), 1e-3 * why.heatSumW());
        assertTrue(why.heatErrorPct() < 0.1 && why.waterErrorPct() < 0.1, why.heatErrorPct() + "");
    }

    @Test
    void theSeriesHasTheDoorEndBesideTheCoilEndWhereThereAreTwo() throws IOException {
        advise(ZONES).writeSeries(folder.resolve("two"));
        List<String> two = Files.readAllLines(folder.resolve("two/chamber-cold.csv"));
        assertTrue(two.get(0).endsWith(",doorEndC,doorEndHumidityPct"), two.get(0));
        String[] row = two.get(two.size() - 1).split(",");
        assertTrue(Double.parseDouble(row[8]) > Double.parseDouble(row[1]), two.get(100));
    }

    @Test
    void oneAirStaysTheDefaultAndSaysNothingOfEnds() throws IOException {
        StoreAdvice advice = advise("");
        assertTrue(advice.forecast().chambers().get(0).doorEnd().isEmpty());
        assertTrue(told(advice, "door-end-warmer").isEmpty());
        advice.writeSeries(folder.resolve("one"));
        String header = Files.readAllLines(folder.resolve("one/chamber-cold.csv")).get(0);
        assertTrue(!header.contains("doorEnd"), header);
        double door = lot(advice, "D").temperatureC().atEnd();
        assertEquals(lot(advice, "M").temperatureC().atEnd(), door, 1e-6);
    }

    @Test
    void aChamberThatNamesNoExchangeIsToldWhatIsTaken() throws IOException {
        StoreAdvice advice = advise("\"airZones\": {},");
        ChamberForecast.DoorEnd end = advice.forecast().chambers().get(0).doorEnd().orElseThrow();
        // Half of 0.6 m3/s carry far more than the door brings: the ends stay near each other.
        assertTrue(end.warmerK().mean() > 0 && end.warmerK().mean() < 2, end.toString());
        List<String> taken =
                advice.forecast().warnings().stream()
                        .filter(warning -> warning.code().equals("default-taken"))
                        .filter(warning -> warning.subject().contains("airZones"))
                        .map(Forecast.Warning::text)
                        .toList();
        assertEquals(
                List.of(
                        "$.chambers[0].airZones.doorEnd: not given; east is taken (assumption).",
                        "$.chambers[0].airZones.doorEndShare: not given; 0.5 is taken (assumption).",
                        "$.chambers[0].airZones.exchangeM3PerHour: not given; half of what fans"
                                + " move; at rest by density, as through an opening of the whole"
                                + " section is taken (common practice, no source)."),
                taken);
    }
}

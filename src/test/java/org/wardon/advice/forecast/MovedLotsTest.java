package org.wardon.advice.forecast;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import org.junit.jupiter.api.AfterAll;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.wardon.files.forecast.ChamberForecast;
import org.wardon.files.forecast.Forecast;
import org.wardon.files.forecast.LotForecast;
import org.wardon.reference.ReferenceBook;

/** Forecasts of plans whose lots are carried from chamber to chamber. */
class MovedLotsTest {
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

    private static LotForecast only(StoreAdvice advice) {
        assertEquals(1, advice.forecast().lots().size());
        return advice.forecast().lots().get(0);
    }

    private static final String NOON = "2026-03-02T12:00";

    private static String moves(String... atTo) {
        StringBuilder text = new StringBuilder();
        for (int i = 0; i < atTo.length; i += 2) {
            text.append(i == 0 ? "" : ",")
                    .append("{\"at\": \"%s\", \"to\": \"%s\"}".formatted(atTo[i], atTo[i + 1]));
        }
        return "\"chamber\": \"north\", \"moves\": [%s]".formatted(text);
    }

    @Test
    void aMoveAtTheHourOfArrivalIsStartingThere() throws IOException {
        List<String> two =
                List.of(SmallStores.chamber("north", 2), SmallStores.chamber("south", 13));
        LotForecast started =
                only(
                        SmallStores.advise(
                                folder,
                                book,
                                two,
                                List.of(
                                        SmallStores.lot(
                                                "M",
                                                "mango",
                                                NOON,
                                                29,
                                                "\"chamber\": \"south\""))));
        LotForecast moved =
                only(
                        SmallStores.advise(
                                folder,
                                book,
                                two,
                                List.of(
                                        SmallStores.lot(
                                                "M", "mango", NOON, 29, moves(NOON, "south")))));
        assertEquals(started, moved);
    }

    @Test
    void aMoveToAnIdenticalChamberChangesNothing() throws IOException {
        List<String> two =
                List.of(SmallStores.chamber("north", 2), SmallStores.chamber("south", 2));
        LotForecast stays =
                only(
                        SmallStores.advise(
                                folder,
                                book,
                                two,
                                List.of(
                                        SmallStores.lot(
                                                "B",
                                                "broccoli",
                                                NOON,
                                                20,
                                                "\"chamber\": \"north\""))));
        StoreAdvice advice =
                SmallStores.advise(
                        folder,
                        book,
                        two,
                        List.of(
                                SmallStores.lot(
                                        "B",
                                        "broccoli",
                                        NOON,
                                        20,
                                        moves("2026-03-04T09:30", "south"))));
        LotForecast moves = only(advice);
        assertEquals("south", moves.chamber().orElseThrow());
        assertEquals(
                stays.coolHalfHours().getAsDouble(), moves.coolHalfHours().getAsDouble(), 1e-6);
        assertEquals(
                stays.coolSevenEighthsHours().getAsDouble(),
                moves.coolSevenEighthsHours().getAsDouble(),
                0.01);
        assertEquals(stays.temperatureC().atEnd(), moves.temperatureC().atEnd(), 0.05);
        // The other chamber's air was a little drier before anything stood in it.
        assertEquals(stays.weightLossPct(), moves.weightLossPct(), 0.03 * stays.weightLossPct());
        assertEquals(
                stays.respirationKWh(), moves.respirationKWh(), 0.005 * stays.respirationKWh());
        assertEquals(stays.lifeUsedPct(), moves.lifeUsedPct(), 0.03 * stays.lifeUsedPct());
        assertEquals(stays.daysLeft().p50(), moves.daysLeft().p50(), 0.05 * stays.daysLeft().p50());
        assertEquals(
                stays.daysGained().p50(), moves.daysGained().p50(), 0.05 * stays.daysLeft().p50());
        assertEquals(stays.daysLeftWithout(), moves.daysLeftWithout());
        closed(advice.forecast());
    }

    private static void closed(Forecast forecast) {
        for (ChamberForecast chamber : forecast.chambers()) {
            assertTrue(chamber.balanceErrorPct() < 0.1, chamber.toString());
        }
    }

    @Test
    void lotsThatChangePlacesAreToldInWordsAndHaveOneSeries() throws IOException {
        StoreAdvice advice =
                SmallStores.advise(
                        folder,
                        book,
                        List.of(SmallStores.chamber("north", 2), SmallStores.chamber("south", 13)),
                        List.of(
                                SmallStores.lot(
                                        "B",
                                        "broccoli",
                                        NOON,
                                        20,
                                        moves("2026-03-04T09:30", "south")),
                                SmallStores.lot("M", "mango", NOON, 29, moves(NOON, "south"))
                                        .replace(
                                                "]",
                                                ", {\"at\": \"2026-03-04T09:30\","
                                                        + " \"to\": \"north\"}]")));
        Forecast forecast = advice.forecast();
        closed(forecast);
        LotForecast broccoli = forecast.lots().get(0);
        LotForecast mango = forecast.lots().get(1);
        assertEquals("south", broccoli.chamber().orElseThrow());
        assertEquals("north", mango.chamber().orElseThrow());
        // So much broccoli in one heap stands above its air by its own breathing.
        assertEquals(16, broccoli.temperatureC().atEnd(), 3);
        assertEquals(2, mango.temperatureC().atEnd(), 1);
        assertTrue(mango.chillingRisk().probability() > 0.3, "four days at 2 °C");
        List<String> told =
                forecast.warnings().stream()
                        .filter(w -> w.code().equals("moved"))
                        .map(Forecast.Warning::text)
                        .toList();
        assertEquals(2, told.size(), told.toString());
        String move = " on 2026-03-04 09:30, at [0-9.]+ °C in its flesh; the air there is at ";
        assertTrue(
                told.get(0).matches("B: moves from north to south" + move + "1[23]\\.[0-9] °C\\."),
                told.get(0));
        assertTrue(
                told.get(1).matches("M: moves from south to north" + move + "[123]\\.[0-9] °C\\."),
                told.get(1));
        String sweats =
                forecast.warnings().stream()
                        .filter(w -> w.code().equals("sweats-when-moved"))
                        .map(w -> w.level() + " " + w.text())
                        .reduce("", (a, b) -> a + b);
        assertTrue(
                sweats.startsWith("caution B: carried from north to south its skin at "), sweats);
        // No company: the two never stand in one chamber at one time.
        for (Forecast.Sharing sharing : forecast.sharing()) {
            assertTrue(
                    sharing.reasons().stream().noneMatch(r -> r.code().equals("temperature-gap")),
                    sharing.toString());
        }
        Path series = folder.resolve("series");
        advice.writeSeries(series);
        List<String> lines = Files.readAllLines(series.resolve("lot-B.csv"));
        long atMove = lines.stream().filter(l -> l.startsWith("2026-03-04T09:30,")).count();
        assertEquals(1, atMove);
        for (int i = 2; i < lines.size(); i++) {
            double before = Double.parseDouble(lines.get(i - 1).split(",")[1]);
            double after = Double.parseDouble(lines.get(i).split(",")[1]);
            assertTrue(Math.abs(after - before) < 3, lines.get(i));
            assertTrue(lines.get(i - 1).compareTo(lines.get(i)) < 0, "times rise");
        }
    }

    @Test
    void aWarmDeliveryOnAColdLoadIsToldInKelvinAndHours() throws IOException {
        List<String> lots =
                List.of(
                        SmallStores.lot(
                                "B", "broccoli", "2026-03-02T00:00", 2, "\"chamber\": \"north\""),
                        SmallStores.lot(
                                        "C",
                                        "carrot-topped",
                                        "2026-03-04T10:00",
                                        28,
                                        "\"chamber\": \"north\"")
                                .replace("\"massKg\": 300", "\"massKg\": 2500"));
        StoreAdvice advice =
                SmallStores.advise(folder, book, List.of(SmallStores.chamber("north", 2)), lots);
        List<Forecast.Warning> told =
                advice.forecast().warnings().stream()
                        .filter(w -> w.code().startsWith("warms-and"))
                        .toList();
        assertEquals(1, told.size(), told.toString());
        assertTrue(
                told.get(0)
                        .text()
                        .matches(
                                "B: warms by [0-9.]+ K when C comes into north, and is within 0.5 K"
                                        + " of before after [0-9.]+ h\\."),
                told.get(0).text());
        Deliveries.Rise rise =
                new Deliveries(advice.outcome(), advice.plan().getChamber("north")).rises().get(0);
        double most = 0;
        double peakS = 0;
        double backS = 0;
        var history = advice.outcome().history("B");
        double arrives = 58 * 3600.0;
        double before = Double.NaN;
        for (int i = 0; i < history.size(); i++) {
            if (history.timeS(i) <= arrives) {
                before = history.meanC(i);
            }
        }
        for (int i = 0; i < history.size(); i++) {
            if (history.timeS(i) > arrives && history.timeS(i) <= arrives + 12 * 3600) {
                peakS = history.meanC(i) > most ? history.timeS(i) : peakS;
                most = Math.max(most, history.meanC(i));
            }
        }
        for (int i = history.size() - 1; i >= 0 && history.timeS(i) > peakS; i--) {
            backS = history.meanC(i) <= before + 0.5 ? history.timeS(i) : backS;
        }
        assertEquals(most - before, rise.riseK(), 0.1);
        assertEquals((backS - arrives) / 3600, rise.backHours().getAsDouble(), 1.01);
        assertEquals(rise.riseK() > 2 ? "caution" : "note", told.get(0).level());
    }
}

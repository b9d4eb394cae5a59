package org.wardon.advice.forecast;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.LocalDateTime;
import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.AfterAll;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.wardon.errors.BadInput;
import org.wardon.files.forecast.ChamberForecast;
import org.wardon.files.forecast.HourlySeries;
import org.wardon.files.forecast.WhyAnswer;
import org.wardon.reference.ReferenceBook;

/** The view of a chamber against the forecast it belongs to. */
class ChamberViewTest {
    private static final ReferenceBook BOOK = ReferenceBook.open();
    private static final double J_PER_KWH = 3.6e6;

    @TempDir private static Path folder;
    private static StoreAdvice advice;

    @BeforeAll
    static void advise() throws IOException {
        advice =
                SmallStores.advise(
                        folder,
                        BOOK,
                        List.of(SmallStores.chamber("north", 5), SmallStores.chamber("south", 12)),
                        List.of(
                                SmallStores.lot(
                                        "B1",
                                        "broccoli",
                                        "2026-03-02T10:00",
                                        24,
                                        "\"chamber\": \"north\""),
                                SmallStores.lot(
                                        "M1",
                                        "mango",
                                        "2026-03-02T12:00",
                                        27,
                                        "\"chamber\": \"south\"")));
    }

    @AfterAll
    static void close() {
        BOOK.close();
    }

    private static List<Double> column(HourlySeries series, String name) {
        return series.column(name).orElseThrow();
    }

    private static double kWh(HourlySeries heat, String name) {
        double sum = 0;
        for (int i = 0; i < heat.timeS().size(); i++) {
            double from = i == 0 ? 0 : heat.timeS().get(i - 1);
            sum += column(heat, name).get(i) * (heat.timeS().get(i) - from);
        }
        return sum / J_PER_KWH;
    }

    @Test
    void theBudgetOfTheHoursAddsUpToTheForecast() {
        ChamberForecast north = advice.forecast().chambers().get(0);
        HourlySeries heat = advice.view("north").heat();
        assertEquals(north.heatRemovedKWh(), kWh(heat, "removed"), 1e-6 * north.heatRemovedKWh());
        assertEquals(north.loadKWh().walls(), kWh(heat, "walls"), 1e-6 * north.heatRemovedKWh());
        assertEquals(
                north.loadKWh().fieldHeat(), kWh(heat, "fieldHeat"), 1e-6 * north.heatRemovedKWh());
        for (int i = 0; i < heat.timeS().size(); i++) {
            double sum = 0;
            for (HourlySeries.Column column : heat.columns()) {
                sum += column.name().equals("removed") ? 0 : column.values().get(i);
            }
            // The balance of one hour closes like that of the run, to a thousandth of what moves.
            assertEquals(column(heat, "removed").get(i), sum, 2, "hour " + i);
        }
    }

    @Test
    void meansLieBetweenLowestAndHighestAndLotsWarmestInside() {
        HourlySeries air = advice.view("north").air();
        assertEquals(144, air.timeS().size());
        for (int i = 0; i < 144; i++) {
            double mean = column(air, "airC").get(i);
            assertTrue(mean >= column(air, "airLowestC").get(i) - 1e-9, "hour " + i);
            assertTrue(mean <= column(air, "airHighestC").get(i) + 1e-9, "hour " + i);
        }
        List<HourlySeries> lots = advice.view("north").lots();
        assertEquals(List.of("B1"), lots.stream().map(HourlySeries::of).toList());
        assertTrue(column(lots.get(0), "coreC").get(2) > column(lots.get(0), "surfaceC").get(2));
    }

    @Test
    void theCsvFileIsTheSeries() throws IOException {
        Path series = folder.resolve("series");
        advice.writeSeries(series);
        List<String> lines = Files.readAllLines(series.resolve("chamber-south.csv"));
        assertEquals(
                "time,airC,humidityPct,outdoorC,coolingW,powerW,co2Ppm,ethylenePpm", lines.get(0));
        HourlySeries air = advice.view("south").air();
        double written = Double.parseDouble(lines.get(31).split(",", -1)[1]);
        assertEquals(column(air, "airC").get(30), written, 1e-4);
        assertTrue(Files.exists(series.resolve("lot-M1.csv")));
    }

    @Test
    void anHourTellsTheFaceFromOutsideToInside() {
        ChamberView view = advice.view("north");
        WhyAnswer hour =
                view.hour(
                        LocalDateTime.parse("2026-03-03T15:00"),
                        Optional.of("west"),
                        Optional.of("B1"));
        WhyAnswer.OfFace west = hour.face().orElseThrow();
        assertTrue(west.points().get(0).temperatureC() > 20, west.toString());
        assertTrue(
                west.points().get(west.points().size() - 1).temperatureC() < 10, west.toString());
        HourlySeries heat = view.heat();
        assertEquals(column(heat, "walls").get(38), hour.heatW().walls(), 1e-6);
    }

    @Test
    void whatIsNotThereIsRefused() {
        BadInput refused =
                assertThrows(
                        BadInput.class,
                        () ->
                                advice.view("north")
                                        .hour(
                                                LocalDateTime.parse("2026-04-03T15:00"),
                                                Optional.of("attic"),
                                                Optional.empty()));
        assertEquals(
                List.of(
                        "--at: is 2026-04-03T15:00, where no hour of the plan ends; accepted:"
                                + " 2026-03-02T01:00 to 2026-03-08T00:00",
                        "--face: is 'attic', no face of a chamber; accepted: roof, floor, north,"
                                + " east, south, west"),
                refused.faults().stream().map(fault -> fault.sentence()).toList());
    }
}

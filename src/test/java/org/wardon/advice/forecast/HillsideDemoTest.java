package org.wardon.advice.forecast;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Path;
import java.util.List;
import java.util.Set;
import java.util.TreeSet;
import java.util.stream.Collectors;
import org.junit.jupiter.api.AfterAll;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;
import org.wardon.advice.PlanLookups;
import org.wardon.advice.wording.Units;
import org.wardon.advice.wording.Words;
import org.wardon.errors.Progress;
import org.wardon.files.PlanReader;
import org.wardon.files.forecast.ChamberForecast;
import org.wardon.files.forecast.Forecast;
import org.wardon.reference.ReferenceBook;

/** The second demo: a chamber for every kind of cooler, and what must be said of each. */
class HillsideDemoTest {
    private static ReferenceBook book;
    private static StoreAdvice advice;

    @BeforeAll
    static void advise() throws IOException {
        book = ReferenceBook.open();
        advice =
                new ForecastAdvice(book, Words.english(Units.METRIC))
                        .advise(
                                PlanReader.read(
                                        Path.of("demo-data/hillside.json"), PlanLookups.of(book)),
                                Progress.SILENT);
    }

    @AfterAll
    static void close() {
        book.close();
    }

    private static ChamberForecast chamber(String id) {
        return advice.forecast().chambers().stream()
                .filter(chamber -> chamber.id().equals(id))
                .findFirst()
                .orElseThrow();
    }

    private static Set<String> cautions(String id) {
        return advice.forecast().warnings().stream()
                .filter(warning -> warning.subject().equals(id))
                .map(Forecast.Warning::code)
                .collect(Collectors.toSet());
    }

    @Test
    void everyKindOfCoolerIsAtWorkAndMarkedInvented() {
        Set<String> kinds = new TreeSet<>();
        for (ChamberForecast chamber : advice.forecast().chambers()) {
            for (ChamberForecast.OfCooler cooler : chamber.coolers()) {
                kinds.add(cooler.kind());
                assertTrue(cooler.runningHours() > 0, chamber.id() + ": " + cooler);
                assertTrue(cooler.heatRemovedKWh() > 0, chamber.id() + ": " + cooler);
            }
            assertTrue(chamber.balanceErrorPct() < 0.1, chamber.id());
        }
        assertEquals(
                Set.of(
                        "compressor",
                        "evaporative-pad",
                        "ice-bank",
                        "night-air",
                        "water-film",
                        "wetted-wall"),
                kinds);
        assertTrue(advice.plan().name().contains("(invented)"));
    }

    @Test
    void allHoldButTheOneThatAsksTheNightsForMoreThanTheyHave() {
        List<String> held =
                advice.forecast().chambers().stream()
                        .filter(ChamberForecast::holds)
                        .map(ChamberForecast::id)
                        .toList();
        assertEquals(List.of("pad", "brick", "spring", "ice", "rack"), held);
        assertEquals("air-outside-band", advice.whyNotHeld("night").get(0).code());
        // Nights of 12 to 14 °C and days of 30 °C outside thick walls: between the two.
        double nightC = chamber("night").airC().mean();
        assertTrue(nightC > 15 && nightC < 20, nightC + " °C");
    }

    @Test
    void eachKindHasItsWaterItsPowerAndItsCautions() {
        assertTrue(cautions("pad").contains("pad-water"), cautions("pad").toString());
        assertTrue(cautions("ice").contains("ice-handling"), cautions("ice").toString());
        assertTrue(cautions("night").contains("night-air-rain"), cautions("night").toString());
        assertTrue(chamber("pad").waterUsedKg() > 20);
        // A chamber of 100 kg evaporates 25 to 50 kg a day (ROY1986 by way of cooling-sources.csv).
        double poured = chamber("brick").waterUsedKg() / 5;
        assertTrue(poured > 20 && poured < 50, poured + " kg a day");
        assertEquals(0, chamber("brick").energyKWh());
        assertEquals(0, chamber("spring").energyKWh());
        assertTrue(chamber("ice").coolers().get(0).ice().orElseThrow().refrozenKg() > 50);
        List<ChamberForecast.OfCooler> rack = chamber("rack").coolers();
        assertTrue(rack.get(1).runningHours() < 0.3 * rack.get(0).runningHours(), rack.toString());
    }

    @Test
    void everyLotGainsByItsChamber() {
        advice.forecast()
                .lots()
                .forEach(lot -> assertTrue(lot.daysGained().p50() > 0, lot.id() + lot));
    }
}

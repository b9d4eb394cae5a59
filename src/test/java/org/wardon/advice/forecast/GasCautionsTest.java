package org.wardon.advice.forecast;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Path;
import java.util.List;
import org.junit.jupiter.api.AfterAll;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.wardon.advice.wording.Units;
import org.wardon.files.forecast.Forecast;
import org.wardon.reference.ReferenceBook;

/** What a person hears of carbon dioxide, and what a crop suffers from it. */
class GasCautionsTest {
    private static final String TIGHT =
            "\"setting\": {\"temperatureC\": 10}, \"leakageAirChangesPerDay\": 0.5,"
                    + "\"cooling\": [{\"kind\": \"compressor\", \"ratedCapacityW\": 3500}]";

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

    private Forecast with(String chamber, String commodity, double kg) throws IOException {
        return new SmallPlan()
                .chamber(chamber)
                .lots(
                        String.format(
                                java.util.Locale.ROOT,
                                "{\"id\": \"A1\", \"commodity\": \"%s\", \"massKg\": %.0f,"
                                        + " \"temperatureC\": 12, \"chamber\": \"north\","
                                        + " \"harvested\": \"2026-03-01T08:00\"}",
                                commodity,
                                kg))
                .advice(book, folder)
                .forecast();
    }

    private static String ppm(double value) {
        return Units.METRIC.figure(value, "ppm");
    }

    @Test
    void aChamberWhoseDoorNeverOpensIsNotToldOfAnOpening() throws IOException {
        Forecast forecast = with(TIGHT, "tomato-mature-green", 600);
        double highest = forecast.chambers().get(0).co2PpmMax();
        assertTrue(highest > 5_000 && highest < 14_000, "highest " + highest);
        assertEquals(
                List.of(
                        "north: carbon dioxide reaches "
                                + ppm(highest)
                                + "; no door opens in this plan. Air the chamber before staying"
                                + " inside."),
                SmallPlan.told(forecast, "co2-caution-shut"));
        assertEquals(List.of(), SmallPlan.told(forecast, "co2-caution"));
    }

    @Test
    void dangerIsToldWithTheOxygenThatIsLeft() throws IOException {
        Forecast forecast = with(TIGHT, "tomato-mature-green", 1_600);
        double highest = forecast.chambers().get(0).co2PpmMax();
        assertTrue(highest > 14_000 && highest < 30_000, "highest " + highest);
        String left = Units.METRIC.figure(20.9 - highest / 1e4, "pct");
        assertEquals(
                List.of(
                        "north: carbon dioxide reaches "
                                + ppm(highest)
                                + ", oxygen falls to "
                                + left
                                + "; no door opens in this plan. Air the chamber ten minutes, do"
                                + " not enter alone."),
                SmallPlan.told(forecast, "co2-danger-shut"));
    }

    @Test
    void aDoorIsToldWithWhatItsFirstOpeningMeets() throws IOException {
        Forecast forecast =
                with(
                        TIGHT
                                + ", \"door\": {\"widthM\": 0.9, \"heightM\": 2,"
                                + " \"openingsPerDay\": 2, \"secondsOpen\": 30}",
                        "tomato-mature-green",
                        1_500);
        List<String> told = SmallPlan.told(forecast, "co2-caution");
        assertEquals(1, told.size());
        assertTrue(told.get(0).contains("at the first opening of a day"), told.get(0));
        assertTrue(!told.get(0).contains("(0 ppm"), told.get(0));
    }

    @Test
    void aCropIsToldWhatHurtsItAndFreshAirMendsIt() throws IOException {
        // Crisphead lettuce: brown stain above 2 % carbon dioxide (gas-injury.csv, CA-SHEETS).
        Forecast stale = with(TIGHT, "lettuce-crisphead", 2_400);
        assertTrue(stale.chambers().get(0).co2PpmMax() > 20_000, "as stale as meant");
        List<String> told = SmallPlan.told(stale, "co2-injures");
        assertEquals(1, told.size(), told.toString());
        assertTrue(told.get(0).startsWith("A1: carbon dioxide stands above 2 % for "), told.get(0));
        assertTrue(told.get(0).contains("brown stain"), told.get(0));
        Forecast aired = with(TIGHT + ", \"freshAirM3PerHour\": 15", "lettuce-crisphead", 2_400);
        assertEquals(List.of(), SmallPlan.told(aired, "co2-injures"));
    }
}

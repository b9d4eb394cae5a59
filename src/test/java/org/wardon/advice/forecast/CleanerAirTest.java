package org.wardon.advice.forecast;

import static org.junit.jupiter.api.Assertions.assertEquals;
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
import org.wardon.files.forecast.ChamberForecast.CleanerAir;
import org.wardon.files.forecast.Forecast;
import org.wardon.files.forecast.LotForecast;
import org.wardon.reference.ReferenceBook;

/** What more fresh air, or a scrubber, is worth to lettuce beside ripe apples. */
class CleanerAirTest {
    private static final double VOLUME_M3 = 4 * 3 * 2.5;
    private static final String CHAMBER =
            "\"setting\": {\"temperatureC\": 3}, \"leakageAirChangesPerDay\": 1,"
                    + "\"cooling\": [{\"kind\": \"compressor\", \"ratedCapacityW\": 3500}]";
    private static final String LETTUCE =
            "{\"id\": \"L1\", \"commodity\": \"lettuce-crisphead\", \"massKg\": 200,"
                    + " \"temperatureC\": 3, \"chamber\": \"north\","
                    + " \"harvested\": \"2026-03-01T20:00\"}";
    private static final String APPLES =
            ", {\"id\": \"A1\", \"commodity\": \"apple\", \"massKg\": 900, \"temperatureC\": 3,"
                    + " \"chamber\": \"north\", \"ripeness\": \"ripe\","
                    + " \"harvested\": \"2026-03-01T08:00\"}";

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

    private Forecast with(String more, String lots) throws IOException {
        return new SmallPlan()
                .chamber(CHAMBER + more)
                .lots(lots)
                .days(4)
                .advice(book, folder)
                .forecast();
    }

    private static Optional<CleanerAir> cleaner(Forecast forecast) {
        return forecast.chambers().get(0).cleanerAir();
    }

    private static CleanerAir.OfLot lettuce(Forecast forecast) {
        return cleaner(forecast).orElseThrow().lots().stream()
                .filter(lot -> lot.id().equals("L1"))
                .findFirst()
                .orElseThrow();
    }

    private static LotForecast lot(Forecast forecast) {
        return forecast.lots().get(0);
    }

    @Test
    void theGainToldIsTheGainOfAPlanThatHasIt() throws IOException {
        Forecast plain = with("", LETTUCE + APPLES);
        CleanerAir.OfLot worth = lettuce(plain);
        Forecast scrubbed =
                with(
                        ", \"ethyleneScrub\": {\"airM3PerHour\": " + VOLUME_M3 + "}",
                        LETTUCE + APPLES);
        double gained = lot(scrubbed).daysLeft().p50() - lot(plain).daysLeft().p50();
        assertTrue(gained > 0.3, "the test needs a gain, found " + gained);
        // Medians of differences and differences of medians part by little where all draws gain.
        assertEquals(gained, worth.scrubDays().p50(), 0.2 * gained);
        // A plan with the fresh air runs its heat too: it cools and dries a little otherwise.
        Forecast aired = with(", \"freshAirM3PerHour\": " + VOLUME_M3, LETTUCE + APPLES);
        double fresh = ethylene(aired) - ethylene(plain);
        assertTrue(fresh < 0 && worth.freshAirDays().p50() > 0.3, worth.toString());
    }

    private static double ethylene(Forecast forecast) {
        return forecast.chambers().get(0).ethylenePpmMax();
    }

    @Test
    void isToldInOneSentenceWithWhatItCosts() throws IOException {
        Forecast plain = with("", LETTUCE + APPLES);
        CleanerAir worth = cleaner(plain).orElseThrow();
        assertEquals(VOLUME_M3, worth.freshAirM3PerHour(), 1e-9, "an air change an hour");
        // 30 m3/h of air at 29 °C into 3 °C: 30/3600 x 1.2 x 1006 x 26 = 262 W, sensible.
        assertEquals(262, worth.freshAirCoolingW(), 10);
        List<String> told = SmallPlan.told(plain, "cleaner-air");
        assertEquals(1, told.size());
        String days =
                String.format(
                        java.util.Locale.ROOT,
                        "L1 %.1f and %.1f",
                        lettuce(plain).freshAirDays().p50(),
                        lettuce(plain).scrubDays().p50());
        assertTrue(told.get(0).contains("would gain in days: " + days), told.get(0));
        assertTrue(
                told.get(0)
                        .endsWith(
                                "at least "
                                        + Units.METRIC.figure(worth.freshAirCoolingW(), "W")
                                        + " on average."),
                told.get(0));
    }

    @Test
    void nothingIsToldWhereTheAirIsCleanOrCleanedAlready() throws IOException {
        Forecast alone = with("", LETTUCE);
        assertTrue(cleaner(alone).isEmpty(), cleaner(alone).toString());
        assertEquals(List.of(), SmallPlan.told(alone, "cleaner-air"));
        Forecast aired = with(", \"freshAirM3PerHour\": 2000", LETTUCE + APPLES);
        assertEquals(List.of(), SmallPlan.told(aired, "cleaner-air"));
    }

    @Test
    void cleanerAirNeverCostsDays() throws IOException {
        CleanerAir worth = cleaner(with("", LETTUCE + APPLES)).orElseThrow();
        for (CleanerAir.OfLot lot : worth.lots()) {
            assertTrue(lot.freshAirDays().p10() >= 0 && lot.scrubDays().p10() >= 0, lot.toString());
            assertTrue(
                    lot.freshAirDays().p50() >= lot.scrubDays().p50() - 1e-9,
                    "a whole change cleans more than four fifths of one: " + lot);
        }
    }
}

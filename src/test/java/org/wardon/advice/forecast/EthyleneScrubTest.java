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

/** A scrubber of ethylene in a chamber of apples. */
class EthyleneScrubTest {
    private static final String CHAMBER =
            "\"setting\": {\"temperatureC\": 4}, \"leakageAirChangesPerDay\": 1,"
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

    private Forecast with(String more) throws IOException {
        return new SmallPlan()
                .chamber(CHAMBER + more)
                .lots(
                        "{\"id\": \"A1\", \"commodity\": \"apple\", \"massKg\": 900,"
                                + " \"temperatureC\": 6, \"chamber\": \"north\", \"ripeness\":"
                                + " \"ripe\", \"harvested\": \"2026-03-01T08:00\"}")
                .days(4)
                .advice(book, folder)
                .forecast();
    }

    private static double ppm(Forecast forecast) {
        return forecast.chambers().get(0).ethylenePpmMax();
    }

    @Test
    void keepsEthyleneDownByWhatItCleansAndSaysSo() throws IOException {
        Forecast without = with("");
        Forecast scrubbed =
                with(", \"ethyleneScrub\": {\"airM3PerHour\": 50, \"efficiencyPct\": 60}");
        // Apples alone feel no more of it than of the exchange: 30 m3/h beside some 1.2 of leakage.
        assertTrue(ppm(scrubbed) < 0.1 * ppm(without), ppm(scrubbed) + " " + ppm(without));
        assertEquals(
                List.of(
                        "north: 30 m3/h of air cleaned of ethylene keeps it at "
                                + Units.METRIC.figure(ppm(scrubbed), "ppm")
                                + " at most; without the scrubber it would reach "
                                + Units.METRIC.figure(ppm(without), "ppm")
                                + "."),
                SmallPlan.told(scrubbed, "scrubs-ethylene"));
        assertEquals(List.of(), SmallPlan.told(without, "scrubs-ethylene"));
    }

    @Test
    void anOutageLetsItRise() throws IOException {
        String scrub = ", \"ethyleneScrub\": {\"airM3PerHour\": 50}";
        double steady = ppm(with(scrub));
        double risen =
                ppm(
                        with(
                                scrub
                                        + ", \"outages\": [{\"from\": \"2026-03-04T06:00\","
                                        + " \"hours\": 12}]"));
        assertTrue(risen > 3 * steady, steady + " rises to " + risen);
    }
}

package org.wardon.advice.forecast;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Path;
import java.time.LocalDateTime;
import java.util.List;
import java.util.OptionalDouble;
import org.junit.jupiter.api.AfterAll;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.wardon.files.forecast.ChamberForecast;
import org.wardon.produce.Reason;
import org.wardon.reference.ReferenceBook;

/** What the forecast tells of a chamber whose setting changes within the plan. */
class SettingChangesAdviceTest {
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

    private StoreAdvice advise(int watts, String changes) throws IOException {
        String chamber =
                "\"setting\": {\"temperatureC\": 12}, \"settingChanges\": ["
                        + changes
                        + "], \"cooling\": [{\"kind\": \"compressor\", \"ratedCapacityW\": "
                        + watts
                        + ", \"control\": \"modulating\"}]";
        return new SmallPlan().chamber(chamber).days(4).advice(book, folder);
    }

    private static ChamberForecast north(StoreAdvice advice) {
        return advice.forecast().chambers().get(0);
    }

    private static String change(String from, double temperatureC) {
        return "{\"from\": \"" + from + "\", \"temperatureC\": " + temperatureC + "}";
    }

    @Test
    void pullingDownAfterAChangeIsToldAndNotHeldAgainstTheChamber() throws IOException {
        StoreAdvice steady = advise(3_500, "");
        StoreAdvice advice = advise(3_500, change("2026-03-04T06:00", 5));
        assertTrue(north(advice).holds(), advice.whyNotHeld("north").toString());
        assertEquals(0, north(advice).hoursOutsideBand(), 1e-9);
        ChamberForecast.SettingChange told = north(advice).settingChanges().get(0);
        assertEquals(LocalDateTime.of(2026, 3, 4, 6, 0), told.from());
        assertEquals(5, told.temperatureC());
        assertTrue(told.reachedAfterHours().orElse(99) < 12, told.toString());
        assertEquals(1, SmallPlan.told(advice.forecast(), "setting-reached").size());
        // The load of bringing it down is no load the chamber has to be sized for.
        assertTrue(
                north(advice).peakLoadW() < 1.6 * north(steady).peakLoadW(),
                north(advice).peakLoadW() + " W, steady " + north(steady).peakLoadW() + " W");
        assertTrue(steady.forecast().chambers().get(0).settingChanges().isEmpty());
    }

    @Test
    void aSettingItCannotReachIsSaid() throws IOException {
        StoreAdvice advice = advise(500, change("2026-03-04T06:00", -5));
        assertEquals(
                OptionalDouble.empty(), north(advice).settingChanges().get(0).reachedAfterHours());
        List<Reason> why = advice.whyNotHeld("north");
        assertEquals(List.of("setting-not-reached"), why.stream().map(Reason::code).toList());
        assertEquals("2026-03-04 at 06:00", why.get(0).arguments().get(0).text());
    }

    @Test
    void aChangeShortOfTheEndIsStillOnItsWay() throws IOException {
        StoreAdvice advice = advise(500, change("2026-03-05T20:00", -5));
        assertTrue(north(advice).holds(), advice.whyNotHeld("north").toString());
        List<String> told = SmallPlan.told(advice.forecast(), "setting-still-coming");
        assertEquals(1, told.size());
        assertTrue(
                told.get(0)
                        .startsWith(
                                "north: set to -5.0 °C from 2026-03-05 at 20:00, its air is still"
                                        + " on its way 4 h later, at "),
                told.get(0));
    }

    /** Both ways of control and the pages' air follow the setting in force. */
    @Test
    void theAirIsShownBesideTheSettingInForce() throws IOException {
        StoreAdvice advice =
                advise(
                        3_500,
                        change("2026-03-03T00:00", 5) + ", " + change("2026-03-04T12:00", 14));
        ChamberAir air = advice.air("north");
        assertTrue(air.changes());
        for (int row = 0; row < 96; row++) {
            double setC = row <= 23 ? 12 : row <= 59 ? 5 : 14;
            assertEquals(setC, air.settingC(row), "hour " + row);
            assertEquals(setC + 1.5, air.warmestC(row), 1e-9);
        }
        assertTrue(Math.abs(air.airC(40) - 5) < 1.5, air.airC(40) + " °C");
        assertTrue(north(advice).balanceErrorPct() < 0.1);
    }
}

package org.wardon.files.readings;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.LocalDateTime;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.wardon.air.Weather;
import org.wardon.errors.BadInput;
import org.wardon.plan.FilledGap;
import org.wardon.plan.WeatherSource;

/** Weather on the hours of the run: straight lines between readings, short gaps filled and told. */
class WeatherCsvTest {
    private static final LocalDateTime FROM = LocalDateTime.parse("2026-03-02T00:00");
    private static final String HEAD = "time,temperatureC,humidityPct\n";

    @TempDir Path folder;

    @Test
    void hoursLieOnStraightLinesBetweenUnevenReadings() throws IOException {
        Weather weather =
                read(
                                HEAD
                                        + "2026-03-01T23:30,19,60\n2026-03-02T00:30,21,70\n"
                                        + "2026-03-02T02:00,24,64\n2026-03-02T03:15,26.5,54\n"
                                        + "2026-03-02T04:30:30,24,60\n",
                                4.0 / 24)
                        .weather();
        assertEquals(5, weather.hours());
        assertEquals(20, weather.temperatureC(0), 1e-12);
        assertEquals(22, weather.temperatureC(1), 1e-12);
        assertEquals(24, weather.temperatureC(2), 1e-12);
        assertEquals(26, weather.temperatureC(3), 1e-12);
        assertEquals(65, weather.humidityPct(0), 1e-12);
        assertTrue(Double.isNaN(weather.globalWm2(2)), "radiation is not known");
    }

    @Test
    void theRunMayStartWithinAnHour() throws IOException {
        Weather weather =
                WeatherCsv.read(
                                file(HEAD + hours(0, 30, 10)),
                                "w.csv",
                                "w.csv",
                                FROM.plusMinutes(30),
                                1)
                        .weather();
        assertEquals(25, weather.hours());
        assertEquals(0.5, weather.temperatureC(0), 1e-12);
        assertEquals(24.5, weather.temperatureC(24), 1e-12);
    }

    @Test
    void threeMissingHoursAreFilledAndTold() throws IOException {
        WeatherSource.Csv csv = read(HEAD + hours(0, 6, 10) + hours(10, 25, 10), 1);
        assertEquals(
                List.of(new FilledGap(FROM.plusHours(6), FROM.plusHours(10), "time")),
                csv.filled());
        assertEquals(8, csv.weather().temperatureC(8), 1e-12);
    }

    @Test
    void fourMissingHoursAreRefused() {
        assertRefused(
                "w.csv line 9: no reading between 2026-03-02T06:00 and 2026-03-02T11:00;"
                        + " accepted: gaps of up to 3 h",
                HEAD + hours(0, 6, 10) + hours(11, 25, 10));
    }

    @Test
    void emptyCellsAreAGapOfTheirColumnAlone() throws IOException {
        String text = HEAD + hours(0, 25, 10).replace("T05:00,5,10", "T05:00,5,");
        WeatherSource.Csv csv = read(text, 1);
        assertEquals(
                List.of(new FilledGap(FROM.plusHours(4), FROM.plusHours(6), "humidityPct")),
                csv.filled());
        assertEquals(10, csv.weather().humidityPct(5), 1e-12);
    }

    @Test
    void theLastHourOfTheLastDayMayBeMissingAndUpToThreeAreTold() throws IOException {
        assertEquals(List.of(), read(HEAD + hours(0, 23, 10), 1).filled());
        WeatherSource.Csv csv = read(HEAD + hours(0, 21, 10), 1);
        assertEquals(
                List.of(new FilledGap(FROM.plusHours(21), FROM.plusHours(24), "time")),
                csv.filled());
        assertEquals(21, csv.weather().temperatureC(24), "the last reading is held");
        assertRefused(
                "w.csv line 21: the readings end at 2026-03-02T19:00, before the plan; accepted:"
                        + " readings from 2026-03-02T00:00 to 2026-03-03T00:00",
                HEAD + hours(0, 19, 10));
    }

    @Test
    void everyThirdHourIsAnEvenStepAndNoGap() throws IOException {
        StringBuilder text = new StringBuilder(HEAD);
        for (int h = 0; h <= 24; h += 3) {
            text.append(FROM.plusHours(h)).append(",").append(h).append(",50\n");
        }
        WeatherSource.Csv csv = read(text.toString(), 1);
        assertEquals(List.of(), csv.filled());
        assertEquals(7, csv.weather().temperatureC(7), 1e-12);
    }

    @Test
    void darknessIsNoNegativeSunAndAnEmptyColumnIsNotKnown() throws IOException {
        StringBuilder text = new StringBuilder("time,temperatureC,humidityPct,globalWm2,windMs\n");
        for (int h = 0; h <= 24; h++) {
            text.append(FROM.plusHours(h)).append(",20,50,").append(h < 6 ? -2 : 300).append(",\n");
        }
        Weather weather = read(text.toString(), 1).weather();
        assertEquals(0, weather.globalWm2(3));
        assertEquals(300, weather.globalWm2(12));
        assertTrue(Double.isNaN(weather.windMs(12)));
    }

    @Test
    void gapsOutsideTheRunDoNotMatter() throws IOException {
        String before = "2026-02-20T00:00,20,50\n2026-02-25T00:00,20,50\n";
        assertEquals(
                List.of(),
                read(HEAD + before + "2026-03-01T23:00,20,50\n" + hours(0, 30, 10), 1).filled());
    }

    @Test
    void aYearOfMinutesIsRead() throws IOException {
        StringBuilder text = new StringBuilder(HEAD);
        for (int m = 0; m <= 365 * 24 * 60; m++) {
            text.append(FROM.plusMinutes(m)).append(",20.25,50\n");
        }
        Weather weather = read(text.toString(), 365).weather();
        assertEquals(365 * 24 + 1, weather.hours());
        assertEquals(20.25, weather.temperatureC(8000));
    }

    private static String hours(int first, int last, int humidityPct) {
        StringBuilder text = new StringBuilder();
        for (int h = first; h <= last; h++) {
            text.append(FROM.plusHours(h)).append(",").append(h).append(",");
            text.append(humidityPct).append("\n");
        }
        return text.toString();
    }

    private Path file(String text) throws IOException {
        return Files.writeString(folder.resolve("w.csv"), text);
    }

    private WeatherSource.Csv read(String text, double days) throws IOException {
        return WeatherCsv.read(file(text), "w.csv", "w.csv", FROM, days);
    }

    private void assertRefused(String message, String text) {
        BadInput bad = assertThrows(BadInput.class, () -> read(text, 1));
        assertEquals(message, bad.getMessage());
    }
}

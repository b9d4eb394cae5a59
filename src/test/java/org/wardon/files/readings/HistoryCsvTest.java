package org.wardon.files.readings;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.LocalDateTime;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.wardon.advice.wording.Units;
import org.wardon.advice.wording.Words;
import org.wardon.errors.BadInput;
import org.wardon.plan.FilledGap;

/** The logged history of a lot. */
class HistoryCsvTest {
    @TempDir Path folder;

    @Test
    void readsUnevenStepsAndHumidityAndTellsGaps() throws IOException {
        LoggedHistory logged =
                read(
                        "time,temperatureC,humidityPct\n2026-03-02T06:00,31,60\n"
                                + "2026-03-02T07:10,28.5,\n2026-03-02T08:00,20,80\n"
                                + "2026-03-02T12:30,12,90\n");
        assertEquals(LocalDateTime.parse("2026-03-02T06:00"), logged.from());
        assertEquals(4, logged.history().size());
        assertEquals(4_200, logged.history().timeS(1));
        assertEquals(28.5, logged.history().meanC(1));
        assertEquals(28.5, logged.history().coldestC(1));
        assertEquals((60 + 20 * 70.0 / 120) / 100, logged.history().humidityFraction(1), 1e-12);
        assertEquals(0.03, logged.history().ethylenePpm(2));
        assertFalse(logged.history().knowsMass());
        assertTrue(logged.humidityKnown());
        assertEquals(
                List.of(
                        new FilledGap(
                                LocalDateTime.parse("2026-03-02T08:00"),
                                LocalDateTime.parse("2026-03-02T12:30"),
                                "time")),
                logged.gaps());
    }

    @Test
    void readsFahrenheitAndPutsInTheHumidityGiven() throws IOException {
        LoggedHistory logged =
                read("time,temperatureF\n2026-03-02T06:00,86\n2026-03-02T07:00,50\n");
        assertEquals(30, logged.history().meanC(0), 1e-12);
        assertEquals(10, logged.history().meanC(1), 1e-12);
        assertEquals(0.9, logged.history().humidityFraction(0));
        assertFalse(logged.humidityKnown());
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            value = {
                "time,temperatureC,temperatureF;2026-03-02T06:00,10,50 | h.csv line 1: temperatureC"
                        + " and temperatureF both stand there; accepted: time,temperatureC or"
                        + " time,temperatureF, and humidityPct where known",
                "time,humidityPct;2026-03-02T06:00,80 | h.csv line 1: no temperature; accepted:"
                        + " time,temperatureC or time,temperatureF, and humidityPct where known",
                "time,temperatureC;2026-03-02T06:00,10 | h.csv: there are 1 readings of"
                        + " temperature; accepted: at least 2",
                "time,temperatureC;2026-03-02T06:00,86;2026-03-02T07:00,50 | h.csv line 2, column"
                        + " temperatureC: is 86 °C; accepted: a number from -40 to 70 °C",
                "time,temperature;2026-03-02T06:00,10 | h.csv line 1, column temperature: it says"
                        + " neither °C nor °F; accepted: a name such as temperatureC, temperatureF"
                        + " or Temp (°C)",
                "time,probe °C,air °C;2026-03-02T06:00,10,9 | h.csv line 1: several columns are"
                        + " temperatures: 'probe °c', 'air °c'; accepted: one; keep that of the"
                        + " probe in the produce",
                "time,temperatureC;03/04/2026 06:00,10;03/04/2026 07:00,10 | h.csv line 2, column"
                        + " time: '03/04/2026 06:00' may be day/month or month/day, and no other"
                        + " line tells; accepted: the year first, such as 2026-03-02T15:00, or dots"
                        + " for day.month.year",
                "time,temperatureC;30/02/2026 06:00,10;01/03/2026 07:00,10 | h.csv line 2, column"
                        + " time: no day of the calendar; accepted: a day and a time such as"
                        + " 2026-03-02T15:00",
                "time,temperatureC;2026-03-02T06:00Z,10;2026-03-02T07:00,10 | h.csv line 3, column"
                        + " time: some times carry an offset from UTC, some do not; accepted: all"
                        + " with an offset, or none",
                "time,temperatureC;noon,10 | h.csv line 2, column time: is 'noon'; accepted: a day"
                        + " and a time such as 2026-03-02T15:00 or 02.03.2026 15:00",
                "time,temperatureC;2026-03-02T06:00,warm | h.csv line 2, column temperatureC: is"
                        + " 'warm'; accepted: a number from -40 to 70 °C; an empty cell for no"
                        + " reading",
                "time,temperatureC;2026-03-02T06:00,12,5 | h.csv line 2: cells: 3, in the line of"
                        + " names: 2; accepted: a cell a column; with a decimal comma semicolons"
                        + " between cells"
            })
    void refusesInWords(String text, String message) {
        BadInput bad = assertThrows(BadInput.class, () -> read(text.replace(';', '\n')));
        assertEquals(message, bad.getMessage());
    }

    @Test
    void refusesAMissingFile() {
        BadInput bad =
                assertThrows(
                        BadInput.class,
                        () -> HistoryCsv.read(folder.resolve("none.csv"), "none.csv", 0.9, 0));
        assertEquals(
                "none.csv: the file does not exist; accepted: a file that can be read",
                bad.getMessage());
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            value = {
                "Time;Celsius(°C);2026-03-02 06:00;12,5;2026-03-02 07:00;13,5",
                "Date;Time;Temp (°C);02.03.2026;06:00;12,5;02.03.2026;07:00;13,5",
                "Zeit;Temperatur °C;02.03.26 06:00:00;12,5;02.03.26 07:00:00;13,5"
            })
    void readsDecimalCommasAndOtherWords(String text) throws IOException {
        int columns = text.startsWith("Date") ? 3 : 2;
        StringBuilder file = new StringBuilder("\uFEFFSerial 17\n\n");
        String[] cells = text.strip().split(";", -1);
        for (int i = 0; i < cells.length; i++) {
            file.append(cells[i]).append(i % columns == columns - 1 ? "\r\n" : ";");
        }
        LoggedHistory logged = read(file.toString());
        assertEquals(LocalDateTime.parse("2026-03-02T06:00"), logged.from());
        assertEquals(3_600, logged.history().timeS(1));
        assertEquals(12.5, logged.history().meanC(0));
        assertEquals(13.5, logged.history().meanC(1));
        assertEquals(List.of(), told(logged));
    }

    @Test
    void readsTabsFahrenheitHalvesOfTheDayAndMonthFirst() throws IOException {
        LoggedHistory logged =
                read(
                        "Date/Time\tTemperature (°F)\tRH %\tDew Point (°F)\n"
                                + "3/2/2026 11:30 PM\t50\t90\t40\n3/13/2026 12:30 AM\t50\t90\t40\n");
        assertEquals(LocalDateTime.parse("2026-03-02T23:30"), logged.from());
        assertEquals(10, logged.history().meanC(1), 1e-12);
        assertTrue(logged.humidityKnown());
        assertEquals(10 * 86_400 + 3_600, logged.history().timeS(1));
        assertEquals(List.of("Columns not used: dew point (°f)."), told(logged));
    }

    @Test
    void daysThatFollowEachOtherTellTheOrderOfDayAndMonth() throws IOException {
        StringBuilder csv = new StringBuilder("time,temperatureC\n");
        for (int day = 1; day <= 9; day++) {
            csv.append("0" + day + "/03/2026 00:00,10\n0" + day + "/03/2026 12:00,11\n");
        }
        LoggedHistory logged = read(csv.toString());
        assertEquals(LocalDateTime.parse("2026-03-01T00:00"), logged.from());
        assertEquals(
                List.of(
                        "The file does not say whether days or months come first; days first is"
                                + " taken, as its days then follow each other."),
                told(logged));
    }

    @Test
    void ordersMergesAndLeavesOutSpikesAndSaysSo() throws IOException {
        LoggedHistory logged =
                read(
                        "time,temperatureC\n2026-03-02T06:00,10\n2026-03-02T08:00,10.4\n"
                                + "2026-03-02T07:00,10.2\n2026-03-02T07:00,10.4\n"
                                + "2026-03-02T08:30,-38\n2026-03-02T09:00,10.5\n"
                                + "2026-03-02T09:30,--\n2026-03-02T10:00,10.5\n");
        assertEquals(5, logged.history().size());
        assertEquals(10.3, logged.history().meanC(1), 1e-12);
        assertEquals(
                List.of(
                        "Lines without a reading of temperature: 1; they are left out.",
                        "Some lines were out of order; they are sorted by time.",
                        "Times that stand there again: 1; they count once, at the mean of their"
                                + " figures.",
                        "Single readings more than 10 K off both neighbours: 1; they are left out"
                                + " as faults of the sensor."),
                told(logged));
    }

    @Test
    void aClockSetBackAndAStuckSensorAreTold() throws IOException {
        StringBuilder csv = new StringBuilder("time,temperatureC\n");
        LocalDateTime start = LocalDateTime.parse("2026-10-24T00:00");
        for (int half = 0; half < 120; half++) {
            LocalDateTime at = start.plusMinutes(30L * half);
            LocalDateTime shown = half < 54 ? at : at.minusHours(1);
            csv.append(shown).append(',').append(half < 60 ? 10 + half : 12.5).append('\n');
        }
        LoggedHistory logged = read(csv.toString().replace(",69", ",68"));
        assertEquals(119 * 1_800, logged.history().timeS(119));
        assertEquals(
                List.of(
                        "The clock was set back by an hour at 2026-10-25T02:00; what follows is"
                                + " taken an hour later.",
                        "The same 12.5 °C to the digit for 30 h from 2026-10-25T06:00 on. Look"
                                + " whether the sensor is stuck or the logger rounds coarsely; it"
                                + " counts as read."),
                told(logged));
    }

    @Test
    void offsetsAreTakenInThatOfTheFirstReading() throws IOException {
        LoggedHistory logged =
                read("time,temperatureC\n2026-03-29T01:00+01:00,10\n2026-03-29T03:00+02:00,10\n");
        assertEquals(3_600 - 0, logged.history().timeS(1));
        assertEquals(
                List.of(
                        "The times change their offset from UTC on the way; all are taken in that"
                                + " of the first reading."),
                told(logged));
    }

    @Test
    void aLongGapIsBoundedByItsNeighboursAndTold() throws IOException {
        LoggedHistory logged =
                read(
                        "time,temperatureC\n2026-03-02T06:00,10\n2026-03-02T07:00,10\n"
                                + "2026-03-02T09:00,10.5\n2026-03-02T10:00,10\n"
                                + "2026-03-03T10:00,20\n2026-03-03T11:00,20\n");
        LoggedHistory.Bounds bounds = logged.bounds().orElseThrow();
        assertEquals(10, bounds.colder().meanC(5));
        assertEquals(20, bounds.warmer().meanC(4));
        assertEquals(
                List.of(
                        "No reading for 24 h from 2026-03-02T10:00 on. A straight line is taken; the"
                                + " range also holds for 10.0 °C and for 20.0 °C all that time."
                                + " Nobody knows what it was in between.",
                        "Gaps of up to 3 h between readings: 1; filled by straight lines."),
                told(logged));
    }

    @Test
    void aHundredThousandReadingsAreTakenInMeansThatKeepTheirHeatAndFrost() throws IOException {
        StringBuilder csv = new StringBuilder("time,temperatureC\n");
        LocalDateTime start = LocalDateTime.parse("2026-03-02T00:00");
        double sum = 0;
        for (int minute = 0; minute < 100_000; minute++) {
            double c = minute == 50_000 ? 1 : 10 + 2 * Math.sin(minute / 300.0);
            sum += c;
            csv.append(start.plusMinutes(minute)).append(',').append(c).append('\n');
        }
        LoggedHistory logged = read(csv.toString());
        assertTrue(logged.history().size() < 3_200, "samples " + logged.history().size());
        double mean = 0;
        double coldest = 99;
        for (int i = 1; i < logged.history().size(); i++) {
            double width = logged.history().timeS(i) - logged.history().timeS(i - 1);
            mean += 0.5 * width * (logged.history().meanC(i) + logged.history().meanC(i - 1));
            coldest = Math.min(coldest, logged.history().coldestC(i));
        }
        assertEquals(sum / 100_000, mean / (99_999 * 60.0), 1e-3);
        assertEquals(1, coldest);
    }

    private static List<String> told(LoggedHistory logged) {
        Words words = Words.english(Units.METRIC);
        return logged.notes().stream().map(words::sentence).toList();
    }

    private LoggedHistory read(String text) throws IOException {
        Path file = Files.writeString(folder.resolve("h.csv"), text);
        return HistoryCsv.read(file, "h.csv", 0.9, 0.03);
    }
}

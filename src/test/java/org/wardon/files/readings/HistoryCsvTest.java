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
                "time,temperature;2026-03-02T06:00,10 | h.csv line 1, column temperature: is not a"
                        + " column known here; did you mean 'temperatureC'? accepted: time,"
                        + " temperatureC, temperatureF, humidityPct"
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

    private LoggedHistory read(String text) throws IOException {
        Path file = Files.writeString(folder.resolve("h.csv"), text);
        return HistoryCsv.read(file, "h.csv", 0.9, 0.03);
    }
}

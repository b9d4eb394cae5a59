package org.wardon.files.forecast;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.LocalDateTime;
import java.time.ZoneId;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.function.IntToDoubleFunction;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.wardon.air.Timeline;

/** Series have the fixed names and columns. */
class SeriesWriterTest {
    private static final double[] TIMES = {0, 3_600, 7_200};

    @TempDir Path folder;

    private SeriesWriter writer() {
        return new SeriesWriter(
                folder.resolve("a/b"),
                new Timeline(LocalDateTime.parse("2026-03-02T00:00"), ZoneId.of("UTC")));
    }

    @Test
    void aLotHasItsColumns() throws IOException {
        writer().lot("M1", TIMES, columns(SeriesWriter.LOT));
        assertEquals(
                "time,meanC,surfaceC,coreC,respirationW,massKg,lifeUsedPct\n"
                        + "2026-03-02T00:00,0,100,200,300,400,500\n"
                        + "2026-03-02T01:00,0.333333,100.333,200.333,300.333,400.333,500.333\n"
                        + "2026-03-02T02:00,,,,,,\n",
                Files.readString(folder.resolve("a/b/lot-M1.csv")));
    }

    @Test
    void aChamberHasItsColumnsAndThoseOfItsCoolers() throws IOException {
        writer().chamber("north", TIMES, columns(SeriesWriter.CHAMBER));
        Map<String, IntToDoubleFunction> film = columns(SeriesWriter.CHAMBER);
        film.put("waterOutC", row -> 4);
        film.put(SeriesWriter.running(1), row -> 40);
        film.put(SeriesWriter.running(0), row -> 100);
        film.put("waterUsedKg", row -> 3);
        writer().chamber("south", TIMES, film);
        assertEquals(
                "time,airC,humidityPct,outdoorC,coolingW,powerW,co2Ppm,ethylenePpm",
                Files.readAllLines(folder.resolve("a/b/chamber-north.csv")).get(0));
        assertEquals(
                "time,airC,humidityPct,outdoorC,coolingW,powerW,co2Ppm,ethylenePpm,waterOutC,"
                        + "waterUsedKg,running1Pct,running2Pct",
                Files.readAllLines(folder.resolve("a/b/chamber-south.csv")).get(0));
    }

    @Test
    void aMissingColumnIsAProgrammersMistake() {
        Map<String, IntToDoubleFunction> columns = columns(SeriesWriter.LOT);
        columns.remove("massKg");
        assertThrows(IllegalArgumentException.class, () -> writer().lot("M1", TIMES, columns));
    }

    private static Map<String, IntToDoubleFunction> columns(List<String> names) {
        Map<String, IntToDoubleFunction> columns = new HashMap<>();
        for (int i = 0; i < names.size(); i++) {
            double start = 100.0 * i;
            columns.put(names.get(i), row -> row == 2 ? Double.NaN : start + row / 3.0);
        }
        return columns;
    }
}

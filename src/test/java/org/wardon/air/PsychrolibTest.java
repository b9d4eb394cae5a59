package org.wardon.air;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;
import org.wardon.Source;

/** Moist air against frozen answers of a library that works from the same equations. */
@Source("psychrolib 1.1.1 (npm), after ASHRAE Handbook - Fundamentals, 2017, chapter 1")
class PsychrolibTest {
    /** Nine printed digits. */
    private static final double ROUNDING = 1e-8;

    /** The library stops its searches for dew point and wet bulb at 0.001 K. */
    private static final double SEARCH_K = 0.001;

    private static List<double[]> rows;

    @BeforeAll
    static void read() throws IOException {
        rows =
                Files.readAllLines(Path.of("src/test/resources/published/psychrolib-1.1.1.csv"))
                        .stream()
                        .filter(line -> !line.startsWith("#") && !line.startsWith("e"))
                        .map(
                                line ->
                                        List.of(line.split(",")).stream()
                                                .mapToDouble(Double::parseDouble)
                                                .toArray())
                        .toList();
        assertEquals(4 * 29 * 11, rows.size());
    }

    private static void near(double expected, double found, String what) {
        assertEquals(expected, found, ROUNDING * Math.max(1e-3, Math.abs(expected)), what);
    }

    @Test
    void pressureOfEachHeight() {
        for (double[] r : rows) {
            near(r[1], StandardAtmosphere.pressurePa(r[0]), "height " + r[0]);
        }
    }

    @Test
    void saturationHumidityRatioEnthalpyAndVolume() {
        for (double[] r : rows) {
            String what = r[2] + " °C, " + r[3] + ", " + r[1] + " Pa";
            near(r[4], SaturatedAir.pressurePa(r[2]), what);
            double w = MoistAir.humidityRatioAt(r[2], r[3], r[1]);
            near(r[5], w, what);
            assertEquals(r[6], MoistAir.enthalpyJkg(r[2], w), 1e-3, what);
            near(r[7], MoistAir.specificVolumeM3kg(r[2], w, r[1]), what);
        }
    }

    @Test
    void dewPoint() {
        for (double[] r : rows) {
            String what = r[2] + " °C, " + r[3] + ", " + r[1] + " Pa";
            assertEquals(r[9], MoistAir.dewPointC(r[5], r[1]), SEARCH_K, what);
        }
    }

    @Test
    void wetBulb() {
        int twoAnswers = 0;
        for (double[] r : rows) {
            String what = r[2] + " °C, " + r[3] + ", " + r[1] + " Pa";
            double wetBulb = WetBulb.temperatureC(r[2], r[5], r[1]);
            if (r[8] < 0 && wetBulb >= 0) {
                // Water just above 0 °C and ice just below can both saturate this air; the library
                // searches downwards across the gap, we take the water. Both must satisfy the law.
                twoAnswers++;
                assertEquals(r[5], WetBulb.humidityRatio(r[2], wetBulb, r[1]), 1e-9, what);
                assertTrue(wetBulb < 0.7, what);
            } else {
                assertEquals(r[8], wetBulb, SEARCH_K, what);
            }
        }
        assertTrue(twoAnswers < 0.01 * rows.size(), "two answers in " + twoAnswers);
    }
}

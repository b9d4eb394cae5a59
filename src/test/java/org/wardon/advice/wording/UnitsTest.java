package org.wardon.advice.wording;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** Figures as a person reads them. */
class UnitsTest {
    private static final Units AMERICAN = new Units(true, true);

    @ParameterizedTest(name = "{0} {1} -> {2} or {3}")
    @CsvSource({
        "13, C, 13.0 °C, 55 °F",
        "-0.9, C, -0.9 °C, 30 °F",
        "0, C, 0.0 °C, 32 °F",
        "2, K, 2.0 K, 4 °F",
        "800, kg, 800 kg, 1 764 lb",
        "12345, kg, 12 345 kg, 27 216 lb",
        "1.2, per kg, 1.20 a kilogram, 0.54 a pound",
        "170, m3/h, 170 m3/h, 100 ft3/min",
        "115, g/m2, 115 g/m2, 0.38 oz/ft2",
        "1, day, 1 day, 1 day",
        "0.96, day, 1 day, 1 day",
        "7.5, day, 7.5 days, 7.5 days",
        "9.97, day, 10 days, 10 days",
        "124.6, day, 125 days, 125 days",
        "3, h, 3 h, 3 h",
        "0, pct, 0 %, 0 %",
        "-0.01, pct, 0 %, 0 %",
        "4.24, pct, 4.2 %, 4.2 %",
        "950, W, 950 W, 950 W",
        "5900, W, 5.9 kW, 5.9 kW",
        "0.326, ppm, 0.33 ppm, 0.33 ppm",
        "27912, ppm, 27 912 ppm, 27 912 ppm",
        "0, ppm, 0 ppm, 0 ppm",
        "0.8, m, 0.80 m, 2.6 ft",
        "0.35, 1, 0.35, 0.35",
        "5, 1, 5, 5"
    })
    void aFigureIsTold(double value, String unit, String metric, String american) {
        assertEquals(metric, Units.METRIC.figure(value, unit));
        assertEquals(american, AMERICAN.figure(value, unit));
    }

    @Test
    void aUnitWithoutWordsIsRefused() {
        IllegalArgumentException refused =
                assertThrows(
                        IllegalArgumentException.class, () -> Units.METRIC.figure(1, "furlong"));
        assertEquals("no words for the unit 'furlong'", refused.getMessage());
    }

    @ParameterizedTest(name = "{0} °C -> {1} or {2}")
    @CsvSource({"9.84, 9.8, 50", "-0.04, 0.0, 32", "-17.9, -17.9, 0", "100, 100.0, 212"})
    void degreesStandWithoutTheirUnit(double temperatureC, String metric, String american) {
        assertEquals(metric, Units.METRIC.degrees(temperatureC));
        assertEquals(american, AMERICAN.degrees(temperatureC));
    }
}

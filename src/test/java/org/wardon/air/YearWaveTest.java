package org.wardon.air;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.time.LocalDateTime;
import java.time.ZoneId;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import org.wardon.Source;
import org.wardon.enclosure.GroundFloor;

/** The year as one wave, and how much of it comes through the ground. */
class YearWaveTest {
    private static final ZoneId UTC = ZoneId.of("UTC");

    @Test
    void aWaveIsFoundBackFromItsMonths() {
        YearWave wave = new YearWave(9.5, 11, 30);
        List<Double> months = new ArrayList<>();
        for (int m = 0; m < 12; m++) {
            months.add(wave.temperatureC((m + 0.5) * YearWave.YEAR_DAYS / 12, 1, 0));
        }
        YearWave found = YearWave.ofMonths(months);
        assertEquals(9.5, found.meanC(), 1e-9);
        assertEquals(11, found.swingK(), 1e-9);
        assertEquals(30, found.warmestDay(), 1e-6);
    }

    @Test
    void aRunOfAYearTellsItAndAShorterOneDoesNot() {
        YearWave wave = new YearWave(15, 8, 205);
        Timeline timeline = new Timeline(LocalDateTime.of(2026, 5, 1, 0, 0), UTC);
        int n = 24 * 366;
        double[] t = new double[n];
        double[] rest = new double[n];
        for (int h = 0; h < n; h++) {
            double daily = 5 * Math.cos(2 * Math.PI * (h - 15) / 24);
            t[h] = wave.temperatureC(timeline.dayOfYear(h * 3600.0), 1, 0) + daily;
        }
        YearWave found = YearWave.of(new Weather(t, rest, rest, rest), timeline).orElseThrow();
        assertEquals(15, found.meanC(), 0.05);
        assertEquals(8, found.swingK(), 0.1);
        assertEquals(205, found.warmestDay(), 1);
        assertEquals(Optional.empty(), YearWave.of(Weather.steady(20, 50), timeline));
    }

    @Test
    void theWarmestDayFollowsTheLongestInEitherHemisphere() {
        assertEquals(202, YearWave.usualWarmestDay(47));
        assertEquals(20, YearWave.usualWarmestDay(-34));
    }

    @Test
    @Source("ISO 13370:2017, periodic heat flow of a slab on ground, from memory")
    void theSwingBelowALargeFloorIsThePeriodicCoefficientByHand() {
        // 10 m by 10 m, bare: B' = 5 m, dt = 0.3 + 2 x 0.21 = 0.72 m, reach 3.17 m in sand;
        // U = 4/(15.708 + 0.72) x ln(15.708/0.72 + 1) = 0.762; Hpe = 0.37 x 40 x 2 x ln(5.40) =
        // 49.9.
        GroundFloor floor = new GroundFloor(100, 40, 0.3, GroundFloor.Soil.SAND_OR_GRAVEL);
        assertEquals(49.9 / 76.2, floor.swingShare(0, 0.17), 0.01);
        GroundFloor small = new GroundFloor(12, 14, 0.08, GroundFloor.Soil.SAND_OR_GRAVEL);
        assertTrue(small.swingShare(3.3, 0.17) <= 1);
        assertTrue(floor.swingShare(0, 0.17) < small.swingShare(0, 0.17), "small floors feel more");
    }
}

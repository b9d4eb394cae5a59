package org.wardon.air;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.SplittableRandom;
import org.junit.jupiter.api.RepeatedTest;
import org.junit.jupiter.api.RepetitionInfo;
import org.junit.jupiter.api.Test;

/** What must hold of moist air whatever its state: inverses, order, slopes. */
class MoistAirTest {
    @RepeatedTest(20)
    void inversesOrderAndSlopesHoldAtRandomStates(RepetitionInfo info) {
        SplittableRandom random = new SplittableRandom(1_000 + info.getCurrentRepetition());
        for (int i = 0; i < 50; i++) {
            double p = StandardAtmosphere.pressurePa(random.nextDouble(-400, 4_000));
            double t = random.nextDouble(-30, 55);
            double rh = random.nextDouble(0.05, 1);
            double w = MoistAir.humidityRatioAt(t, rh, p);
            String what = t + " °C, " + rh + ", " + p + " Pa";
            assertEquals(rh, MoistAir.humidityFraction(t, w, p), 1e-12, what);
            assertEquals(w, MoistAir.humidityRatio(MoistAir.vapourPressurePa(w, p), p), 1e-15);
            assertEquals(t, MoistAir.temperatureC(MoistAir.enthalpyJkg(t, w), w), 1e-9, what);
            double wet = WetBulb.temperatureC(t, w, p);
            assertEquals(w, WetBulb.humidityRatio(t, wet, p), 1e-9, what);
            double dew = MoistAir.dewPointC(w, p);
            assertTrue(dew <= wet + 1e-6 && wet <= t + 1e-6, dew + " " + wet + " " + what);
        }
    }

    @Test
    void dewPointUndoesSaturation() {
        for (double t = -60; t <= 60; t += 0.25) {
            // Ice and water disagree by 3e-6 of the pressure at the triple point.
            assertEquals(t, SaturatedAir.temperatureC(SaturatedAir.pressurePa(t)), 1e-4);
        }
    }

    @Test
    void slopeIsTheDerivative() {
        for (double t = -59.5; t < 60; t += 1) {
            double h = 1e-3;
            double difference =
                    (SaturatedAir.pressurePa(t + h) - SaturatedAir.pressurePa(t - h)) / (2 * h);
            assertEquals(difference, SaturatedAir.slopePaPerK(t), 1e-6 * difference, "at " + t);
        }
    }

    @Test
    void saturatedAirIsItsOwnWetBulbAndDewPoint() {
        for (double t = -40; t <= 55; t += 2.5) {
            double w = MoistAir.saturatedHumidityRatio(t, 101_325);
            assertEquals(t, WetBulb.temperatureC(t, w, 101_325), 1e-6);
            assertEquals(t, MoistAir.dewPointC(w, 101_325), 1e-4);
        }
    }

    @Test
    void supercooledWaterIsAboveIce() {
        for (double t = -40; t < 0; t += 1) {
            assertTrue(SaturatedAir.overWaterPa(t) > SaturatedAir.overIcePa(t));
        }
        assertEquals(SaturatedAir.overWaterPa(0.01), SaturatedAir.overIcePa(0.01), 0.01);
    }

    @Test
    void refusesWhatLiesOutsideTheFormulas() {
        String message =
                assertThrows(IllegalArgumentException.class, () -> SaturatedAir.pressurePa(60.5))
                        .getMessage();
        assertEquals(
                "temperatureC is 60.5 °C; accepted is -60.0 to 60.0 °C. The formulas of moist air"
                        + " are used between -60 and 60 °C.",
                message);
        assertThrows(IllegalArgumentException.class, () -> SaturatedAir.pressurePa(Double.NaN));
        assertThrows(IllegalArgumentException.class, () -> SaturatedAir.overIcePa(1));
        assertThrows(IllegalArgumentException.class, () -> MoistAir.humidityRatioAt(20, 55, 1e5));
        assertThrows(IllegalArgumentException.class, () -> MoistAir.dewPointC(0, 1e5));
        assertThrows(IllegalArgumentException.class, () -> StandardAtmosphere.pressurePa(12_000));
    }
}

package org.wardon.heat.network;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/** Saturation beyond the range of its formulas, where a refused step may ask. */
class SaturationTest {
    @ParameterizedTest
    @ValueSource(doubles = {-134, -80, -59, -10, 0, 30, 59, 75, 200})
    void slopesAreThoseOfTheCurvesOnBothSidesOfTheRange(double t) {
        double h = 1e-3;
        double overWater = Saturation.overWaterPa(t + h) - Saturation.overWaterPa(t - h);
        double overIce = Saturation.pressurePa(t + h) - Saturation.pressurePa(t - h);
        double scale = Math.abs(Saturation.slopePaPerK(t)) + 1e-3;
        assertEquals(overWater / (2 * h), Saturation.overWaterSlopePaPerK(t), 1e-4 * scale);
        assertEquals(overIce / (2 * h), Saturation.slopePaPerK(t), 1e-4 * scale);
    }

    @ParameterizedTest
    @ValueSource(doubles = {Double.NaN, Double.POSITIVE_INFINITY})
    void whatIsNoNumberIsPassedOn(double t) {
        assertTrue(!Double.isFinite(Saturation.overWaterPa(t)));
        assertTrue(Double.isNaN(t) == Double.isNaN(Saturation.overWaterSlopePaPerK(t)));
    }
}

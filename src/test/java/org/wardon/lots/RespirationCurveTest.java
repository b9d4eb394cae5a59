package org.wardon.lots;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import org.junit.jupiter.api.Test;
import org.wardon.Source;
import org.wardon.produce.Commodity;
import org.wardon.produce.Ripeness;

/** The curve goes through print, goes on by the handbook's Q10, and never jumps. */
class RespirationCurveTest {
    private static final ClassValues CLASSES = ClassValues.of(List.of(Crops.apple()));

    private static RespirationCurve curve(Commodity.Breath breath, Ripeness ripe, double share) {
        Commodity crop = Crops.of("x", "fruit", Crops.apple().body(), breath, List.of());
        return Respirations.of(crop, ripe, CLASSES, share).value();
    }

    private static final Commodity.Breath TABLE =
            Crops.breath(
                    Crops.row(5, "not-stated", 10, 20),
                    Crops.row(15, "not-stated", 30, 45),
                    Crops.row(20, "not-stated", 60, 60));

    @Test
    void goesThroughThePrintedRates() {
        RespirationCurve low = curve(TABLE, Ripeness.UNKNOWN, 0);
        RespirationCurve middle = curve(TABLE, Ripeness.UNKNOWN, 0.5);
        assertEquals(0.010, low.wattsPerKg(5), 1e-15);
        assertEquals(0.030, low.wattsPerKg(15), 1e-15);
        assertEquals(Math.sqrt(30 * 45) / 1000, middle.wattsPerKg(15), 1e-12);
        assertEquals(Math.sqrt(0.010 * 0.030), low.wattsPerKg(10), 1e-12);
        assertEquals(0.045, middle.fresh().wattsPerKg(15), 1e-15);
    }

    @Source("USDA Agriculture Handbook 66, table 20.3: Q10 3.0 below 10 °C, 2.0 from 20 to 30")
    @Test
    void goesOnByTheHandbookOutsideThePrintedTemperatures() {
        RespirationCurve low = curve(TABLE, Ripeness.UNKNOWN, 0);
        assertEquals(0.010 / Math.sqrt(3), low.wattsPerKg(0), 1e-12);
        assertEquals(low.wattsPerKg(0), low.wattsPerKg(-5), 0);
        assertEquals(0.120, low.wattsPerKg(30), 1e-12);
        assertEquals(0.120 * Math.pow(1.5, 0.8), low.wattsPerKg(38), 1e-12);
        assertEquals(low.wattsPerKg(38), low.wattsPerKg(44), 1e-15);
    }

    @Test
    void tissueKilledByHeatStopsBreathing() {
        RespirationCurve curve = curve(TABLE, Ripeness.UNKNOWN, 0.5);
        assertEquals(curve.wattsPerKg(44) * Math.exp(-7), curve.wattsPerKg(50), 1e-12);
        assertEquals(curve.wattsPerKg(50), curve.wattsPerKg(60), 0);
    }

    @Test
    void neverJumpsNeverFallsAndItsSlopeIsItsDifference() {
        RespirationCurve curve = curve(TABLE, Ripeness.UNKNOWN, 0.3);
        double last = curve.wattsPerKg(-5);
        for (int n = -4999; n <= 44_000; n++) {
            double c = n / 1000.0;
            double now = curve.wattsPerKg(c);
            assertTrue(now >= last && now < last * 1.001, "jump or fall at " + c);
            last = now;
        }
        for (double c : new double[] {-3, 0.5, 7, 12, 17, 27, 33, 41, 47, 55}) {
            double difference = (curve.wattsPerKg(c + 1e-5) - curve.wattsPerKg(c - 1e-5)) / 2e-5;
            assertEquals(difference, curve.slopeWattsPerKgK(c), 1e-7 * curve.wattsPerKg(c));
        }
    }

    @Test
    void takesTheRowsOfTheState() {
        Commodity.Breath both =
                Crops.breath(
                        Crops.row(15, "green", 20, 30),
                        Crops.row(15, "ripe", 80, 90),
                        Crops.row(15, "uncured", 500, 500));
        assertEquals(0.020, curve(both, Ripeness.GREEN, 0).wattsPerKg(15), 1e-12);
        assertEquals(0.080, curve(both, Ripeness.RIPE, 0).wattsPerKg(15), 1e-12);
        assertEquals(0.080, curve(both, Ripeness.TURNING, 0).wattsPerKg(15), 1e-12);
        assertEquals(0.020, curve(both, Ripeness.UNKNOWN, 0).wattsPerKg(15), 1e-12);
        assertEquals(0.090, curve(both, Ripeness.UNKNOWN, 1).wattsPerKg(15), 1e-12);
        Commodity crop = Crops.of("x", "root", Crops.apple().body(), both, List.of());
        double uncured = Respirations.uncured(crop, 0.5).orElseThrow().value().wattsPerKg(15);
        assertEquals(0.500, uncured, 1e-12);
        assertTrue(Respirations.uncured(Crops.apple(), 0.5).isEmpty());
    }

    @Source("Becker, Misra and Fricke 1996, apple: 97.338 W/t at 20 °C")
    @Test
    void takesThePowerLawOnlyWithoutATable() {
        RespirationCurve power = curve(Crops.power(0.00056871, 2.5977), Ripeness.UNKNOWN, 0.5);
        assertEquals(0.097338, power.wattsPerKg(20), 1e-6);
        Commodity.Breath both =
                new Commodity.Breath(TABLE.respiration(), Crops.power(1, 2).powers(), List.of());
        assertEquals(0.010, curve(both, Ripeness.UNKNOWN, 0).wattsPerKg(5), 1e-12);
    }

    @Test
    void aCropNobodyMeasuredTakesItsClassAndSaysSo() {
        WithReasons<RespirationCurve> found =
                Respirations.of(Crops.unknown("fruit"), Ripeness.UNKNOWN, CLASSES, 0.5);
        RespirationCurve apple =
                Respirations.of(Crops.apple(), Ripeness.UNKNOWN, CLASSES, 0.5).value();
        assertTrue(found.ofClass());
        assertEquals("respiration-class", found.restsOn().get(0).code());
        assertEquals(apple.wattsPerKg(10), found.value().wattsPerKg(10), 1e-12);
        assertEquals(3 * apple.wattsPerKg(10), found.value().fresh().wattsPerKg(10), 1e-12);
    }

    @Source("10.7 J per mg of CO2, Becker, Misra and Fricke 1996; stoichiometry of glucose")
    @Test
    void carbonDioxideWaterAndSugarFollowFromHeat() {
        RespirationCurve curve = curve(TABLE, Ripeness.UNKNOWN, 0);
        assertEquals(0.030 / 10.7 * 1e-6, curve.co2KgPerKgS(15), 1e-18);
        assertEquals(180.156 / (6 * 44.01), BurntSugar.GLUCOSE_KG_PER_KG_CO2, 0.0005);
        assertEquals(18.015 / 44.01, BurntSugar.WATER_KG_PER_KG_CO2, 0.0005);
    }
}

package org.wardon.lots;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import org.junit.jupiter.api.Test;
import org.wardon.Source;
import org.wardon.air.SaturatedAir;
import org.wardon.produce.Commodity;
import org.wardon.produce.rows.TranspirationRow;

/** Water lost by printed coefficients, skins and classes. */
class TranspirationsTest {
    private static final ClassValues CLASSES = ClassValues.of(List.of(Crops.apple()));

    private static Commodity with(TranspirationRow row) {
        return Crops.of("x", "leafy", Crops.apple().body(), Crops.breath(), List.of(row));
    }

    private static WithReasons<TranspirationLaw> law(Commodity crop, double share) {
        return Transpirations.of(crop, Items.of(crop, CLASSES).value(), CLASSES, share);
    }

    @Source("crisphead lettuce, 7400 ng/(kg s Pa): about 12 % a day bare at 10 °C and 85 %")
    @Test
    void crispheadLettuceLosesAboutTwelvePercentADay() {
        TranspirationLaw lettuce = law(with(Crops.coefficient(7400)), 0.5).value();
        double saturation = SaturatedAir.pressurePa(10);
        double perDay = 86_400 * lettuce.waterKgPerKgS(saturation, 0.85 * saturation);
        assertEquals(0.12, perDay, 0.005);
    }

    @Test
    void aCoefficientStandsAloneASkinIsInSeriesWithTheFilm() {
        assertEquals(
                42e-12,
                law(with(Crops.coefficient(42)), 0.5).value().conductanceKgPerKgSPa(),
                1e-20);
        Commodity skinned = with(Crops.skin(0.5, 1, 4));
        TranspirationLaw law = law(skinned, 0.5).value();
        double area = 3 / (840 * 0.038);
        assertEquals(
                1 / (1 / (area * 1e-9) + 1 / law.filmKgPerKgSPa()),
                law.conductanceKgPerKgSPa(),
                1e-9 * law.conductanceKgPerKgSPa());
        assertTrue(law.conductanceKgPerKgSPa() < area * 1e-9);
        double low = law(skinned, 0).value().conductanceKgPerKgSPa();
        double high = law(skinned, 1).value().conductanceKgPerKgSPa();
        assertEquals(0.5, low / law.conductanceKgPerKgSPa(), 0.05);
        assertTrue(high / law.conductanceKgPerKgSPa() > 3);
    }

    @Test
    void aCropNobodyMeasuredTakesTheMedianTimesOrOverThree() {
        WithReasons<TranspirationLaw> found = law(Crops.unknown("fruit"), 0.5);
        assertTrue(found.ofClass());
        assertEquals("transpiration-class", found.restsOn().get(0).code());
        assertEquals(42e-12, found.value().conductanceKgPerKgSPa(), 1e-20);
        assertEquals(14e-12, law(Crops.unknown("fruit"), 0).value().conductanceKgPerKgSPa(), 1e-20);
        assertEquals(
                126e-12, law(Crops.unknown("fruit"), 1).value().conductanceKgPerKgSPa(), 1e-20);
    }

    @Test
    void dewSettlesThroughTheFilmAndNothingPassesBetween() {
        TranspirationLaw law = new TranspirationLaw(1e-10, 0.98, 1e-9);
        assertEquals(48e-10 * 10, law.waterKgPerKgS(1000, 500), 1e-20);
        assertEquals(0, law.waterKgPerKgS(1000, 990), 0);
        assertEquals(-1e-7, law.waterKgPerKgS(1000, 1100), 1e-20);
    }
}

package org.wardon.web.plan;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.math.RoundingMode;
import java.util.Map;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.wardon.files.form.PlanChange;
import org.wardon.web.pages.Preferences;

/** Bounds beside the fields of the plan: short, and never beyond what the plan takes. */
class TypedNumbersTest {
    private static final Preferences POUNDS = Preferences.of("c.lb.point.auto");

    private static PlanChange.Typed typed(String mass, String price) {
        return new PlanChange.Typed(
                Map.of("$.lots[0].massKg", mass, "$.lots[0].pricePerKg", price),
                Map.of(),
                Map.of());
    }

    @ParameterizedTest(name = "{0} {1} stands as {2}")
    @CsvSource({
        "500, kg, 1102",
        "871, kg, 1920",
        "12345, kg, 27216",
        "0.1, kg, 0.2205",
        "1.2, per kg, 0.5443",
        "2, kg/h, 4.409",
        "0, kg, 0",
        "300, K, 300"
    })
    void whatThePlanSaysStandsInFewDigitsOfPounds(String written, String unit, String shown) {
        assertEquals(shown, new TypedNumbers(POUNDS).shown(written, unit));
    }

    @ParameterizedTest(name = "{0} {1}")
    @CsvSource({
        "1100, kg",
        "1102.5, kg",
        "0.25, kg",
        "54321, kg",
        "10240.5, kg",
        "0.55, per kg",
        "12.75, per kg",
        "3, kg/h",
        "0.125, kg/s"
    })
    void whatIsTypedInPoundsStandsThereAgain(String typed, String unit) {
        TypedNumbers pounds = new TypedNumbers(POUNDS);
        assertEquals(typed, pounds.shown(pounds.read(typed, unit).orElseThrow(), unit));
    }

    @Test
    void aPriceByThePoundIsKeptByTheKilogram() {
        TypedNumbers pounds = new TypedNumbers(POUNDS);
        assertEquals("per lb", pounds.unit("per kg"));
        assertEquals("1.21254244", pounds.read("0.55", "per kg").orElseThrow());
        assertEquals("453000", pounds.bound(1_000_000, "per kg", RoundingMode.FLOOR));
    }

    @Test
    void whatIsLeftAsItStandsLeavesThePlanAsItIs() {
        String plan = "{\"lots\": [{\"massKg\": 500, \"pricePerKg\": 1.2}]}";
        PlanChange change = new PlanChange(new TypedNumbers(POUNDS));
        assertEquals(plan, change.apply(plan, typed("1102", "0.5443")));
        assertEquals(
                "{\"lots\": [{\"massKg\": 500, \"pricePerKg\": 1.21254244}]}",
                change.apply(plan, typed("1102", "0.55")));
    }

    @Test
    void boundsOfAMassInPoundsAreShortAndTakenAsTheyAreTold() {
        TypedNumbers pounds = new TypedNumbers(Preferences.of("f.lb.comma.auto"));
        String least = pounds.bound(0.1, "kg", RoundingMode.CEILING);
        String most = pounds.bound(500_000, "kg", RoundingMode.FLOOR);
        assertEquals("0,221", least);
        assertEquals("1100000", most);
        assertTrue(Double.parseDouble(pounds.read(least, "kg").orElseThrow()) >= 0.1);
        assertTrue(Double.parseDouble(pounds.read(most, "kg").orElseThrow()) <= 500_000);
        assertEquals("-22", pounds.bound(-30, "°C", RoundingMode.CEILING));
        assertEquals("0,2", pounds.bound(0.2, "m", RoundingMode.CEILING));
        assertEquals(
                "0.1", new TypedNumbers(Preferences.USUAL).bound(0.1, "kg", RoundingMode.CEILING));
    }
}

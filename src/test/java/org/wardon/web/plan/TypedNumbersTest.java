package org.wardon.web.plan;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.math.RoundingMode;
import org.junit.jupiter.api.Test;
import org.wardon.web.pages.Preferences;

/** Bounds beside the fields of the plan: short, and never beyond what the plan takes. */
class TypedNumbersTest {
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

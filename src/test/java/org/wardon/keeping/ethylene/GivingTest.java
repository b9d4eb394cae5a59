package org.wardon.keeping.ethylene;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.wardon.Source;
import org.wardon.keeping.Crops;
import org.wardon.keeping.Draw;

/** What fruit gives off before and after it ripens. */
class GivingTest {
    /**
     * Tomatoes have rows of turning fruit only: green ones keep to the class of green ones, under
     * 0.1 µL/(kg h), and come to the rows when they ripen. Bananas have rows of both kinds.
     */
    @Source("kader-lists for the class; ucd-produce-facts, by way of ethylene.csv, for the rows")
    @ParameterizedTest(name = "{0} at 20 °C: {1} to {2}, then {3}")
    @CsvSource({"tomato-mature-green, 0, 0.1, 4.9", "banana-green, 0.3, 0.3, 10"})
    void greenFruitGivesLittleUntilItRipens(String id, double low, double high, double after) {
        Giving giving = Giving.of(Crops.get(id));
        double green = giving.microlitrePerKgHour(20, 0, Draw.MEDIAN);
        assertTrue(green >= low - 1e-9 && green <= high + 1e-9, green + " µL/(kg h)");
        assertEquals(after, giving.microlitrePerKgHour(20, 1, Draw.MEDIAN), 1e-6);
    }
}

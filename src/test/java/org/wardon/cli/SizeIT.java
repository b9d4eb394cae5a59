package org.wardon.cli;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import org.junit.jupiter.api.Test;
import tools.jackson.databind.JsonNode;

/** The verb that sums a design load by hand. */
class SizeIT {
    private static final String DEMO = "demo-data/landing.json";

    @Test
    void aPersonGetsTheSumLineByLine() {
        String page = WardonJar.run("size", DEMO, "--chamber", "cold").good().out();
        assertTrue(page.startsWith("Chamber cold at 2.0 °C, outdoors "), page);
        assertTrue(page.contains("  cooling it needs while it runs "), page);
        assertTrue(page.replaceAll("\\s+", " ").contains("licensed refrigeration engineer"), page);
        assertFalse(page.contains("NaN") || page.contains("{"), page);
        assertTrue(page.lines().allMatch(line -> line.length() <= 100), page);
    }

    @Test
    void aProgramGetsTermsThatAddUp() {
        JsonNode size = WardonJar.run("size", DEMO, "--chamber", "fruit", "--json").json();
        JsonNames.check(size, "terms[]", "kind", "of", "meanW", "formula", "source");
        double sum = 0;
        for (JsonNode term : size.get("terms")) {
            sum += term.get("meanW").asDouble();
        }
        assertEquals(size.get("meanW").asDouble(), sum, 1e-4 * sum);
    }

    @Test
    void whatIsNotThereIsRefused() {
        assertTrue(
                WardonJar.run("size", DEMO, "--chamber", "attic")
                        .refused(2)
                        .err()
                        .startsWith("wardon: --chamber: is 'attic', no chamber of this plan;"));
    }
}

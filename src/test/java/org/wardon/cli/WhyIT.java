package org.wardon.cli;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import org.junit.jupiter.api.Test;
import tools.jackson.databind.JsonNode;

/** The verb that tells what moves heat and water in an hour. */
class WhyIT {
    private static final String DEMO = "demo-data/landing.json";

    private static WardonJar.Ran why(String chamber, String at, String... more) {
        List<String> words =
                new java.util.ArrayList<>(List.of("why", DEMO, "--chamber", chamber, "--at", at));
        words.addAll(List.of(more));
        return WardonJar.run(words.toArray(String[]::new));
    }

    @Test
    void aPersonGetsTermsAndProfiles() {
        String page =
                why("cold", "2026-03-04T15:00", "--face", "south", "--lot", "LET1").good().out();
        assertTrue(page.startsWith("Chamber cold, 2026-03-04 14:00 to 15:00: the air goes"), page);
        for (String line :
                List.of("  sum of all terms ", "  left open ", "  outer surface ", "  core ")) {
            assertTrue(page.contains("\n" + line), line + " in " + page);
        }
        assertFalse(page.contains("NaN") || page.contains("{"), page);
        assertTrue(page.lines().allMatch(line -> line.length() <= 100), page);
    }

    @Test
    void aProgramGetsTheNamesOfTheForecastsTerms() {
        JsonNode why = why("shed", "2026-03-03T13:00", "--face", "roof", "--json").json();
        JsonNames.check(
                why,
                "heatW",
                ("walls door leakage freshAir fieldHeat respiration fans lights people packages"
                                + " defrost humidifier heater pumps air")
                        .split(" "));
        JsonNames.check(
                why,
                "waterKgH",
                "lots packages door leakage freshAir people humidifier faces coolers air"
                        .split(" "));
        JsonNames.check(why, "face.points[]", "depthMm", "temperatureC", "layer");
        assertTrue(why.get("lot").isNull());
        double sum = 0;
        double through = 0;
        for (JsonNode term : why.get("heatW")) {
            sum += term.asDouble();
            through += Math.abs(term.asDouble());
        }
        assertEquals(why.get("removedW").asDouble(), sum, 1e-3 * through);
    }

    @Test
    void whatIsNotThereIsRefused() {
        String told = why("cold", "2026-03-04T15:00", "--lot", "MAN1").refused(2).err();
        assertTrue(
                told.startsWith(
                        "wardon: --lot: is 'MAN1', no lot that stands in cold then; did you mean"
                                + " 'BAN1'? accepted: BAN1, LET1, OKR1, CAR1, BRO1"),
                told);
        assertEquals(
                "wardon: Missing required options: '--chamber=ID', '--at=TIME'; see 'wardon why"
                        + " --help'\n",
                WardonJar.run("why", DEMO).refused(2).err());
    }
}

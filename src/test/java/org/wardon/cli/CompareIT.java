package org.wardon.cli;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import org.junit.jupiter.api.Test;
import tools.jackson.databind.JsonNode;

/** The verb that puts plans side by side. */
class CompareIT {
    private static final String DEMO = "demo-data/landing.json";
    private static final String CURTAIN = "chambers[cold].door.protection=strip-curtain";

    @Test
    void aPersonGetsWhatEarnsMostFirst() {
        String page =
                WardonJar.run(
                                "compare",
                                DEMO,
                                "--variant",
                                "curtain",
                                "--set",
                                CURTAIN,
                                "--variant",
                                "warmer",
                                "--set",
                                "chambers[cold].setting.temperatureC=8")
                        .good()
                        .out();
        assertTrue(page.lines().findFirst().orElseThrow().contains(" earn"), page);
        assertTrue(page.contains("  curtain "), page);
        assertTrue(page.contains("warmer: $.chambers[1].setting.temperatureC from 2 to 8\n"), page);
    }

    @Test
    void aProgramGetsEachVariantInOrder() {
        JsonNode answer = WardonJar.run("compare", DEMO, "--set", CURTAIN, "--json").json();
        JsonNode variants = answer.get("variants");
        assertEquals("as planned", variants.get(0).get("name").asString());
        assertEquals("changed", variants.get(1).get("name").asString());
        double before = variants.get(0).get("chambers").get(1).get("energyKWh").asDouble();
        double after = variants.get(1).get("chambers").get(1).get("energyKWh").asDouble();
        assertTrue(after < before, after + " against " + before);
    }

    @Test
    void faultsAreToldWhole() {
        assertEquals(
                "wardon: --set chambers[colt].setting.temperatureC: there is no 'colt' in $.chambers;"
                        + " did you mean 'cold'? accepted: fruit, cold, shed\n",
                WardonJar.run("compare", DEMO, "--set", "chambers[colt].setting.temperatureC=3")
                        .refused(2)
                        .err());
        assertEquals(
                "wardon: --set: nothing is changed; accepted: --set PATH=VALUE, or --with FILE\n",
                WardonJar.run("compare", DEMO).refused(2).err());
    }
}

package org.wardon.cli;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import tools.jackson.databind.JsonNode;

/** What {@code look}, {@code keep} and {@code share} answer. */
class AnswersIT {
    @TempDir Path folder;

    private static void narrow(String page) {
        assertTrue(page.lines().allMatch(line -> line.length() <= 100), page);
        assertFalse(page.contains("{"), page);
    }

    @Test
    void lookListsTheCommodities() {
        String list = WardonJar.run("look").good().out();
        assertEquals(107, list.lines().count(), "a head and a line each");
        assertTrue(list.lines().anyMatch(line -> line.matches(" +mango +Mango")), list);
    }

    @Test
    void lookTellsFactsInTheFixedNames() {
        JsonNode mango = WardonJar.run("look", "Mango", "--json").json();
        JsonNames.check(mango, "", "commodity", "names", "facts");
        JsonNames.check(
                mango, "facts[]", "name", "low", "high", "unit", "source", "evidence", "own");
        assertEquals("mango", mango.get("commodity").asString());
        for (JsonNode fact : mango.get("facts")) {
            assertFalse(fact.get("source").asString().isBlank(), fact.toString());
        }
    }

    @Test
    void lookIsReadableInBothUnits() {
        String page = WardonJar.run("look", "mango", "--fahrenheit").good().out();
        narrow(page);
        assertTrue(page.contains("storage temperature: 55.4 °F [cantwell-2001, seen]"), page);
        assertTrue(page.contains("\nSources\n"), page);
    }

    @Test
    void ownValuesWinAreShownAsOwnAndCanBeForgotten() {
        String home = folder.resolve("home").toString();
        JsonNode set =
                WardonJar.run(
                                "look",
                                "mango",
                                "--home",
                                home,
                                "--own",
                                "storage-temperature=11..12",
                                "--json")
                        .json();
        JsonNode first = set.get("facts").get(0);
        assertEquals("storage-temperature", first.get("name").asString());
        assertTrue(first.get("own").asBoolean(), first.toString());
        assertEquals(12, first.get("high").asDouble());
        assertTrue(
                WardonJar.run("look", "mango", "--home", home).good().out().contains("13 °C"),
                "print stays visible");
        JsonNode forgotten =
                WardonJar.run(
                                "look",
                                "mango",
                                "--home",
                                home,
                                "--forget",
                                "storage-temperature",
                                "--json")
                        .json();
        for (JsonNode fact : forgotten.get("facts")) {
            assertFalse(fact.get("own").asBoolean(), fact.toString());
        }
    }

    @Test
    void keepTellsDaysInTheFixedNames() {
        JsonNode kept = WardonJar.run("keep", "mango", "--at", "13", "--json").json();
        JsonNames.check(
                kept,
                "",
                "commodity",
                "daysLeft",
                "lifeUsedPct",
                "limitedBy",
                "chillingRisk",
                "mechanisms");
        JsonNames.check(kept, "daysLeft", "p10", "p50", "p90");
        JsonNames.check(kept, "chillingRisk", "probability", "safeDays");
        JsonNames.check(kept, "mechanisms[]", "name", "daysLeft");
        JsonNames.check(kept, "mechanisms[].daysLeft", "p10", "p50", "p90");
        JsonNames.finite(kept);
        double likely = kept.get("daysLeft").get("p50").asDouble();
        assertTrue(likely >= 14 && likely <= 21, "handbook: 14 to 21 days, found " + likely);
    }

    @Test
    void keepFollowsAHistoryInEitherScaleAndGoesOnFromIt() throws IOException {
        Path celsius = Files.writeString(folder.resolve("c.csv"), history("temperatureC", 25));
        Path fahrenheit = Files.writeString(folder.resolve("f.csv"), history("temperatureF", 77));
        String ofC =
                WardonJar.run("keep", "mango", "--history", celsius.toString(), "--json")
                        .good()
                        .out();
        String ofF =
                WardonJar.run("keep", "mango", "--history", fahrenheit.toString(), "--json")
                        .good()
                        .out();
        assertEquals(ofC, ofF);
        String then =
                WardonJar.run(
                                "keep",
                                "mango",
                                "--history",
                                celsius.toString(),
                                "--then",
                                "13",
                                "--fahrenheit")
                        .good()
                        .out();
        narrow(then);
        assertTrue(then.startsWith("Mango: keeps "), then);
        assertTrue(then.contains("at the end of the history"), then);
        assertTrue(then.contains("cold harms it below 55 °F"), then);
    }

    private static String history(String column, double value) {
        StringBuilder csv = new StringBuilder("time," + column + ",humidityPct\n");
        for (int hour = 0; hour < 48; hour++) {
            csv.append(
                    String.format("2026-03-%02dT%02d:00,%s,85%n", 2 + hour / 24, hour % 24, value));
        }
        return csv.toString();
    }

    @Test
    void shareTellsPairsInTheFixedNames() {
        JsonNode shared = WardonJar.run("share", "mango", "banana-green", "--json").json();
        JsonNames.check(
                shared,
                "",
                "verdict",
                "workableC",
                "workableHumidityPct",
                "pairs",
                "compromise",
                "takeOut");
        JsonNames.check(shared, "pairs[]", "a", "b", "verdict", "reasons");
        JsonNames.check(shared, "pairs[].reasons[]", "code", "lots", "text", "source");
        assertEquals(1, shared.get("pairs").size());
        assertEquals("no", shared.get("verdict").asString(), "mango ripens green bananas");
        narrow(WardonJar.run("share", "mango=10", "lettuce", "--days", "5").good().out());
    }
}

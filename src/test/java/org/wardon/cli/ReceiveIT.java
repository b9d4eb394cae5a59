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

/** The verb for a lot at the door. */
class ReceiveIT {
    private static final String DEMO = "demo-data/landing.json";

    @TempDir private Path folder;

    private static String[] mango(String... more) {
        String[] words = {
            "receive",
            DEMO,
            "--commodity",
            "mangó",
            "--mass",
            "800",
            "--temperature",
            "29",
            "--ripeness",
            "green",
            "--purpose",
            "sell-ripe",
            "--harvested",
            "6",
            "--at",
            "2026-03-04T14:00"
        };
        String[] all = java.util.Arrays.copyOf(words, words.length + more.length);
        System.arraycopy(more, 0, all, words.length, more.length);
        return all;
    }

    @Test
    void theFirstLineIsTheSentenceAKeeperNeeds() {
        String page = WardonJar.run(mango()).good().out();
        assertTrue(page.startsWith("Put the 800 kg of mango into fruit"), page);
        assertTrue(page.contains("Ranges over 32 draws"), page);
        assertFalse(page.contains("NaN") || page.contains("{"), page);
        assertTrue(page.lines().allMatch(line -> line.length() <= 100), page);
    }

    @Test
    void aProgramGetsEveryChoiceBestFirst() {
        JsonNode answer = WardonJar.run(mango("--json", "-")).json();
        assertEquals(5, answer.get("choices").size());
        assertEquals("fruit", answer.get("choices").get(0).get("chamber").asString());
        assertEquals(answer.get("sentence"), answer.get("choices").get(0).get("text"));
        JsonNames.check(
                answer,
                "choices[]",
                "kind",
                "chamber",
                "verdict",
                "text",
                "reasons",
                "keeps",
                "worth",
                "inside");
    }

    @Test
    void onePutsItIntoThePlan() throws IOException {
        Files.copy(Path.of("demo-data/weather.csv"), folder.resolve("weather.csv"));
        Path written = folder.resolve("with.json");
        String page =
                WardonJar.run(mango("--put", "best", "--write", written.toString())).good().out();
        assertTrue(page.endsWith("Written to " + written + " as MAN2.\n"), page);
        String text = Files.readString(written);
        assertTrue(text.contains("\"id\": \"MAN2\""), text);
        assertTrue(text.contains("\"chamber\": \"fruit\"}\n  ]\n}"), text);
    }

    @Test
    void badInputIsToldWholeAndNothingWritten() {
        Path written = folder.resolve("with.json");
        assertEquals(
                "wardon: --put: is 'fruti', no chamber of this plan; did you mean 'fruit'? accepted:"
                        + " fruit, cold, shed\n",
                WardonJar.run(mango("--put", "fruti", "--write", written.toString()))
                        .refused(2)
                        .err());
        String elsewhere =
                WardonJar.run(mango("--put", "fruit", "--write", written.toString()))
                        .refused(2)
                        .err();
        assertTrue(elsewhere.contains("weather"), elsewhere);
        assertFalse(Files.exists(written));
        assertEquals(
                "wardon: --put: stands alone; accepted: --put CHAMBER together with --write FILE\n",
                WardonJar.run(mango("--put", "fruit")).refused(2).err());
        assertEquals(
                "wardon: --mass: is 0; accepted: 0.1 to 500000 kg, net\n",
                WardonJar.run("receive", DEMO, "--commodity", "mango", "--mass", "0")
                        .refused(2)
                        .err());
    }
}

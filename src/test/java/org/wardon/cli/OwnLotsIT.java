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

/** A keeper's own lots: remembered, listed, used and forgotten. */
class OwnLotsIT {
    @TempDir Path home;

    private WardonJar.Ran keep(String... words) {
        String[] all = new String[words.length + 3];
        all[0] = "keep";
        System.arraycopy(words, 0, all, 1, words.length);
        all[words.length + 1] = "--home";
        all[words.length + 2] = home.toString();
        return WardonJar.run(all);
    }

    @Test
    void aLotIsRememberedUsedAndForgotten() throws IOException {
        JsonNode printed = keep("mango", "--at", "13", "--json").json();
        String told =
                keep("mango", "--at", "13", "--days", "10", "--ended", "aged", "--lot", "M1")
                        .good()
                        .out();
        assertTrue(told.startsWith("Mango: remembered as lot 1.\n"), told);
        JsonNode own = keep("mango", "--at", "13", "--json").json();
        assertTrue(
                own.at("/daysLeft/p90").asDouble() < 0.8 * printed.at("/daysLeft/p90").asDouble());
        String answer = keep("mango", "--at", "13").good().out();
        assertTrue(answer.contains("rests on lots of the keeper's own"), answer);
        assertTrue(answer.contains("- mango: one lot of your own counts"), answer);
        assertTrue(answer.contains("[own]"), answer);
        Path history = home.resolve("box.csv");
        Files.writeString(history, "time,temperatureC\n2026-03-02T06:00,13\n2026-03-14T06:00,13\n");
        keep("mango", "--history", history.toString(), "--ended", "sold").good();
        JsonNode list = keep("mango", "--outcomes", "--json").json();
        assertEquals(2, list.get("lots").size());
        assertEquals("2026-03-14", list.at("/lots/1/endedOn").asString());
        assertEquals(12, list.at("/lots/1/days").asDouble(), 1e-9);
        assertEquals("M1", list.at("/lots/0/lot").asString());
        keep("mango", "--forget-outcome", "1").good();
        keep("mango", "--forget-outcome", "2").good();
        assertEquals(printed, keep("mango", "--at", "13", "--json").json());
        assertEquals(
                "Mango: no lots of your own are remembered.\n",
                keep("mango", "--outcomes").good().out());
    }

    @Test
    void wrongWordsAreRefusedAndNothingIsWritten() {
        assertEquals(
                "wardon: --ended: nothing says how long the lot was kept; accepted: --days N beside"
                        + " --at C, or --history CSV\n",
                keep("mango", "--at", "12", "--ended", "aged").refused(2).err());
        assertEquals(
                "wardon: --note: it goes with --ended only; accepted: --ended aged, ripe, sold or"
                        + " spoilt beside it\n",
                keep("mango", "--at", "12", "--note", "x").refused(2).err());
        assertEquals(
                "wardon: --ended: it does not go with --outcomes or --forget-outcome; accepted: one"
                        + " of them at a time\n",
                keep("mango", "--outcomes", "--ended", "aged").refused(2).err());
        assertEquals(
                "wardon: --forget-outcome: no lot of mango has the number 3; accepted: a number of"
                        + " 'keep mango --outcomes'\n",
                keep("mango", "--forget-outcome", "3").refused(2).err());
        assertEquals(
                "wardon: keep: nothing says what the lot goes through; accepted: --at C or"
                        + " --history CSV; --outcomes to list lots of your own\n",
                keep("mango").refused(2).err());
        assertEquals(
                "wardon: --on: 2999-01-01 is still to come; accepted: a day up to "
                        + java.time.LocalDate.now(java.time.ZoneId.systemDefault())
                        + "\n",
                keep("mango", "--at=12", "--days=9", "--ended=aged", "--on=2999-01-01")
                        .refused(2)
                        .err());
        keep("mango", "--at=12", "--days=9", "--ended=aged", "--note=a\nb").refused(2);
        assertEquals(
                "wardon: --used: nothing of its life was left to see; accepted with --ended: 0 to"
                        + " 99 %\n",
                keep("mango", "--at=12", "--days=9", "--ended=aged", "--used=100")
                        .refused(2)
                        .err());
        keep("mango", "--at=12", "--days=9", "--ended=odd").refused(2);
        assertFalse(Files.exists(home.resolve("store.db")));
    }
}

package org.wardon.cli;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.condition.EnabledOnOs;
import org.junit.jupiter.api.condition.OS;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import org.wardon.cli.WardonJar.Ran;

/** What the program refuses, with which status and words, and that it leaves nothing behind. */
class RefusalsIT {
    private static final Path CORPUS = Path.of("src/test/resources/bad-plans");
    private static final String MINIMAL = "src/test/resources/plans/minimal/plan.json";

    @TempDir Path folder;

    private boolean nothingWritten() throws IOException {
        try (Stream<Path> files = Files.list(folder)) {
            return files.findAny().isEmpty();
        }
    }

    @ParameterizedTest
    @ValueSource(
            strings = {
                "bound-fahrenheit",
                "csv-decimal-commas",
                "csv-gap-of-five-hours",
                "door-higher-than-chamber",
                "file-missing",
                "id-commodity",
                "json-truncated",
                "name-near-miss-door",
                "several-in-both-files",
                "text-windows-1252",
                "time-31-february",
                "weather-file-outside",
                "cooler-ice-bank"
            })
    void aBadPlanIsRefusedInItsOwnWordsAndNothingIsWritten(String name) throws IOException {
        Path bad = CORPUS.resolve(name);
        Ran ran =
                WardonJar.run(
                                "advise",
                                bad.resolve("plan.json").toString(),
                                "--json",
                                folder.resolve("out.json").toString(),
                                "--series",
                                folder.resolve("series").toString())
                        .refused(2);
        String told = ran.err().replace("wardon: ", "").replace(bad + "/", "");
        assertEquals(Files.readString(bad.resolve("expected.txt")), told);
        assertTrue(nothingWritten());
    }

    @Test
    void aMisspeltCommodityIsToldItsNeighbours() {
        String told = WardonJar.run("look", "mangoe").refused(2).err();
        assertTrue(
                told.startsWith("wardon: mangoe: no commodity is called so; perhaps mango"), told);
        String kept = WardonJar.run("keep", "brocoli", "--at", "2").refused(2).err();
        assertTrue(kept.contains("perhaps broccoli"), kept);
    }

    @Test
    void nonsenseInAQuestionIsRefusedAllAtOnce() {
        assertEquals(
                "wardon: --at: 99.0 is out of range; accepted: -5.0 to 50.0 °C\n"
                        + "wardon: --used: 120.0 is out of range; accepted: 0.0 to 100.0 %\n"
                        + "wardon: --known-life: 'nine' is not DAYS@C; accepted: days, @ and °C,"
                        + " such as 9@10\n",
                WardonJar.run("keep", "mango", "--at=99", "--used=120", "--known-life=nine")
                        .refused(2)
                        .err());
        assertEquals(
                "wardon: Invalid value for option '--at': 'x' is not a number; see 'wardon keep"
                        + " --help'\n",
                WardonJar.run("keep", "mango", "--at", "x").refused(2).err());
        WardonJar.run("keep", "mango").refused(2);
        WardonJar.run("keep", "mango", "--history", "no-such.csv").refused(2);
    }

    @Test
    void aCropNamedTwiceIsRefused() {
        assertEquals(
                "wardon: mango: it is named twice; name each crop once\n",
                WardonJar.run("share", "mango", "okra", "mango").refused(2).err());
        assertEquals(
                "wardon: Mango: mango is named twice; name each crop once\n",
                WardonJar.run("share", "mango", "Mango").refused(2).err());
    }

    @Test
    void aResultThatCannotBeWrittenIsSaidBeforeTheWork() throws IOException {
        Path gone = folder.resolve("gone/out.json");
        assertEquals(
                "wardon: "
                        + gone
                        + ": cannot be written: its folder does not exist; make the folder first,"
                        + " or give another\n",
                WardonJar.run("advise", MINIMAL, "--json", gone.toString()).refused(4).err());
        assertTrue(nothingWritten());
        Path file = Files.writeString(folder.resolve("taken"), "mine");
        WardonJar.run("advise", MINIMAL, "--series", file.toString()).refused(4);
        assertEquals("mine", Files.readString(file));
        WardonJar.run("advise", MINIMAL, "--json", folder.toString()).refused(4);
        Path readOnly = Path.of("/proc/out.json");
        if (Files.isDirectory(readOnly.getParent())) {
            WardonJar.run("advise", MINIMAL, "--json", readOnly.toString()).refused(4);
        }
    }

    @Test
    @EnabledOnOs(OS.LINUX)
    void aFullDiskIsSaid() throws IOException, InterruptedException {
        Path full = Path.of("/dev/full");
        assertEquals(
                "wardon: /dev/full: cannot be written: the disk is full; free some space and run"
                        + " again; nothing was left under that name\n",
                WardonJar.run("advise", MINIMAL, "--json", full.toString()).refused(4).err());
        Path err = folder.resolve("err");
        Process toFull = WardonJar.start(full, err, "look");
        assertEquals(4, toFull.waitFor(), Files.readString(err));
        assertTrue(Files.readString(err).startsWith("wardon: standard output: "));
    }

    /**
     * Lamps of 5 kW burn day and night in a small shut room without a cooler, at 45 °C outdoors.
     */
    @Test
    void aRunThatComesToAStateThatCannotBeStops() throws IOException {
        String plan =
                Files.readString(Path.of(MINIMAL))
                        .replace("\"temperatureC\": 28", "\"temperatureC\": 45")
                        .replace(
                                "\"setting\"",
                                "\"gains\": {\"lightsW\": 5000, \"lightsHoursPerDay\": 24},"
                                        + " \"setting\"");
        Path hot = Files.writeString(folder.resolve("hot.json"), plan);
        Path out = folder.resolve("out.json");
        String told =
                WardonJar.run("advise", hot.toString(), "--json", out.toString()).refused(3).err();
        assertTrue(
                told.matches(
                        "wardon: the run stopped at a state that cannot be: chamber north, [0-9.]+"
                                + " h after the start: air temperature would be [0-9.]+ °C; .*\n"),
                told);
        assertFalse(Files.exists(out));
    }
}

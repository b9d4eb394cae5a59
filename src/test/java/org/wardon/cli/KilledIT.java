package org.wardon.cli;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.concurrent.TimeUnit;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** A run killed while it writes leaves no half file under a final name. */
class KilledIT {
    private static final Path MINIMAL = Path.of("src/test/resources/plans/minimal/plan.json");
    private static final int DAYS = 200;

    @TempDir Path folder;

    @Test
    void whatStandsUnderAFinalNameIsWhole() throws IOException, InterruptedException {
        String year = Files.readString(MINIMAL).replace("\"days\": 2", "\"days\": " + DAYS);
        Path plan = Files.writeString(folder.resolve("plan.json"), year);
        Path series = folder.resolve("series");
        Path json = folder.resolve("out.json");
        Process process =
                WardonJar.start(
                        folder.resolve("stdout"),
                        folder.resolve("stderr"),
                        "advise",
                        plan.toString(),
                        "--json",
                        json.toString(),
                        "--series",
                        series.toString());
        while (process.isAlive() && files(series).isEmpty()) {
            Thread.sleep(1);
        }
        assertTrue(process.isAlive(), Files.readString(folder.resolve("stderr")));
        process.destroyForcibly();
        assertTrue(process.waitFor(20, TimeUnit.SECONDS));
        assertFalse(files(series).isEmpty(), "it was killed before it wrote anything");
        for (Path file : files(series)) {
            if (!file.getFileName().toString().endsWith(".part")) {
                List<String> lines = Files.readAllLines(file);
                assertTrue(lines.size() >= 7 * 24, file + " has " + lines.size() + " lines");
                int columns = lines.get(0).split(",", -1).length;
                assertEquals(columns, lines.get(lines.size() - 1).split(",", -1).length);
            }
        }
        assertFalse(Files.exists(json), "it was to be killed before the forecast was written");
    }

    private static List<Path> files(Path folder) throws IOException {
        if (!Files.isDirectory(folder)) {
            return List.of();
        }
        try (Stream<Path> files = Files.list(folder)) {
            return files.toList();
        }
    }
}

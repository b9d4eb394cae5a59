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
import tools.jackson.databind.json.JsonMapper;

/** A run killed while it writes leaves no half file under a final name. */
class KilledIT {
    private static final Path MINIMAL = Path.of("src/test/resources/plans/minimal/plan.json");
    private static final int DAYS = 200;
    private static final int LEAST_STAY_DAYS = 6;

    @TempDir Path folder;

    @Test
    void whatStandsUnderAFinalNameIsWhole() throws IOException, InterruptedException {
        String longPlan = Files.readString(MINIMAL).replace("\"days\": 2", "\"days\": " + DAYS);
        Path plan = Files.writeString(folder.resolve("plan.json"), longPlan);
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
        while (process.isAlive() && finals(series).isEmpty()) {
            Thread.sleep(1);
        }
        process.destroyForcibly();
        assertTrue(process.waitFor(20, TimeUnit.SECONDS));
        List<Path> finals = finals(series);
        assertFalse(finals.isEmpty(), Files.readString(folder.resolve("stderr")));
        for (Path file : finals) {
            List<String> lines = Files.readAllLines(file);
            boolean chamber = file.getFileName().toString().startsWith("chamber-");
            assertTrue(lines.size() > 24 * (chamber ? DAYS - 1 : LEAST_STAY_DAYS), file + "");
            int columns = lines.get(0).split(",", -1).length;
            assertEquals(columns, lines.get(lines.size() - 1).split(",", -1).length);
        }
        if (Files.exists(json)) {
            JsonNames.finite(JsonMapper.shared().readTree(Files.readString(json)));
        }
    }

    private static List<Path> finals(Path folder) throws IOException {
        return files(folder).stream()
                .filter(file -> !file.getFileName().toString().endsWith(".part"))
                .toList();
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

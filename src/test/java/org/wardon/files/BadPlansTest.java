package org.wardon.files;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;
import static org.junit.jupiter.api.Assumptions.assumeFalse;
import static org.junit.jupiter.api.DynamicTest.dynamicTest;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.attribute.PosixFilePermissions;
import java.util.List;
import java.util.stream.Stream;
import org.junit.jupiter.api.DynamicTest;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.TestFactory;
import org.junit.jupiter.api.io.TempDir;
import org.wardon.errors.BadInput;

/**
 * The corpus of bad plans and weather files: each folder holds a plan, where needed its weather,
 * and in {@code expected.txt} the whole message, a line a fault.
 */
class BadPlansTest {
    private static final Path CORPUS = Path.of("src/test/resources/bad-plans");
    private static final Path MINIMAL = Path.of("src/test/resources/plans/minimal/plan.json");
    private static final Lookups LOOKUPS = TableLookups.read();

    @TempDir Path folder;

    @TestFactory
    Stream<DynamicTest> eachFaultIsToldOnceInWords() throws IOException {
        List<Path> cases;
        try (Stream<Path> folders = Files.list(CORPUS)) {
            cases = folders.sorted().toList();
        }
        assertTrue(cases.size() >= 60, "the corpus has shrunk to " + cases.size());
        return cases.stream()
                .map(path -> dynamicTest(path.getFileName().toString(), () -> refused(path)));
    }

    private static void refused(Path folder) throws IOException {
        BadInput bad =
                assertThrows(
                        BadInput.class,
                        () -> PlanReader.read(folder.resolve("plan.json"), LOOKUPS));
        String expected = Files.readString(folder.resolve("expected.txt"));
        assertEquals(expected, bad.getMessage().replace(folder + "/", "") + "\n");
        assertEquals(expected.lines().count(), bad.faults().size());
    }

    @Test
    void aByteOrderMarkIsPassedOver() throws IOException {
        Path plan = folder.resolve("plan.json");
        Files.writeString(plan, "\uFEFF" + Files.readString(MINIMAL));
        assertEquals("plan", PlanReader.read(plan, LOOKUPS).name());
    }

    @Test
    void aPlanTooLargeIsRefused() throws IOException {
        Path plan = folder.resolve("plan.json");
        Files.writeString(plan, Files.readString(MINIMAL) + " ".repeat(20_000_000));
        assertRefused(plan, "plan.json: the file is larger than 20 MB; accepted: up to 20 MB");
    }

    @Test
    void aLinkThatLeavesTheFolderIsRefused() throws IOException {
        Path inside = Files.createDirectory(folder.resolve("inside"));
        Path secret = Files.writeString(folder.resolve("secret.csv"), "time\n");
        Files.createSymbolicLink(inside.resolve("weather.csv"), secret);
        Path plan = withWeather(inside.resolve("plan.json"));
        assertRefused(
                plan,
                "plan.json $.weather.csv: is 'weather.csv', a link that leads outside the plan's"
                        + " folder; accepted: a file in the plan's folder or below it");
    }

    @Test
    void aFileWithoutPermissionIsRefused() throws IOException {
        Path plan = folder.resolve("plan.json");
        Files.copy(MINIMAL, plan);
        Files.setPosixFilePermissions(plan, PosixFilePermissions.fromString("---------"));
        assumeFalse(Files.isReadable(plan), "root may read everything");
        assertRefused(
                plan,
                "plan.json: there is no permission to read it; accepted: a file that can be read");
    }

    static Path withWeather(Path plan) throws IOException {
        String text = Files.readString(MINIMAL);
        int from = text.indexOf("\"weather\"");
        int to = text.indexOf("\"from\"");
        return Files.writeString(
                plan,
                text.substring(0, from)
                        + "\"weather\": {\"csv\": \"weather.csv\"}, "
                        + text.substring(to));
    }

    private static void assertRefused(Path plan, String message) {
        BadInput bad = assertThrows(BadInput.class, () -> PlanReader.read(plan, LOOKUPS));
        assertEquals(message, bad.getMessage().replace(plan.getParent() + "/", ""));
    }
}

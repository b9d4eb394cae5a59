package org.wardon.cli;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.concurrent.TimeUnit;
import tools.jackson.databind.JsonNode;
import tools.jackson.databind.json.JsonMapper;

/** The packed program, run as a keeper runs it. */
final class WardonJar {
    private static final Path JAR = Path.of("target/wardon.jar").toAbsolutePath();
    private static final long PATIENCE_S = 240;

    private WardonJar() {}

    /** What a run left behind. */
    record Ran(int status, String out, String err) {
        /** Checks that it went well and said nothing on the side. */
        Ran good() {
            assertEquals("", err);
            assertEquals(0, status, out);
            return this;
        }

        /** Checks that it was refused with a line a fault and nothing else. */
        Ran refused(int expected) {
            assertEquals(expected, status, err);
            assertEquals("", out);
            assertFalse(err.isBlank());
            assertTrue(err.lines().allMatch(line -> line.startsWith("wardon: ")), err);
            assertFalse(err.contains("\tat ") || err.contains("Exception"), err);
            return this;
        }

        JsonNode json() {
            return JsonMapper.shared().readTree(good().out());
        }
    }

    /** Runs the program to its end. */
    static Ran run(String... words) {
        Path out = temporary("out");
        Path err = temporary("err");
        try {
            Process process = start(out, err, words);
            if (!process.waitFor(PATIENCE_S, TimeUnit.SECONDS)) {
                process.destroyForcibly();
                throw new AssertionError("no end after " + PATIENCE_S + " s");
            }
            return new Ran(process.exitValue(), text(out), text(err));
        } catch (InterruptedException e) {
            Thread.currentThread().interrupt();
            throw new IllegalStateException(e);
        } finally {
            out.toFile().delete();
            err.toFile().delete();
        }
    }

    /** Starts the program and returns at once. */
    static Process start(Path out, Path err, String... words) {
        List<String> command = new ArrayList<>();
        command.add(Path.of(System.getProperty("java.home"), "bin", "java").toString());
        // As the program starts itself for long answers, short ones too: they come sooner.
        command.addAll(Launcher.MACHINE);
        command.addAll(
                List.of(
                        "-Xmx512m",
                        "-XX:SharedArchiveFile=" + JAR.resolveSibling("wardon.jsa"),
                        "-Xlog:disable"));
        command.add("-jar");
        command.add(JAR.toString());
        command.addAll(List.of(words));
        assertTrue(Files.isRegularFile(JAR), JAR + " is not packed yet");
        ProcessBuilder builder =
                new ProcessBuilder(command)
                        .redirectOutput(out.toFile())
                        .redirectError(err.toFile());
        // No keeper's own values of the machine the tests run on.
        builder.environment().put("WARDON_HOME", temporaryFolder().toString());
        builder.environment().remove("JAVA_TOOL_OPTIONS");
        try {
            return builder.start();
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }

    private static Path temporaryFolder() {
        return Path.of("target", "empty-home").toAbsolutePath();
    }

    private static Path temporary(String name) {
        try {
            return Files.createTempFile("wardon-" + name, ".txt");
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }

    private static String text(Path file) {
        try {
            return Files.readString(file, StandardCharsets.UTF_8);
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }
}

package org.wardon.cli;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.concurrent.TimeUnit;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.condition.DisabledOnOs;
import org.junit.jupiter.api.condition.OS;
import org.junit.jupiter.api.io.TempDir;

/** The program started as people start it, without an option: long answers in their own machine. */
@DisabledOnOs(value = OS.WINDOWS, disabledReason = "options of a process are not told there")
class LauncherIT {
    private static final Path MINIMAL = Path.of("src/test/resources/plans/minimal/plan.json");

    /** One option of the user's own: the answer comes from the machine as Java sets it up. */
    private static final List<String> OWN_OPTION = List.of("-Xmx512m");

    @TempDir Path folder;

    private Process start(String... words) throws IOException {
        return start(List.of(), words);
    }

    private Process start(List<String> options, String... words) throws IOException {
        List<String> command = new ArrayList<>();
        command.add(Path.of(System.getProperty("java.home"), "bin", "java").toString());
        command.addAll(options);
        command.addAll(List.of("-jar", Path.of("target/wardon.jar").toAbsolutePath().toString()));
        command.addAll(List.of(words));
        ProcessBuilder builder =
                new ProcessBuilder(command)
                        .redirectOutput(folder.resolve("out").toFile())
                        .redirectError(folder.resolve("err").toFile());
        List.of("JAVA_TOOL_OPTIONS", "JDK_JAVA_OPTIONS", "_JAVA_OPTIONS")
                .forEach(builder.environment()::remove);
        builder.environment().put("WARDON_HOME", folder.resolve("home").toString());
        return builder.start();
    }

    private static void end(Process process) throws InterruptedException {
        if (!process.waitFor(240, TimeUnit.SECONDS)) {
            process.destroyForcibly();
            throw new AssertionError("no end after 240 s");
        }
    }

    @Test
    void answersTheSameInEitherMachine() throws IOException, InterruptedException {
        for (String[] words :
                List.of(
                        new String[] {"advise", MINIMAL.toString()},
                        new String[] {"keep", "mango", "--at", "13"})) {
            String there = answer(List.of(), words);
            assertFalse(there.isBlank());
            assertEquals(there, answer(OWN_OPTION, words));
        }
    }

    private String answer(List<String> options, String... words)
            throws IOException, InterruptedException {
        Process process = start(options, words);
        end(process);
        assertEquals("", Files.readString(folder.resolve("err")));
        assertEquals(0, process.exitValue());
        return Files.readString(folder.resolve("out"));
    }

    @Test
    void handsTheStatusOn() throws IOException, InterruptedException {
        Path missing = folder.resolve("missing.json");
        Process process = start("advise", missing.toString());
        end(process);
        assertEquals(2, process.exitValue());
        String err = Files.readString(folder.resolve("err"));
        assertEquals(1, err.lines().count(), err);
        assertTrue(err.startsWith("wardon: " + missing), err);
        assertEquals("", Files.readString(folder.resolve("out")));
    }

    @Test
    void machineEndsWithItsStarter() throws IOException, InterruptedException {
        String text = Files.readString(MINIMAL).replace("\"days\": 2", "\"days\": 3000");
        Path plan = Files.writeString(folder.resolve("plan.json"), text);
        Process process = start("advise", plan.toString());
        Optional<ProcessHandle> machine = Optional.empty();
        while (process.isAlive() && machine.isEmpty()) {
            machine = process.descendants().findFirst();
            Thread.sleep(5);
        }
        assertTrue(machine.isPresent(), Files.readString(folder.resolve("err")));
        process.destroyForcibly();
        long until = System.nanoTime() + TimeUnit.SECONDS.toNanos(30);
        while (machine.get().isAlive() && System.nanoTime() < until) {
            Thread.sleep(20);
        }
        boolean lives = machine.get().isAlive();
        machine.get().destroyForcibly();
        assertFalse(lives, "the second machine lives on without its starter");
    }
}

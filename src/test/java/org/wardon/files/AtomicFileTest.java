package org.wardon.files;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assumptions.assumeTrue;

import java.io.File;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.concurrent.TimeUnit;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** A file is written whole or not at all, and the folder is left as it was. */
class AtomicFileTest {
    @TempDir Path folder;

    @Test
    void writesAndReplaces() throws IOException {
        Path file = folder.resolve("out.json");
        AtomicFile.write(file, out -> out.write("one °C\n"));
        AtomicFile.write(file, out -> out.write("two\n"));
        assertEquals("two\n", Files.readString(file));
        assertEquals(List.of("out.json"), names());
    }

    @Test
    void aFullDiskLeavesWhatStoodThere() throws IOException {
        Path file = Files.writeString(folder.resolve("out.json"), "before\n");
        CannotWrite e =
                assertThrows(
                        CannotWrite.class,
                        () ->
                                AtomicFile.write(
                                        file,
                                        out -> {
                                            out.write("x".repeat(200_000));
                                            throw new IOException("No space left on device");
                                        }));
        assertEquals(
                file
                        + ": cannot be written: the disk is full; free some space and run again;"
                        + " nothing was left under that name",
                e.getMessage());
        assertEquals("before\n", Files.readString(file));
        assertEquals(List.of("out.json"), names());
    }

    @Test
    void aReallyFullDeviceIsTold() {
        Path full = Path.of("/dev/full");
        assumeTrue(Files.exists(full), "only where the system has such a device");
        CannotWrite e =
                assertThrows(
                        CannotWrite.class,
                        () -> AtomicFile.write(full, out -> out.write("x".repeat(200_000))));
        assertEquals(
                "/dev/full: cannot be written: the disk is full; free some space and run again;"
                        + " nothing was left under that name",
                e.getMessage());
    }

    @Test
    void aFaultOfTheBodyLeavesNothing() throws IOException {
        Path file = folder.resolve("out.json");
        assertThrows(
                IllegalStateException.class,
                () ->
                        AtomicFile.write(
                                file,
                                out -> {
                                    out.write("half");
                                    throw new IllegalStateException("stopped");
                                }));
        assertEquals(List.of(), names());
    }

    @Test
    void aMissingFolderIsTold() {
        Path file = folder.resolve("none/out.json");
        CannotWrite e =
                assertThrows(
                        CannotWrite.class, () -> AtomicFile.write(file, out -> out.write("x")));
        assertEquals(
                file
                        + ": cannot be written: its folder does not exist; make the folder first,"
                        + " or give another",
                e.getMessage());
    }

    @Test
    void aFolderInTheWayIsTold() throws IOException {
        Path file = Files.createDirectory(folder.resolve("out.json"));
        CannotWrite e =
                assertThrows(
                        CannotWrite.class, () -> AtomicFile.write(file, out -> out.write("x")));
        assertEquals(file + ": it is a folder; give the name of a file", e.getMessage());
    }

    @Test
    void aReadOnlyFolderIsTold() {
        // /proc takes no files from anybody, root included.
        Path file = Path.of("/proc/wardon.json");
        assumeTrue(Files.isDirectory(Path.of("/proc")), "only where the system has /proc");
        CannotWrite e =
                assertThrows(
                        CannotWrite.class, () -> AtomicFile.write(file, out -> out.write("x")));
        assertEquals(file.toString(), e.fault().file());
        assertFalse(Files.exists(file));
    }

    @Test
    void aLinkIsFollowedAndStays() throws IOException {
        Path real = Files.writeString(folder.resolve("real.json"), "before\n");
        Path link = Files.createSymbolicLink(folder.resolve("link.json"), real);
        AtomicFile.write(link, out -> out.write("after\n"));
        assertEquals("after\n", Files.readString(real));
        assertEquals(true, Files.isSymbolicLink(link));
    }

    @Test
    void aKilledRunLeavesNothingUnderTheFinalName() throws Exception {
        Path file = folder.resolve("out.json");
        Process process =
                new ProcessBuilder(
                                Path.of(System.getProperty("java.home"), "bin", "java").toString(),
                                "-cp",
                                System.getProperty("java.class.path")
                                        + File.pathSeparator
                                        + "target/classes",
                                SlowWriter.class.getName(),
                                file.toString())
                        .redirectErrorStream(true)
                        .start();
        assertEquals('r', process.getInputStream().read(), "the writer is half way");
        process.destroyForcibly();
        process.waitFor(10, TimeUnit.SECONDS);
        assertFalse(Files.exists(file));
    }

    /** Writes half a file and waits to be killed. */
    static final class SlowWriter {
        private SlowWriter() {}

        public static void main(String[] args) {
            AtomicFile.write(
                    Path.of(args[0]),
                    out -> {
                        out.write("half".repeat(100_000));
                        out.flush();
                        System.out.println("ready");
                        sleep();
                    });
        }

        private static void sleep() {
            try {
                TimeUnit.MINUTES.sleep(1);
            } catch (InterruptedException e) {
                Thread.currentThread().interrupt();
            }
        }
    }

    private List<String> names() throws IOException {
        try (Stream<Path> files = Files.list(folder)) {
            return files.map(path -> path.getFileName().toString()).sorted().toList();
        }
    }
}

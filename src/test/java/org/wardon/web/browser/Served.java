package org.wardon.web.browser;

import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.concurrent.TimeUnit;

/** The packed program serving its pages from a home of its own, as a keeper starts it. */
public final class Served implements AutoCloseable {
    private static final Path JAR = Path.of("target/wardon.jar").toAbsolutePath();
    private static final long PATIENCE_MS = 60_000;
    private static final long LOOK_EVERY_MS = 20;

    private final Process process;
    private final String address;

    private Served(Process process, String address) {
        this.process = process;
        this.address = address;
    }

    /**
     * Starts it on a free port.
     *
     * @param home empty folder for what is kept
     * @param words further words of the command
     * @return the server, once it listens
     */
    public static Served from(Path home, String... words) {
        assertTrue(Files.isRegularFile(JAR), JAR + " is not packed yet");
        List<String> command = new ArrayList<>();
        command.add(Path.of(System.getProperty("java.home"), "bin", "java").toString());
        command.addAll(List.of("-jar", JAR.toString(), "open", "--port", "0", "--no-browser"));
        command.addAll(List.of("--home", home.toString()));
        command.addAll(List.of(words));
        Path out = home.resolve("out.txt");
        Path err = home.resolve("err.txt");
        try {
            ProcessBuilder builder =
                    new ProcessBuilder(command)
                            .redirectOutput(out.toFile())
                            .redirectError(err.toFile());
            builder.environment().remove("JAVA_TOOL_OPTIONS");
            Process process = builder.start();
            return new Served(process, address(process, out, err));
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }

    private static String address(Process process, Path out, Path err) throws IOException {
        long end = System.currentTimeMillis() + PATIENCE_MS;
        while (System.currentTimeMillis() < end && process.isAlive()) {
            Optional<String> line = Files.readString(out).lines().findFirst();
            if (line.isPresent()) {
                return line.get().strip().replaceFirst("/$", "");
            }
            pause();
        }
        process.destroy();
        throw new AssertionError("no address told: " + Files.readString(err));
    }

    private static void pause() {
        try {
            Thread.sleep(LOOK_EVERY_MS);
        } catch (InterruptedException e) {
            Thread.currentThread().interrupt();
            throw new IllegalStateException(e);
        }
    }

    /**
     * Returns the address told, without a slash at its end.
     *
     * @return the address
     */
    public String address() {
        return address;
    }

    @Override
    public void close() {
        process.destroy();
        try {
            assertTrue(process.waitFor(30, TimeUnit.SECONDS), "does not end");
        } catch (InterruptedException e) {
            Thread.currentThread().interrupt();
        }
    }
}

package org.wardon.cli;

import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Objects;
import java.util.concurrent.Callable;
import org.jspecify.annotations.Nullable;
import org.wardon.files.PlanReader;
import org.wardon.reference.ReferenceBook;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Option;

/** Runs the demo that ships with the program. */
@Command(
        name = "demo",
        mixinStandardHelpOptions = true,
        description = {
            "Advises on an invented store in which some things are wrong on purpose.",
            "Everything in it is invented: place, weather, chambers, lots, prices."
        })
final class Demo implements Callable<Integer> {
    private static final String PLAN = "landing.json";
    private static final List<String> FILES = List.of(PLAN, "weather.csv", "README.md");

    @Mixin private Shared shared = new Shared();

    @Mixin private AdviceOutput output = new AdviceOutput();

    @Option(
            names = "--copy-to",
            paramLabel = "DIR",
            description = "Also copy the demo's files into this new or empty folder, to try on.")
    private @Nullable Path copyTo;

    @Override
    public Integer call() throws IOException {
        Path folder = copyTo == null ? Files.createTempDirectory("wardon-demo") : copyTo;
        try (ReferenceBook book = shared.book()) {
            Files.createDirectories(folder);
            for (String file : FILES) {
                copy(file, folder.resolve(file));
            }
            output.advise(
                    PlanReader.read(folder.resolve(PLAN), shared.lookups(book)), book, shared);
        } finally {
            if (copyTo == null) {
                remove(folder);
            }
        }
        return Exit.OK;
    }

    private static void copy(String file, Path to) {
        try (InputStream in =
                Objects.requireNonNull(
                        Demo.class.getResourceAsStream("/org/wardon/demo/" + file), file)) {
            Files.copy(in, to);
        } catch (IOException e) {
            throw new UncheckedIOException("the demo cannot be copied to " + to, e);
        }
    }

    private static void remove(Path folder) throws IOException {
        for (String file : FILES) {
            Files.deleteIfExists(folder.resolve(file));
        }
        Files.deleteIfExists(folder);
    }
}

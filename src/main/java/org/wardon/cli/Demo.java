package org.wardon.cli;

import java.io.IOException;
import java.io.InputStreamReader;
import java.io.Reader;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.LinkOption;
import java.nio.file.Path;
import java.util.List;
import java.util.Objects;
import java.util.concurrent.Callable;
import org.jspecify.annotations.Nullable;
import org.wardon.errors.BadInput;
import org.wardon.files.AtomicFile;
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
    private static final List<String> FILES =
            List.of(PLAN, "weather.csv", "hillside.json", "README.md");

    @Mixin private Shared shared = new Shared();

    @Mixin private AdviceOutput output = new AdviceOutput();

    @Option(
            names = "--copy-to",
            paramLabel = "DIR",
            description = "Also copy the demo's files into this new or empty folder, to try on.")
    private @Nullable Path copyTo;

    @Override
    public Integer call() {
        Path folder = copyTo == null ? temporaryFolder() : newOrEmpty(copyTo);
        try (ReferenceBook book = shared.book()) {
            for (String file : FILES) {
                copy(file, folder.resolve(file));
            }
            output.advise(
                    PlanReader.read(folder.resolve(PLAN), shared.lookups(book)), book, shared);
        } finally {
            if (copyTo == null) {
                FILES.forEach(file -> folder.resolve(file).toFile().delete());
                folder.toFile().delete();
            }
        }
        return Exit.OK;
    }

    private static Path temporaryFolder() {
        try {
            return Files.createTempDirectory("wardon-demo");
        } catch (IOException e) {
            throw new BadInput(
                    "demo",
                    "",
                    "no temporary folder can be made: " + e.getMessage(),
                    "name a folder with --copy-to");
        }
    }

    private static Path newOrEmpty(Path folder) {
        for (String file : FILES) {
            if (Files.exists(folder.resolve(file), LinkOption.NOFOLLOW_LINKS)) {
                throw new BadInput(
                        folder.toString(),
                        "",
                        "a file '" + file + "' is there already",
                        "give a new or empty folder");
            }
        }
        return AtomicFile.folder(folder);
    }

    private static void copy(String file, Path to) {
        AtomicFile.write(
                to,
                out -> {
                    try (Reader text =
                            new InputStreamReader(
                                    Objects.requireNonNull(
                                            Demo.class.getResourceAsStream(
                                                    "/org/wardon/demo/" + file),
                                            file),
                                    StandardCharsets.UTF_8)) {
                        text.transferTo(out);
                    }
                });
    }
}

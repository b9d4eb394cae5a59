package org.wardon.files;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.InvalidPathException;
import java.nio.file.Path;
import java.util.Optional;
import org.wardon.files.json.Json;

/** The files in a plan's folder or below it, and never outside. */
final class FilesOfFolder implements PlanFiles {
    private static final String INSIDE = "accepted: a file in the plan's folder or below it";

    private final Path planFile;

    FilesOfFolder(Path planFile) {
        this.planFile = planFile;
    }

    @Override
    public Found find(String name) {
        try {
            Path folder = Optional.ofNullable(planFile.getParent()).orElse(Path.of(""));
            Path file = folder.resolve(name);
            Path home = folder.toAbsolutePath().normalize();
            if (Path.of(name).isAbsolute() || !file.toAbsolutePath().normalize().startsWith(home)) {
                return no("is " + Json.quoted(name) + ", outside the plan's folder");
            }
            if (!Files.exists(file)) {
                return no("the file " + Json.quoted(name) + " does not exist");
            }
            if (Files.isDirectory(file)) {
                return no("is " + Json.quoted(name) + ", a folder");
            }
            // A link may lead out of the folder though its name does not.
            if (!file.toRealPath().startsWith(folder.toAbsolutePath().toRealPath())) {
                return no(
                        "is "
                                + Json.quoted(name)
                                + ", a link that leads outside the plan's folder");
            }
            return new Text(TextFile.read(file, file.toString(), LARGEST_MB), file.toString());
        } catch (InvalidPathException | IOException e) {
            return no("is " + Json.quoted(name) + ", no usable file name");
        }
    }

    private static Absent no(String what) {
        return new Absent(what, INSIDE);
    }
}

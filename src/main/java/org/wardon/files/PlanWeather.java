package org.wardon.files;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.InvalidPathException;
import java.nio.file.Path;
import java.time.LocalDateTime;
import java.util.Optional;
import java.util.OptionalDouble;
import org.wardon.errors.BadInput;
import org.wardon.files.json.Faults;
import org.wardon.files.json.Json;
import org.wardon.files.json.Part;
import org.wardon.files.readings.WeatherCsv;
import org.wardon.plan.WeatherSource;

/**
 * Finds the weather of a plan: steady, made from normals, or a file in the plan's folder and never
 * outside it.
 */
final class PlanWeather {
    private static final String INSIDE = "accepted: a file in the plan's folder or below it";

    private PlanWeather() {}

    /** Returns the weather, absent where the plan or the file has faults. */
    static Optional<WeatherSource> read(Part plan, Path planFile, Faults faults) {
        Part weather = plan.at("weather");
        if (faults.at(weather.path())) {
            return Optional.empty();
        }
        if (weather.has("steady")) {
            Part steady = weather.at("steady");
            return Optional.of(
                    new WeatherSource.Steady(
                            steady.at("temperatureC").number().orElseThrow(),
                            steady.at("humidityPct").number().orElseThrow()));
        }
        if (weather.has("normals")) {
            return NormalsReader.read(plan, faults).map(source -> source);
        }
        Part csv = weather.at("csv");
        return csv.text().flatMap(name -> csv(plan, csv.path(), name, planFile, faults));
    }

    private static Optional<WeatherSource> csv(
            Part plan, String path, String name, Path planFile, Faults faults) {
        Optional<Path> file = inside(planFile, name, path, faults);
        Optional<LocalDateTime> from = Times.at(plan.at("from"));
        OptionalDouble days = plan.at("days").number();
        boolean known =
                from.isPresent()
                        && days.isPresent()
                        && !faults.at("$.from")
                        && !faults.at("$.days");
        if (file.isEmpty() || !known) {
            return Optional.empty();
        }
        try {
            return Optional.of(
                    WeatherCsv.read(
                            file.get(),
                            file.get().toString(),
                            name,
                            from.get(),
                            days.getAsDouble()));
        } catch (BadInput e) {
            faults.addAll(e.faults());
            return Optional.empty();
        }
    }

    private static Optional<Path> inside(Path planFile, String name, String path, Faults faults) {
        try {
            Path folder = Optional.ofNullable(planFile.getParent()).orElse(Path.of(""));
            Path file = folder.resolve(name);
            Path home = folder.toAbsolutePath().normalize();
            if (Path.of(name).isAbsolute() || !file.toAbsolutePath().normalize().startsWith(home)) {
                faults.add(path, "is " + Json.quoted(name) + ", outside the plan's folder", INSIDE);
                return Optional.empty();
            }
            if (!Files.exists(file)) {
                faults.add(path, "the file " + Json.quoted(name) + " does not exist", INSIDE);
                return Optional.empty();
            }
            if (Files.isDirectory(file)) {
                faults.add(path, "is " + Json.quoted(name) + ", a folder", INSIDE);
                return Optional.empty();
            }
            // A link may lead out of the folder though its name does not.
            if (!file.toRealPath().startsWith(folder.toAbsolutePath().toRealPath())) {
                faults.add(
                        path,
                        "is " + Json.quoted(name) + ", a link that leads outside the plan's folder",
                        INSIDE);
                return Optional.empty();
            }
            return Optional.of(file);
        } catch (InvalidPathException | IOException e) {
            faults.add(path, "is " + Json.quoted(name) + ", no usable file name", INSIDE);
            return Optional.empty();
        }
    }
}

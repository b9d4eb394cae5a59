package org.wardon.files;

import java.time.LocalDateTime;
import java.util.Optional;
import java.util.OptionalDouble;
import org.wardon.errors.BadInput;
import org.wardon.files.json.Faults;
import org.wardon.files.json.Part;
import org.wardon.files.readings.WeatherCsv;
import org.wardon.plan.WeatherSource;

/** Finds the weather of a plan: steady, made from normals, or a file the plan names. */
final class PlanWeather {
    private PlanWeather() {}

    /** Returns the weather, absent where the plan or the file has faults. */
    static Optional<WeatherSource> read(Part plan, PlanFiles files, Faults faults) {
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
        return csv.text().flatMap(name -> csv(plan, csv.path(), name, files, faults));
    }

    private static Optional<WeatherSource> csv(
            Part plan, String path, String name, PlanFiles files, Faults faults) {
        try {
            PlanFiles.Found found = files.find(name);
            if (found instanceof PlanFiles.Absent absent) {
                faults.add(path, absent.what(), absent.accepted());
                return Optional.empty();
            }
            return csv(plan, name, (PlanFiles.Text) found, faults);
        } catch (BadInput e) {
            faults.addAll(e.faults());
            return Optional.empty();
        }
    }

    private static Optional<WeatherSource> csv(
            Part plan, String name, PlanFiles.Text file, Faults faults) {
        Optional<LocalDateTime> from = Times.at(plan.at("from"));
        OptionalDouble days = plan.at("days").number();
        boolean known =
                from.isPresent()
                        && days.isPresent()
                        && !faults.at("$.from")
                        && !faults.at("$.days");
        return known
                ? Optional.of(
                        WeatherCsv.read(
                                file.text(), file.shown(), name, from.get(), days.getAsDouble()))
                : Optional.empty();
    }
}

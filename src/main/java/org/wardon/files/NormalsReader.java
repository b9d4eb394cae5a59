package org.wardon.files;

import java.time.LocalDateTime;
import java.time.ZoneId;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.OptionalDouble;
import org.wardon.air.Site;
import org.wardon.air.Timeline;
import org.wardon.air.normals.MonthlyNormals;
import org.wardon.air.normals.NormalsWeather;
import org.wardon.files.json.Faults;
import org.wardon.files.json.Part;
import org.wardon.plan.Defaults;
import org.wardon.plan.WeatherSource;

/** Makes the weather of a plan that gives monthly normals, and says what no month can be. */
final class NormalsReader {
    private static final int DAY_H = 24;

    private final Part plan;
    private final Part normals;
    private final Faults faults;

    private NormalsReader(Part plan, Faults faults) {
        this.plan = plan;
        this.normals = plan.at("weather").at("normals");
        this.faults = faults;
    }

    /** Returns the weather, absent where the normals or what else it hangs on have faults. */
    static Optional<WeatherSource.Normals> read(Part plan, Faults faults) {
        return new NormalsReader(plan, faults).read();
    }

    private Optional<WeatherSource.Normals> read() {
        order();
        OptionalDouble latitude = plan.at("site").at("latitudeDeg").number();
        if (latitude.isPresent() && !faults.at("$.site.latitudeDeg")) {
            sun(latitude.getAsDouble());
        }
        for (String path : List.of("$.weather", "$.site", "$.from", "$.days", "$.seed")) {
            if (faults.at(path)) {
                return Optional.empty();
            }
        }
        Optional<LocalDateTime> from = Times.at(plan.at("from"));
        OptionalDouble days = plan.at("days").number();
        if (from.isEmpty() || days.isEmpty()) {
            return Optional.empty();
        }
        MonthlyNormals months = months();
        Timeline timeline = new Timeline(from.get(), site().zone());
        long seed = (long) plan.at("seed").number().orElse(Defaults.SEED);
        int hours = (int) Math.ceil(days.getAsDouble() * DAY_H - 1e-9);
        return Optional.of(
                new WeatherSource.Normals(
                        months, NormalsWeather.of(months, site(), timeline, seed, hours)));
    }

    private MonthlyNormals months() {
        return new MonthlyNormals(
                numbers("dailyMaxC"),
                numbers("dailyMinC"),
                numbers("humidityPct"),
                normals.has("globalKWhM2Day")
                        ? Optional.of(numbers("globalKWhM2Day"))
                        : Optional.empty());
    }

    private Site site() {
        Part site = plan.at("site");
        return new Site(
                site.at("latitudeDeg").number().orElseThrow(),
                site.at("longitudeDeg").number().orElseThrow(),
                site.at("elevationM").number().orElse(Defaults.ELEVATION_M.value()),
                ZoneId.of(site.at("zone").text().orElseThrow()));
    }

    private List<Double> numbers(String name) {
        return normals.at(name).items().stream().map(one -> one.number().orElseThrow()).toList();
    }

    /** The highest of a month is not below its lowest. */
    private void order() {
        List<Part> highs = normals.at("dailyMaxC").items();
        List<Part> lows = normals.at("dailyMinC").items();
        for (int m = 0; m < Math.min(highs.size(), lows.size()); m++) {
            OptionalDouble high = highs.get(m).number();
            OptionalDouble low = lows.get(m).number();
            boolean known = high.isPresent() && low.isPresent();
            if (known && high.getAsDouble() < low.getAsDouble()) {
                String least = lows.get(m).json().orElseThrow().shown();
                faults.add(
                        highs.get(m).path(),
                        "is "
                                + highs.get(m).json().orElseThrow().shown()
                                + " °C, below the month's dailyMinC of "
                                + least
                                + " °C",
                        "accepted: " + least + " °C or more");
            }
        }
    }

    /** No month has more sun than the sky lets through. */
    private void sun(double latitudeDeg) {
        List<Part> suns = normals.at("globalKWhM2Day").items();
        for (int m = 0; m < Math.min(suns.size(), MonthlyNormals.MONTHS); m++) {
            double most = MonthlyNormals.mostKWhM2(m, latitudeDeg);
            OptionalDouble sun = suns.get(m).number();
            if (sun.isPresent() && sun.getAsDouble() > most) {
                faults.add(
                        suns.get(m).path(),
                        "is "
                                + suns.get(m).json().orElseThrow().shown()
                                + " kWh/m2, more than reaches the ground at this latitude in that"
                                + " month",
                        String.format(Locale.ROOT, "accepted: 0 to %.2f kWh/m2", most));
            }
        }
    }
}

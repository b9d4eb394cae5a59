package org.wardon.plan;

import java.util.List;
import org.wardon.air.Weather;
import org.wardon.air.normals.MonthlyNormals;
import org.wardon.errors.Require;

/** Where the weather of a plan comes from. */
public sealed interface WeatherSource {
    /**
     * Returns the hourly weather of the run.
     *
     * @return hour 0 at the plan's {@code from}
     */
    Weather weather();

    /**
     * Weather that never changes.
     *
     * @param temperatureC outdoor air, °C
     * @param humidityPct relative humidity, percent
     */
    record Steady(double temperatureC, double humidityPct) implements WeatherSource {
        /** Checks the bounds. */
        public Steady {
            Require.within("weather.steady.temperatureC", temperatureC, -60, 60, "°C", "");
            Require.within("weather.steady.humidityPct", humidityPct, 0, 100, "%", "");
        }

        @Override
        public Weather weather() {
            return Weather.steady(temperatureC, humidityPct);
        }
    }

    /**
     * Weather read from a file.
     *
     * @param file the file as the plan names it
     * @param weather hourly values from {@code from} to the end of the plan
     * @param filled gaps of more than an hour that were filled in
     */
    record Csv(String file, Weather weather, List<FilledGap> filled) implements WeatherSource {
        /** Copies the list. */
        public Csv {
            filled = List.copyOf(filled);
        }
    }

    /**
     * Weather made from monthly normals.
     *
     * @param normals the normals
     * @param weather hourly values made from them, from {@code from} to the end of the plan
     */
    record Normals(MonthlyNormals normals, Weather weather) implements WeatherSource {}
}

package org.wardon.enclosure;

import java.util.Map;
import java.util.Optional;
import org.wardon.air.Site;
import org.wardon.air.Sunshine;
import org.wardon.air.Timeline;
import org.wardon.air.Weather;
import org.wardon.air.YearWave;
import org.wardon.errors.Require;

/**
 * What surrounds a chamber during a run. Its sun is worked out once for all faces.
 *
 * @param site where the store stands, with the course of its year where known
 * @param timeline the run's calendar
 * @param weather outdoor weather
 * @param sun its sun, for hour 0 to {@code hours}
 * @param hours length of the run, h
 * @param insideMeanC temperature the chamber is expected to keep, °C; tells heat flowing up from
 *     down
 * @param neighbourC hourly air of other chambers by id, °C, as far as they are known
 * @param known what was worked out before of the same site, timeline, weather, sun and hours
 */
public record Surroundings(
        Site site,
        Timeline timeline,
        Weather weather,
        Sunshine sun,
        int hours,
        double insideMeanC,
        Map<String, HourlyAir> neighbourC,
        WorkedOut known) {
    /** Air of a neighbour, hour by hour. */
    @FunctionalInterface
    public interface HourlyAir {
        /**
         * Returns the air temperature.
         *
         * @param hour hour of the run
         * @return °C
         */
        double temperatureC(int hour);
    }

    /** Copies the neighbours and checks the length. */
    public Surroundings {
        neighbourC = Map.copyOf(neighbourC);
        Require.within("hours", hours, 1, 200_000, "h", "");
    }

    /**
     * Returns the surroundings of a chamber that has no neighbours.
     *
     * @param site where
     * @param timeline the run's calendar
     * @param weather its weather
     * @param hours length of the run, h
     * @param insideMeanC temperature the chamber is expected to keep, °C
     * @return the surroundings, ground at the mean of the weather
     */
    public static Surroundings of(
            Site site, Timeline timeline, Weather weather, int hours, double insideMeanC) {
        Sunshine sun = Sunshine.of(site, timeline, weather, hours);
        return new Surroundings(
                site, timeline, weather, sun, hours, insideMeanC, Map.of(), new WorkedOut());
    }

    /**
     * Returns a copy with other neighbours.
     *
     * @param neighbours hourly air by chamber id
     * @return the copy
     */
    public Surroundings withNeighbours(Map<String, HourlyAir> neighbours) {
        return new Surroundings(
                site, timeline, weather, sun, hours, insideMeanC, neighbours, known);
    }

    /**
     * Returns a copy for a chamber that is expected to keep another temperature.
     *
     * @param otherC that temperature, °C
     * @return the copy
     */
    public Surroundings keeping(double otherC) {
        return new Surroundings(site, timeline, weather, sun, hours, otherC, neighbourC, known);
    }

    /**
     * Returns the course of the year that the ground follows: what the site tells, else that of a
     * run of a year.
     *
     * @return empty where nobody knows; the ground is then taken at the mean of the run's weather
     */
    public Optional<YearWave> year() {
        return site.year().or(() -> YearWave.of(weather, timeline));
    }

    /**
     * Returns the mean of the run's outdoor air.
     *
     * @return °C
     */
    public double meanOutdoorC() {
        double sum = 0;
        for (int h = 0; h <= hours; h++) {
            sum += weather.temperatureC(h);
        }
        return sum / (hours + 1);
    }
}

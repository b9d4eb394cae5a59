package org.wardon.heat;

import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.wardon.air.Site;
import org.wardon.air.Timeline;
import org.wardon.air.Weather;
import org.wardon.cooling.Cooler;
import org.wardon.cooling.Outage;
import org.wardon.cooling.Setting;
import org.wardon.cooling.SettingCourse;
import org.wardon.cooling.solar.SolarSupply;
import org.wardon.enclosure.Enclosure;
import org.wardon.enclosure.Surroundings;
import org.wardon.errors.Require;

/**
 * One chamber to be run through a span of time.
 *
 * @param chamberId id of the chamber
 * @param site where it stands
 * @param timeline calendar of the run
 * @param weather outdoor weather from second 0
 * @param enclosure the chamber as built and used
 * @param coolers in the order they act; none for a passive chamber
 * @param settings what the keeper dials in, and when
 * @param outages spans without power, in order of time
 * @param stays the lots
 * @param factors what perturbs the run
 * @param start the air it starts with
 * @param durationS how long, s, above 0
 * @param doorMode how the door acts
 * @param controlMode how coolers follow the thermostat
 * @param extras heater, humidifier, air of neighbours
 */
public record ChamberRun(
        String chamberId,
        Site site,
        Timeline timeline,
        Weather weather,
        Enclosure enclosure,
        List<Cooler> coolers,
        SettingCourse settings,
        List<Outage> outages,
        List<Stay> stays,
        Factors factors,
        Start start,
        double durationS,
        DoorMode doorMode,
        ControlMode controlMode,
        Extras extras) {
    /**
     * What else stands in the chamber or beside it.
     *
     * @param heaterW heater that keeps a chamber from falling below its setting - band, W
     * @param humidifierKgH water a humidifier can add towards the wanted humidity, kg/h
     * @param neighbours air of the chambers next door, by id
     * @param solar panels and battery its electricity comes from; absent where a grid feeds it
     * @param around surroundings worked out before for the same site, weather and span, whose sun
     *     is taken; absent, or of another span or weather, it is worked out
     */
    public record Extras(
            double heaterW,
            double humidifierKgH,
            Map<String, AirSeries> neighbours,
            Optional<SolarSupply> solar,
            Optional<Surroundings> around) {
        /** Nothing else. */
        public static final Extras NONE = new Extras(0, 0, Map.of());

        /** Copies the map and checks the bounds. */
        public Extras {
            neighbours = Map.copyOf(neighbours);
            Require.within("heaterW", heaterW, 0, 1e6, "W", "");
            Require.within("humidifierKgH", humidifierKgH, 0, 1e4, "kg/h", "");
        }

        /**
         * A chamber on the grid.
         *
         * @param heaterW heater, W
         * @param humidifierKgH humidifier, kg/h
         * @param neighbours air of the chambers next door, by id
         */
        public Extras(double heaterW, double humidifierKgH, Map<String, AirSeries> neighbours) {
            this(heaterW, humidifierKgH, neighbours, Optional.empty());
        }

        /**
         * A chamber whose surroundings are worked out for it.
         *
         * @param heaterW heater, W
         * @param humidifierKgH humidifier, kg/h
         * @param neighbours air of the chambers next door, by id
         * @param solar panels and battery, absent where a grid feeds it
         */
        public Extras(
                double heaterW,
                double humidifierKgH,
                Map<String, AirSeries> neighbours,
                Optional<SolarSupply> solar) {
            this(heaterW, humidifierKgH, neighbours, solar, Optional.empty());
        }

        /**
         * Returns the same with surroundings worked out before.
         *
         * @param known surroundings of a run like it
         * @return the changed copy
         */
        public Extras under(Surroundings known) {
            return new Extras(heaterW, humidifierKgH, neighbours, solar, Optional.of(known));
        }

        /**
         * Returns the same, fed by a grid.
         *
         * @return the changed copy
         */
        Extras onGrid() {
            return new Extras(heaterW, humidifierKgH, neighbours, Optional.empty(), around);
        }
    }

    /** Copies the lists and checks the bounds. */
    public ChamberRun {
        Require.text("chamberId", chamberId);
        Require.within("durationS", durationS, 1, 20 * 366 * 86_400.0, "s", "");
        coolers = List.copyOf(coolers);
        outages = List.copyOf(outages);
        stays = List.copyOf(stays);
    }

    /**
     * A plain run: pulses, coolers as built, nothing perturbed, the usual start.
     *
     * @param chamberId id of the chamber
     * @param site where it stands
     * @param timeline calendar of the run
     * @param weather outdoor weather
     * @param enclosure the chamber
     * @param setting what the keeper dials in
     * @param durationS how long, s
     * @return the run, without coolers, outages and lots
     */
    public static ChamberRun of(
            String chamberId,
            Site site,
            Timeline timeline,
            Weather weather,
            Enclosure enclosure,
            Setting setting,
            double durationS) {
        return new ChamberRun(
                chamberId,
                site,
                timeline,
                weather,
                enclosure,
                List.of(),
                SettingCourse.steady(setting),
                List.of(),
                List.of(),
                Factors.PLAIN,
                Start.USUAL,
                durationS,
                DoorMode.PULSES,
                ControlMode.AS_BUILT,
                Extras.NONE);
    }

    /**
     * Returns the run with other weather.
     *
     * @param other taken instead
     * @return the changed copy
     */
    public ChamberRun withWeather(Weather other) {
        return new ChamberRun(
                chamberId,
                site,
                timeline,
                other,
                enclosure,
                coolers,
                settings,
                outages,
                stays,
                factors,
                start,
                durationS,
                doorMode,
                controlMode,
                extras);
    }

    /**
     * Returns the run with another enclosure.
     *
     * @param other taken instead
     * @return the changed copy
     */
    public ChamberRun withEnclosure(Enclosure other) {
        return new ChamberRun(
                chamberId,
                site,
                timeline,
                weather,
                other,
                coolers,
                settings,
                outages,
                stays,
                factors,
                start,
                durationS,
                doorMode,
                controlMode,
                extras);
    }

    /**
     * Returns the run with other coolers.
     *
     * @param other taken instead
     * @return the changed copy
     */
    public ChamberRun withCoolers(List<Cooler> other) {
        return new ChamberRun(
                chamberId,
                site,
                timeline,
                weather,
                enclosure,
                other,
                settings,
                outages,
                stays,
                factors,
                start,
                durationS,
                doorMode,
                controlMode,
                extras);
    }

    /**
     * Returns the run at one other setting throughout.
     *
     * @param other taken instead
     * @return the changed copy
     */
    public ChamberRun withSetting(Setting other) {
        return withSettings(SettingCourse.steady(other));
    }

    /**
     * Returns the setting it starts with.
     *
     * @return the first
     */
    public Setting setting() {
        return settings.first();
    }

    /**
     * Returns the run with other settings.
     *
     * @param other taken instead
     * @return the changed copy
     */
    public ChamberRun withSettings(SettingCourse other) {
        return new ChamberRun(
                chamberId,
                site,
                timeline,
                weather,
                enclosure,
                coolers,
                other,
                outages,
                stays,
                factors,
                start,
                durationS,
                doorMode,
                controlMode,
                extras);
    }

    /**
     * Returns the run with other outages.
     *
     * @param other taken instead
     * @return the changed copy
     */
    public ChamberRun withOutages(List<Outage> other) {
        return new ChamberRun(
                chamberId,
                site,
                timeline,
                weather,
                enclosure,
                coolers,
                settings,
                other,
                stays,
                factors,
                start,
                durationS,
                doorMode,
                controlMode,
                extras);
    }

    /**
     * Returns the run with other lots.
     *
     * @param other taken instead
     * @return the changed copy
     */
    public ChamberRun withStays(List<Stay> other) {
        return new ChamberRun(
                chamberId,
                site,
                timeline,
                weather,
                enclosure,
                coolers,
                settings,
                outages,
                other,
                factors,
                start,
                durationS,
                doorMode,
                controlMode,
                extras);
    }

    /**
     * Returns the run with other factors.
     *
     * @param other taken instead
     * @return the changed copy
     */
    public ChamberRun withFactors(Factors other) {
        return new ChamberRun(
                chamberId,
                site,
                timeline,
                weather,
                enclosure,
                coolers,
                settings,
                outages,
                stays,
                other,
                start,
                durationS,
                doorMode,
                controlMode,
                extras);
    }

    /**
     * Returns the run with another start.
     *
     * @param other taken instead
     * @return the changed copy
     */
    public ChamberRun withStart(Start other) {
        return new ChamberRun(
                chamberId,
                site,
                timeline,
                weather,
                enclosure,
                coolers,
                settings,
                outages,
                stays,
                factors,
                other,
                durationS,
                doorMode,
                controlMode,
                extras);
    }

    /**
     * Returns the run with another span.
     *
     * @param other s
     * @return the changed copy
     */
    public ChamberRun withDurationS(double other) {
        return new ChamberRun(
                chamberId,
                site,
                timeline,
                weather,
                enclosure,
                coolers,
                settings,
                outages,
                stays,
                factors,
                start,
                other,
                doorMode,
                controlMode,
                extras);
    }

    /**
     * Returns the run with another way of the door.
     *
     * @param other taken instead
     * @return the changed copy
     */
    public ChamberRun withDoorMode(DoorMode other) {
        return new ChamberRun(
                chamberId,
                site,
                timeline,
                weather,
                enclosure,
                coolers,
                settings,
                outages,
                stays,
                factors,
                start,
                durationS,
                other,
                controlMode,
                extras);
    }

    /**
     * Returns the run with another way of control.
     *
     * @param other taken instead
     * @return the changed copy
     */
    public ChamberRun withControlMode(ControlMode other) {
        return new ChamberRun(
                chamberId, site, timeline, weather, enclosure, coolers, settings, outages, stays,
                factors, start, durationS, doorMode, other, extras);
    }

    /**
     * Returns the run with other extras.
     *
     * @param other taken instead
     * @return the changed copy
     */
    public ChamberRun withExtras(Extras other) {
        return new ChamberRun(
                chamberId,
                site,
                timeline,
                weather,
                enclosure,
                coolers,
                settings,
                outages,
                stays,
                factors,
                start,
                durationS,
                doorMode,
                controlMode,
                other);
    }
}

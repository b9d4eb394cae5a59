package org.wardon.enclosure;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.concurrent.ConcurrentHashMap;
import org.wardon.air.Coarse;
import org.wardon.air.SolAir;
import org.wardon.air.Timeline;
import org.wardon.air.YearWave;
import org.wardon.produce.Reason;

/**
 * What a face feels on its far side: a temperature and a film, hour by hour, linear between. The
 * heat model sees no sun, wind or soil, only this.
 */
public final class OutsideBoundary {
    /** Conductance in place of a film where the resistance stands elsewhere already, W/(m2 K). */
    private static final double TIGHT_WM2K = 1e4;

    private final double[] temperatureC;
    private final double[] filmWm2K;
    private final HeatFlow direction;
    private final List<Layer> addedLayers;
    private final List<Reason> reasons;
    private final Map<Integer, double[]> meansC = new ConcurrentHashMap<>();

    private OutsideBoundary(
            double[] temperatureC,
            double[] filmWm2K,
            HeatFlow direction,
            List<Layer> addedLayers,
            List<Reason> reasons) {
        this.temperatureC = temperatureC;
        this.filmWm2K = filmWm2K;
        this.direction = direction;
        this.addedLayers = List.copyOf(addedLayers);
        this.reasons = List.copyOf(reasons);
    }

    /**
     * Works out the far side of a face.
     *
     * @param enclosure the chamber
     * @param face one of its faces
     * @param around what surrounds it
     * @return the boundary
     * @throws IllegalArgumentException where a neighbour's air is not given
     */
    public static OutsideBoundary of(Enclosure enclosure, Face face, Surroundings around) {
        if (face.beyond() instanceof Beyond.Neighbour) {
            return anew(enclosure, face, around);
        }
        Optional<Enclosure> onGround =
                Optional.of(enclosure).filter(any -> face.beyond() instanceof Beyond.Ground);
        return around.known()
                .once(
                        new Key(face, onGround, around.insideMeanC()),
                        OutsideBoundary.class,
                        () -> anew(enclosure, face, around));
    }

    /** What a boundary hangs on, but for the outdoors. */
    private record Key(Face face, Optional<Enclosure> onGround, double insideMeanC) {}

    private static OutsideBoundary anew(Enclosure enclosure, Face face, Surroundings around) {
        Beyond beyond = face.beyond();
        if (beyond instanceof Beyond.Outdoors) {
            return outdoors(face, around);
        }
        if (beyond instanceof Beyond.Ground) {
            return ground(enclosure, face, around);
        }
        double[] air = new double[around.hours() + 1];
        for (int h = 0; h < air.length; h++) {
            air[h] = airBeyondC(beyond, around, h);
        }
        HeatFlow flow = HeatFlow.through(face.name(), mean(air), around.insideMeanC());
        boolean shade = beyond instanceof Beyond.Shade;
        // Behind a wall to a space the air is as still as inside, so the inside film stands again.
        double film = 1 / (shade ? Films.OUTSIDE_M2KW : Films.insideM2KW(flow));
        return new OutsideBoundary(air, constant(air.length, film), flow, List.of(), List.of());
    }

    /**
     * Returns the air beyond a face or a door at an hour, without sun.
     *
     * @param beyond what lies there; soil counts as outdoors
     * @param around what surrounds the chamber
     * @param hour hour of the run
     * @return °C
     * @throws IllegalArgumentException where a neighbour's air is not given
     */
    public static double airBeyondC(Beyond beyond, Surroundings around, int hour) {
        double outdoorC = around.weather().temperatureC(hour);
        if (beyond instanceof Beyond.Space space) {
            return space.temperatureC();
        }
        if (beyond instanceof Beyond.SpaceAboveOutdoor space) {
            return outdoorC + space.aboveOutdoorK();
        }
        if (beyond instanceof Beyond.Neighbour neighbour) {
            Surroundings.HourlyAir air = around.neighbourC().get(neighbour.chamberId());
            if (air == null) {
                throw new IllegalArgumentException(
                        "the air of chamber "
                                + neighbour.chamberId()
                                + " is not given; known are "
                                + around.neighbourC().keySet());
            }
            return air.temperatureC(hour);
        }
        return outdoorC;
    }

    private static OutsideBoundary outdoors(Face face, Surroundings around) {
        int n = around.hours() + 1;
        double[] temperature = new double[n];
        double[] film = new double[n];
        boolean roof = face.name() == FaceName.ROOF;
        double openSky = SolAir.SKY_LOSS_K * Math.cos(Math.toRadians(face.tiltDeg()));
        for (int h = 0; h < n; h++) {
            film[h] = 1 / Films.outsideM2KW(around.weather().windMs(h));
            // No sun reaches the underside of a floor on posts.
            double sun =
                    face.name() == FaceName.FLOOR
                            ? 0
                            : around.sun().onFaceWm2(h, face.tiltDeg(), face.azimuthDeg());
            double sky = roof ? openSky * around.sun().skyClearness(h) : 0;
            temperature[h] =
                    SolAir.temperatureC(
                            around.weather().temperatureC(h),
                            face.solarAbsorptance(),
                            sun,
                            film[h],
                            sky);
        }
        HeatFlow flow = HeatFlow.through(face.name(), mean(temperature), around.insideMeanC());
        List<Reason> reasons = new ArrayList<>();
        if (around.sun().estimated()) {
            reasons.add(Reason.about("sun-from-temperature-range", "", "FAO56"));
        }
        return new OutsideBoundary(temperature, film, flow, List.of(), reasons);
    }

    /**
     * The ISO 13370 slab over ground that follows the year; a wall against soil is taken as part of
     * it (assumption).
     */
    private static OutsideBoundary ground(Enclosure enclosure, Face face, Surroundings around) {
        Optional<YearWave> year = around.year();
        double deep = year.map(YearWave::meanC).orElseGet(around::meanOutdoorC);
        HeatFlow flow = HeatFlow.through(face.name(), deep, around.insideMeanC());
        GroundFloor floor = GroundFloor.under(enclosure);
        double layers = UValue.resistanceM2KW(face.asBuilt());
        double film = Films.insideM2KW(flow);
        double[] temperature = constant(around.hours() + 1, deep);
        if (year.isPresent()) {
            double share = floor.swingShare(layers, film);
            for (int h = 0; h < temperature.length; h++) {
                double t = h * Timeline.HOUR_S;
                double day =
                        around.timeline().dayOfYear(t)
                                + around.timeline().secondOfDay(t) / Timeline.DAY_S;
                temperature[h] = year.get().temperatureC(day, share, GroundFloor.LATE_DAYS);
            }
        }
        List<Reason> reasons =
                year.isPresent()
                        ? List.of()
                        : List.of(
                                Reason.about(
                                        "ground-from-run-weather",
                                        "",
                                        "assumption",
                                        Reason.Argument.of(deep, "C")));
        // The film is inside the slab's resistance already: a tight one stands here.
        return new OutsideBoundary(
                temperature,
                constant(temperature.length, TIGHT_WM2K),
                flow,
                floor.soilLayers(layers, film),
                reasons);
    }

    private static double[] constant(int n, double value) {
        double[] values = new double[n];
        Arrays.fill(values, value);
        return values;
    }

    private static double mean(double[] values) {
        return Arrays.stream(values).average().orElseThrow();
    }

    /**
     * Returns how many hours the boundary knows.
     *
     * @return length of the run, h; values stand for hour 0 to this
     */
    public int hours() {
        return temperatureC.length - 1;
    }

    /**
     * Returns the temperatures of all hours as they run straight between means.
     *
     * @param stretchHours hours of each mean, odd; 1 for the hours themselves
     * @return {@code [hour]}, °C, not to be changed
     * @see Coarse#means
     */
    public double[] meansC(int stretchHours) {
        return meansC.computeIfAbsent(stretchHours, n -> Coarse.means(temperatureC, n));
    }

    /**
     * Returns the temperature beyond the film: sol-air, air of the space, or deep ground.
     *
     * @param hour hour of the run, 0 to {@link #hours}
     * @return °C
     */
    public double temperatureC(int hour) {
        return temperatureC[hour];
    }

    /**
     * Returns the conductance of the far film.
     *
     * @param hour hour of the run
     * @return W/(m2 K)
     */
    public double filmWm2K(int hour) {
        return filmWm2K[hour];
    }

    /**
     * Returns the direction of the heat flow, for the inner film too.
     *
     * @return by the run's mean
     */
    public HeatFlow direction() {
        return direction;
    }

    /**
     * Returns layers to put outside those of the face: soil under a floor.
     *
     * @return deepest first, may be empty
     */
    public List<Layer> addedLayers() {
        return addedLayers;
    }

    /**
     * Returns what the boundary rests on that a keeper should know: {@code
     * sun-from-temperature-range}, {@code ground-from-run-weather}.
     *
     * @return reasons with an empty subject, to be named for the chamber
     */
    public List<Reason> reasons() {
        return reasons;
    }
}

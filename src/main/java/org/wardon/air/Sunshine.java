package org.wardon.air;

/**
 * The sun of a run, hour by hour: beam and diffuse radiation, and how clear the sky is.
 *
 * <p>Where the weather states global radiation it is split by {@link DiffuseShare}. Where it does
 * not, each day's clearness is estimated from its range of temperature ({@link
 * DailyRadiation#shareByRange}) and held through the day (assumption); {@link #estimated()} says
 * so. With the sun below 5 degrees all is taken as diffuse, since the split is worthless there.
 */
public final class Sunshine {
    /** Solar constant, W/m2. Source: Duffie and Beckman, chapter 1 (from memory). */
    public static final double SOLAR_CONSTANT_WM2 = 1_367;

    /** Reflected by the ground. Source: Duffie and Beckman, without snow (from memory). */
    public static final double GROUND_ALBEDO = 0.2;

    private static final double LOWEST_COS_ZENITH = Math.cos(Math.toRadians(85));
    private static final int DAY_H = 24;

    private static final double CLEANEST_AIR = 0.8;

    private final double[] beamNormalWm2;
    private final double[] diffuseWm2;
    private final double[] cosZenith;
    private final double[] azimuthDeg;
    private final double[] skyClearness;
    private final boolean estimated;

    private Sunshine(int size, boolean estimated) {
        beamNormalWm2 = new double[size];
        diffuseWm2 = new double[size];
        cosZenith = new double[size];
        azimuthDeg = new double[size];
        skyClearness = new double[size];
        this.estimated = estimated;
    }

    /**
     * Works out the sun of a run.
     *
     * @param site where
     * @param timeline the run's calendar
     * @param weather its weather
     * @param hours length of the run, h; values are held for hour 0 to {@code hours}
     * @return the sun
     */
    public static Sunshine of(Site site, Timeline timeline, Weather weather, int hours) {
        boolean estimated = false;
        for (int h = 0; h <= hours; h++) {
            estimated |= Double.isNaN(weather.globalWm2(h));
        }
        Sunshine sun = new Sunshine(hours + 1, estimated);
        double[] outside = new double[hours + 1];
        double[] global = new double[hours + 1];
        for (int h = 0; h <= hours; h++) {
            outside[h] = sun.place(site, timeline, h);
            double measured = weather.globalWm2(h);
            global[h] =
                    Double.isNaN(measured)
                            ? outside[h] * estimatedShare(site, timeline, weather, h, hours)
                            : Math.max(0, measured);
            sun.split(h, global[h], outside[h]);
        }
        sun.clearSky(site, timeline, global, outside);
        return sun;
    }

    /** Sets the sun's place and returns the extraterrestrial radiation on the level, W/m2. */
    private double place(Site site, Timeline timeline, int h) {
        double seconds = h * Timeline.HOUR_S;
        double day = timeline.dayOfYear(seconds);
        double declination = SunPosition.declinationDeg(day);
        double solar = SunPosition.solarHour(site, timeline, seconds);
        cosZenith[h] = SunPosition.cosZenith(site.latitudeDeg(), declination, solar);
        azimuthDeg[h] = SunPosition.azimuthDeg(site.latitudeDeg(), declination, solar);
        double distance = 1 + 0.033 * Math.cos(2 * Math.PI * day / 365);
        return SOLAR_CONSTANT_WM2 * distance * Math.max(0, cosZenith[h]);
    }

    /**
     * Beam is never more than the cleanest air lets through: a clock an hour wrong would else make
     * suns of a little light at a low sun. What is left of the measured is diffuse then.
     */
    private void split(int h, double globalWm2, double outsideWm2) {
        boolean low = cosZenith[h] < LOWEST_COS_ZENITH;
        double share = low ? 1 : DiffuseShare.of(globalWm2 / outsideWm2);
        double most = low ? 0 : outsideWm2 * cleanestShare(cosZenith[h]);
        double beam = Math.min((1 - share) * globalWm2, most);
        diffuseWm2[h] = globalWm2 - beam;
        beamNormalWm2[h] = low ? 0 : beam / cosZenith[h];
    }

    /**
     * Share of the beam that the cleanest air lets through.
     *
     * <p>Source: the form is that of Meinel and Meinel 1976, 0.7^(air mass^0.678) for usual clear
     * air (from memory); 0.8 for the cleanest (assumption).
     */
    private static double cleanestShare(double cosZenith) {
        return Math.pow(CLEANEST_AIR, Math.pow(1 / cosZenith, 0.678));
    }

    private static double estimatedShare(
            Site site, Timeline timeline, Weather weather, int hour, int hours) {
        int first = firstHourOfDay(timeline, hour);
        int last = Math.min(first + DAY_H - 1, hours);
        // A day cut short by the run's ends borrows hours from its neighbour to show its range.
        first = Math.max(0, Math.min(first, last - DAY_H + 1));
        last = Math.min(hours, Math.max(last, first + DAY_H - 1));
        double low = Double.POSITIVE_INFINITY;
        double high = Double.NEGATIVE_INFINITY;
        for (int h = first; h <= last; h++) {
            low = Math.min(low, weather.temperatureC(h));
            high = Math.max(high, weather.temperatureC(h));
        }
        return DailyRadiation.shareByRange(high - low, site.elevationM());
    }

    private static int firstHourOfDay(Timeline timeline, int hour) {
        double ofDay = timeline.secondOfDay(hour * Timeline.HOUR_S) / Timeline.HOUR_S;
        return hour - (int) Math.floor(ofDay);
    }

    /** Clearness of each day against a clear sky, held through its night. */
    private void clearSky(Site site, Timeline timeline, double[] global, double[] outside) {
        int n = global.length;
        double last = 1;
        for (int from = firstHourOfDay(timeline, 0); from < n; from += DAY_H) {
            double sum = 0;
            double clear = 0;
            for (int h = Math.max(0, from); h < Math.min(n, from + DAY_H); h++) {
                sum += global[h];
                clear += outside[h] * DailyRadiation.clearSkyShare(site.elevationM());
            }
            // Less than a tenth of a summer day tells nothing: the day before speaks for it.
            last = clear > 500 ? Math.min(1, sum / clear) : last;
            for (int h = Math.max(0, from); h < Math.min(n, from + DAY_H); h++) {
                skyClearness[h] = last;
            }
        }
    }

    /**
     * Returns whether any hour's radiation was estimated from temperatures.
     *
     * @return true if so
     */
    public boolean estimated() {
        return estimated;
    }

    /**
     * Returns how clear the sky is against a cloudless one, of the whole day.
     *
     * @param hour hour of the run, 0 to its length
     * @return 0 to 1
     */
    public double skyClearness(int hour) {
        return skyClearness[hour];
    }

    /**
     * Returns global radiation on the level.
     *
     * @param hour hour of the run
     * @return W/m2
     */
    public double globalWm2(int hour) {
        return diffuseWm2[hour] + beamNormalWm2[hour] * Math.max(0, cosZenith[hour]);
    }

    /**
     * Returns diffuse radiation on the level.
     *
     * @param hour hour of the run
     * @return W/m2
     */
    public double diffuseWm2(int hour) {
        return diffuseWm2[hour];
    }

    /**
     * Returns the radiation on a tilted face: beam, an evenly bright sky, and the ground.
     *
     * <p>Source: Liu and Jordan 1963, isotropic sky, as in Duffie and Beckman, equation 2.15.1
     * (from memory).
     *
     * @param hour hour of the run
     * @param tiltDeg 0 level and looking up, 90 upright
     * @param azimuthFromNorthDeg compass direction the face looks to, degrees from north by east
     * @return W/m2, 0 or more
     */
    public double onFaceWm2(int hour, double tiltDeg, double azimuthFromNorthDeg) {
        double tilt = Math.toRadians(tiltDeg);
        double c = cosZenith[hour];
        double turn = Math.toRadians(azimuthDeg[hour] - (azimuthFromNorthDeg - 180));
        double sinZenith = Math.sqrt(Math.max(0, 1 - c * c));
        double incidence = Math.cos(tilt) * c + Math.sin(tilt) * sinZenith * Math.cos(turn);
        return beamNormalWm2[hour] * Math.max(0, incidence)
                + diffuseWm2[hour] * (1 + Math.cos(tilt)) / 2
                + globalWm2(hour) * GROUND_ALBEDO * (1 - Math.cos(tilt)) / 2;
    }
}

package org.wardon.air;

import java.time.ZoneOffset;

/**
 * Where the sun stands. Angles in degrees; azimuth 0 at south, east negative, west positive.
 *
 * <p>Source: Duffie and Beckman, Solar Engineering of Thermal Processes, chapter 1 (from memory):
 * equation 1.6.1a declination (Cooper 1969), 1.5.3 equation of time (Spencer 1971), 1.5.2 solar
 * time, 1.6.5 zenith, 1.6.6 azimuth, 1.6.11 daylength.
 */
public final class SunPosition {
    private SunPosition() {}

    /**
     * Returns the declination.
     *
     * @param dayOfYear 1 to 366
     * @return degrees, -23.45 to 23.45
     */
    public static double declinationDeg(double dayOfYear) {
        return 23.45 * Math.sin(Math.toRadians(360 * (284 + dayOfYear) / 365));
    }

    /**
     * Returns the equation of time.
     *
     * @param dayOfYear 1 to 366
     * @return minutes, sun ahead of the clock positive
     */
    public static double equationOfTimeMin(double dayOfYear) {
        double b = Math.toRadians((dayOfYear - 1) * 360 / 365);
        return 229.2
                * (0.000075
                        + 0.001868 * Math.cos(b)
                        - 0.032077 * Math.sin(b)
                        - 0.014615 * Math.cos(2 * b)
                        - 0.04089 * Math.sin(2 * b));
    }

    /**
     * Returns the solar time of an instant of a run.
     *
     * @param site where
     * @param timeline the run's calendar
     * @param seconds s since the start of the run
     * @return hours, 0 to 24, 12 with the sun in the meridian
     */
    public static double solarHour(Site site, Timeline timeline, double seconds) {
        ZoneOffset offset = timeline.offset();
        double utcHour =
                (timeline.secondOfDay(seconds) - offset.getTotalSeconds()) / Timeline.HOUR_S;
        double correctionH =
                site.longitudeDeg() / 15 + equationOfTimeMin(timeline.dayOfYear(seconds)) / 60;
        double hour = (utcHour + correctionH) % 24;
        return hour < 0 ? hour + 24 : hour;
    }

    /**
     * Returns the cosine of the zenith angle.
     *
     * @param latitudeDeg latitude, degrees, north positive
     * @param declinationDeg declination, degrees
     * @param solarHour solar time, hours
     * @return -1 to 1, below 0 at night
     */
    public static double cosZenith(double latitudeDeg, double declinationDeg, double solarHour) {
        double phi = Math.toRadians(latitudeDeg);
        double delta = Math.toRadians(declinationDeg);
        return Math.cos(phi) * Math.cos(delta) * Math.cos(hourAngle(solarHour))
                + Math.sin(phi) * Math.sin(delta);
    }

    /**
     * Returns the zenith angle.
     *
     * @param latitudeDeg latitude, degrees
     * @param declinationDeg declination, degrees
     * @param solarHour solar time, hours
     * @return degrees, 0 overhead, above 90 at night
     */
    public static double zenithDeg(double latitudeDeg, double declinationDeg, double solarHour) {
        double c = cosZenith(latitudeDeg, declinationDeg, solarHour);
        return Math.toDegrees(Math.acos(Math.min(1, Math.max(-1, c))));
    }

    /**
     * Returns the azimuth.
     *
     * @param latitudeDeg latitude, degrees
     * @param declinationDeg declination, degrees
     * @param solarHour solar time, hours
     * @return degrees, -180 to 180, south 0, west positive
     */
    public static double azimuthDeg(double latitudeDeg, double declinationDeg, double solarHour) {
        double phi = Math.toRadians(latitudeDeg);
        double delta = Math.toRadians(declinationDeg);
        double omega = hourAngle(solarHour);
        // South and west parts of the sun's direction; safe overhead and at the poles.
        double south =
                Math.cos(omega) * Math.cos(delta) * Math.sin(phi) - Math.sin(delta) * Math.cos(phi);
        double west = Math.cos(delta) * Math.sin(omega);
        return Math.toDegrees(Math.atan2(west, south));
    }

    /**
     * Returns the length of the day.
     *
     * @param latitudeDeg latitude, degrees
     * @param declinationDeg declination, degrees
     * @return hours, 0 to 24
     */
    public static double daylengthH(double latitudeDeg, double declinationDeg) {
        double c =
                -Math.tan(Math.toRadians(latitudeDeg)) * Math.tan(Math.toRadians(declinationDeg));
        return 24 / Math.PI * Math.acos(Math.min(1, Math.max(-1, c)));
    }

    private static double hourAngle(double solarHour) {
        return Math.toRadians(15 * (solarHour - 12));
    }
}

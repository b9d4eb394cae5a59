package org.wardon.air;

/**
 * Radiation of a whole day on level ground, MJ/m2.
 *
 * <p>Source: FAO Irrigation and Drainage Paper 56, 1998, chapter 3; equation numbers beside each
 * formula (from memory).
 */
public final class DailyRadiation {
    private static final double SOLAR_CONSTANT_MJ_M2_MIN = 0.0820;

    /** Coefficient for the interior of a land mass, 1/K^0.5; 0.19 at coasts. */
    private static final double INTERIOR = 0.16;

    private DailyRadiation() {}

    /**
     * Returns the radiation outside the atmosphere, equation 21 with 23 to 25.
     *
     * @param dayOfYear 1 to 366
     * @param latitudeDeg latitude, degrees, north positive
     * @return MJ/(m2 day), 0 in the polar night
     */
    public static double extraterrestrialMJ(int dayOfYear, double latitudeDeg) {
        double phi = Math.toRadians(latitudeDeg);
        double delta = declinationRad(dayOfYear);
        double sunset = sunsetRad(dayOfYear, latitudeDeg);
        double distance = 1 + 0.033 * Math.cos(2 * Math.PI * dayOfYear / 365);
        return 24
                * 60
                / Math.PI
                * SOLAR_CONSTANT_MJ_M2_MIN
                * distance
                * (sunset * Math.sin(phi) * Math.sin(delta)
                        + Math.cos(phi) * Math.cos(delta) * Math.sin(sunset));
    }

    /**
     * Returns the hours of daylight, equation 34.
     *
     * @param dayOfYear 1 to 366
     * @param latitudeDeg latitude, degrees
     * @return hours
     */
    public static double daylightH(int dayOfYear, double latitudeDeg) {
        return 24 / Math.PI * sunsetRad(dayOfYear, latitudeDeg);
    }

    /**
     * Returns the radiation under a clear sky, equation 36 with Angstrom's coefficients.
     *
     * @param extraterrestrialMJ radiation outside the atmosphere, MJ/(m2 day)
     * @param a share under a full overcast; 0.25 where not fitted
     * @param b share added by a clear sky; 0.50 where not fitted
     * @return MJ/(m2 day)
     */
    public static double clearSkyMJ(double extraterrestrialMJ, double a, double b) {
        return (a + b) * extraterrestrialMJ;
    }

    /**
     * Returns the share of extraterrestrial radiation that a clear sky lets through, equation 37.
     *
     * @param elevationM height above the sea, m
     * @return share, 0.75 at the sea
     */
    public static double clearSkyShare(double elevationM) {
        return 0.75 + 2e-5 * elevationM;
    }

    /**
     * Returns the share of extraterrestrial radiation by the daily range of temperature, equation
     * 50 (Hargreaves and Samani), not above a clear sky's.
     *
     * @param rangeK highest less lowest temperature of the day, K, 0 or more
     * @param elevationM height above the sea, m
     * @return share
     */
    public static double shareByRange(double rangeK, double elevationM) {
        return Math.min(INTERIOR * Math.sqrt(rangeK), clearSkyShare(elevationM));
    }

    private static double declinationRad(int dayOfYear) {
        return 0.409 * Math.sin(2 * Math.PI * dayOfYear / 365 - 1.39);
    }

    private static double sunsetRad(int dayOfYear, double latitudeDeg) {
        double c = -Math.tan(Math.toRadians(latitudeDeg)) * Math.tan(declinationRad(dayOfYear));
        return Math.acos(Math.min(1, Math.max(-1, c)));
    }
}

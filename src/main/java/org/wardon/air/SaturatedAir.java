package org.wardon.air;

import org.wardon.errors.Require;

/**
 * Vapour pressure of air saturated over ice (up to the triple point) and over water (above it), its
 * slope and its inverse.
 *
 * <p>Source: Hyland and Wexler 1983 in the form of ASHRAE Handbook - Fundamentals, 2017, chapter 1,
 * equation 5 (ice) and 6 (water); coefficients as PsychroLib prints them.
 */
public final class SaturatedAir {
    /** Lowest temperature taken, °C. */
    public static final double LOWEST_C = -60;

    /** Highest temperature taken, °C. */
    public static final double HIGHEST_C = 60;

    /** 0 °C in kelvin. */
    public static final double ZERO_C_IN_K = 273.15;

    /** Triple point of water, °C: ice below, water above. */
    public static final double TRIPLE_POINT_C = 0.01;

    private static final double LOWEST_PA = overIcePa(LOWEST_C);
    private static final double TRIPLE_POINT_PA = overWaterPa(TRIPLE_POINT_C);
    private static final double HIGHEST_PA = overWaterPa(HIGHEST_C);

    private SaturatedAir() {}

    /**
     * Returns the vapour pressure of saturated air, over ice below the triple point.
     *
     * @param temperatureC temperature, °C, -60 to 60
     * @return Pa, above 0 and rising with temperature
     * @throws IllegalArgumentException outside that range
     */
    public static double pressurePa(double temperatureC) {
        checked(temperatureC);
        return temperatureC <= TRIPLE_POINT_C ? ice(temperatureC) : water(temperatureC);
    }

    /**
     * Returns the vapour pressure of air saturated over water, supercooled below 0 °C. Weather
     * stations state humidity over water at all temperatures.
     *
     * @param temperatureC temperature, °C, -60 to 60
     * @return Pa
     * @throws IllegalArgumentException outside that range
     */
    public static double overWaterPa(double temperatureC) {
        return water(checked(temperatureC));
    }

    /**
     * Returns the vapour pressure of air saturated over ice.
     *
     * @param temperatureC temperature, °C, -60 to 0.01
     * @return Pa
     * @throws IllegalArgumentException outside that range
     */
    public static double overIcePa(double temperatureC) {
        Require.within(
                "temperatureC over ice",
                temperatureC,
                LOWEST_C,
                TRIPLE_POINT_C,
                "°C",
                "Above the triple point call overWaterPa.");
        return ice(temperatureC);
    }

    /**
     * Returns how the saturation pressure rises with temperature: the derivative of {@link
     * #pressurePa}, term by term.
     *
     * @param temperatureC temperature, °C, -60 to 60
     * @return Pa/K, above 0
     * @throws IllegalArgumentException outside that range
     */
    public static double slopePaPerK(double temperatureC) {
        return pressurePa(temperatureC) * logSlopePerK(temperatureC);
    }

    /**
     * Returns the temperature at which air of this vapour pressure is saturated: the dew point, or
     * frost point below 0 °C. The inverse of {@link #pressurePa}, by Newton steps on its logarithm.
     *
     * @param vapourPressurePa vapour pressure, Pa, that of -60 to that of 60 °C
     * @return °C
     * @throws IllegalArgumentException outside that range
     */
    public static double temperatureC(double vapourPressurePa) {
        Require.within(
                "vapourPressurePa",
                vapourPressurePa,
                LOWEST_PA,
                HIGHEST_PA,
                "Pa",
                "Air this dry or this wet has no dew point between -60 and 60 °C.");
        boolean liquid = vapourPressurePa >= TRIPLE_POINT_PA;
        double low = liquid ? TRIPLE_POINT_C : LOWEST_C;
        double high = liquid ? HIGHEST_C : TRIPLE_POINT_C;
        double wanted = Math.log(vapourPressurePa);
        double t = magnusInverse(wanted);
        for (int i = 0; i < 8; i++) {
            t = Math.min(Math.max(t, low), high);
            double now = Math.log(liquid ? water(t) : ice(t));
            double step = (wanted - now) / (liquid ? waterLogSlope(t) : iceLogSlope(t));
            t += step;
            if (Math.abs(step) < 1e-11) {
                break;
            }
        }
        return Math.min(Math.max(t, low), high);
    }

    /** A start for the inverse. Source: Magnus form of Bolton 1980, equation 10. */
    private static double magnusInverse(double logPressure) {
        double x = logPressure - Math.log(611.2);
        return 243.5 * x / (17.67 - x);
    }

    private static double checked(double temperatureC) {
        return Require.within(
                "temperatureC",
                temperatureC,
                LOWEST_C,
                HIGHEST_C,
                "°C",
                "The formulas of moist air are used between -60 and 60 °C.");
    }

    private static double ice(double temperatureC) {
        double t = temperatureC + ZERO_C_IN_K;
        return Math.exp(
                -5.6745359e3 / t
                        + 6.3925247
                        + t
                                * (-9.677843e-3
                                        + t
                                                * (6.2215701e-7
                                                        + t * (2.0747825e-9 - t * 9.484024e-13)))
                        + 4.1635019 * Math.log(t)); // equation 5
    }

    private static double water(double temperatureC) {
        double t = temperatureC + ZERO_C_IN_K;
        return Math.exp(
                -5.8002206e3 / t
                        + 1.3914993
                        + t * (-4.8640239e-2 + t * (4.1764768e-5 - t * 1.4452093e-8))
                        + 6.5459673 * Math.log(t)); // equation 6
    }

    /**
     * Returns the slope of the logarithm of the saturation pressure: {@link #slopePaPerK} divided
     * by {@link #pressurePa}, without an exponential.
     *
     * @param temperatureC temperature, °C, -60 to 60; not checked
     * @return 1/K
     */
    public static double logSlopePerK(double temperatureC) {
        return temperatureC <= TRIPLE_POINT_C
                ? iceLogSlope(temperatureC)
                : waterLogSlope(temperatureC);
    }

    private static double iceLogSlope(double temperatureC) {
        double t = temperatureC + ZERO_C_IN_K;
        return 5.6745359e3 / (t * t)
                - 9.677843e-3
                + t * (2 * 6.2215701e-7 + t * (3 * 2.0747825e-9 - t * 4 * 9.484024e-13))
                + 4.1635019 / t;
    }

    private static double waterLogSlope(double temperatureC) {
        double t = temperatureC + ZERO_C_IN_K;
        return 5.8002206e3 / (t * t)
                - 4.8640239e-2
                + t * (2 * 4.1764768e-5 - t * 3 * 1.4452093e-8)
                + 6.5459673 / t;
    }
}

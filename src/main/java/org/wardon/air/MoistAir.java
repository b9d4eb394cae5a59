package org.wardon.air;

import org.wardon.errors.Require;

/**
 * Moist air as an ideal mixture. Humidity ratios are kg water per kg dry air; enthalpies are J per
 * kg dry air with their zero at dry air and liquid water of 0 °C; relative humidity is a fraction
 * of saturation, over ice below the triple point.
 *
 * <p>Source: ASHRAE Handbook - Fundamentals, 2017, chapter 1; the number of each equation stands
 * beside it. The enhancement factor of the printed tables (0.4 %) is left out, as in the book's own
 * ideal-gas equations.
 */
public final class MoistAir {
    /** Specific heat of dry air, J/(kg K). */
    public static final double DRY_AIR_J_KG_K = 1_006;

    /** Specific heat of water vapour, J/(kg K). */
    public static final double VAPOUR_J_KG_K = 1_860;

    /** Specific heat of liquid water, J/(kg K). */
    public static final double WATER_J_KG_K = 4_186;

    /** Heat of evaporation at 0 °C, J/kg. */
    public static final double EVAPORATION_J_KG = 2.501e6;

    /** Heat of melting at 0 °C, J/kg. Source: from memory of the same chapter, table 3. */
    public static final double MELTING_J_KG = 333_500;

    /** Gas constant of dry air, J/(kg K), equation 1. */
    public static final double DRY_AIR_GAS_J_KG_K = 287.042;

    /** Molar mass of water over that of dry air, equation 20. */
    public static final double MOLAR_MASS_RATIO = 0.621945;

    private MoistAir() {}

    /**
     * Returns the humidity ratio, equation 20.
     *
     * @param vapourPressurePa vapour pressure, Pa, 0 up to below the air pressure
     * @param pressurePa air pressure, Pa
     * @return kg/kg
     * @throws IllegalArgumentException where there would be more vapour than air
     */
    public static double humidityRatio(double vapourPressurePa, double pressurePa) {
        Require.within(
                "vapourPressurePa",
                vapourPressurePa,
                0,
                0.9 * pressurePa,
                "Pa",
                "Vapour pressure must stay well below the air pressure.");
        return MOLAR_MASS_RATIO * vapourPressurePa / (pressurePa - vapourPressurePa);
    }

    /**
     * Returns the vapour pressure of a humidity ratio: the inverse of {@link #humidityRatio}.
     *
     * @param humidityRatio kg/kg, 0 or more
     * @param pressurePa air pressure, Pa
     * @return Pa
     */
    public static double vapourPressurePa(double humidityRatio, double pressurePa) {
        return pressurePa * humidityRatio / (MOLAR_MASS_RATIO + humidityRatio);
    }

    /**
     * Returns the humidity ratio of air of this temperature and relative humidity.
     *
     * @param temperatureC °C, -60 to 60
     * @param humidityFraction relative humidity, 0 to 1
     * @param pressurePa air pressure, Pa
     * @return kg/kg
     */
    public static double humidityRatioAt(
            double temperatureC, double humidityFraction, double pressurePa) {
        Require.within(
                "humidityFraction",
                humidityFraction,
                0,
                1,
                "",
                "Relative humidity is a fraction of 1.");
        return humidityRatio(humidityFraction * SaturatedAir.pressurePa(temperatureC), pressurePa);
    }

    /**
     * Returns the humidity ratio of saturated air, equation 21.
     *
     * @param temperatureC °C, -60 to 60
     * @param pressurePa air pressure, Pa
     * @return kg/kg
     */
    public static double saturatedHumidityRatio(double temperatureC, double pressurePa) {
        return humidityRatio(SaturatedAir.pressurePa(temperatureC), pressurePa);
    }

    /**
     * Returns the relative humidity, equation 22.
     *
     * @param temperatureC °C, -60 to 60
     * @param humidityRatio kg/kg
     * @param pressurePa air pressure, Pa
     * @return fraction; above 1 where the air is supersaturated
     */
    public static double humidityFraction(
            double temperatureC, double humidityRatio, double pressurePa) {
        return vapourPressurePa(humidityRatio, pressurePa) / SaturatedAir.pressurePa(temperatureC);
    }

    /**
     * Returns the enthalpy, equation 30.
     *
     * @param temperatureC °C
     * @param humidityRatio kg/kg
     * @return J per kg dry air
     */
    public static double enthalpyJkg(double temperatureC, double humidityRatio) {
        return DRY_AIR_J_KG_K * temperatureC + humidityRatio * vapourEnthalpyJkg(temperatureC);
    }

    /**
     * Returns the enthalpy of the vapour in the air.
     *
     * @param temperatureC °C
     * @return J per kg vapour, from liquid water of 0 °C
     */
    public static double vapourEnthalpyJkg(double temperatureC) {
        return EVAPORATION_J_KG + VAPOUR_J_KG_K * temperatureC;
    }

    /**
     * Returns the temperature of air of this enthalpy: the inverse of {@link #enthalpyJkg}.
     *
     * @param enthalpyJkg J per kg dry air
     * @param humidityRatio kg/kg
     * @return °C
     */
    public static double temperatureC(double enthalpyJkg, double humidityRatio) {
        return (enthalpyJkg - humidityRatio * EVAPORATION_J_KG) / heatCapacityJkgK(humidityRatio);
    }

    /**
     * Returns the heat capacity at constant humidity.
     *
     * @param humidityRatio kg/kg
     * @return J per K and kg dry air
     */
    public static double heatCapacityJkgK(double humidityRatio) {
        return DRY_AIR_J_KG_K + VAPOUR_J_KG_K * humidityRatio;
    }

    /**
     * Returns the volume a kilogram of dry air takes with its vapour, equation 26.
     *
     * @param temperatureC °C
     * @param humidityRatio kg/kg
     * @param pressurePa air pressure, Pa
     * @return m3 per kg dry air
     */
    public static double specificVolumeM3kg(
            double temperatureC, double humidityRatio, double pressurePa) {
        return DRY_AIR_GAS_J_KG_K
                * (temperatureC + SaturatedAir.ZERO_C_IN_K)
                * (1 + 1.607858 * humidityRatio)
                / pressurePa;
    }

    /**
     * Returns the density of the mixture, equation 11.
     *
     * @param temperatureC °C
     * @param humidityRatio kg/kg
     * @param pressurePa air pressure, Pa
     * @return kg moist air per m3
     */
    public static double densityKgM3(double temperatureC, double humidityRatio, double pressurePa) {
        return (1 + humidityRatio) / specificVolumeM3kg(temperatureC, humidityRatio, pressurePa);
    }

    /**
     * Returns the dew point, below 0 °C the frost point.
     *
     * @param humidityRatio kg/kg
     * @param pressurePa air pressure, Pa
     * @return °C
     * @throws IllegalArgumentException where it lies outside -60 to 60 °C
     */
    public static double dewPointC(double humidityRatio, double pressurePa) {
        return SaturatedAir.temperatureC(vapourPressurePa(humidityRatio, pressurePa));
    }
}

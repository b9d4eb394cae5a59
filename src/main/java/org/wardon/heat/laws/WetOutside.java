package org.wardon.heat.laws;

import org.wardon.air.MoistAir;

/**
 * Evaporation from a wet outer side: saturated air at the surface's temperature, carried off by the
 * convective part of the outer film.
 *
 * <p>Source: {@code cooling-sources.csv}, rows evaporation and mass_transfer (from memory of ASHRAE
 * Fundamentals): the Lewis relation as in {@link FaceWater}. Dew on a side colder than the dew
 * point of its air is not counted.
 */
public final class WetOutside {
    private WetOutside() {}

    /**
     * Returns the vapour that leaves the side.
     *
     * @param convectiveWm2K convective part of the outer film, W/(m2 K)
     * @param saturatedRatio humidity ratio of saturation at the surface, kg/kg
     * @param airRatio humidity ratio of the air beyond, kg/kg
     * @return kg/(m2 s), 0 or more
     */
    public static double vapourKgM2S(
            double convectiveWm2K, double saturatedRatio, double airRatio) {
        return FaceWater.conductanceKgM2S(convectiveWm2K)
                * FreeWater.positive(saturatedRatio - airRatio, FaceWater.ROUND_KG_KG);
    }

    /**
     * Returns the heat it draws from the surface; its water is as warm as the surface.
     *
     * @param surfaceC surface, °C
     * @return J/kg
     */
    public static double latentJkg(double surfaceC) {
        return MoistAir.vapourEnthalpyJkg(surfaceC) - MoistAir.WATER_J_KG_K * surfaceC;
    }
}

package org.wardon.heat.laws;

import org.wardon.air.MoistAir;

/**
 * Vapour between the inner surface of a face and the chamber's air: condensation on a cold face and
 * its drying.
 *
 * <p>Source: Lewis relation g = hc/(cp Le^(2/3)) with Le^(2/3) = 0.9, from memory of ASHRAE
 * Fundamentals, chapter on mass transfer; convective part of the inside film 5.0 upward, 2.5 level,
 * 0.7 downward W/(m2 K), from memory of ISO 6946, annex C.
 */
public final class FaceWater {
    /** Lewis number to the power two thirds, water vapour in air. */
    public static final double LEWIS_TWO_THIRDS = 0.9;

    /** Differences of humidity ratio are rounded within this of 0, kg/kg. */
    public static final double ROUND_KG_KG = 1e-5;

    private FaceWater() {}

    /**
     * Returns the vapour conductance of a film.
     *
     * @param convectiveWm2K convective part of the film, W/(m2 K)
     * @return kg/(m2 s) per kg/kg
     */
    public static double conductanceKgM2S(double convectiveWm2K) {
        return convectiveWm2K / (MoistAir.DRY_AIR_J_KG_K * LEWIS_TWO_THIRDS);
    }

    /**
     * Returns the vapour that leaves the face.
     *
     * @param conductanceKgM2S of the film, kg/(m2 s)
     * @param saturatedRatio humidity ratio of saturation at the face, kg/kg
     * @param airRatio humidity ratio of the air, kg/kg
     * @param wetShare share of the face under water, 0 to 1
     * @return kg/(m2 s); below 0 where it condenses
     */
    public static double vapourKgM2S(
            double conductanceKgM2S, double saturatedRatio, double airRatio, double wetShare) {
        double drop = saturatedRatio - airRatio;
        return conductanceKgM2S
                * (wetShare * FreeWater.positive(drop, ROUND_KG_KG)
                        - FreeWater.positive(-drop, ROUND_KG_KG));
    }

    /**
     * Returns the water that runs off.
     *
     * @param waterKgM2 water on the face, kg/m2
     * @return kg/(m2 s)
     */
    public static double runsOffKgM2S(double waterKgM2) {
        return FreeWater.positive(waterKgM2 - FreeWater.FACE_HOLDS_KG_M2, 0.01)
                / FreeWater.RUNS_OFF_S;
    }
}

package org.wardon.heat.network;

import org.wardon.air.MoistAir;
import org.wardon.heat.laws.FaceWater;
import org.wardon.heat.laws.FreeWater;

/**
 * Water at an inner surface: free water that condensed and dries again or runs off, and a share of
 * the surface that is kept damp from within the wall. Scratch of one face, by {@link FaceWater}.
 */
final class SurfaceWater {
    private static final double VAPOUR_LESS_WATER = MoistAir.VAPOUR_J_KG_K - MoistAir.WATER_J_KG_K;

    private final double areaM2;
    private final double vapourKgS;
    private final LocalCurve saturation;

    /** Vapour to the air, kg/s. */
    double vapour;

    /** Part of it that the damp wall gave, kg/s. */
    double fromDamp;

    /** Free water running off, kg/s. */
    double runOff;

    /** Heat that makes a kilogram vapour, J/kg. */
    double latent;

    /** Enthalpy of that vapour, J/kg. */
    double enthalpy;

    /** The same two where the step started, to which all slopes belong. */
    double latentAtStart;

    double enthalpyAtStart;

    double bySurface;
    double byWater;
    double byRatio;
    double dampBySurface;
    double dampByRatio;
    double runOffByWater;
    double latentBySurface;
    double enthalpyBySurface;

    SurfaceWater(double areaM2, double convectiveWm2K, boolean plain) {
        this.areaM2 = areaM2;
        this.vapourKgS = areaM2 * FaceWater.conductanceKgM2S(convectiveWm2K);
        this.saturation = Saturation.curve(plain);
    }

    /** Works out the rates; {@code damp} is the share kept damp, 0 to 1. */
    void at(AirState air, double surfaceC, double waterKg, double damp) {
        double psat = saturation.value(surfaceC);
        double drop = MoistAir.MOLAR_MASS_RATIO * psat / (air.pressurePa - psat) - air.ratio;
        double up = FreeWater.positive(drop, FaceWater.ROUND_KG_KG);
        double down = FreeWater.positive(-drop, FaceWater.ROUND_KG_KG);
        double wet = FreeWater.wetShare(waterKg / (areaM2 * FreeWater.FULL_KG_M2));
        fromDamp = vapourKgS * damp * up;
        vapour = fromDamp + vapourKgS * ((1 - damp) * wet * up - down);
        runOff = areaM2 * FaceWater.runsOffKgM2S(waterKg / areaM2);
        latent = MoistAir.EVAPORATION_J_KG + VAPOUR_LESS_WATER * surfaceC;
        enthalpy = MoistAir.vapourEnthalpyJkg(surfaceC);
    }

    /** Renews the curve where need be, before a step starts. */
    void near(double surfaceC) {
        saturation.near(surfaceC);
    }

    /** Works out rates and slopes at the start of a step. */
    void slopesAt(AirState air, double surfaceC, double waterKg, double damp) {
        at(air, surfaceC, waterKg, damp);
        double psat = saturation.value(surfaceC);
        double rest = air.pressurePa - psat;
        double saturatedSlope =
                MoistAir.MOLAR_MASS_RATIO
                        * air.pressurePa
                        / (rest * rest)
                        * saturation.slope(surfaceC);
        double drop = MoistAir.MOLAR_MASS_RATIO * psat / rest - air.ratio;
        double full = areaM2 * FreeWater.FULL_KG_M2;
        double wet = FreeWater.wetShare(waterKg / full);
        double up = FreeWater.positive(drop, FaceWater.ROUND_KG_KG);
        double upSlope = FreeWater.positiveSlope(drop, FaceWater.ROUND_KG_KG);
        double downSlope = FreeWater.positiveSlope(-drop, FaceWater.ROUND_KG_KG);
        double damped = vapourKgS * damp * upSlope;
        double byDrop = damped + vapourKgS * ((1 - damp) * wet * upSlope + downSlope);
        dampBySurface = damped * saturatedSlope;
        dampByRatio = -damped;
        bySurface = byDrop * saturatedSlope;
        byRatio = -byDrop;
        byWater = vapourKgS * (1 - damp) * up * FreeWater.wetShareSlope(waterKg / full) / full;
        runOffByWater =
                FreeWater.positiveSlope(waterKg / areaM2 - FreeWater.FACE_HOLDS_KG_M2, 0.01)
                        / FreeWater.RUNS_OFF_S;
        latentAtStart = latent;
        enthalpyAtStart = enthalpy;
        latentBySurface = bySurface * latent + vapour * VAPOUR_LESS_WATER;
        enthalpyBySurface = bySurface * enthalpy + vapour * MoistAir.VAPOUR_J_KG_K;
    }
}

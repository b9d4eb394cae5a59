package org.wardon.heat.laws;

import org.wardon.air.MoistAir;

/**
 * Mist: what air holds beyond saturation falls out as water; its latent heat stays in the air.
 *
 * <p>Source: air holds no more vapour than saturation (ASHRAE Handbook - Fundamentals, chapter 1;
 * from memory of it). How fast the excess falls out is an assumption: within a minute.
 */
public final class Mist {
    /** Time in which the excess falls out, s (assumption). */
    public static final double FALLS_IN_S = 60;

    /** The excess is rounded within this of saturation, kg/kg: about 0.2 % humidity at 5 °C. */
    public static final double ROUND_KG_KG = 1e-5;

    private Mist() {}

    /**
     * Returns the water that falls out of the air.
     *
     * @param airKg dry air, kg
     * @param airC its temperature, °C
     * @param ratio its humidity ratio, kg/kg
     * @param pressurePa pressure, Pa
     * @return kg/s, not negative
     */
    public static double waterKgS(double airKg, double airC, double ratio, double pressurePa) {
        double excess = ratio - MoistAir.saturatedHumidityRatio(airC, pressurePa);
        return airKg / FALLS_IN_S * FreeWater.positive(excess, ROUND_KG_KG);
    }
}

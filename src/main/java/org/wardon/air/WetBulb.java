package org.wardon.air;

/**
 * Thermodynamic wet bulb: the temperature at which water, or ice below 0 °C, saturates the air
 * without heat from elsewhere.
 *
 * <p>Source: ASHRAE Handbook - Fundamentals, 2017, chapter 1, equation 33 (water) and 35 (ice).
 */
public final class WetBulb {
    private WetBulb() {}

    /**
     * Returns the humidity ratio of air of this dry and wet bulb.
     *
     * @param temperatureC dry bulb, °C, -60 to 60
     * @param wetBulbC wet bulb, °C, not above the dry bulb; the bulb is iced below 0
     * @param pressurePa air pressure, Pa
     * @return kg/kg; below 0 where the two cannot be
     */
    public static double humidityRatio(double temperatureC, double wetBulbC, double pressurePa) {
        return wetBulbC >= 0
                ? overWater(temperatureC, wetBulbC, pressurePa)
                : overIce(temperatureC, wetBulbC, pressurePa);
    }

    /**
     * Returns the wet bulb. Where the air could keep a wet bulb just above 0 °C and an iced one
     * just below, the wet one is returned.
     *
     * @param temperatureC dry bulb, °C, -60 to 60
     * @param humidityRatio kg/kg, 0 up to saturation; saturated air gives its own temperature
     * @param pressurePa air pressure, Pa
     * @return °C, not above the dry bulb
     */
    public static double temperatureC(
            double temperatureC, double humidityRatio, double pressurePa) {
        boolean wet = temperatureC >= 0 && humidityRatio >= overWater(temperatureC, 0, pressurePa);
        double low = wet ? 0 : Math.max(SaturatedAir.LOWEST_C, Math.min(temperatureC, 0) - 30);
        double high = wet ? temperatureC : Math.min(temperatureC, 0);
        double t = high;
        for (int i = 0; i < 100 && high - low > 1e-11; i++) {
            double f = excess(wet, temperatureC, t, pressurePa) - humidityRatio;
            if (f > 0) {
                high = t;
            } else {
                low = t;
            }
            double nearby = Math.max(t - 1e-4, SaturatedAir.LOWEST_C);
            double g = excess(wet, temperatureC, nearby, pressurePa) - humidityRatio;
            double slope = (g - f) / (nearby - t);
            double next = t - f / slope;
            // Newton's step where it stays inside the bracket, else halve: always converges.
            double moved = next > low && next < high ? next : 0.5 * (low + high);
            if (Math.abs(moved - t) < 1e-11) {
                return moved;
            }
            t = moved;
        }
        return t;
    }

    private static double excess(boolean wet, double dryC, double wetBulbC, double pressurePa) {
        return wet ? overWater(dryC, wetBulbC, pressurePa) : overIce(dryC, wetBulbC, pressurePa);
    }

    private static double overWater(double dryC, double wetBulbC, double pressurePa) {
        double saturated = MoistAir.saturatedHumidityRatio(wetBulbC, pressurePa);
        return ((2_501 - 2.326 * wetBulbC) * saturated - 1.006 * (dryC - wetBulbC))
                / (2_501 + 1.86 * dryC - 4.186 * wetBulbC);
    }

    private static double overIce(double dryC, double wetBulbC, double pressurePa) {
        double saturated = MoistAir.saturatedHumidityRatio(wetBulbC, pressurePa);
        return ((2_830 - 0.24 * wetBulbC) * saturated - 1.006 * (dryC - wetBulbC))
                / (2_830 + 1.86 * dryC - 2.1 * wetBulbC);
    }
}

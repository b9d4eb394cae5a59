package org.wardon.air;

import org.wardon.errors.Require;

/**
 * Outdoor weather of a run: hourly values from second 0 of the run on, linear between them, the
 * last one held beyond the end.
 */
public final class Weather {
    private final double[] temperatureC;
    private final double[] humidityPct;
    private final double[] globalWm2;
    private final double[] windMs;

    /**
     * Holds hourly weather. All four arrays are {@code [hour]}, hour 0 at the start of the run, of
     * equal length of at least 1, and are copied.
     *
     * @param temperatureC air temperature, °C
     * @param humidityPct relative humidity over water, percent
     * @param globalWm2 global radiation on the level, W/m2; NaN where not known
     * @param windMs wind, m/s; NaN where not known
     */
    public Weather(
            double[] temperatureC, double[] humidityPct, double[] globalWm2, double[] windMs) {
        int n = temperatureC.length;
        Require.that(
                n > 0 && humidityPct.length == n && globalWm2.length == n && windMs.length == n,
                "weather needs four arrays of equal length of at least 1, found " + n);
        this.temperatureC = temperatureC.clone();
        this.humidityPct = humidityPct.clone();
        this.globalWm2 = globalWm2.clone();
        this.windMs = windMs.clone();
    }

    /**
     * Returns weather that never changes, without sun.
     *
     * @param temperatureC air temperature, °C
     * @param humidityPct relative humidity, percent
     * @return the weather
     */
    public static Weather steady(double temperatureC, double humidityPct) {
        return new Weather(
                new double[] {temperatureC},
                new double[] {humidityPct},
                new double[] {0},
                new double[] {Double.NaN});
    }

    /**
     * Returns how many hours are held.
     *
     * @return number of hourly values, at least 1
     */
    public int hours() {
        return temperatureC.length;
    }

    /**
     * Returns the air temperature.
     *
     * @param hour hour since the start; beyond the end the last value is held
     * @return °C
     */
    public double temperatureC(int hour) {
        return temperatureC[clamp(hour)];
    }

    /**
     * Returns the relative humidity.
     *
     * @param hour hour since the start
     * @return percent
     */
    public double humidityPct(int hour) {
        return humidityPct[clamp(hour)];
    }

    /**
     * Returns the vapour pressure. Weather states humidity over water, also in frost; what would
     * stand above saturation over ice is taken as fallen out.
     *
     * @param hour hour since the start
     * @return Pa
     */
    public double vapourPressurePa(int hour) {
        double t = temperatureC(hour);
        return Math.min(
                humidityPct(hour) / 100 * SaturatedAir.overWaterPa(t), SaturatedAir.pressurePa(t));
    }

    /**
     * Returns the humidity ratio.
     *
     * @param hour hour since the start
     * @param pressurePa air pressure of the site, Pa
     * @return kg/kg
     */
    public double humidityRatio(int hour, double pressurePa) {
        return MoistAir.humidityRatio(vapourPressurePa(hour), pressurePa);
    }

    /**
     * Returns the global radiation on the level.
     *
     * @param hour hour since the start
     * @return W/m2, NaN where not known
     */
    public double globalWm2(int hour) {
        return globalWm2[clamp(hour)];
    }

    /**
     * Returns the wind.
     *
     * @param hour hour since the start
     * @return m/s, NaN where not known
     */
    public double windMs(int hour) {
        return windMs[clamp(hour)];
    }

    private int clamp(int hour) {
        return Math.min(Math.max(hour, 0), temperatureC.length - 1);
    }
}

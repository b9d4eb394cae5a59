package org.wardon.cooling;

import org.wardon.errors.Require;

/**
 * What the keeper dials in.
 *
 * @param temperatureC air temperature wanted, °C
 * @param bandK half width of the band the thermostat keeps, K, above 0
 * @param humidityPct humidity wanted, percent; a wish, not a dial
 * @param stageK how much warmer each further cooler with a thermostat keeps the air, K; 0 lets all
 *     act together
 */
public record Setting(double temperatureC, double bandK, double humidityPct, double stageK) {
    /** Checks the bounds. */
    public Setting {
        Require.within("setting.temperatureC", temperatureC, -30, 45, "°C", "");
        Require.within("setting.bandK", bandK, 0.1, 10, "K", "");
        Require.within("setting.humidityPct", humidityPct, 0, 100, "%", "");
        Require.within("setting.stageK", stageK, 0, 10, "K", "");
    }

    /**
     * A setting whose further coolers come on a band later (common practice, no source).
     *
     * @param temperatureC air temperature wanted, °C
     * @param bandK half width of the band the thermostat keeps, K, above 0
     * @param humidityPct humidity wanted, percent
     */
    public Setting(double temperatureC, double bandK, double humidityPct) {
        this(temperatureC, bandK, humidityPct, bandK);
    }
}

package org.wardon.cooling;

import org.wardon.errors.Require;

/**
 * What the keeper dials in.
 *
 * @param temperatureC air temperature wanted, °C
 * @param bandK half width of the band the thermostat keeps, K, above 0
 * @param humidityPct humidity wanted, percent; a wish, not a dial
 */
public record Setting(double temperatureC, double bandK, double humidityPct) {
    /** Checks the bounds. */
    public Setting {
        Require.within("setting.temperatureC", temperatureC, -30, 45, "°C", "");
        Require.within("setting.bandK", bandK, 0.1, 10, "K", "");
        Require.within("setting.humidityPct", humidityPct, 0, 100, "%", "");
    }
}

package org.wardon.plan;

import java.util.OptionalDouble;
import org.wardon.errors.Require;

/**
 * The air a chamber starts with.
 *
 * @param temperatureC its temperature, °C
 * @param humidityPct its relative humidity, percent; absent: as the default start has it
 */
public record StartAir(double temperatureC, OptionalDouble humidityPct) {
    /** Checks the bounds. */
    public StartAir {
        Require.within("starts.temperatureC", temperatureC, -30, 60, "°C", "");
        if (humidityPct.isPresent()) {
            Require.within("starts.humidityPct", humidityPct.getAsDouble(), 0, 100, "%", "");
        }
    }
}

package org.wardon.plan;

import org.wardon.errors.Require;

/** What happens to the lots otherwise. */
public sealed interface WithoutChamber {
    /** Outdoor air without sun. */
    record Shade() implements WithoutChamber {}

    /**
     * A place that never changes.
     *
     * @param temperatureC its air, °C
     * @param humidityPct its relative humidity, percent
     */
    record Steady(double temperatureC, double humidityPct) implements WithoutChamber {
        /** Checks the bounds. */
        public Steady {
            Require.within("withoutChamber.temperatureC", temperatureC, -30, 60, "°C", "");
            Require.within("withoutChamber.humidityPct", humidityPct, 0, 100, "%", "");
        }
    }
}

package org.wardon.heat;

import java.util.Optional;
import java.util.OptionalDouble;
import org.wardon.errors.Require;

/**
 * The air a run starts with. What is left open: a chamber whose coolers keep it cold starts at its
 * setting with faces at the steady profile, all others as the first day, come five times before,
 * leaves them.
 *
 * @param temperatureC air, °C
 * @param humidityPct its relative humidity, percent
 * @param warmed what the first day leaves, where it was worked out before
 */
public record Start(
        OptionalDouble temperatureC, OptionalDouble humidityPct, Optional<Warmed> warmed) {
    /** Everything as usual. */
    public static final Start USUAL =
            new Start(OptionalDouble.empty(), OptionalDouble.empty(), Optional.empty());

    /** Checks the bounds. */
    public Start {
        temperatureC.ifPresent(t -> Require.within("starts.temperatureC", t, -30, 60, "°C", ""));
        humidityPct.ifPresent(h -> Require.within("starts.humidityPct", h, 0, 100, "%", ""));
    }

    /**
     * Returns a start in given air.
     *
     * @param temperatureC air, °C
     * @param humidityPct relative humidity, percent
     * @return the start
     */
    public static Start at(double temperatureC, double humidityPct) {
        return new Start(
                OptionalDouble.of(temperatureC), OptionalDouble.of(humidityPct), Optional.empty());
    }
}

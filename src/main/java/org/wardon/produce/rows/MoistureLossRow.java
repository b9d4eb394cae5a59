package org.wardon.produce.rows;

import java.util.Optional;
import java.util.OptionalDouble;
import org.wardon.produce.Fact;

/**
 * A published daily loss of water.
 *
 * @param variant variant, may be empty
 * @param temperatureC temperature, °C; empty where the source gives words or nothing
 * @param humidityPct humidity, percent
 * @param loss the loss; unit {@code pct_per_day} or {@code pct_per_day_per_mbar}
 * @param acceptablePct acceptable loss, percent
 * @param note the note of the table
 */
public record MoistureLossRow(
        String variant,
        OptionalDouble temperatureC,
        OptionalDouble humidityPct,
        Optional<Fact> loss,
        Optional<Fact> acceptablePct,
        String note) {}

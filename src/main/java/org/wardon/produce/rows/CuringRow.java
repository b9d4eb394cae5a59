package org.wardon.produce.rows;

import java.util.Optional;
import org.wardon.produce.Fact;

/**
 * Curing before storage.
 *
 * @param temperatureC curing temperature, °C
 * @param humidityPct curing humidity, percent
 * @param days curing time, days
 * @param sourceId source
 * @param note the note of the table
 */
public record CuringRow(
        Optional<Fact> temperatureC,
        Optional<Fact> humidityPct,
        Optional<Fact> days,
        String sourceId,
        String note) {}

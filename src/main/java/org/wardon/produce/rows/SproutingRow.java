package org.wardon.produce.rows;

import java.util.OptionalDouble;
import org.wardon.produce.Fact;

/**
 * Sprouting or rooting against temperature and humidity.
 *
 * @param lowC lower end of temperature, °C; alone: at and above it
 * @param highC upper end, °C; alone: at and below it
 * @param humidityLimitPct humidity above which roots or mould set in, percent
 * @param days days to the effect; only low: not before, only high: by then
 * @param effect the effect as printed
 * @param sourceId source
 */
public record SproutingRow(
        OptionalDouble lowC,
        OptionalDouble highC,
        OptionalDouble humidityLimitPct,
        java.util.Optional<Fact> days,
        String effect,
        String sourceId) {}

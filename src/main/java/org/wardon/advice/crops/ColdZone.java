package org.wardon.advice.crops;

import java.util.OptionalDouble;
import org.wardon.produce.Ripeness;

/**
 * Cold that injures a crop at a ripeness.
 *
 * @param ripeness how ripe; unknown is judged as green
 * @param safeFromC lowest safe temperature, °C
 * @param bandLowC lower end of a damaging band, below which it is milder again, °C; empty where
 *     colder is always worse
 * @param assumed whether nobody printed it for this crop
 * @param sourceId where the temperature stands
 */
public record ColdZone(
        Ripeness ripeness,
        double safeFromC,
        OptionalDouble bandLowC,
        boolean assumed,
        String sourceId) {}

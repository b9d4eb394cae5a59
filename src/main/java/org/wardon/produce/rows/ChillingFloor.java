package org.wardon.produce.rows;

import java.util.OptionalDouble;
import org.wardon.produce.Fact;

/**
 * Lowest safe temperature as a source gives it.
 *
 * @param lowestSafeC lowest safe temperature, °C, low to high; see {@code rated}
 * @param rated false where the source says hardly sensitive and gives no temperature
 * @param symptoms symptoms as printed
 * @param ripeness ripeness or {@code not-stated}
 * @param variant variant, may be empty
 * @param tissue {@code skin}, {@code flesh}, {@code leaf}, {@code whole} or {@code not-stated}
 * @param zone {@code floor}, {@code band} or empty
 * @param bandLowC printed lower end of a damaging band, °C
 * @param sourceId source
 */
public record ChillingFloor(
        java.util.Optional<Fact> lowestSafeC,
        boolean rated,
        String symptoms,
        String ripeness,
        String variant,
        String tissue,
        String zone,
        OptionalDouble bandLowC,
        String sourceId) {}

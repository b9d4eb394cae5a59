package org.wardon.produce.rows;

import org.wardon.produce.Fact;

/**
 * A time and temperature after which chilling injury was, or was not, seen.
 *
 * @param temperatureC temperature, °C
 * @param days days to injury or days without it, low to high
 * @param kind {@code onset}, {@code by} or {@code safe}
 * @param visible {@code yes}, {@code after-rewarming} or {@code no}
 * @param bound {@code none}, {@code below-temperature} or {@code upper-end-entered}
 * @param ripeness ripeness or {@code not-stated}
 * @param variant variant, may be empty
 * @param tissue tissue judged
 * @param note the note of the table
 */
public record ChillingExposure(
        double temperatureC,
        Fact days,
        String kind,
        String visible,
        String bound,
        String ripeness,
        String variant,
        String tissue,
        String note) {}

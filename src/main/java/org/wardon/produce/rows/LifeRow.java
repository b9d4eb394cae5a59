package org.wardon.produce.rows;

import java.util.OptionalDouble;
import org.wardon.produce.Fact;

/**
 * A published life at a temperature.
 *
 * @param variant cultivar or kind as the source names it, may be empty
 * @param temperatureC storage temperature, °C
 * @param humidity storage humidity as printed, may be empty
 * @param lifeDays life, days
 * @param criterion what ended it, as printed
 * @param endedBy {@code senescence}, {@code ripening}, {@code chilling}, {@code water-loss}, {@code
 *     decay}, {@code sprouting}, {@code trial-end}, {@code not-stated} and the like
 * @param bound {@code exact}, {@code at-least} or {@code at-most}
 * @param ripeness ripeness as printed or {@code not-stated}
 * @param packaging {@code bare}, {@code film}, {@code map}, {@code liner} or {@code not-stated}
 * @param note the note of the table
 */
public record LifeRow(
        String variant,
        OptionalDouble temperatureC,
        String humidity,
        Fact lifeDays,
        String criterion,
        String endedBy,
        String bound,
        String ripeness,
        String packaging,
        String note) {}

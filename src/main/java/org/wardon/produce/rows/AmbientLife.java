package org.wardon.produce.rows;

import java.util.Optional;
import org.wardon.produce.Fact;

/**
 * Life at the ambient temperature of a market against life cooled.
 *
 * @param variant variant, may be empty
 * @param ambient ambient temperature as printed
 * @param ambientDays life at ambient, days
 * @param cooledDays life cooled, days
 * @param cooling how cooled
 * @param note the note of the table
 */
public record AmbientLife(
        String variant,
        String ambient,
        Optional<Fact> ambientDays,
        Optional<Fact> cooledDays,
        String cooling,
        String note) {}

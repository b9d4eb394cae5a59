package org.wardon.produce.rows;

import org.wardon.produce.Fact;

/**
 * A published Q10, of a commodity or of a class.
 *
 * @param lowC lower end of the span, °C
 * @param highC upper end of the span, °C
 * @param q10 factor a 10 K
 * @param note the note of the table
 */
public record Q10Row(double lowC, double highC, Fact q10, String note) {}

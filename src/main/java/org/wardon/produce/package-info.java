/**
 * What is known of a commodity, each figure with its source.
 *
 * <p>Lives here: facts, commodities, reasons; the printed rows stand in {@code produce.rows}.
 *
 * <p>May import: {@code java} and {@code errors}.
 */
@NullMarked
package org.wardon.produce;

import org.jspecify.annotations.NullMarked;

/**
 * Rows of published tables as they were printed, one record a table.
 *
 * <p>Lives here: records that carry a printed row with its source and evidence; no choice is made
 * here.
 *
 * <p>May import: {@code java}, {@code errors} and {@code produce}.
 */
@NullMarked
package org.wardon.produce.rows;

import org.jspecify.annotations.NullMarked;

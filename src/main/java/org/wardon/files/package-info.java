/**
 * Everything that is read from or written to a file.
 *
 * <p>Lives here: store plan, weather, history, series and forecast; the schema; all faults of a
 * file at once.
 *
 * <p>May import: the model and the ground, JSON, CSV.
 */
@NullMarked
package org.wardon.files;

import org.jspecify.annotations.NullMarked;

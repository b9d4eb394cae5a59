/**
 * Builds {@code reference.db} from the published tables; runs in the build, never in the program.
 *
 * <p>Lives here: reading the CSV tables by their list of columns, checking every cell, writing the
 * database and its views.
 *
 * <p>May import: {@code java}, the CSV reader, SQLite, {@code errors}.
 */
@NullMarked
package org.wardon.reference.build;

import org.jspecify.annotations.NullMarked;

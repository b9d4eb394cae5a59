/**
 * The reference tables in SQLite, read-only, and the keeper's own values.
 *
 * <p>Lives here: the builder of the shipped database, its readers, the rules that choose between
 * sources.
 *
 * <p>May import: {@code produce}, {@code plan}, {@code errors}, JDBC, a CSV reader for the builder.
 */
@NullMarked
package org.wardon.reference;

import org.jspecify.annotations.NullMarked;

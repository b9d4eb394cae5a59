/**
 * What the program answers, with the fixed names of its files.
 *
 * <p>Lives here: the records of the forecast and of the other verbs' answers, whose components are
 * the names in JSON, and the writers of JSON and hourly series.
 *
 * <p>May import: {@code java}, JSON, {@code errors}, {@code air}, {@code files}.
 */
@NullMarked
package org.wardon.files.forecast;

import org.jspecify.annotations.NullMarked;

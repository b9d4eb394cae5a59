/**
 * Files of readings: weather and the logged history of a lot.
 *
 * <p>Lives here: CSV with a time column, strictly read; gaps found, filled or refused.
 *
 * <p>May import: {@code java}, CSV, {@code files}, {@code plan}, {@code lots}, {@code air}, {@code
 * errors}. Times are local, temperatures °C, humidity percent.
 */
@NullMarked
package org.wardon.files.readings;

import org.jspecify.annotations.NullMarked;

/**
 * Makes the fitted curves of life out of the printed tables and scores them; runs by hand, never in
 * an answer. What it makes lies in {@code reference-tables/fits} and goes into the database like
 * every other table.
 *
 * <p>Lives here: what a printed row says of a life, the curves with their points and pictures, the
 * scores on what is left out.
 *
 * <p>May import: {@code java}, the CSV reader, {@code errors}, {@code produce}, {@code keeping},
 * {@code reference}.
 */
@NullMarked
package org.wardon.reference.fits;

import org.jspecify.annotations.NullMarked;

/**
 * How long a lot keeps, by which mechanism it ends, with its range.
 *
 * <p>Lives here: mechanisms that read a lot history, the draws of their ranges, the fate they come
 * to.
 *
 * <p>May import: {@code lots}, {@code produce}, {@code air}, {@code errors}, Commons Math.
 */
@NullMarked
package org.wardon.keeping;

import org.jspecify.annotations.NullMarked;

/**
 * A lot as a body that breathes, sweats and cools, and the history it went through.
 *
 * <p>Lives here: items, packages, respiration and transpiration laws, lot histories.
 *
 * <p>May import: {@code java}, Commons Math, {@code air}, {@code produce}, {@code errors}.
 */
@NullMarked
package org.wardon.lots;

import org.jspecify.annotations.NullMarked;

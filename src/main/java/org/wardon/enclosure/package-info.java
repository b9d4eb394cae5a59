/**
 * The chamber as built: faces, layers, door, leakage, gains.
 *
 * <p>Lives here: records of the enclosure and its published laws (U-value, ground, door exchange).
 *
 * <p>May import: {@code java}, Commons Math, {@code air}, {@code produce}, {@code errors}.
 */
@NullMarked
package org.wardon.enclosure;

import org.jspecify.annotations.NullMarked;

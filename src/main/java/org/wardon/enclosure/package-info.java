/**
 * The chamber as built: faces, layers, door, leakage, gains.
 *
 * <p>Lives here: records of the enclosure and its published laws (U-value, waves through a face,
 * ground, films, door exchange), and what a face feels on its far side ({@link OutsideBoundary}).
 *
 * <p>May import: {@code java}, Commons Math, {@code air}, {@code produce}, {@code errors}.
 */
@NullMarked
package org.wardon.enclosure;

import org.jspecify.annotations.NullMarked;

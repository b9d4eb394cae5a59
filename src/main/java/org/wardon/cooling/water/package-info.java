/**
 * Water on faces: films that run down a wall, jackets, and walls kept wet.
 *
 * <p>Lives here: properties of water, how a film flows and takes heat, the exchange along its way,
 * the least flow for a wall, evaporation from a wet outer side.
 *
 * <p>May import: {@code java}, Commons Math, {@code air}, {@code enclosure}, {@code errors}.
 */
@NullMarked
package org.wardon.cooling.water;

import org.jspecify.annotations.NullMarked;

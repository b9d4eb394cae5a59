/**
 * What a keeper has seen of the life of a commodity in a store of their own.
 *
 * <p>Lives here: figures and lots of the keeper's own, and the belief they leave of the level of
 * life, the published spread being the belief before.
 *
 * <p>May import: {@code java}, Commons Math, {@code keeping}, {@code produce}, {@code errors}.
 * Times are days and hours, temperatures °C, levels the logarithm of life over the published one.
 */
@NullMarked
package org.wardon.keeping.experience;

import org.jspecify.annotations.NullMarked;

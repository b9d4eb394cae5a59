/**
 * Coolers: one record a kind, each with its relations.
 *
 * <p>Lives here: the sealed cooler and the setting it follows.
 *
 * <p>May import: {@code java}, Commons Math, {@code air}, {@code enclosure}, {@code errors}.
 */
@NullMarked
package org.wardon.cooling;

import org.jspecify.annotations.NullMarked;

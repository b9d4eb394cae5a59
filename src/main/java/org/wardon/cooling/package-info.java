/**
 * Coolers: one record a kind, each with its relations.
 *
 * <p>Lives here: the sealed cooler, its law compiled for a site, what it does to the air, the
 * setting and the thermostat that follow it.
 *
 * <p>May import: {@code java}, Commons Math, {@code air}, {@code enclosure}, {@code errors}.
 */
@NullMarked
package org.wardon.cooling;

import org.jspecify.annotations.NullMarked;

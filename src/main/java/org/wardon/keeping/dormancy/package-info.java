/**
 * Bulbs, roots and tubers: sprouting, damp and curing.
 *
 * <p>Lives here: the hump of sprouting over temperature, the humidity bulbs stand, what a missing
 * cure costs.
 *
 * <p>May import: what {@code keeping} may.
 *
 * <p>Units: °C, days, humidity 0 to 1.
 */
@NullMarked
package org.wardon.keeping.dormancy;

import org.jspecify.annotations.NullMarked;

/**
 * How fast produce ages at a temperature.
 *
 * <p>Lives here: the generic handbook curve, the slope of a commodity's own published lives, the
 * level its life is anchored on, class values where nobody printed a life.
 *
 * <p>May import: what {@code keeping} may.
 *
 * <p>Units: °C, days.
 */
@NullMarked
package org.wardon.keeping.life;

import org.jspecify.annotations.NullMarked;

/**
 * Ripening of fruit as a stage in time and temperature: from its start to ripe, from ripe to
 * overripe, by printed days.
 *
 * <p>Lives here: days of a leg by temperature, the heat in which ripening fails, and how fast a lot
 * goes through the legs in a draw. What starts ripening lives in {@code keeping} and {@code
 * keeping.ethylene}.
 *
 * <p>May import: {@code errors}, {@code produce}, the draws of {@code keeping}, {@code
 * keeping.life}, {@code keeping.ethylene}.
 */
@NullMarked
package org.wardon.keeping.ripening;

import org.jspecify.annotations.NullMarked;

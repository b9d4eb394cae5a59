/**
 * Ethylene: what produce gives off, what it does to life, when it starts ripening, and how it
 * gathers in a chamber.
 *
 * <p>Lives here: published rates and classes, the log relation of life to level, triggers, the
 * balance of a chamber's air.
 *
 * <p>May import: what {@code keeping} may.
 *
 * <p>Units: µL/L (ppm), µL/(kg h), m3, m3/s.
 */
@NullMarked
package org.wardon.keeping.ethylene;

import org.jspecify.annotations.NullMarked;

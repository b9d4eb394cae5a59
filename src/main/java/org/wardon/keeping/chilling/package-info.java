/**
 * Injury by cold above freezing.
 *
 * <p>Lives here: floors and damaging bands, the dose that injures fitted on published exposures,
 * its range.
 *
 * <p>May import: what {@code keeping} may.
 *
 * <p>Units: °C, K, days, kelvin-days.
 */
@NullMarked
package org.wardon.keeping.chilling;

import org.jspecify.annotations.NullMarked;

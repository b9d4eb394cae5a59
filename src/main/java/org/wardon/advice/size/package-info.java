/**
 * How big must it be?
 *
 * <p>Lives here: the design heat load of a chamber, summed by hand as the handbooks do it, each
 * term with its formula and source.
 *
 * <p>May import: the shelf, the model, the parts, the ground.
 */
@NullMarked
package org.wardon.advice.size;

import org.jspecify.annotations.NullMarked;

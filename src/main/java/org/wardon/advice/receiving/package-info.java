/**
 * A lot comes to the door: where does it go?
 *
 * <p>Lives here: the lot as a keeper tells it, what it comes to in each chamber and outside, what
 * it does to the lots that stand there, which choice is best and why. Quick enough for a page.
 *
 * <p>May import: the shelf, the model, the parts, the ground, {@code advice.forecast}, {@code
 * advice.wording}.
 */
@NullMarked
package org.wardon.advice.receiving;

import org.jspecify.annotations.NullMarked;

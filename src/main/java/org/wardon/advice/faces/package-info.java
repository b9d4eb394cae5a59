/**
 * How does a face of a plan conduct?
 *
 * <p>Lives here: a face layer by layer, for a plan that need not be whole elsewhere.
 *
 * <p>May import: the shelf, the model, the parts, the ground.
 */
@NullMarked
package org.wardon.advice.faces;

import org.jspecify.annotations.NullMarked;

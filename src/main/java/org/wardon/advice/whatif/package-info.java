/**
 * What if? One chamber with one thing changed, quickly, and whole plans side by side.
 *
 * <p>Lives here: the changes a page can move live, the chamber run with them, and the comparison of
 * plans that differ in any input.
 *
 * <p>May import: the shelf, the model, the parts, the ground, {@code advice.forecast}, {@code
 * advice.wording}.
 */
@NullMarked
package org.wardon.advice.whatif;

import org.jspecify.annotations.NullMarked;

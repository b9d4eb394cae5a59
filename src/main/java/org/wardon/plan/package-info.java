/**
 * A store plan as pure records.
 *
 * <p>Lives here: the plan, its chambers and lots, with the bounds of each value.
 *
 * <p>May import: the parts and the ground.
 */
@NullMarked
package org.wardon.plan;

import org.jspecify.annotations.NullMarked;

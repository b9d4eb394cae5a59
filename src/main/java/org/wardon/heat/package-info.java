/**
 * The coupled heat and moisture model of one chamber.
 *
 * <p>Lives here: the run asked for and the course it returns; laws, network and solver stand in
 * inner rooms.
 *
 * <p>May import: the parts and the ground; Commons Math except in {@code heat.solver}. Knows
 * nothing of shelf life.
 */
@NullMarked
package org.wardon.heat;

import org.jspecify.annotations.NullMarked;

/**
 * A chamber compiled once into numbers the solver can step.
 *
 * <p>Lives here: the translation from records to nodes, chains and events.
 *
 * <p>May import: {@code heat.laws}, {@code heat.solver}, the parts and the ground.
 */
@NullMarked
package org.wardon.heat.network;

import org.jspecify.annotations.NullMarked;

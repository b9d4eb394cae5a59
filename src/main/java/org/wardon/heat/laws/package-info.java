/**
 * The equations of the model, readable, each with its source.
 *
 * <p>Lives here: heat and vapour flows between nodes as pure functions.
 *
 * <p>May import: the parts and the ground.
 */
@NullMarked
package org.wardon.heat.laws;

import org.jspecify.annotations.NullMarked;

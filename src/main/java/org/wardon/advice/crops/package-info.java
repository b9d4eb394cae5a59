/**
 * What is known of one crop, put together to be looked at: facts with their sources, life and heat
 * over temperature, the cold that injures it, and how to find a crop by what people call it.
 *
 * <p>Lives here: sheets of figures and the search over names; no drawing and no sentences.
 *
 * <p>May import: the shelf, the model, the parts, the ground.
 */
@NullMarked
package org.wardon.advice.crops;

import org.jspecify.annotations.NullMarked;

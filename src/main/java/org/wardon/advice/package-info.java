/**
 * Questions answered.
 *
 * <p>Lives here: one inner room a question, around one store run.
 *
 * <p>May import: the shelf, the model and the ground.
 */
@NullMarked
package org.wardon.advice;

import org.jspecify.annotations.NullMarked;

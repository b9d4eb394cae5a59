/**
 * The main question: what will the chambers do to this load, and what is to be done.
 *
 * <p>Lives here: the lots of a plan with all they rest on, the store run through the heat model
 * once in full and once a draw, the fates of the lots with and without a chamber, the forecast made
 * of them.
 *
 * <p>May import: the shelf, the model, the parts, the ground, {@code advice.wording}.
 */
@NullMarked
package org.wardon.advice.forecast;

import org.jspecify.annotations.NullMarked;

/**
 * How long does one lot keep, in one condition or along a history?
 *
 * <p>Lives here: the question as asked and the answer with its ranges and reasons.
 *
 * <p>May import: the shelf, the model, the parts, the ground.
 */
@NullMarked
package org.wardon.advice.outlook;

import org.jspecify.annotations.NullMarked;

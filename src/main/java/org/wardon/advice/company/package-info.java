/**
 * Who may share a chamber with whom?
 *
 * <p>Lives here: the question as asked and the answer with its reasons.
 *
 * <p>May import: the shelf, the model, the parts, the ground, {@code advice.wording}.
 */
@NullMarked
package org.wardon.advice.company;

import org.jspecify.annotations.NullMarked;

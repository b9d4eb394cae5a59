/**
 * Words for what the model rooms return as codes.
 *
 * <p>Lives here: sentences from bundles, and figures in the units a person reads.
 *
 * <p>May import: {@code produce}, {@code errors}.
 */
@NullMarked
package org.wardon.advice.wording;

import org.jspecify.annotations.NullMarked;

/**
 * Faults and refusals: what a person did wrong, what cannot be, how far the work has come.
 *
 * <p>Lives here: checks of arguments, the list of faults in bad input, the stop of a run, progress.
 *
 * <p>May import: {@code java} only.
 */
@NullMarked
package org.wardon.errors;

import org.jspecify.annotations.NullMarked;

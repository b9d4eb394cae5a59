/**
 * Who may share a chamber with whom.
 *
 * <p>Lives here: workable settings of lots and groups, conflicts, verdicts.
 *
 * <p>May import: {@code keeping} and what it may import.
 */
@NullMarked
package org.wardon.sharing;

import org.jspecify.annotations.NullMarked;

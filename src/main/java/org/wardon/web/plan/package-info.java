/**
 * The page on which a plan is changed.
 *
 * <p>Lives here: forms made of the schema of a plan, faults at their fields, faces as they are
 * drawn and told while they are typed, saves that lose nothing.
 *
 * <p>May import: desk, shelf, {@code plan}, {@code produce}, {@code air}.
 */
@NullMarked
package org.wardon.web.plan;

import org.jspecify.annotations.NullMarked;

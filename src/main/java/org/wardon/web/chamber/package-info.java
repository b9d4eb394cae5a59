/**
 * The page of one chamber: its air and gases hour by hour, what heats it, the temperatures through
 * a face, its lots, and what it would do with something changed.
 *
 * <p>May import: {@code web.pages}, {@code web.work}, {@code web.guard}, {@code advice} and what
 * lies below.
 */
@NullMarked
package org.wardon.web.chamber;

import org.jspecify.annotations.NullMarked;

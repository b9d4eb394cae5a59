/**
 * Long lists of a plan, part by part: its lots, cautions, notes, things to do, and why a chamber is
 * shared or not.
 *
 * <p>Lives here: the pages and their views. The page of all chambers shows the head of each list
 * and links here for the rest.
 *
 * <p>May import: {@code web.pages}, {@code web.work}, {@code web.guard}, {@code advice}, {@code
 * plan}, {@code files.forecast}.
 */
@NullMarked
package org.wardon.web.lists;

import org.jspecify.annotations.NullMarked;

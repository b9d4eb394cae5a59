/**
 * At the door: a warm lot comes in, where does it go?
 *
 * <p>Lives here: the form a keeper fills in, the answer as the page shows it, putting the lot into
 * the plan.
 *
 * <p>May import: {@code web.pages}, {@code web.work}, {@code web.guard}, the desk, the shelf,
 * {@code plan}, {@code produce}.
 */
@NullMarked
package org.wardon.web.door;

import org.jspecify.annotations.NullMarked;

/**
 * What is open and what is being worked out.
 *
 * <p>Lives here: the reference book in use, kept plans read and checked, forecasts computed in the
 * background and remembered by the version of their plan.
 *
 * <p>May import: desk, shelf and {@code plan}; no page.
 */
@NullMarked
package org.wardon.web.work;

import org.jspecify.annotations.NullMarked;

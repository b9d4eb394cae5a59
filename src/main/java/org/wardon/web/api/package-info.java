/**
 * The same advice as JSON.
 *
 * <p>Lives here: one handler a resource, the records it writes.
 *
 * <p>May import: {@code web.guard}, {@code web.work}, desk, shelf and {@code plan}.
 */
@NullMarked
package org.wardon.web.api;

import org.jspecify.annotations.NullMarked;

/**
 * Who may ask, and how: hosts, origins, sessions, tokens, the passcode, limits, headers.
 *
 * <p>Lives here: everything defensive, and nothing else.
 *
 * <p>May import: {@code errors} and Javalin.
 */
@NullMarked
package org.wardon.web.guard;

import org.jspecify.annotations.NullMarked;

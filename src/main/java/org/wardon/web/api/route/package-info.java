/**
 * What a route of the JSON interface is: what it takes, what it gives, and who does the work.
 *
 * <p>Lives here: operations as plain records, requests checked against their schema, replies. Code
 * and document are made of the same operations, so they cannot drift apart.
 *
 * <p>May import: {@code web.guard}, {@code web.work}, {@code web.pages.Call}, {@code files.json}.
 */
@NullMarked
package org.wardon.web.api.route;

import org.jspecify.annotations.NullMarked;

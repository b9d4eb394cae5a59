/**
 * The same advice as JSON, for programs and for the scripts of the pages.
 *
 * <p>Lives here: the one table of routes, one class a resource. {@code route} holds what a route
 * is, {@code told} the answers only the interface gives, {@code document} the OpenAPI document made
 * of the table.
 *
 * <p>May import: {@code web.guard}, {@code web.work}, {@code web.chamber}, words, charts and calls
 * of {@code web.pages}, desk, shelf and {@code plan}.
 */
@NullMarked
package org.wardon.web.api;

import org.jspecify.annotations.NullMarked;

/**
 * The OpenAPI 3.1 document, made of the table of routes.
 *
 * <p>Lives here: shapes of answers out of their records, requests out of their schema, words and
 * examples out of resources.
 *
 * <p>May import: {@code web.api.route}, {@code web.pages.Problem}, Jackson.
 */
@NullMarked
package org.wardon.web.api.document;

import org.jspecify.annotations.NullMarked;

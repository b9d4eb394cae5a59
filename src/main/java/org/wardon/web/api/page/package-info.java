/**
 * The OpenAPI document as a page.
 *
 * <p>Lives here: the page and its view, made of the document and of nothing else.
 *
 * <p>May import: {@code web.pages}, Jackson.
 */
@NullMarked
package org.wardon.web.api.page;

import org.jspecify.annotations.NullMarked;

/**
 * What people see: one handler a page, the records its template shows, words, figures and assets.
 *
 * <p>Lives here: handlers and view records. Templates stand in {@code src/main/jte}, words in
 * {@code pages.properties}. No rule of the trade.
 *
 * <p>May import: {@code web.guard}, {@code web.work}, desk, shelf and {@code plan}.
 */
@NullMarked
package org.wardon.web.pages;

import org.jspecify.annotations.NullMarked;

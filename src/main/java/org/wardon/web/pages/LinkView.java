package org.wardon.web.pages;

/**
 * A link.
 *
 * @param href where to
 * @param text what stands there
 */
public record LinkView(String href, String text) {}

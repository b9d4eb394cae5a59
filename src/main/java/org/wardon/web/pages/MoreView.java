package org.wardon.web.pages;

/**
 * What a page leaves out, and where it stands.
 *
 * @param told what is left out, in words; blank where the link says it
 * @param all a link to all of it
 */
public record MoreView(String told, LinkView all) {}

package org.wardon.web.pages;

/**
 * A fact in a list of facts.
 *
 * @param name what it is
 * @param value what it comes to, with its unit
 */
public record FactView(String name, String value) {}

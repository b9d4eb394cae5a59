package org.wardon.web.pages;

/**
 * Something to beware of.
 *
 * @param level {@code danger}, {@code caution} or {@code note}
 * @param text the sentence
 * @param source id of what it rests on
 */
public record CautionView(String level, String text, String source) {}

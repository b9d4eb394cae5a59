package org.wardon.files.forecast;

/**
 * The published range the days left hang on most.
 *
 * @param range its name
 * @param sharePct share of the order of the days left that it explains, percent
 */
public record HangsOn(String range, double sharePct) {}

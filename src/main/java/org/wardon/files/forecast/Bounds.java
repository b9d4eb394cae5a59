package org.wardon.files.forecast;

/**
 * A span of settings.
 *
 * @param low its lower end
 * @param high its upper end
 */
public record Bounds(double low, double high) {}

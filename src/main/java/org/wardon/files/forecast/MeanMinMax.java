package org.wardon.files.forecast;

/**
 * A series in three numbers.
 *
 * @param mean its mean
 * @param min its lowest value
 * @param max its highest value
 */
public record MeanMinMax(double mean, double min, double max) {}

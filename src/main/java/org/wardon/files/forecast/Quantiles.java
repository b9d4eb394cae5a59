package org.wardon.files.forecast;

/**
 * A range over the draws.
 *
 * @param p10 one draw in ten is below
 * @param p50 half of the draws are below
 * @param p90 nine draws in ten are below
 */
public record Quantiles(double p10, double p50, double p90) {}

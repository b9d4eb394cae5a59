package org.wardon.enclosure.section;

/**
 * A place in a section.
 *
 * @param xM from the left, m
 * @param yM above the floor, m
 * @param temperatureC there, °C
 */
public record Spot(double xM, double yM, double temperatureC) {}

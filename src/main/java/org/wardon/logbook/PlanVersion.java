package org.wardon.logbook;

import java.time.Instant;

/**
 * One version in the history of a plan.
 *
 * @param number its number, from 1
 * @param parent the version it was made from; 0 for the first
 * @param note what was done, in a line
 * @param at when, UTC
 */
public record PlanVersion(int number, int parent, String note, Instant at) {}

package org.wardon.produce.rows;

/**
 * A commodity that takes the smell of another.
 *
 * @param giverId commodity that gives the smell
 * @param takerId commodity that takes it, or {@code any}
 * @param sourceId source
 */
public record OdourPair(String giverId, String takerId, String sourceId) {}

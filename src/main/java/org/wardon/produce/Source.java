package org.wardon.produce;

/**
 * Where a figure was published.
 *
 * @param id short id used beside each figure
 * @param citation the whole citation
 * @param year year printed, may be empty
 * @param publisher publisher, may be empty
 * @param note what was seen of it, may be empty
 */
public record Source(String id, String citation, String year, String publisher, String note) {}

package org.wardon.produce.rows;

import org.wardon.produce.Evidence;

/**
 * What a level of ethylene did to the life of stored produce, in the words of the source.
 *
 * @param commodity produce in the words of the source
 * @param temperature temperature in the words of the source, °C; may be empty
 * @param ethylene levels compared
 * @param effect what it did to the life; may be empty
 * @param sourceId source
 * @param evidence how it reached us
 * @param note the note of the table
 */
public record EthyleneStorageRow(
        String commodity,
        String temperature,
        String ethylene,
        String effect,
        String sourceId,
        Evidence evidence,
        String note) {}

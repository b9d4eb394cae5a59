package org.wardon.reference;

import org.wardon.produce.rows.OwnLot;

/**
 * A lot of the keeper's own that is gone, as it is kept in the keeper's file.
 *
 * @param commodityId id of the tables
 * @param name what the keeper calls the lot, may be empty
 * @param note what the keeper wrote beside it, may be empty
 * @param lot what it went through and how it ended
 */
public record GoneLot(String commodityId, String name, String note, OwnLot lot) {}

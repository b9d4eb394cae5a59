package org.wardon.plan;

/** What a ripening lot is kept for. */
public enum Purpose {
    /** To be sent on unripe. */
    SHIP_GREEN,
    /** To be sold ripe. */
    SELL_RIPE
}

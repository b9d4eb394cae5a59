package org.wardon.heat;

/**
 * Something that changes at a time known beforehand.
 *
 * @param atS when, s since the start of the run
 * @param kind what changes
 * @param index which lot, outage, cooler or setting; 0 where there is but one
 */
record Edge(double atS, Kind kind, int index) {
    /** What changes. */
    enum Kind {
        MIDNIGHT,
        USE_STARTS,
        USE_ENDS,
        LIGHTS_ON,
        LIGHTS_OFF,
        POWER_OFF,
        POWER_ON,
        DEFROST_STARTS,
        DEFROST_ENDS,
        WALL_POURED,
        RECHARGE_ENDS,
        RECHARGE_STARTS,
        SETTING_CHANGES,
        DOOR_SHUTS,
        LEAVES,
        ARRIVES,
        FRESH_ENDS,
        DOOR_OPENS
    }
}

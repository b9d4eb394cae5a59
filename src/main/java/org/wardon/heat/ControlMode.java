package org.wardon.heat;

/** How coolers follow the thermostat in a run. */
public enum ControlMode {
    /** As each cooler is built. */
    AS_BUILT,
    /** Capacity follows the air within the band, whatever is built; for sampling and fits. */
    MODULATING,
    /**
     * Instead of the coolers, an unlimited one that never lets the air above the setting: what it
     * takes is the load. Its coil stands 6 K below the air (common practice for rooms of produce).
     */
    IDEAL
}

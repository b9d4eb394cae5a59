package org.wardon.cooling;

/** How a cooler follows the thermostat. */
public enum Control {
    /** On above setting + band, off below setting - band. */
    ON_OFF,
    /** Capacity follows the air temperature within the band. */
    MODULATING
}

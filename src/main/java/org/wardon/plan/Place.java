package org.wardon.plan;

/** Where in its chamber a lot stands. */
public enum Place {
    /** In the blast of the cooler. */
    NEAR_COOLER,
    /** In the middle. */
    MIDDLE,
    /** By the door. */
    DOOR
}

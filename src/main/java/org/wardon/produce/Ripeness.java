package org.wardon.produce;

/** How far a ripening fruit has come. */
public enum Ripeness {
    /** Mature and green; ripening has not begun. */
    GREEN,
    /** Colour or softness has begun to turn. */
    TURNING,
    /** Ripe, ready to eat. */
    RIPE,
    /** Nobody said; judged as green for chilling and as ripe for giving off ethylene. */
    UNKNOWN
}

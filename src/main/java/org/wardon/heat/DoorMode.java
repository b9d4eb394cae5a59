package org.wardon.heat;

/** How the door acts on the air. */
public enum DoorMode {
    /** Each opening is an event. */
    PULSES,
    /**
     * The same exchange spread evenly over the hours of use, each opening counting {@code V (1 -
     * exp(-flow t/V))}; needs modulating or ideal control.
     */
    AVERAGED
}

package org.wardon.heat;

/** How the door acts on the air, and how finely the run follows the outdoors. */
public enum DoorMode {
    /** Each opening is an event. */
    PULSES(1),
    /**
     * The same exchange spread evenly over the hours of use, each opening counting {@code V (1 -
     * exp(-flow t/V))}; needs modulating or ideal control.
     */
    AVERAGED(1),
    /**
     * As averaged, the outdoors in means of five hours and a row every fifth hour, door, people and
     * lights spread over each row, with a looser step: for sampling, where a lot's days count and
     * no single hour does.
     */
    SKETCHED(5);

    private final int rowHours;

    DoorMode(int rowHours) {
        this.rowHours = rowHours;
    }

    /**
     * Returns the hours from row to row.
     *
     * @return at least 1
     */
    public int rowHours() {
        return rowHours;
    }
}

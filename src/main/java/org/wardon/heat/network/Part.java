package org.wardon.heat.network;

/** Something that hangs on the chamber's air: writes its own rates and adds to those of the air. */
interface Part {
    /**
     * Adds rates and writes flows. The hub's entries collect W and kg/s; the network divides them
     * by the mass of the air.
     */
    void rates(AirState air, Outside outside, double[] y, double[] rates, double[] flows);

    /** Hears that a step starts here, before it is asked for rates. */
    default void near(AirState air, double[] y) {}

    /**
     * Writes J, after {@link #rates} was asked of the same state; what the part does to the air
     * goes, divided by {@code airKg}, to the air's own rows.
     */
    void linearise(AirState air, Outside outside, double airKg, double[] y);

    /**
     * Adds what the outside's change in time does, after {@link #linearise}; the hub's entries
     * collect W/s and kg/s2.
     */
    void timeSlope(AirState air, Outside outside, double[] y, double[] rateSlope, double[] slope);

    /** Writes the change of its flows along a direction, linearised at {@code air}. */
    void flowsAlong(AirState air, double[] v, double[] change);
}

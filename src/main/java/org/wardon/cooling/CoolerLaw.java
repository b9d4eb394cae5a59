package org.wardon.cooling;

/** A cooler compiled for the air pressure of its site: pure, without state, safe to share. */
public sealed interface CoolerLaw
        permits CompressorLaw, EvaporativePadLaw, NightAirLaw, IceBankLaw, FaceLaw {
    /**
     * Returns how many own states the cooler has, such as water on its coil.
     *
     * @return 0 or more
     */
    int ownStates();

    /**
     * States what the cooler does now. Smooth in all inputs, with its derivatives; allocates
     * nothing.
     *
     * @param in what it meets; {@code in.run} 0 is a cooler at rest
     * @param out filled with all it does
     */
    void effect(CoolerInputs in, CoolerEffect out);

    /**
     * Returns how far the cooler is inside its own conditions for running, thermostat apart: air
     * outdoors cold enough, for example. One that is switched on and off comes on where this and
     * the thermostat allow it, and goes off where either does not; a margin between the two keeps
     * it from chattering.
     *
     * @param in what it meets
     * @param on whether it runs now
     * @param out scratch, its answers are not kept
     * @return K or percent of humidity, whichever is nearest to its limit; below 0 outside;
     *     infinite where it has no conditions
     */
    default double inside(CoolerInputs in, boolean on, CoolerEffect out) {
        return Double.POSITIVE_INFINITY;
    }

    /**
     * Returns whether {@link #inside} can be less than infinite.
     *
     * @return true where it has conditions of its own
     */
    default boolean conditional() {
        return false;
    }

    /**
     * Returns an own state at the start of a run.
     *
     * @param i number of the state
     * @return in its unit
     */
    default double ownAtStart(int i) {
        return 0;
    }

    /**
     * Returns the error of an own state that counts as 1.
     *
     * @param i number of the state
     * @return in its unit; 5 g for water on a coil
     */
    default double ownTolerance(int i) {
        return 0.005;
    }

    /**
     * Returns the most an own state can hold; below 0 it never is.
     *
     * @param i number of the state
     * @return in its unit; infinite where there is no such bound
     */
    default double ownMost(int i) {
        return Double.POSITIVE_INFINITY;
    }
}

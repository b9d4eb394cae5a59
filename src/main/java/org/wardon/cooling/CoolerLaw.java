package org.wardon.cooling;

/** A cooler compiled for the air pressure of its site: pure, without state, safe to share. */
public sealed interface CoolerLaw permits CompressorLaw {
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
}

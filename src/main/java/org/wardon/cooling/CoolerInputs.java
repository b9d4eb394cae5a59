package org.wardon.cooling;

/**
 * What a cooler meets at one instant. Mutable with open fields for the same reason as {@link
 * CoolerEffect}: it is refilled at each stage of each step.
 */
public final class CoolerInputs {
    /** Air of the chamber, °C. */
    public double airC;

    /** Humidity ratio of the chamber's air, kg/kg. */
    public double humidityRatio;

    /** Outdoor air, °C. */
    public double outdoorC;

    /** Humidity ratio of outdoor air, kg/kg. */
    public double outdoorHumidityRatio;

    /** {@code [own state]}, the cooler's own states. */
    public final double[] own;

    /** Share of the time it runs, or speed, 0 to 1; 1 for a cooler that is on. */
    public double run = 1;

    /** Whether it is the hour of its machine that makes ice, and there is power. */
    public boolean recharging;

    /**
     * Makes room for what one cooler meets.
     *
     * @param ownStates own states of the cooler, 0 or more
     */
    public CoolerInputs(int ownStates) {
        own = new double[ownStates];
    }
}

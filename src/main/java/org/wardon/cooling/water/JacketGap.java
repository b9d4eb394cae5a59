package org.wardon.cooling.water;

import org.wardon.errors.Require;

/**
 * Water that fills the gap between a face and the sheet of a jacket before it.
 *
 * <p>Source: developed laminar flow between two plates of one temperature, Nu = 7.54 with twice the
 * gap as the length, Incropera and others, Fundamentals of Heat and Mass Transfer, table of fully
 * developed laminar flow (from memory). A lower bound where the flow is turbulent; the still air
 * before the sheet, 20 to 50 times less conducting, rules the exchange.
 *
 * @param gapM thickness of the water, m
 */
public record JacketGap(double gapM) {
    private static final double NUSSELT = 7.54;

    /** Checks the bounds. */
    public JacketGap {
        Require.within("gapM", gapM, 1e-3, 0.2, "m", "");
    }

    /**
     * Returns the film coefficient between water and either side while it flows.
     *
     * @param water its properties
     * @return W/(m2 K)
     */
    public double sideWm2K(LiquidWater water) {
        return NUSSELT * water.conductivityWmK() / (2 * gapM);
    }

    /**
     * Returns the conductance from face to sheet while the water stands.
     *
     * @param water its properties
     * @return W/(m2 K)
     */
    public double standingWm2K(LiquidWater water) {
        return water.conductivityWmK() / gapM;
    }
}

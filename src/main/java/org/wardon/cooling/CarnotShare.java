package org.wardon.cooling;

import org.wardon.air.SaturatedAir;
import org.wardon.errors.Require;

/**
 * Coefficient of performance of a vapour-compression cycle.
 *
 * <p>Source: Carnot's relation with a fraction for the real cycle, as in the table of cooling
 * sources (cop_carnot_fraction).
 */
public final class CarnotShare {
    private CarnotShare() {}

    /**
     * Returns heat taken per electric energy.
     *
     * @param evaporatingC saturated evaporating temperature, °C
     * @param condensingC saturated condensing temperature, °C, above the evaporating one
     * @param carnotFraction share of Carnot's figure reached, 0 to 1
     * @return coefficient of performance
     * @throws IllegalArgumentException where the condensing side is not the warmer one
     */
    public static double cop(double evaporatingC, double condensingC, double carnotFraction) {
        Require.within(
                "condensingC less evaporatingC",
                condensingC - evaporatingC,
                1e-3,
                200,
                "K",
                "The condensing side must be the warmer one.");
        return carnotFraction
                * (evaporatingC + SaturatedAir.ZERO_C_IN_K)
                / (condensingC - evaporatingC);
    }
}

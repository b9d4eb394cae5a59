package org.wardon.lots;

import java.util.OptionalDouble;
import org.wardon.errors.Require;

/**
 * A stack of produce that cools from its outside, and how it heats itself.
 *
 * <p>Source: first term of the slab series, ln(2 x 8/pi2)/(pi/2)2 = 0.196, with the film in series;
 * the pairing is an (assumption).
 *
 * @param halfThicknessM path of heat to the middle, m
 * @param diffusivityM2S diffusivity of the bulk, m2/s; 1.2e-7 to 2.5e-7 (assumption)
 * @param capacityJm3K heat capacity of the bulk, J/(m3 K); about 2.1e6 (assumption)
 * @param filmWm2K outer film, W/(m2 K); 5 to 15 (assumption)
 */
public record StackCooling(
        double halfThicknessM, double diffusivityM2S, double capacityJm3K, double filmWm2K) {
    /** Excess of a stack's core over the mean excess at rest (assumption). */
    public static final double CORE_OVER_MEAN = 1.5;

    /** Self-heating above which a caution is due, K (assumption). */
    public static final double CAUTION_K = 3;

    /**
     * Most self-heating a stack of Q10 2.5 can stand at, K: 10/ln 2.5. Where heat of breathing
     * grows as exp(T ln Q10/10) and loss with the excess alone, both meet only up to there (N. N.
     * Semenov's condition of self-ignition, from memory); at the air's own temperature the
     * breathing may then be worth no more than a third of it, 10/(e ln Q10).
     */
    public static final double RUNAWAY_K = 11;

    /** Where no rest is found up to here above the air, there is none, K. */
    private static final double SEARCHED_K = 60;

    private static final double SEARCH_STEP_K = 0.05;

    private static final double LN2 = 0.693;

    /** Refuses what no stack is. */
    public StackCooling {
        Require.within("halfThicknessM", halfThicknessM, 0.01, 20, "m", "Half the shortest side.");
        Require.within("diffusivityM2S", diffusivityM2S, 1e-8, 1e-6, "m2/s", "");
        Require.within("capacityJm3K", capacityJm3K, 1e5, 5e6, "J/(m3 K)", "");
        Require.within("filmWm2K", filmWm2K, 0.1, 1000, "W/(m2 K)", "");
    }

    /**
     * Returns a stack with the middle of the assumed properties.
     *
     * @param halfThicknessM path of heat to the middle, m
     * @return the stack: 1.8e-7 m2/s, 2.1 MJ/(m3 K), 10 W/(m2 K) (assumption)
     */
    public static StackCooling of(double halfThicknessM) {
        return new StackCooling(halfThicknessM, 1.8e-7, 2.1e6, 10);
    }

    /**
     * Returns the half-cooling time.
     *
     * @return s: 0.196 L2/alpha + 0.69 rho c L/h
     */
    public double halfS() {
        return 0.196 * halfThicknessM * halfThicknessM / diffusivityM2S
                + 0.69 * capacityJm3K * halfThicknessM / filmWm2K;
    }

    /**
     * Returns how far produce stands above its air once it has come to rest, breathing at its own
     * temperature, not at the air's.
     *
     * @param law its breathing
     * @param airC the air around it, °C
     * @param halfCoolingS half-cooling time, s
     * @param specificHeatJkgK specific heat of the produce, J/(kg K)
     * @return mean excess, K; empty where it never rests: it runs away
     */
    public static OptionalDouble restsAtK(
            RespirationLaw law, double airC, double halfCoolingS, double specificHeatJkgK) {
        double lower = 0;
        for (double above = SEARCH_STEP_K; above <= SEARCHED_K; above += SEARCH_STEP_K) {
            double gives =
                    selfHeatingK(law.wattsPerKg(airC + above), halfCoolingS, specificHeatJkgK);
            if (gives <= above) {
                // Straight between the last two: breathing bends little over a twentieth of a
                // kelvin.
                double over =
                        selfHeatingK(law.wattsPerKg(airC + lower), halfCoolingS, specificHeatJkgK)
                                - lower;
                return OptionalDouble.of(lower + SEARCH_STEP_K * over / (over + above - gives));
            }
            lower = above;
        }
        return OptionalDouble.empty();
    }

    /**
     * Returns how far produce at rest stays above its air for a given heat of breathing.
     *
     * @param respirationWPerKg heat of respiration at the produce's own temperature, W/kg
     * @param halfCoolingS half-cooling time, s
     * @param specificHeatJkgK specific heat of the produce, J/(kg K)
     * @return mean excess, K
     */
    public static double selfHeatingK(
            double respirationWPerKg, double halfCoolingS, double specificHeatJkgK) {
        return respirationWPerKg * halfCoolingS / (LN2 * specificHeatJkgK);
    }
}

package org.wardon.lots;

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

    /** Self-heating above which a stack of Q10 2.5 runs away, K: 10/ln 2.5. */
    public static final double RUNAWAY_K = 11;

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
     * Returns how far produce at rest stays above its air.
     *
     * @param respirationWPerKg heat of respiration, W/kg
     * @param halfCoolingS half-cooling time, s
     * @param specificHeatJkgK specific heat of the produce, J/(kg K)
     * @return mean excess, K
     */
    public static double selfHeatingK(
            double respirationWPerKg, double halfCoolingS, double specificHeatJkgK) {
        return respirationWPerKg * halfCoolingS / (LN2 * specificHeatJkgK);
    }
}

package org.wardon.enclosure;

import org.wardon.air.SaturatedAir;

/**
 * Radiation between the inner surfaces, as a film to the chamber's air.
 *
 * <p>Source: ISO 6946:2017, annex C: emissivity times 4 sigma T^3 (from memory); emissivity 0.9 as
 * in its table 7.
 */
public final class RadiantFilm {
    private static final double STEFAN_BOLTZMANN = 5.67e-8;
    private static final double EMISSIVITY = 0.9;

    private RadiantFilm() {}

    /**
     * Returns the film.
     *
     * @param meanC mean of surface and surroundings, °C
     * @return W/(m2 K)
     */
    public static double wattsM2K(double meanC) {
        double t = meanC + SaturatedAir.ZERO_C_IN_K;
        return EMISSIVITY * 4 * STEFAN_BOLTZMANN * t * t * t;
    }

    /**
     * Returns the film between two wide surfaces that face each other, both of emissivity 0.9.
     *
     * <p>Source: ISO 6946:2017, annex D: 4 sigma T^3 / (1/e + 1/e - 1) (from memory).
     *
     * @param meanC mean of the surfaces, °C
     * @return W/(m2 K)
     */
    public static double betweenWm2K(double meanC) {
        return wattsM2K(meanC) / EMISSIVITY / (2 / EMISSIVITY - 1);
    }
}

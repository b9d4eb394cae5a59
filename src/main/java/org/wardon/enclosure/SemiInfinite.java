package org.wardon.enclosure;

import org.apache.commons.math3.special.Erf;

/**
 * A thick body whose surface takes a new temperature at once.
 *
 * <p>Source: Incropera and others, Fundamentals of Heat and Mass Transfer, semi-infinite solid,
 * case 1 (from memory).
 */
public final class SemiInfinite {
    private SemiInfinite() {}

    /**
     * Returns the temperature at a depth some time after the step.
     *
     * @param initialC temperature before, °C
     * @param surfaceC temperature of the surface from then on, °C
     * @param diffusivityM2s thermal diffusivity, m2/s
     * @param depthM depth, m, 0 or more
     * @param timeS time since the step, s, above 0
     * @return °C
     */
    public static double temperatureC(
            double initialC, double surfaceC, double diffusivityM2s, double depthM, double timeS) {
        return surfaceC
                + (initialC - surfaceC) * Erf.erf(depthM / (2 * Math.sqrt(diffusivityM2s * timeS)));
    }
}

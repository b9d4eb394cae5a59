package org.wardon.air;

import org.wardon.errors.Require;

/**
 * Mean air pressure by height.
 *
 * <p>Source: ASHRAE Handbook - Fundamentals, 2017, chapter 1, equation 3.
 */
public final class StandardAtmosphere {
    /** Pressure at the sea, Pa. */
    public static final double SEA_LEVEL_PA = 101_325;

    private StandardAtmosphere() {}

    /**
     * Returns the pressure at a height.
     *
     * @param elevationM height above the sea, m, -5000 to 11 000
     * @return Pa
     * @throws IllegalArgumentException outside that range
     */
    public static double pressurePa(double elevationM) {
        Require.within("elevationM", elevationM, -5_000, 11_000, "m", "Give metres above the sea.");
        return SEA_LEVEL_PA * Math.pow(1 - 2.25577e-5 * elevationM, 5.2559);
    }
}

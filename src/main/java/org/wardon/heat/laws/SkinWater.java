package org.wardon.heat.laws;

import org.wardon.lots.TranspirationLaw;

/**
 * Vapour leaving the skin of produce for the air of its package: from the tissue where the skin is
 * dry, from free water where it is wet, and back as dew where the air's vapour pressure is above
 * saturation at the skin.
 *
 * <p>Source: transpiration J = kt (VPL psat - pa), ASHRAE Handbook - Refrigeration 2006, chapter 9
 * ({@link TranspirationLaw}); free water and dew by the film alone with full saturation pressure.
 * Corners are rounded ({@link FreeWater#ROUND_PA}).
 */
public final class SkinWater {
    private SkinWater() {}

    /**
     * Returns the water that leaves the tissue.
     *
     * @param law the lot's law
     * @param saturationPa saturation at the skin, Pa
     * @param airPa vapour pressure of package air, Pa
     * @param wetShare share of the skin under free water, 0 to 1
     * @return kg/s per kg of lot, 0 or more
     */
    public static double fromTissueKgPerKgS(
            TranspirationLaw law, double saturationPa, double airPa, double wetShare) {
        double drop = law.vapourPressureLowering() * saturationPa - airPa;
        return law.conductanceKgPerKgSPa()
                * FreeWater.positive(drop, FreeWater.ROUND_PA)
                * (1 - wetShare);
    }

    /**
     * Returns the water that leaves the film of free water.
     *
     * @param law the lot's law
     * @param saturationPa saturation at the skin, Pa
     * @param airPa vapour pressure of package air, Pa
     * @param wetShare share of the skin under free water, 0 to 1
     * @return kg/s per kg of lot; below 0 where dew settles
     */
    public static double fromFilmKgPerKgS(
            TranspirationLaw law, double saturationPa, double airPa, double wetShare) {
        double drop = saturationPa - airPa;
        double up = wetShare * FreeWater.positive(drop, FreeWater.ROUND_PA);
        double down = FreeWater.positive(-drop, FreeWater.ROUND_PA);
        return law.filmKgPerKgSPa() * (up - down);
    }
}

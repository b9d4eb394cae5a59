package org.wardon.lots;

/**
 * The film of air around an item in a slow stream.
 *
 * <p>Source: Becker and Fricke 1996, as in ASHRAE Handbook - Refrigeration 2006, chapter 9: Sh =
 * 2.0 + 0.552 Re^0.53 Sc^0.33, and ka = Sh D/(d Rw T). Heat follows by analogy, Nu with Pr in place
 * of Sc.
 */
public final class AirFilm {
    /** Speed of air among items in a package without forced air, m/s (assumption). */
    public static final double PACKAGE_AIR_M_S = 0.1;

    /** Kinematic viscosity of air at 10 °C, m2/s (from memory of tables of air). */
    private static final double VISCOSITY_M2_S = 1.42e-5;

    /** Diffusivity of vapour in air at 10 °C, m2/s (from memory of tables of air). */
    private static final double DIFFUSIVITY_M2_S = 2.3e-5;

    /** Conductivity of air at 10 °C, W/(m K) (from memory of tables of air). */
    private static final double CONDUCTIVITY_W_M_K = 0.025;

    /** Prandtl number of air (from memory of tables of air). */
    private static final double PRANDTL = 0.71;

    /** Gas constant of water vapour, J/(kg K). Source: R/M with 8.31446 and 18.0153 g/mol. */
    private static final double VAPOUR_GAS_J_KG_K = 461.52;

    private static final double TEN_C_IN_K = 283.15;

    /** Length the air passes along a leaf or plate, m (assumption). */
    private static final double PLATE_M = 0.05;

    private AirFilm() {}

    /**
     * Returns the Sherwood number.
     *
     * @param reynolds Reynolds number by diameter
     * @param schmidt Schmidt number; the Prandtl number gives the Nusselt number
     * @return Sherwood (Nusselt) number by diameter, at least 2
     */
    public static double sherwood(double reynolds, double schmidt) {
        return 2.0 + 0.552 * Math.pow(reynolds, 0.53) * Math.pow(schmidt, 0.33);
    }

    /**
     * Returns the vapour film coefficient.
     *
     * @param sherwood Sherwood number by diameter
     * @param diffusivityM2S diffusivity of vapour in air, m2/s
     * @param diameterM diameter, m
     * @param temperatureK temperature, K
     * @return kg/(s m2 Pa)
     */
    public static double vapourKgPerSM2Pa(
            double sherwood, double diffusivityM2S, double diameterM, double temperatureK) {
        return sherwood * diffusivityM2S / diameterM / (VAPOUR_GAS_J_KG_K * temperatureK);
    }

    /**
     * Returns the vapour film coefficient of an item in its package at 10 °C.
     *
     * @param item the item; along a slab or leaf the air passes 5 cm
     * @return kg/(s m2 Pa)
     */
    public static double vapourKgPerSM2Pa(Item item) {
        double sherwood = sherwood(reynolds(item), VISCOSITY_M2_S / DIFFUSIVITY_M2_S);
        return vapourKgPerSM2Pa(sherwood, DIFFUSIVITY_M2_S, diameterM(item), TEN_C_IN_K);
    }

    /**
     * Returns the heat film coefficient of an item in its package at 10 °C, without radiation: its
     * neighbours have its temperature.
     *
     * @param item the item; along a slab or leaf the air passes 5 cm
     * @return W/(m2 K)
     */
    public static double heatWPerM2K(Item item) {
        return sherwood(reynolds(item), PRANDTL) * CONDUCTIVITY_W_M_K / diameterM(item);
    }

    private static double reynolds(Item item) {
        return PACKAGE_AIR_M_S * diameterM(item) / VISCOSITY_M2_S;
    }

    private static double diameterM(Item item) {
        return item.shape() == Shape.SLAB
                ? Math.max(PLATE_M, 2 * item.radiusM())
                : 2 * item.radiusM();
    }
}

package org.wardon.cooling;

/**
 * Ice as a store of cold.
 *
 * <p>Source: latent heat 334 kJ/kg, melting by load: table of cooling sources (ice_or_pcm_bank);
 * growth on a plane plate: Stefan's solution for thin ice, as in ASHRAE Handbook - Refrigeration
 * (from memory).
 */
public final class Ice {
    /** Latent heat of melting, J/kg. */
    public static final double LATENT_J_KG = 334_000;

    private Ice() {}

    /**
     * Returns how long ice carries a load.
     *
     * @param iceKg ice, kg
     * @param latentJkg latent heat, J/kg, such as {@link #LATENT_J_KG}
     * @param loadW load, W, above 0
     * @return s
     */
    public static double lastsS(double iceKg, double latentJkg, double loadW) {
        return iceKg * latentJkg / loadW;
    }

    /**
     * Returns how fast ice melts under a load.
     *
     * @param loadW load, W
     * @param latentJkg latent heat, J/kg
     * @return kg/s
     */
    public static double meltsKgS(double loadW, double latentJkg) {
        return loadW / latentJkg;
    }

    /**
     * Returns how long ice takes to grow on a cold plate.
     *
     * @param thicknessM thickness grown, m
     * @param differenceK plate below freezing, K, above 0
     * @param conductivityWmK conductivity of ice, W/(m K)
     * @param densityKgM3 density of ice, kg/m3
     * @param latentJkg latent heat, J/kg
     * @return s
     */
    public static double growsS(
            double thicknessM,
            double differenceK,
            double conductivityWmK,
            double densityKgM3,
            double latentJkg) {
        return densityKgM3
                * latentJkg
                * thicknessM
                * thicknessM
                / (2 * conductivityWmK * differenceK);
    }
}

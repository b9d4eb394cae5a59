package org.wardon.air;

/**
 * The outdoor temperature that would give a face the heat which air, sun and sky give it together.
 *
 * <p>Source: ASHRAE Handbook - Fundamentals, sol-air temperature: To + alpha I/ho - epsilon dR/ho,
 * the last term 4 K on level faces and 0 on upright ones.
 */
public final class SolAir {
    /** Lost to a clear sky by a level face, K. */
    public static final double SKY_LOSS_K = 4;

    private SolAir() {}

    /**
     * Returns the sol-air temperature.
     *
     * @param outdoorC outdoor air, °C
     * @param absorptance share of sunlight taken up, 0 to 1
     * @param irradianceWm2 sun on the face, W/m2
     * @param filmWm2K outdoor film, W/(m2 K)
     * @param skyLossK lost to the sky, K; {@link #SKY_LOSS_K} times clearness on roofs
     * @return °C
     */
    public static double temperatureC(
            double outdoorC,
            double absorptance,
            double irradianceWm2,
            double filmWm2K,
            double skyLossK) {
        return outdoorC + absorptance * irradianceWm2 / filmWm2K - skyLossK;
    }
}

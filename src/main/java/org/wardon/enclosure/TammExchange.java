package org.wardon.enclosure;

/**
 * Air exchanged through an open doorway, the older form; kept to set the newer one against.
 *
 * <p>Source: Tamm 1966 with the measured factor 0.68 of Pham and Oliver 1983.
 */
public final class TammExchange {
    /** Measured share of the calculated flow. Source: Pham and Oliver 1983. */
    public static final double MEASURED_SHARE = 0.68;

    private TammExchange() {}

    /**
     * Returns the calculated volume flow of the heavier air.
     *
     * @param heavyKgM3 density of the heavier side, kg/m3
     * @param lightKgM3 density of the lighter side, kg/m3
     * @param widthM clear width, m
     * @param heightM clear height, m
     * @return m3/s
     */
    public static double flowM3s(
            double heavyKgM3, double lightKgM3, double widthM, double heightM) {
        double ratio = lightKgM3 / heavyKgM3;
        return 0.333
                * widthM
                * heightM
                * Math.sqrt(DoorExchange.GRAVITY_MS2 * heightM * (1 - ratio))
                * Math.pow(2 / (1 + Math.cbrt(ratio)), 1.5);
    }
}

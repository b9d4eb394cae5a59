package org.wardon.enclosure;

/**
 * Air exchanged through an open doorway by the difference in density, whichever side is heavier;
 * both sides lose and gain the same mass.
 *
 * <p>Source: Gosney and Olama 1975, as printed by Jekel 2017: heat = 0.221 A (hi - hr) rho_r (1 -
 * rho_i/rho_r)^0.5 (g H)^0.5 Fm with Fm = (2/(1 + (rho_r/rho_i)^(1/3)))^1.5, r the heavier side.
 * Departure: the root of the density difference x is taken as x^2/(x^2 + d^2)^(3/4) with d = 1e-4
 * (0.03 K), so that its slope stays finite at equal density; at 3 K this is 7e-5 lower.
 */
public final class DoorExchange {
    /** Share of the full flow in use by passing traffic. Source: see the table of doorways. */
    public static final double FLOW_FACTOR = 0.8;

    /** Gravity, m/s2. */
    public static final double GRAVITY_MS2 = 9.81;

    private static final double CONSTANT = 0.221;
    private static final double ROUNDING = 1e-4;

    private DoorExchange() {}

    /**
     * Returns the mass exchanged each way through the wholly open, unprotected doorway once the
     * flow is established.
     *
     * @param roomKgM3 density of the chamber's air, kg/m3
     * @param beyondKgM3 density of the air beyond, kg/m3
     * @param widthM clear width, m
     * @param heightM clear height, m
     * @return kg of moist air/s, 0 at equal density, the same with the sides swapped
     */
    public static double flowKgS(
            double roomKgM3, double beyondKgM3, double widthM, double heightM) {
        double heavy = Math.max(roomKgM3, beyondKgM3);
        double ratio = Math.min(roomKgM3, beyondKgM3) / heavy;
        return opening(widthM, heightM) * heavy * root(1 - ratio) * shape(ratio);
    }

    /**
     * Returns what is left of the full flow in use.
     *
     * @param flowFactor share of the full flow reached, such as {@link #FLOW_FACTOR}
     * @param effectiveness share a curtain keeps back, 0 to 1
     * @return share of the full flow
     */
    public static double share(double flowFactor, double effectiveness) {
        return flowFactor * (1 - effectiveness);
    }

    /**
     * Returns the volume an opening exchanges where the chamber empties towards the air beyond: a
     * small chamber empties once, not twice.
     *
     * @param flowM3s flow while open, m3/s
     * @param openS time open, s
     * @param volumeM3 free volume of the chamber, m3
     * @return m3, at most the volume
     */
    public static double volumeAnOpeningM3(double flowM3s, double openS, double volumeM3) {
        return volumeM3 * -Math.expm1(-flowM3s * openS / volumeM3);
    }

    /**
     * Returns the share of a period a doorway is open.
     *
     * <p>Source: ASHRAE Handbook - Refrigeration, doorway open-time factor (from memory).
     *
     * @param passages passages in the period
     * @param secondsAPassage open and close time of a berth, s
     * @param minutesOpen minutes it simply stands open in the period
     * @param periodH length of the period, h
     * @return fraction
     */
    public static double timeFactor(
            double passages, double secondsAPassage, double minutesOpen, double periodH) {
        return (passages * secondsAPassage + 60 * minutesOpen) / (3_600 * periodH);
    }

    private static double opening(double widthM, double heightM) {
        return CONSTANT * widthM * heightM * Math.sqrt(GRAVITY_MS2 * heightM);
    }

    private static double root(double x) {
        double q = x * x + ROUNDING * ROUNDING;
        return x * x / Math.sqrt(q * Math.sqrt(q));
    }

    private static double shape(double ratio) {
        double f = 2 / (1 + 1 / Math.cbrt(ratio));
        return f * Math.sqrt(f);
    }
}

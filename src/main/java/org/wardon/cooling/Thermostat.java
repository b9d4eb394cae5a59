package org.wardon.cooling;

/** When and how much a cooler runs, by the air it keeps. */
public final class Thermostat {
    private Thermostat() {}

    /**
     * Returns the setting a cooler can follow: the one dialled in, or the lowest its control
     * reaches.
     *
     * @param setting what the keeper dialled in
     * @param lowestC lowest temperature the control can be set to, °C
     * @return °C
     */
    public static double followedC(Setting setting, double lowestC) {
        return Math.max(setting.temperatureC(), lowestC);
    }

    /**
     * Returns the running share of modulating control: 0 below setting - band, 1 above setting +
     * band, and between them a cubic with level ends. The ends are level so that neither the share
     * nor its slope jumps, which a solver with error control would answer with tiny steps; the band
     * is that of the on/off thermostat so that both keep the same mean.
     *
     * @param airC air of the chamber, °C
     * @param followedC temperature kept, °C
     * @param bandK half width of the band, K
     * @return 0 to 1
     */
    public static double modulatedShare(double airC, double followedC, double bandK) {
        double u = (airC - followedC + bandK) / (2 * bandK);
        return Smooth.step(u);
    }

    /**
     * Returns the slope of {@link #modulatedShare} by air temperature.
     *
     * @param airC air of the chamber, °C
     * @param followedC temperature kept, °C
     * @param bandK half width of the band, K
     * @return 1/K, 0 or more
     */
    public static double modulatedSlopePerK(double airC, double followedC, double bandK) {
        double u = (airC - followedC + bandK) / (2 * bandK);
        return Smooth.stepSlope(u) / (2 * bandK);
    }
}

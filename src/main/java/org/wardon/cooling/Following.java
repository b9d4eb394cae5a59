package org.wardon.cooling;

/**
 * How a cooler follows the thermostat.
 *
 * @param control on and off, or within the band
 * @param lowestC lowest temperature its control can be set to, °C
 * @param minRunS shortest run, s
 * @param minRestS shortest rest, s
 * @param fanAlwaysW fan that runs through rest and defrost, W; 0 for none
 */
public record Following(
        Control control, double lowestC, double minRunS, double minRestS, double fanAlwaysW) {
    /** Lowest setting a plain thermostat takes, °C: none a plan can ask for is below. */
    private static final double ANY_C = -40;

    /** A fan rests for this long at least, s (assumption); it may stop at once. */
    private static final double FAN_RESTS_S = 60;

    /**
     * Returns how a fan or damper without a compressor follows it.
     *
     * @param control on and off, or within the band
     * @return with a shortest rest of a minute
     */
    static Following ofFan(Control control) {
        return new Following(control, ANY_C, 0, FAN_RESTS_S, 0);
    }

    /**
     * Returns whether it follows the air within the band.
     *
     * @return false where it is switched on and off
     */
    public boolean modulating() {
        return control == Control.MODULATING;
    }
}

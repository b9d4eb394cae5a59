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
    /**
     * Returns whether it follows the air within the band.
     *
     * @return false where it is switched on and off
     */
    public boolean modulating() {
        return control == Control.MODULATING;
    }
}

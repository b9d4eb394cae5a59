package org.wardon.lots;

/** Heat of respiration of produce at its own temperature. */
public interface RespirationLaw {
    /** How long after harvest produce breathes at the high end of its printed range, s. */
    double FRESH_S = 86_400;

    /**
     * Returns the heat of respiration.
     *
     * @param temperatureC temperature of the tissue, °C, any
     * @return W/kg, above 0
     */
    double wattsPerKg(double temperatureC);

    /**
     * Returns how the heat rises with temperature; at a kink, the slope of the warmer side.
     *
     * @param temperatureC temperature of the tissue, °C, any
     * @return W/(kg K)
     */
    double slopeWattsPerKgK(double temperatureC);

    /**
     * Returns the law for the first {@link #FRESH_S} after harvest.
     *
     * @return the high end of the same range; this law where there is no range
     */
    default RespirationLaw fresh() {
        return this;
    }

    /**
     * Returns the carbon dioxide given off.
     *
     * @param temperatureC temperature of the tissue, °C, any
     * @return kg CO2/(kg s), above 0
     */
    default double co2KgPerKgS(double temperatureC) {
        return wattsPerKg(temperatureC) / BurntSugar.JOULE_PER_KG_CO2;
    }
}

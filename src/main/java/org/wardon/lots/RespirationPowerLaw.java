package org.wardon.lots;

import org.wardon.produce.rows.RespirationPower;

/**
 * Respiration by a published power of temperature.
 *
 * <p>Source: Becker, Misra and Fricke 1996: mg CO2/(kg h) = f (1.8 T + 32)^g. Some coefficients are
 * 1.4 to 2 times off the handbook's own table, so a table goes first.
 */
public final class RespirationPowerLaw {
    private RespirationPowerLaw() {}

    /**
     * Returns the carbon dioxide given off.
     *
     * @param law its coefficients
     * @param temperatureC temperature, °C, 0 to 30
     * @return mg CO2/(kg h), above 0
     */
    public static double co2MgPerKgH(RespirationPower law, double temperatureC) {
        return law.f() * Math.pow(1.8 * temperatureC + 32, law.g());
    }

    /**
     * Returns the heat.
     *
     * @param law its coefficients
     * @param temperatureC temperature, °C, 0 to 30
     * @return W/kg, above 0
     */
    public static double wattsPerKg(RespirationPower law, double temperatureC) {
        return BurntSugar.wattsPerKg(co2MgPerKgH(law, temperatureC));
    }
}

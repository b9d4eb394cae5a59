package org.wardon.lots;

/**
 * What burning glucose gives: C6H12O6 + 6 O2 = 6 CO2 + 6 H2O, all of its heat set free.
 *
 * <p>Source: heat, Becker, Misra and Fricke 1996 (10.7 J per mg of CO2), as in the ASHRAE Handbook
 * - Refrigeration 2006, chapter 9; masses, stoichiometry with molar masses 180.16, 44.01 and 18.015
 * g/mol.
 */
public final class BurntSugar {
    /** Heat set free, J per kg of CO2. */
    public static final double JOULE_PER_KG_CO2 = 10.7e6;

    /** Glucose burnt, kg per kg of CO2. */
    public static final double GLUCOSE_KG_PER_KG_CO2 = 0.682;

    /** Water formed, kg per kg of CO2. */
    public static final double WATER_KG_PER_KG_CO2 = 0.409;

    private BurntSugar() {}

    /**
     * Turns a rate of carbon dioxide into heat.
     *
     * @param co2MgPerKgH mg CO2/(kg h)
     * @return W/kg
     */
    public static double wattsPerKg(double co2MgPerKgH) {
        return co2MgPerKgH * 1e-6 * JOULE_PER_KG_CO2 / 3600;
    }
}

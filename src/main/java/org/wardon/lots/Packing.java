package org.wardon.lots;

import org.wardon.errors.Require;

/**
 * What stands between items and chamber, for a kilogram of lot: film, package air, package.
 *
 * @param filmWPerKgK skin of the items to package air, W/(kg K)
 * @param chamberWPerKgK package air to chamber air, W/(kg K)
 * @param airM3PerKg air in the package, m3/kg
 * @param tareJPerKgK heat capacity of the empty package, J/(kg K); 0 for a heap
 * @param vapourKgPerKgSPa package air to chamber air, kg water/(kg s Pa)
 */
public record Packing(
        double filmWPerKgK,
        double chamberWPerKgK,
        double airM3PerKg,
        double tareJPerKgK,
        double vapourKgPerKgSPa) {
    /** Heat capacity of a cubic metre of air at about 10 °C, J/(m3 K); 1.247 kg/m3 x 1006. */
    private static final double AIR_J_M3_K = 1254;

    /** Refuses conductances that are not above 0. */
    public Packing {
        Require.within("filmWPerKgK", filmWPerKgK, 1e-6, 1e4, "W/(kg K)", "");
        Require.within("chamberWPerKgK", chamberWPerKgK, 1e-6, 1e4, "W/(kg K)", "");
        Require.within("airM3PerKg", airM3PerKg, 1e-6, 1, "m3/kg", "");
        Require.within("tareJPerKgK", tareJPerKgK, 0, 1e4, "J/(kg K)", "");
        Require.within("vapourKgPerKgSPa", vapourKgPerKgSPa, 1e-16, 1e-3, "kg/(kg s Pa)", "");
    }

    /**
     * Returns the heat capacity of package and package air.
     *
     * @return J/(K kg of lot), above 0
     */
    public double capacityJPerKgK() {
        return tareJPerKgK + AIR_J_M3_K * airM3PerKg;
    }
}

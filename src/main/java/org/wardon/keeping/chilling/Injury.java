package org.wardon.keeping.chilling;

/**
 * Chilling in one draw.
 *
 * @param zone the zone that injures
 * @param shiftK how far its top lies lower than printed, K
 * @param doseKd dose at which injury shows, K d
 */
public record Injury(Zone zone, double shiftK, double doseKd) {
    /**
     * Returns the share of the injuring dose a day.
     *
     * @param meanC mean temperature, °C
     * @param skinC temperature of the skin, °C
     * @return 1/day, 0 where it is safe
     */
    public double perDay(double meanC, double skinC) {
        return zone.severityK(zone.bySkin() ? skinC : meanC, shiftK) / doseKd;
    }

    /**
     * Returns the temperature from which on nothing is injured.
     *
     * @return °C
     */
    public double safeFromC() {
        return zone.topC() - shiftK;
    }
}

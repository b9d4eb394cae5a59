package org.wardon.keeping.chilling;

/**
 * Chilling in one draw.
 *
 * @param zone the zone that injures
 * @param doseKd dose at which injury shows, K d
 */
public record Injury(Zone zone, double doseKd) {
    /**
     * Returns the share of the injuring dose a day.
     *
     * @param meanC mean temperature, °C
     * @param skinC temperature of the skin, °C
     * @return 1/day, 0 where it is safe
     */
    public double perDay(double meanC, double skinC) {
        return zone.severityK(zone.bySkin() ? skinC : meanC) / doseKd;
    }
}

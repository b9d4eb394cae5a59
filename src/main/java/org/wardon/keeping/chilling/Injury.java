package org.wardon.keeping.chilling;

/**
 * Chilling in one draw.
 *
 * @param zone the zone that injures
 * @param doseKd dose at which injury shows, K d
 * @param handbook the condition that holds whatever exposures say
 */
public record Injury(Zone zone, double doseKd, Handbook handbook) {
    /**
     * Returns the share of the injuring dose a day.
     *
     * @param meanC mean temperature, °C
     * @param skinC temperature of the skin, °C
     * @return 1/day, 0 where it is safe
     */
    public double perDay(double meanC, double skinC) {
        double temperatureC = zone.bySkin() ? skinC : meanC;
        return handbook.hold(
                zone.severityK(temperatureC) / doseKd, temperatureC, zone.bandLowC().isPresent());
    }
}

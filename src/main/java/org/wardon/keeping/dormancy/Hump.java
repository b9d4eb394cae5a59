package org.wardon.keeping.dormancy;

/**
 * Sprouting over temperature: nothing at the cold end, fastest between two temperatures, nothing
 * (or as fast still) at the hot end; straight lines between.
 *
 * @param nothingBelowC at and below it no sprout grows, °C
 * @param fastFromC fastest from here, °C
 * @param fastToC to here, °C
 * @param nothingAboveC at and above it no sprout grows, °C; infinite where heat does not stop it
 * @param shortDays shortest time to sprouting where it is fastest, days
 * @param longDays longest, days
 * @param sourceId source of the times
 */
public record Hump(
        double nothingBelowC,
        double fastFromC,
        double fastToC,
        double nothingAboveC,
        double shortDays,
        double longDays,
        String sourceId) {
    /**
     * Returns how fast sprouts grow against the fastest.
     *
     * @param temperatureC temperature, °C
     * @return 0 to 1
     */
    double share(double temperatureC) {
        double rising = (temperatureC - nothingBelowC) / (fastFromC - nothingBelowC);
        double falling =
                Double.isInfinite(nothingAboveC)
                        ? 1
                        : (nothingAboveC - temperatureC) / (nothingAboveC - fastToC);
        return Math.max(0, Math.min(1, Math.min(rising, falling)));
    }
}

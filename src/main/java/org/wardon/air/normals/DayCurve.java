package org.wardon.air.normals;

/**
 * The course of temperature through a day: from the lowest at five in the morning to the highest
 * between 14 and 15 h, and down again to the next morning's lowest, by hours of mean solar time.
 *
 * <p>Source: ASHRAE Handbook - Fundamentals, 2017, chapter 14, table 6, fraction of the daily range
 * (from memory); printed by the hour, straight between. The lowest is held for an hour around five
 * (a hundredth of the range off the print) so that hourly readings meet it wherever in the hour
 * they fall.
 */
final class DayCurve {
    /** Hour of the lowest. */
    private static final double LOWEST_H = 5;

    /** Hour by which the highest has come. */
    private static final double HIGHEST_H = 14.5;

    /** Half of the time the lowest is held, h. */
    private static final double HELD_H = 0.5;

    private static final double[] BELOW_HIGHEST = {
        0.82, 0.88, 0.92, 0.95, 0.98, 1.00, 0.98, 0.91, 0.74, 0.55, 0.38, 0.23, 0.13, 0.05, 0.00,
        0.00, 0.06, 0.14, 0.24, 0.39, 0.50, 0.59, 0.68, 0.75, 0.82
    };

    private DayCurve() {}

    /**
     * Highest and lowest of a day and of its neighbours, °C.
     *
     * @param highestBefore highest of the day before
     * @param lowest lowest of the day
     * @param highest highest of the day
     * @param lowestAfter lowest of the day after
     */
    record Extremes(double highestBefore, double lowest, double highest, double lowestAfter) {}

    /** Returns the temperature at an hour of the day, 0 to 24, °C. */
    static double temperatureC(double hour, Extremes day) {
        double fraction = belowHighest(hour);
        double low = hour <= HIGHEST_H ? day.lowest : day.lowestAfter;
        double high = hour < LOWEST_H ? day.highestBefore : day.highest;
        return high - fraction * (high - low);
    }

    /** Returns how far below the highest the curve runs, share of the range. */
    static double belowHighest(double hour) {
        if (Math.abs(hour - LOWEST_H) <= HELD_H) {
            return 1;
        }
        int h = (int) Math.min(Math.floor(hour), BELOW_HIGHEST.length - 2);
        double from = BELOW_HIGHEST[h];
        double to = BELOW_HIGHEST[h + 1];
        // Beside the hour that is held the curve comes to it in half the time.
        if (h == LOWEST_H - 1) {
            return from + Math.min(1, (hour - h) / HELD_H) * (to - from);
        }
        if (h == LOWEST_H) {
            return to + Math.min(1, (h + 1 - hour) / HELD_H) * (from - to);
        }
        return from + (hour - h) * (to - from);
    }
}

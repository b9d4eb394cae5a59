package org.wardon.keeping;

/**
 * How fast loss of water uses up one lot in one draw.
 *
 * <p>In the handbook's own condition, and in moister air, no lot dries out before the published
 * life, however open its skin: sources disagree, and that condition must hold. In air twice as dry
 * the skin of the draw counts in full (assumption), between the two in part.
 */
final class WaterPace {
    private final double limitFraction;
    private final double publishedDays;
    private final double handbookPerDay;
    private final WaterLimit.Loss loss;

    /**
     * Takes what is known of a lot in a draw.
     *
     * @param limitFraction permissible loss, share of the mass
     * @param publishedDays published life in the handbook's own condition, days
     * @param handbookPerDay what a bare usual item loses there, share a day
     * @param loss what it loses elsewhere
     */
    WaterPace(
            double limitFraction,
            double publishedDays,
            double handbookPerDay,
            WaterLimit.Loss loss) {
        this.limitFraction = limitFraction;
        this.publishedDays = publishedDays;
        this.handbookPerDay = handbookPerDay;
        this.loss = loss;
    }

    /**
     * Returns the share of the limit used a day.
     *
     * @param lostPerDay what the lot loses, share of its mass a day
     * @param skinC temperature of its skin, °C
     * @param humidityFraction humidity at it, 0 to 1
     * @return 1/day, not negative
     */
    double perDay(double lostPerDay, double skinC, double humidityFraction) {
        double byLimit = lostPerDay / limitFraction;
        if (!(handbookPerDay > 0)) {
            return byLimit;
        }
        double dryness = loss.perDay(skinC, humidityFraction) / handbookPerDay;
        double held = dryness / publishedDays;
        if (byLimit <= held) {
            return byLimit;
        }
        double counts = Math.min(1, Math.max(0, dryness - 1));
        return held + counts * (byLimit - held);
    }
}

package org.wardon.keeping;

/** How fast one mechanism uses up a lot in a given state. */
@FunctionalInterface
interface Wear {
    /**
     * Returns the rate.
     *
     * @param meanC mean temperature, °C
     * @param skinC temperature of the skin, °C
     * @param humidityFraction humidity at the produce, 0 to 1
     * @param ethylenePpm ethylene, µL/L
     * @return share of the limit used a day, not negative
     */
    double perDay(double meanC, double skinC, double humidityFraction, double ethylenePpm);
}

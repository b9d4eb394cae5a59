package org.wardon.lots;

import java.util.Map;
import org.wardon.produce.Fact;

/**
 * What stands in for figures nobody printed.
 *
 * @param heat specific heat, conductivity and density
 * @param size shape and size
 * @param respiration rates by temperature in °C, W/t, median × or ÷ the class spread
 * @param transpirationKgPerKgSPa tissue to package air, kg/(kg s Pa)
 */
record StandIn(
        Figure<ItemHeat> heat,
        Figure<ItemSize> size,
        Figure<Map<Double, Fact>> respiration,
        Figure<Double> transpirationKgPerKgSPa) {
    /**
     * A median and whose it is.
     *
     * @param value the median
     * @param group scientific name, plant part, or {@code all}
     * @param <T> what it is of
     */
    record Figure<T>(T value, String group) {}
}

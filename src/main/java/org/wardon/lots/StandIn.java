package org.wardon.lots;

import java.util.Map;
import org.wardon.produce.Fact;

/**
 * What stands in for figures nobody printed, the median over a plant part.
 *
 * @param heat specific heat, conductivity and density
 * @param size shape and size
 * @param respiration rates by temperature in °C, W/t, median × or ÷ the class spread
 * @param transpirationKgPerKgSPa tissue to package air, kg/(kg s Pa)
 */
record StandIn(
        ItemHeat heat,
        ItemSize size,
        Map<Double, Fact> respiration,
        double transpirationKgPerKgSPa) {
    /** Copies the map. */
    StandIn {
        respiration = Map.copyOf(respiration);
    }
}

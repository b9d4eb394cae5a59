package org.wardon.keeping.life;

import org.wardon.keeping.RestsOn;
import org.wardon.produce.Commodity;

/**
 * The life a curve is anchored on.
 *
 * @param atLowC lower end of the condition's temperature, °C
 * @param atHighC upper end of it, °C
 * @param lowDays shortest life printed for that condition, days
 * @param highDays longest, days
 * @param restsOn what it rests on: handbook life or class
 * @param sourceId its source
 */
public record LifeLevel(
        double atLowC,
        double atHighC,
        double lowDays,
        double highDays,
        RestsOn restsOn,
        String sourceId) {
    /**
     * Returns the life to anchor on.
     *
     * @param commodity the commodity
     * @return the handbook's own life in its own condition, else that of kin or plant part
     */
    public static LifeLevel of(Commodity commodity) {
        return ClassLife.of(commodity);
    }
}

package org.wardon.keeping.life;

import org.wardon.produce.Commodity;

/**
 * How resting bulbs age: as slowly with temperature as they breathe, for what ends them is the
 * sprout and not the tissue. Near 0 °C or dry at 25 to 30 °C onions keep (id BREWSTER2008), which
 * the curve of typical perishables would deny.
 */
final class Rest {
    private static final String RESTING = "bulb";

    /**
     * From 0 to 20 °C the handbook's respiration (id ah66-2016, mg CO2/(kg h)) rises from 3 to 8 in
     * onion and from 8 to 20 in garlic: 0.49 and 0.46 of the rise of a typical perishable, taken in
     * the logarithm.
     */
    private static final double RESTING_EXPONENT = 0.5;

    private Rest() {}

    /**
     * Returns the power to which the generic curve is raised.
     *
     * @param commodity the commodity
     * @return 1 for all but resting bulbs
     */
    static double exponent(Commodity commodity) {
        return commodity.plantPart().equals(RESTING) ? RESTING_EXPONENT : 1;
    }
}

package org.wardon.keeping.life;

import org.wardon.produce.Commodity;
import org.wardon.produce.rows.RespirationRow;

/**
 * How resting bulbs age: as slowly with temperature as they breathe, for what ends them is the
 * sprout and not the tissue. Near 0 °C or dry at 25 to 30 °C onions keep (id BREWSTER2008), which
 * the curve of typical perishables would deny.
 */
final class Rest {
    private static final String RESTING = "bulb";

    /** Where a bulb has no printed rates: half as steep as a typical perishable (assumption). */
    private static final double WITHOUT_RATES = 0.5;

    private static final double FLATTEST = 0.2;

    private Rest() {}

    /**
     * Returns the power to which the generic curve is raised.
     *
     * @param commodity the commodity
     * @return 1 for all but resting bulbs
     */
    static double exponent(Commodity commodity) {
        if (!commodity.plantPart().equals(RESTING)) {
            return 1;
        }
        RespirationRow coldest = null;
        RespirationRow warmest = null;
        for (RespirationRow row : commodity.breath().respiration()) {
            if (coldest == null || row.temperatureC() < coldest.temperatureC()) {
                coldest = row;
            }
            if (warmest == null || row.temperatureC() > warmest.temperatureC()) {
                warmest = row;
            }
        }
        if (coldest == null || warmest == null) {
            return WITHOUT_RATES;
        }
        return between(coldest, warmest);
    }

    private static double between(RespirationRow coldest, RespirationRow warmest) {
        GenericCurve generic = new GenericCurve(0.5, 1);
        double expected =
                generic.lnRate(warmest.temperatureC()) - generic.lnRate(coldest.temperatureC());
        double found =
                Math.log(warmest.wattsPerTonne().middle() / coldest.wattsPerTonne().middle());
        return expected <= 0 ? WITHOUT_RATES : Math.min(1, Math.max(FLATTEST, found / expected));
    }
}

package org.wardon.enclosure;

/**
 * Heat of people at work in the chamber, and the carbon dioxide that goes with it.
 *
 * <p>Source: ASHRAE Handbook - Refrigeration, 272 - 6 t W a person, tabulated to 10 °C (from
 * memory); the line is carried on to 20 °C and held beyond, and below -25 °C. 40 % latent: common
 * practice, no source.
 */
public final class PeopleHeat {
    /** Share given off as vapour. */
    public static final double LATENT_SHARE = 0.4;

    /**
     * Carbon dioxide breathed out for the heat given off, kg/J.
     *
     * <p>Source: ASTM D6245 (also ASHRAE Fundamentals, chapter on air quality), from memory:
     * 0.00276 A M RQ/(0.23 RQ + 0.77) L/s a person of A m2 at M met of 58.2 W/m2, respiratory
     * quotient RQ 0.83; 1.977 kg/m3 at 0 °C and 101.325 kPa. A person at 272 W gives off 40 L an
     * hour, at 182 W 27: as between light and medium work.
     */
    public static final double CO2_KG_PER_J =
            0.00276 * 0.83 / (0.23 * 0.83 + 0.77) / 58.2 * 1.977e-3;

    private static final double COLDEST_C = -25;
    private static final double WARMEST_C = 20;

    private PeopleHeat() {}

    /**
     * Returns the heat of one person.
     *
     * @param airC air of the chamber, °C
     * @return W, sensible and latent
     */
    public static double watts(double airC) {
        return 272 - 6 * Math.min(Math.max(airC, COLDEST_C), WARMEST_C);
    }

    /**
     * Returns the slope of {@link #watts}.
     *
     * @param airC air of the chamber, °C
     * @return W/K
     */
    public static double slopeWattsPerK(double airC) {
        return airC > COLDEST_C && airC < WARMEST_C ? -6 : 0;
    }
}

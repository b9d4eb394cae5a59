package org.wardon.enclosure;

/**
 * Heat of people at work in the chamber.
 *
 * <p>Source: ASHRAE Handbook - Refrigeration, 272 - 6 t W a person, tabulated to 10 °C (from
 * memory); the line is carried on to 20 °C and held beyond, and below -25 °C. 40 % latent: common
 * practice, no source.
 */
public final class PeopleHeat {
    /** Share given off as vapour. */
    public static final double LATENT_SHARE = 0.4;

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

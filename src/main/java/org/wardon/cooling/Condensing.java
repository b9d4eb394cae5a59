package org.wardon.cooling;

/**
 * The hot side of an air-cooled compressor.
 *
 * <p>Source: approach of 12 K (10 to 17) from memory of ASHRAE Handbook - Refrigeration (table of
 * cooling sources, condensing_approach); lowest condensing temperature and trip: common practice,
 * no source.
 */
final class Condensing {
    /** Condensing temperature above the air onto the condenser, K. */
    static final double APPROACH_K = 12;

    /** Head pressure is held up in cold weather, °C. */
    static final double LOWEST_C = 25;

    /** The high-pressure switch opens above this, °C. */
    static final double TRIP_C = 62;

    /** The trip is spread over this, K, so that power and heat have no jump in time. */
    private static final double TRIP_SPREAD_K = 0.5;

    private Condensing() {}

    /** Condensing temperature, °C, for air onto the condenser, °C. */
    static double temperatureC(double ontoCondenserC) {
        return LOWEST_C + Smooth.positive(ontoCondenserC + APPROACH_K - LOWEST_C, 1);
    }

    /** Share the compressor may still give: 1, and 0 above the trip. */
    static double permitted(double condensingC) {
        return 1 - Smooth.step((condensingC - TRIP_C + TRIP_SPREAD_K) / TRIP_SPREAD_K);
    }
}

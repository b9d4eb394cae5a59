package org.wardon.keeping.life;

/**
 * How much faster produce ages when warmer, as the handbook draws it for a typical perishable.
 *
 * <p>Source: ah66-2002-tab, Table 20.3: assumed Q10 of 3.0, 2.5, 2.0 and 1.5 a decade from 0 to 40
 * °C. Below 0 °C the first decade goes on, above 40 °C nothing changes any more (both ours).
 */
public final class GenericCurve {
    /** Source of the curve. */
    public static final String SOURCE_ID = "ah66-2002-tab";

    private static final double DECADE_K = 10;
    private static final double HIGHEST_C = 40;
    private static final double[] ASSUMED = {3.0, 2.5, 2.0, 1.5};

    /** {@code [decade]}, slope of ln rate, 1/K. */
    private final double[] perK = new double[ASSUMED.length];

    /** {@code [decade]}, ln rate at the lower end of the decade. */
    private final double[] atStart = new double[ASSUMED.length + 1];

    /**
     * Takes the curve raised to a power.
     *
     * @param power 1 for a typical perishable, more for one that suffers more from warmth
     */
    public GenericCurve(double power) {
        for (int decade = 0; decade < ASSUMED.length; decade++) {
            perK[decade] = power * Math.log(ASSUMED[decade]) / DECADE_K;
            atStart[decade + 1] = atStart[decade] + perK[decade] * DECADE_K;
        }
    }

    /**
     * Returns the Q10 of a decade.
     *
     * @param decade 0 for 0 to 10 °C, to 3 for 30 to 40 °C
     * @return factor a 10 K
     */
    public static double q10(int decade) {
        return ASSUMED[decade];
    }

    /**
     * Returns the logarithm of the rate of ageing over that at 0 °C.
     *
     * @param temperatureC temperature, °C
     * @return never falls with temperature
     */
    public double lnRate(double temperatureC) {
        double capped = Math.min(temperatureC, HIGHEST_C);
        int decade = (int) Math.min(Math.max(capped / DECADE_K, 0), ASSUMED.length - 1);
        return atStart[decade] + perK[decade] * (capped - decade * DECADE_K);
    }
}

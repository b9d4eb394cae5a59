package org.wardon.lots;

/**
 * The handbook's usual rise of deterioration with temperature.
 *
 * <p>Source: USDA Agriculture Handbook 66, table 20.3, Q10 assumed there: 3.0 from 0 to 10 °C, 2.5
 * to 20 °C, 2.0 to 30 °C, 1.5 to 40.
 */
public final class HandbookQ10 {
    private static final double[] Q10 = {3.0, 2.5, 2.0, 1.5};

    private HandbookQ10() {}

    /**
     * Returns the rate over the rate at 0 °C.
     *
     * @param temperatureC temperature, °C; held within 0 to 40
     * @return 1 or more
     */
    public static double relativeRate(double temperatureC) {
        double left = Math.min(40, Math.max(0, temperatureC));
        double rate = 1;
        for (double q10 : Q10) {
            rate *= Math.pow(q10, Math.min(left, 10) / 10);
            left = Math.max(0, left - 10);
        }
        return rate;
    }

    /**
     * Returns how long something keeps at another temperature.
     *
     * @param days life at the first temperature, days
     * @param atC first temperature, °C
     * @param thereC other temperature, °C
     * @return days
     */
    public static double lifeDays(double days, double atC, double thereC) {
        return days * relativeRate(atC) / relativeRate(thereC);
    }
}

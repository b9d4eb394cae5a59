package org.wardon.air.normals;

import java.util.Arrays;
import org.wardon.air.SaturatedAir;

/**
 * The vapour pressure a day holds: {@code e = (mean humidity/100)/mean(1/psat(T_hour))}. Where an
 * hour would be above saturation it is saturated, and the others take what that cuts off, so that
 * the day's mean humidity stays.
 */
final class HeldVapour {
    private static final int ROUNDS = 50;

    private HeldVapour() {}

    /**
     * Returns the vapour pressure.
     *
     * @param humidity mean relative humidity of the day, 0 to 1
     * @param hourC temperatures of the day, °C
     * @return Pa
     */
    static double pressurePa(double humidity, double[] hourC) {
        double[] psat = Arrays.stream(hourC).map(SaturatedAir::overWaterPa).toArray();
        double low = humidity * Arrays.stream(psat).min().orElseThrow();
        double high = Arrays.stream(psat).max().orElseThrow();
        for (int i = 0; i < ROUNDS; i++) {
            double middle = 0.5 * (low + high);
            if (meanHumidity(middle, psat) < humidity) {
                low = middle;
            } else {
                high = middle;
            }
        }
        return 0.5 * (low + high);
    }

    private static double meanHumidity(double pressurePa, double[] psat) {
        double sum = 0;
        for (double pa : psat) {
            sum += Math.min(1, pressurePa / pa);
        }
        return sum / psat.length;
    }
}

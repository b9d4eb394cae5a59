package org.wardon.heat.network;

import java.util.ArrayList;
import java.util.List;

/**
 * One lot at an instant, from its middle to the air of its package.
 *
 * @param shellsC shells from the middle outwards, °C
 * @param skinC skin, °C
 * @param packageC air of the package, °C
 * @param packageHumidityFraction its relative humidity, 0 to 1
 * @param freeWaterKg free water on the lot, kg
 */
public record LotReading(
        List<Double> shellsC,
        double skinC,
        double packageC,
        double packageHumidityFraction,
        double freeWaterKg) {
    /** Copies the list. */
    public LotReading {
        shellsC = List.copyOf(shellsC);
    }

    /**
     * Reads a lot.
     *
     * @param lot the lot
     * @param y state, in which the rates were asked for last
     * @return the reading
     */
    public static LotReading of(LotBranch lot, double[] y) {
        List<Double> shells = new ArrayList<>();
        for (int i = lot.branch.start; i <= lot.branch.blockAt(0); i++) {
            shells.add(y[i]);
        }
        double skinC = lot.skinC;
        double humidity = lot.humidityFraction(y);
        return new LotReading(shells, skinC, lot.packageC, humidity, lot.waterKg(y));
    }
}

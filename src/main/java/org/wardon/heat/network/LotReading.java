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
    public static LotReading of(LotPart lot, double[] y) {
        List<Double> shells = new ArrayList<>();
        for (int k = 0; k < LotBank.SHELLS; k++) {
            shells.add(lot.shellC(k, y));
        }
        double humidity = lot.humidityFraction(y);
        return new LotReading(shells, lot.skinC(), lot.packageC(y), humidity, lot.waterKg(y));
    }
}

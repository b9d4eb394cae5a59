package org.wardon.keeping;

import java.util.Arrays;

/** The ethylene of one chamber over a run, as {@link StoreEthylene} works it out. */
public final class ChamberEthylene {
    /** Ethylene of clean outdoor air, µL/L (assumption). */
    public static final double OUTDOOR_PPM = 0.01;

    /** Ethylene of a market building, µL/L; source: id wills-2000, mean of wholesale markets. */
    public static final double MARKET_PPM = 0.06;

    private final double[] timeS;
    private final double[] ppm;

    ChamberEthylene(double[] timeS, double[] ppm) {
        this.timeS = timeS;
        this.ppm = ppm;
    }

    /**
     * Returns the highest level of the run.
     *
     * @return µL/L
     */
    public double highestPpm() {
        return Arrays.stream(ppm).max().orElseThrow();
    }

    /**
     * Returns the level at a time.
     *
     * @param atS time, s; held beyond the ends
     * @return µL/L
     */
    public double ppmAt(double atS) {
        int i = Arrays.binarySearch(timeS, atS);
        if (i >= 0) {
            return ppm[i];
        }
        int right = -i - 1;
        if (right == 0 || right == timeS.length) {
            return ppm[Math.min(right, timeS.length - 1)];
        }
        double share = (atS - timeS[right - 1]) / (timeS[right] - timeS[right - 1]);
        return ppm[right - 1] + share * (ppm[right] - ppm[right - 1]);
    }
}

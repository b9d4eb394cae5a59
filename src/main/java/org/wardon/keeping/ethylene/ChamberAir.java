package org.wardon.keeping.ethylene;

import org.wardon.errors.Require;

/**
 * How much air a chamber exchanges, cleans and holds, at rising times; each value holds until the
 * next.
 */
public final class ChamberAir {
    private final double[] timeS;
    private final double[] exchangeM3s;
    private final double[] freeVolumeM3;
    private final double[] cleanedM3s;

    /**
     * Takes the series of a run. The arrays are {@code [sample]}, of equal length of at least 2,
     * and are copied.
     *
     * @param timeS times, s, rising
     * @param exchangeM3s air exchanged with outdoors from each time on, m3/s, not negative
     * @param freeVolumeM3 inside volume less lots and packages, m3, above 0
     */
    public ChamberAir(double[] timeS, double[] exchangeM3s, double[] freeVolumeM3) {
        this(timeS, exchangeM3s, freeVolumeM3, new double[timeS.length]);
    }

    /**
     * Takes the series of a run with a scrubber. The arrays are {@code [sample]}, of equal length
     * of at least 2, and are copied.
     *
     * @param timeS times, s, rising
     * @param exchangeM3s air exchanged with outdoors from each time on, m3/s, not negative
     * @param freeVolumeM3 inside volume less lots and packages, m3, above 0
     * @param cleanedM3s air freed of ethylene from each time on, what comes through the scrubber
     *     times the share it takes at a pass, m3/s, not negative
     */
    public ChamberAir(
            double[] timeS, double[] exchangeM3s, double[] freeVolumeM3, double[] cleanedM3s) {
        int n = timeS.length;
        Require.that(
                n >= 2
                        && exchangeM3s.length == n
                        && freeVolumeM3.length == n
                        && cleanedM3s.length == n,
                "chamber air needs arrays of equal length of at least 2, found " + n);
        for (int i = 0; i < n; i++) {
            if (i > 0 && !(timeS[i] > timeS[i - 1])) {
                throw new IllegalArgumentException("times must rise, found " + timeS[i]);
            }
            Require.within("exchangeM3s", exchangeM3s[i], 0, 1e4, "m3/s", "");
            Require.within("freeVolumeM3", freeVolumeM3[i], 1e-3, 1e7, "m3", "Less lots.");
            Require.within("cleanedM3s", cleanedM3s[i], 0, 1e4, "m3/s", "");
        }
        this.timeS = timeS.clone();
        this.exchangeM3s = exchangeM3s.clone();
        this.freeVolumeM3 = freeVolumeM3.clone();
        this.cleanedM3s = cleanedM3s.clone();
    }

    /**
     * Returns how many samples there are.
     *
     * @return at least 2
     */
    public int size() {
        return timeS.length;
    }

    /**
     * Returns the time of a sample.
     *
     * @param i sample
     * @return s
     */
    public double timeS(int i) {
        return timeS[i];
    }

    /**
     * Returns the level at the end of a step in which everything is steady.
     *
     * @param i sample at which the step begins
     * @param ppm level there, µL/L
     * @param microlitrePerHour given off in the chamber, µL/h
     * @param outdoorPpm level outdoors, µL/L
     * @return µL/L
     */
    public double after(int i, double ppm, double microlitrePerHour, double outdoorPpm) {
        double stepS = timeS[i + 1] - timeS[i];
        double perS = exchangeM3s[i] / freeVolumeM3[i];
        double sourcePpmS = microlitrePerHour / 3_600 / (freeVolumeM3[i] * 1_000);
        double lostPerS = perS + cleanedM3s[i] / freeVolumeM3[i];
        double changes = lostPerS * stepS;
        double kept = Math.exp(-changes);
        double filled = changes < 1e-9 ? stepS : -Math.expm1(-changes) / lostPerS;
        return ppm * kept + (sourcePpmS + perS * outdoorPpm) * filled;
    }
}

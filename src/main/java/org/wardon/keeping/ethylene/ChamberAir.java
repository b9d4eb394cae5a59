package org.wardon.keeping.ethylene;

import org.wardon.errors.Require;

/** How much air a chamber exchanges and holds, at rising times; each value holds until the next. */
public final class ChamberAir {
    private final double[] timeS;
    private final double[] exchangeM3s;
    private final double[] freeVolumeM3;

    /**
     * Takes the series of a run. The arrays are {@code [sample]}, of equal length of at least 2,
     * and are copied.
     *
     * @param timeS times, s, rising
     * @param exchangeM3s air exchanged with outdoors from each time on, m3/s, not negative
     * @param freeVolumeM3 inside volume less lots and packages, m3, above 0
     */
    public ChamberAir(double[] timeS, double[] exchangeM3s, double[] freeVolumeM3) {
        int n = timeS.length;
        Require.that(
                n >= 2 && exchangeM3s.length == n && freeVolumeM3.length == n,
                "chamber air needs three arrays of equal length of at least 2, found " + n);
        for (int i = 0; i < n; i++) {
            Require.that(i == 0 || timeS[i] > timeS[i - 1], "times must rise, found " + timeS[i]);
            Require.within("exchangeM3s", exchangeM3s[i], 0, 1e4, "m3/s", "");
            Require.within("freeVolumeM3", freeVolumeM3[i], 1e-3, 1e7, "m3", "Less lots.");
        }
        this.timeS = timeS.clone();
        this.exchangeM3s = exchangeM3s.clone();
        this.freeVolumeM3 = freeVolumeM3.clone();
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
        double changes = perS * stepS;
        double kept = Math.exp(-changes);
        double filled = changes < 1e-9 ? stepS : -Math.expm1(-changes) / perS;
        return ppm * kept + (sourcePpmS + perS * outdoorPpm) * filled;
    }
}

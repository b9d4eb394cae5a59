package org.wardon.advice.size;

import org.wardon.errors.Require;

/**
 * Air changes a day by door use and leakage in a room above 0 °C, by its volume; average use, heavy
 * use about double.
 *
 * <p>Source: Dossat, Principles of Refrigeration, table of air changes (from memory), internal
 * loads, rows airchange_*; between rows straight on logarithmic scales, held beyond both ends.
 */
public final class AirChanges {
    /** Heavy use over average use. */
    public static final double HEAVY_USE = 2;

    private static final double[] VOLUME_M3 = {5.7, 14.2, 28.3, 56.6, 141.6, 283, 850, 1416};
    private static final double[] PER_DAY = {44, 26, 17.5, 12, 7.2, 4.9, 2.7, 2.0};

    private AirChanges() {}

    /**
     * Returns the air changes.
     *
     * @param volumeM3 gross volume, m3, above 0
     * @return air changes a day, falling with volume
     */
    public static double perDay(double volumeM3) {
        Require.within("volumeM3", volumeM3, 0.01, 1e6, "m3", "");
        int last = VOLUME_M3.length - 1;
        if (volumeM3 <= VOLUME_M3[0]) {
            return PER_DAY[0];
        }
        if (volumeM3 >= VOLUME_M3[last]) {
            return PER_DAY[last];
        }
        int i = 1;
        while (VOLUME_M3[i] < volumeM3) {
            i++;
        }
        double way =
                Math.log(volumeM3 / VOLUME_M3[i - 1]) / Math.log(VOLUME_M3[i] / VOLUME_M3[i - 1]);
        return PER_DAY[i - 1] * Math.pow(PER_DAY[i] / PER_DAY[i - 1], way);
    }
}

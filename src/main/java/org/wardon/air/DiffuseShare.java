package org.wardon.air;

/**
 * How much of global radiation is diffuse.
 *
 * <p>Source: Erbs, Klein and Duffie 1982, hourly correlation (from memory).
 */
public final class DiffuseShare {
    private DiffuseShare() {}

    /**
     * Returns the share.
     *
     * @param clearness global over extraterrestrial radiation on the level, 0 or more
     * @return 0.165 to 1
     */
    public static double of(double clearness) {
        double k = Math.max(0, clearness);
        if (k <= 0.22) {
            return 1 - 0.09 * k;
        }
        if (k <= 0.80) {
            return 0.9511 + k * (-0.1604 + k * (4.388 + k * (-16.638 + k * 12.336)));
        }
        return 0.165;
    }
}

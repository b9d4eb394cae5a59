package org.wardon.enclosure;

import org.wardon.errors.Require;

/**
 * A chamber left to itself, as one body in steady surroundings: exact, and a check on the full
 * model.
 *
 * @param conductanceWK conductance to the surroundings, W/K, above 0
 * @param capacityJK heat capacity, J/K, above 0
 * @param internalW heat given off inside, W
 * @param ambientC surroundings, °C
 */
public record LumpedChamber(
        double conductanceWK, double capacityJK, double internalW, double ambientC) {
    /** Checks the bounds. */
    public LumpedChamber {
        Require.within("conductanceWK", conductanceWK, 1e-9, 1e9, "W/K", "");
        Require.within("capacityJK", capacityJK, 1e-9, 1e15, "J/K", "");
    }

    /**
     * Returns the temperature it comes to rest at.
     *
     * @return °C
     */
    public double restsAtC() {
        return ambientC + internalW / conductanceWK;
    }

    /**
     * Returns the temperature after some time.
     *
     * @param startC temperature at the start, °C
     * @param timeS time since, s
     * @return °C
     */
    public double temperatureC(double startC, double timeS) {
        double rest = restsAtC();
        return rest + (startC - rest) * Math.exp(-timeS * conductanceWK / capacityJK);
    }

    /**
     * Returns the time until it reaches a temperature.
     *
     * @param startC temperature at the start, °C
     * @param limitC the temperature, °C
     * @return s, infinite where it never does
     */
    public double timeToS(double startC, double limitC) {
        double left = (limitC - restsAtC()) / (startC - restsAtC());
        if (left >= 1) {
            return left == 1 ? 0 : Double.POSITIVE_INFINITY;
        }
        return left <= 0 ? Double.POSITIVE_INFINITY : -Math.log(left) * capacityJK / conductanceWK;
    }
}

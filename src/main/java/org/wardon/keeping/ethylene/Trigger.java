package org.wardon.keeping.ethylene;

/**
 * Starts ripening once ethylene has stayed above a level for 24 hours at or above the lowest safe
 * temperature. Fed in order of time.
 */
public final class Trigger {
    private static final double NEEDED_S = 86_400;

    private final double levelPpm;
    private final double lowestSafeC;
    private double sinceS = Double.NaN;
    private double startsS = Double.POSITIVE_INFINITY;

    /**
     * Waits for a level.
     *
     * @param levelPpm level that starts ripening, µL/L
     * @param lowestSafeC colder produce does not respond, °C
     */
    public Trigger(double levelPpm, double lowestSafeC) {
        this.levelPpm = levelPpm;
        this.lowestSafeC = lowestSafeC;
    }

    /**
     * Takes the next sample.
     *
     * @param atS time, s
     * @param meanC temperature of the produce, °C
     * @param ppm ethylene, µL/L
     */
    public void feel(double atS, double meanC, double ppm) {
        if (!(ppm > levelPpm && meanC >= lowestSafeC)) {
            sinceS = Double.NaN;
            return;
        }
        if (Double.isNaN(sinceS)) {
            sinceS = atS;
        }
        if (atS - sinceS >= NEEDED_S) {
            startsS = Math.min(startsS, sinceS + NEEDED_S);
        }
    }

    /**
     * Returns when ripening starts.
     *
     * @return s, infinite while it has not
     */
    public double startsS() {
        return startsS;
    }
}

package org.wardon.heat;

import org.wardon.air.SaturatedAir;

/**
 * Carbon dioxide of the chamber as a tracer: it does not act back. Between two steps source and
 * exchange are taken as even, which makes the level exact for them.
 */
final class Carbon {
    /** Outdoor level, ppm by volume (from memory of NOAA's global mean, rounded). */
    static final double OUTDOOR_PPM = 420;

    /** Gas constant of carbon dioxide, J/(kg K): 8.31446/44.01e-3. */
    private static final double GAS_J_KG_K = 188.92;

    private final double pressurePa;
    private double ppm = OUTDOOR_PPM;
    private double highest = OUTDOOR_PPM;

    Carbon(double pressurePa) {
        this.pressurePa = pressurePa;
    }

    /** Carries the level over a step: source kg/s, exchange m3/s, air °C, free volume m3. */
    void step(double seconds, double sourceKgS, double exchangeM3S, double airC, double freeM3) {
        double m3PerKg = GAS_J_KG_K * (airC + SaturatedAir.ZERO_C_IN_K) / pressurePa;
        double sourcePpmS = 1e6 * sourceKgS * m3PerKg / freeM3;
        double rate = exchangeM3S / freeM3;
        if (rate * seconds < 1e-9) {
            ppm += sourcePpmS * seconds;
        } else {
            double settles = OUTDOOR_PPM + sourcePpmS / rate;
            ppm = settles + (ppm - settles) * Math.exp(-rate * seconds);
        }
        highest = Math.max(highest, ppm);
    }

    /** Outdoor air fills what lots left; lots coming in push air of the chamber's own level out. */
    void mix(double freeBeforeM3, double freeAfterM3) {
        if (freeAfterM3 > freeBeforeM3) {
            ppm = OUTDOOR_PPM + (ppm - OUTDOOR_PPM) * freeBeforeM3 / freeAfterM3;
        }
    }

    double ppm() {
        return ppm;
    }

    double highestPpm() {
        return highest;
    }
}

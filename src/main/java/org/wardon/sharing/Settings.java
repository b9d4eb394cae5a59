package org.wardon.sharing;

import java.util.OptionalDouble;

/** The settings looked at: a grid of temperature and humidity. */
final class Settings {
    static final double LOWEST_C = -2;
    static final double HIGHEST_C = 35;
    static final double STEP_C = 0.5;
    static final double LOWEST_PCT = 40;
    static final double STEP_PCT = 2.5;
    static final int TEMPERATURES = (int) Math.round((HIGHEST_C - LOWEST_C) / STEP_C) + 1;
    static final int HUMIDITIES = (int) Math.round((100 - LOWEST_PCT) / STEP_PCT) + 1;

    private Settings() {}

    static double temperatureC(int t) {
        return LOWEST_C + t * STEP_C;
    }

    static double humidityPct(int h) {
        return LOWEST_PCT + h * STEP_PCT;
    }

    static int nearestTemperature(double temperatureC) {
        long t = Math.round((temperatureC - LOWEST_C) / STEP_C);
        return (int) Math.min(Math.max(t, 0), TEMPERATURES - 1);
    }

    static int nearestHumidity(double humidityPct) {
        long h = Math.round((humidityPct - LOWEST_PCT) / STEP_PCT);
        return (int) Math.min(Math.max(h, 0), HUMIDITIES - 1);
    }

    /** Lowest and highest of the values chosen. */
    static final class Extent {
        private double low = Double.POSITIVE_INFINITY;
        private double high = Double.NEGATIVE_INFINITY;

        void add(double value) {
            low = Math.min(low, value);
            high = Math.max(high, value);
        }

        OptionalDouble low() {
            return low <= high ? OptionalDouble.of(low) : OptionalDouble.empty();
        }

        OptionalDouble high() {
            return low <= high ? OptionalDouble.of(high) : OptionalDouble.empty();
        }
    }
}

package org.wardon.advice.forecast;

import org.wardon.air.SaturatedAir;
import org.wardon.heat.AirSeries;
import org.wardon.heat.Course;
import org.wardon.heat.Hours;

/**
 * Turns what a chamber came to into air that lots are put into: the temperature of one run, the
 * humidity of another with lots in it.
 */
final class TrialAir {
    private static final double HOUR_S = 3_600;

    private TrialAir() {}

    /** By the hour, then in rows of three as lots of draws are run. */
    static AirSeries of(Course course, Course loaded, double warmerK) {
        Hours hours = course.hours();
        Hours humid = loaded.hours();
        int n = (int) Math.max(1, Math.round(hours.atS(hours.size() - 1) / HOUR_S));
        double[] time = new double[n];
        double[] temperature = new double[n];
        double[] humidity = new double[n];
        int row = 0;
        for (int h = 0; h < n; h++) {
            time[h] = (h + 1) * HOUR_S;
            while (row < hours.size() - 1 && hours.atS(row) < time[h] - 1) {
                row++;
            }
            double airC = hours.airC(row);
            temperature[h] = airC + warmerK;
            humidity[h] = Math.min(1, humid.humidityFraction(row) * drier(airC, warmerK));
        }
        return new AirSeries(time, temperature, humidity).sketched();
    }

    /** The same water in warmer air is less of what it can hold. */
    private static double drier(double airC, double warmerK) {
        return warmerK == 0
                ? 1
                : SaturatedAir.pressurePa(airC) / SaturatedAir.pressurePa(airC + warmerK);
    }
}

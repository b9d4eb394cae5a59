package org.wardon.heat.network;

import org.wardon.air.Coarse;

/** Temperature and humidity ratio hour by hour, linear between. */
final class HourlyAir {
    private final double[] airC;
    private final double[] ratio;

    /** Holds {@code [hour]}, °C and kg/kg, of equal length of at least 2, in longer stretches. */
    HourlyAir(double[] airC, double[] ratio, int stretchHours) {
        this.airC = Coarse.means(airC, stretchHours);
        this.ratio = Coarse.means(ratio, stretchHours);
    }

    double airC(int hour) {
        return airC[hour];
    }

    double ratio(int hour) {
        return ratio[hour];
    }

    /** Sets a place to an instant of the stretch that starts with an hour. */
    void at(int hour, double intoHourS, Outside.Place place) {
        double x = intoHourS / 3600;
        place.airC = airC[hour] + x * (airC[hour + 1] - airC[hour]);
        place.ratio = ratio[hour] + x * (ratio[hour + 1] - ratio[hour]);
        place.airSlope = (airC[hour + 1] - airC[hour]) / 3600;
        place.ratioSlope = (ratio[hour + 1] - ratio[hour]) / 3600;
    }
}

package org.wardon.heat;

import org.wardon.air.Weather;
import org.wardon.errors.Require;

/** Given air: temperature and humidity at rising times, linear between them, held beyond. */
public final class AirSeries {
    private final double[] timeS;
    private final double[] temperatureC;
    private final double[] humidityFraction;

    /**
     * Holds a series; the arrays are copied.
     *
     * @param timeS {@code [sample]}, s since the start of the run, rising
     * @param temperatureC {@code [sample]}, °C
     * @param humidityFraction {@code [sample]}, relative humidity, 0 to 1
     */
    public AirSeries(double[] timeS, double[] temperatureC, double[] humidityFraction) {
        int n = timeS.length;
        Require.that(
                n > 0 && temperatureC.length == n && humidityFraction.length == n,
                "an air series needs three arrays of equal length of at least 1, found " + n);
        for (int i = 1; i < n; i++) {
            Require.that(timeS[i] > timeS[i - 1], "times must rise, found " + timeS[i] + " s");
        }
        this.timeS = timeS.clone();
        this.temperatureC = temperatureC.clone();
        this.humidityFraction = humidityFraction.clone();
    }

    /**
     * Returns air that never changes.
     *
     * @param temperatureC °C
     * @param humidityFraction relative humidity, 0 to 1
     * @return the series
     */
    public static AirSeries steady(double temperatureC, double humidityFraction) {
        return new AirSeries(
                new double[] {0}, new double[] {temperatureC}, new double[] {humidityFraction});
    }

    /**
     * Returns outdoor air in the shade.
     *
     * @param weather the weather
     * @return its hours
     */
    public static AirSeries outdoors(Weather weather) {
        int n = weather.hours();
        double[] time = new double[n];
        double[] temperature = new double[n];
        double[] humidity = new double[n];
        for (int h = 0; h < n; h++) {
            time[h] = h * 3600.0;
            temperature[h] = weather.temperatureC(h);
            humidity[h] = weather.humidityPct(h) / 100;
        }
        return new AirSeries(time, temperature, humidity);
    }

    /**
     * Returns the number of samples.
     *
     * @return at least 1
     */
    public int size() {
        return timeS.length;
    }

    /**
     * Returns the time of a sample.
     *
     * @param i sample
     * @return s since the start of the run
     */
    public double timeS(int i) {
        return timeS[i];
    }

    /**
     * Returns the temperature.
     *
     * @param atS s since the start of the run
     * @return °C
     */
    public double temperatureC(double atS) {
        return between(temperatureC, atS);
    }

    /**
     * Returns the relative humidity.
     *
     * @param atS s since the start of the run
     * @return 0 to 1
     */
    public double humidityFraction(double atS) {
        return between(humidityFraction, atS);
    }

    private double between(double[] values, double atS) {
        int found = java.util.Arrays.binarySearch(timeS, atS);
        if (found >= 0) {
            return values[found];
        }
        int next = -found - 1;
        if (next == 0) {
            return values[0];
        }
        if (next == timeS.length) {
            return values[next - 1];
        }
        double share = (atS - timeS[next - 1]) / (timeS[next] - timeS[next - 1]);
        return values[next - 1] + share * (values[next] - values[next - 1]);
    }
}

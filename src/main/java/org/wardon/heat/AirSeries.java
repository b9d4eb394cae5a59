package org.wardon.heat;

import java.util.stream.IntStream;
import org.wardon.air.Coarse;
import org.wardon.air.Weather;
import org.wardon.errors.Require;

/** Given air: temperature and humidity at rising times, linear between them, held beyond. */
public final class AirSeries {
    private final double[] timeS;
    private final double[] temperatureC;
    private final double[] humidityFraction;
    private final int rowHours;

    /**
     * Holds a series; the arrays are copied.
     *
     * @param timeS {@code [sample]}, s since the start of the run, rising
     * @param temperatureC {@code [sample]}, °C
     * @param humidityFraction {@code [sample]}, relative humidity, 0 to 1
     */
    public AirSeries(double[] timeS, double[] temperatureC, double[] humidityFraction) {
        this(timeS, temperatureC, humidityFraction, 1);
    }

    private AirSeries(
            double[] timeS, double[] temperatureC, double[] humidityFraction, int rowHours) {
        int n = timeS.length;
        Require.that(
                n > 0 && temperatureC.length == n && humidityFraction.length == n,
                "an air series needs three arrays of equal length of at least 1, found " + n);
        for (int i = 1; i < n; i++) {
            if (!(timeS[i] > timeS[i - 1])) {
                throw new IllegalArgumentException("times must rise, found " + timeS[i] + " s");
            }
        }
        this.timeS = timeS.clone();
        this.temperatureC = temperatureC.clone();
        this.humidityFraction = humidityFraction.clone();
        this.rowHours = rowHours;
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
     * Returns an hourly series for sampling: straight between means of three hours, with rows as
     * far apart for the lot that stands in it. A series of one sample stays as it is.
     *
     * @return about every third sample, and the last
     */
    public AirSeries sketched() {
        int rows = DoorMode.SKETCHED.rowHours();
        double[] meanC = Coarse.means(temperatureC, rows);
        double[] mean = Coarse.means(humidityFraction, rows);
        int[] kept =
                IntStream.range(0, size()).filter(i -> i % rows == 0 || i == size() - 1).toArray();
        return new AirSeries(
                IntStream.of(kept).mapToDouble(i -> timeS[i]).toArray(),
                IntStream.of(kept).mapToDouble(i -> meanC[i]).toArray(),
                IntStream.of(kept).mapToDouble(i -> mean[i]).toArray(),
                size() > 1 ? rows : 1);
    }

    /** Hours from row to row of a lot that stands in it. */
    int rowHours() {
        return rowHours;
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

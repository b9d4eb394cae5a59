package org.wardon.air;

import java.util.List;
import java.util.Optional;
import org.wardon.errors.Require;

/**
 * The course of the outdoor temperature over a year as a mean and one wave, which is what soil
 * below a floor hears of it.
 *
 * @param meanC yearly mean, °C
 * @param swingK how far the warmest time lies above the mean, K, 0 or more
 * @param warmestDay day of the year of the warmest time, 1 to 366
 */
public record YearWave(double meanC, double swingK, double warmestDay) {
    /** Length of a year, days. */
    public static final double YEAR_DAYS = 365.25;

    /** The warmest time follows the longest day by this much, days (assumption). */
    private static final double AFTER_SOLSTICE_DAYS = 30;

    private static final double JUNE_SOLSTICE = 172;
    private static final double DECEMBER_SOLSTICE = 355;
    private static final int DAY_H = 24;
    private static final int MONTHS = 12;

    /** A run this long tells the year by itself, days. */
    private static final int TELLS_YEAR_DAYS = 350;

    /** Checks the bounds. */
    public YearWave {
        Require.within("site.year.meanC", meanC, -50, 45, "°C", "");
        Require.within("site.year.swingK", swingK, 0, 40, "K", "");
        Require.within("site.year.warmestDay", warmestDay, 1, 366, "", "");
    }

    /**
     * Returns the usual warmest day: a month after the longest.
     *
     * @param latitudeDeg latitude, degrees, north positive
     * @return day of the year
     */
    public static double usualWarmestDay(double latitudeDeg) {
        double longest = latitudeDeg >= 0 ? JUNE_SOLSTICE : DECEMBER_SOLSTICE;
        return (longest + AFTER_SOLSTICE_DAYS - 1) % 365 + 1;
    }

    /**
     * Returns the wave of monthly means.
     *
     * @param monthsC twelve means, January first, °C
     * @return their mean and first harmonic
     */
    public static YearWave ofMonths(List<Double> monthsC) {
        Require.that(monthsC.size() == MONTHS, "twelve months are needed, found " + monthsC.size());
        double[] dayOfYear = new double[MONTHS];
        double[] values = new double[MONTHS];
        for (int m = 0; m < MONTHS; m++) {
            dayOfYear[m] = (m + 0.5) * YEAR_DAYS / MONTHS;
            values[m] = monthsC.get(m);
        }
        return fitted(dayOfYear, values);
    }

    /**
     * Returns the wave of the weather of a run, where it covers a year.
     *
     * @param weather the weather
     * @param timeline the run's calendar
     * @return the wave of its last year; empty for a shorter run
     */
    public static Optional<YearWave> of(Weather weather, Timeline timeline) {
        int days = weather.hours() / DAY_H;
        if (days < TELLS_YEAR_DAYS) {
            return Optional.empty();
        }
        int n = Math.min(days, 365);
        double[] dayOfYear = new double[n];
        double[] means = new double[n];
        for (int d = 0; d < n; d++) {
            int day = days - n + d;
            dayOfYear[d] = timeline.dayOfYear(day * Timeline.DAY_S);
            for (int h = 0; h < DAY_H; h++) {
                means[d] += weather.temperatureC(DAY_H * day + h) / DAY_H;
            }
        }
        return Optional.of(fitted(dayOfYear, means));
    }

    /** Mean and first harmonic of values spread evenly over a year. */
    private static YearWave fitted(double[] dayOfYear, double[] values) {
        double mean = 0;
        double cosine = 0;
        double sine = 0;
        int n = values.length;
        for (int i = 0; i < n; i++) {
            double angle = 2 * Math.PI * dayOfYear[i] / YEAR_DAYS;
            mean += values[i] / n;
            cosine += 2 * values[i] * Math.cos(angle) / n;
            sine += 2 * values[i] * Math.sin(angle) / n;
        }
        double day = Math.atan2(sine, cosine) / (2 * Math.PI) * YEAR_DAYS;
        double warmest = day < 1 ? Math.min(day + YEAR_DAYS, 366) : day;
        return new YearWave(mean, Math.hypot(cosine, sine), Math.max(1, warmest));
    }

    /**
     * Returns the wave at a day, damped and late.
     *
     * @param dayOfYear day of the year, may be a fraction
     * @param share of the swing that is left, 0 to 1
     * @param lateDays how much it comes later, days
     * @return °C
     */
    public double temperatureC(double dayOfYear, double share, double lateDays) {
        double angle = 2 * Math.PI * (dayOfYear - warmestDay - lateDays) / YEAR_DAYS;
        return meanC + share * swingK * Math.cos(angle);
    }
}

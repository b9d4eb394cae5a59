package org.wardon.air.normals;

import java.time.LocalDate;
import java.util.Arrays;
import org.wardon.air.SaturatedAir;
import org.wardon.air.Site;
import org.wardon.air.Timeline;
import org.wardon.air.Weather;

/**
 * Hourly weather made from monthly normals.
 *
 * <p>An instant's weather hangs on the normals, the place and the seed alone: two runs of the same
 * seed share it where they overlap, whatever their start. Days are those of mean solar time at the
 * place. Each day has the mean humidity of its time of year; its vapour pressure is held through
 * the day and runs straight from noon to noon. Wind is not known.
 */
public final class NormalsWeather {
    private static final int DAY_H = 24;
    private static final int NOON_H = 12;
    private static final double DEGREES_AN_HOUR = 15;

    /** Days needed beyond the run: vapour runs to the next noon, an evening to the next morning. */
    private static final int DAYS_BESIDE = 2;

    /** Beyond these the formulas of moist air end, °C. */
    private static final double COLDEST_C = -60;

    private static final double WARMEST_C = 60;

    private final double solarZeroS;
    private final long firstDay;
    private final DayTemperatures.Extremes[] extremes;
    private final double[] vapourPa;
    private final HourlySun sun;

    private NormalsWeather(
            MonthlyNormals normals, Site site, Timeline timeline, long seed, int hours) {
        Spells spells = new Spells(seed);
        solarZeroS =
                timeline.from().toEpochSecond(timeline.offset())
                        + solarAheadH(site, timeline) * Timeline.HOUR_S;
        firstDay = (long) Math.floor(solarZeroS / Timeline.DAY_S) - DAYS_BESIDE;
        int days = hours / DAY_H + 2 * DAYS_BESIDE + 2;
        DayTemperatures temperatures = new DayTemperatures(normals, spells);
        extremes = new DayTemperatures.Extremes[days];
        Arrays.setAll(extremes, i -> temperatures.on(LocalDate.ofEpochDay(firstDay + i)));
        MonthBlend humidity = MonthBlend.within(normals.humidityPct(), 0, 100);
        vapourPa = new double[days];
        for (int i = 1; i < days - 1; i++) {
            double mean = humidity.at(LocalDate.ofEpochDay(firstDay + i)) / 100;
            vapourPa[i] = HeldVapour.pressurePa(mean, hoursC(i));
        }
        DailySun daily = new DailySun(normals, site.latitudeDeg(), site.elevationM(), spells);
        sun = new HourlySun(site, timeline, hours, daily);
    }

    /** Mean solar time ahead of UTC, h, on the side of the date line the zone is on. */
    private static double solarAheadH(Site site, Timeline timeline) {
        double ahead = site.longitudeDeg() / DEGREES_AN_HOUR;
        double zone = timeline.offset().getTotalSeconds() / Timeline.HOUR_S;
        return ahead + DAY_H * Math.rint((zone - ahead) / DAY_H);
    }

    /**
     * Makes the weather of a run.
     *
     * @param normals normals of the place
     * @param site where
     * @param timeline the run's calendar
     * @param seed number the days are drawn from
     * @param hours length of the run, h
     * @return hour 0 to {@code hours}; radiation known, wind not
     */
    public static Weather of(
            MonthlyNormals normals, Site site, Timeline timeline, long seed, int hours) {
        NormalsWeather made = new NormalsWeather(normals, site, timeline, seed, hours);
        double[] temperatureC = new double[hours + 1];
        double[] humidityPct = new double[hours + 1];
        double[] globalWm2 = new double[hours + 1];
        double[] windMs = new double[hours + 1];
        for (int h = 0; h <= hours; h++) {
            double solarS = made.solarZeroS + h * Timeline.HOUR_S;
            int day = (int) (Math.floor(solarS / Timeline.DAY_S) - made.firstDay);
            double hour = (solarS - (made.firstDay + day) * Timeline.DAY_S) / Timeline.HOUR_S;
            temperatureC[h] = made.temperatureC(day, hour);
            humidityPct[h] = made.humidityPct(day, hour, temperatureC[h]);
            globalWm2[h] = made.sun.globalWm2(h, LocalDate.ofEpochDay(made.firstDay + day), hour);
            windMs[h] = Double.NaN;
        }
        return new Weather(temperatureC, humidityPct, globalWm2, windMs);
    }

    private double[] hoursC(int day) {
        double[] hourC = new double[DAY_H];
        Arrays.setAll(hourC, h -> temperatureC(day, h));
        return hourC;
    }

    private double temperatureC(int day, double hour) {
        double c =
                DayCurve.temperatureC(
                        hour,
                        new DayCurve.Extremes(
                                extremes[day - 1].highestC(),
                                extremes[day].lowestC(),
                                extremes[day].highestC(),
                                extremes[day + 1].lowestC()));
        return Math.max(COLDEST_C, Math.min(WARMEST_C, c));
    }

    private double humidityPct(int day, double hour, double airC) {
        int noon = hour >= NOON_H ? day : day - 1;
        double share = (hour + (noon == day ? -NOON_H : NOON_H)) / DAY_H;
        double pa = vapourPa[noon] + share * (vapourPa[noon + 1] - vapourPa[noon]);
        return 100 * Math.min(1, pa / SaturatedAir.overWaterPa(airC));
    }
}

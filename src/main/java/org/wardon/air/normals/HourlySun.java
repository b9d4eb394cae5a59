package org.wardon.air.normals;

import java.time.LocalDate;
import org.wardon.air.Site;
import org.wardon.air.SunPosition;
import org.wardon.air.Sunshine;
import org.wardon.air.Timeline;

/**
 * A day's radiation on its hours, in proportion to the radiation above the air on the level times
 * {@code a + b cos(hour angle)}, so that their sum is the day's; nothing while the sun is down.
 *
 * <p>Source: Collares-Pereira and Rabl 1979, as in Duffie and Beckman, equation 2.13.2 (from
 * memory); with the sun's height for {@code cos w - cos ws}, which is the same where the sun sets
 * and holds where it does not.
 */
final class HourlySun {
    private static final int DAY_H = 24;

    private final Site site;
    private final Timeline timeline;
    private final DailySun daily;
    private final double[] cosZenith;
    private final double[] weight;

    HourlySun(Site site, Timeline timeline, int hours, DailySun daily) {
        this.site = site;
        this.timeline = timeline;
        this.daily = daily;
        // A day before the run and one after, so that the first and last days have all their hours.
        cosZenith = new double[hours + 1 + 2 * DAY_H];
        weight = new double[cosZenith.length];
        for (int i = 0; i < weight.length; i++) {
            place(i);
        }
    }

    private void place(int i) {
        double seconds = (i - DAY_H) * Timeline.HOUR_S;
        double declination = SunPosition.declinationDeg(timeline.dayOfYear(seconds));
        double hour = SunPosition.solarHour(site, timeline, seconds);
        cosZenith[i] = SunPosition.cosZenith(site.latitudeDeg(), declination, hour);
        if (cosZenith[i] > 0) {
            double daylengthH = SunPosition.daylengthH(site.latitudeDeg(), declination);
            double sunset = Math.toRadians(7.5 * daylengthH) - Math.toRadians(60);
            double a = 0.409 + 0.5016 * Math.sin(sunset);
            double b = 0.6609 - 0.4767 * Math.sin(sunset);
            double angle = Math.toRadians(15 * (hour - 12));
            weight[i] = cosZenith[i] * Math.max(0, a + b * Math.cos(angle));
        }
    }

    /** Returns global radiation on the level at an hour of the run, W/m2. */
    double globalWm2(int runHour, LocalDate solarDay, double solarHour) {
        int i = runHour + DAY_H;
        if (weight[i] <= 0) {
            return 0;
        }
        int first = i - (int) Math.floor(solarHour);
        double sum = 0;
        for (int h = first; h < first + DAY_H; h++) {
            sum += weight[h];
        }
        double watts = daily.joulesM2(solarDay) * weight[i] / (sum * Timeline.HOUR_S);
        // At the edge of the polar night a day's sun may fall on one grazing hour.
        return Math.min(Sunshine.SOLAR_CONSTANT_WM2 * cosZenith[i], watts);
    }
}

package org.wardon.advice.forecast;

import java.util.function.IntToDoubleFunction;
import org.wardon.air.Timeline;
import org.wardon.air.Weather;

/** The weather of a plan, its last day repeated beyond the horizon. */
final class PlanWeather {
    private static final int DAY_HOURS = 24;

    private PlanWeather() {}

    /**
     * Returns weather that goes on beyond the horizon.
     *
     * @param weather hourly weather of the plan
     * @param horizonS end of the plan, s
     * @param beyondDays whole days to add
     * @return weather of horizon and added days; the last day of the horizon is repeated
     */
    static Weather prolonged(Weather weather, double horizonS, int beyondDays) {
        if (weather.hours() == 1) {
            return weather;
        }
        int end = (int) Math.ceil(horizonS / Timeline.HOUR_S);
        int hours = end + beyondDays * DAY_HOURS + 1;
        return new Weather(
                column(hours, end, weather::temperatureC),
                column(hours, end, weather::humidityPct),
                column(hours, end, weather::globalWm2),
                column(hours, end, weather::windMs));
    }

    private static double[] column(int hours, int end, IntToDoubleFunction value) {
        double[] column = new double[hours];
        int dayStart = Math.max(0, end - DAY_HOURS);
        int day = Math.max(1, end - dayStart);
        for (int hour = 0; hour < hours; hour++) {
            int from = hour <= end ? hour : dayStart + (hour - dayStart) % day;
            column[hour] = value.applyAsDouble(from);
        }
        return column;
    }
}

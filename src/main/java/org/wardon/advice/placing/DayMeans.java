package org.wardon.advice.placing;

import java.util.function.IntToDoubleFunction;
import org.wardon.air.Timeline;
import org.wardon.heat.Course;
import org.wardon.heat.Hours;

/** Means of days of what a chamber came to. */
final class DayMeans {
    private DayMeans() {}

    /** Air of each day, °C. */
    static double[] of(Course course, int days) {
        return of(course.hours(), course.hours()::airC, days);
    }

    /** Any figure of the rows, each row counted in the day of its middle. */
    static double[] of(Hours hours, IntToDoubleFunction figure, int days) {
        double[] sum = new double[days];
        double[] span = new double[days];
        double before = 0;
        for (int i = 0; i < hours.size(); i++) {
            double step = hours.atS(i) - before;
            int day = (int) Math.min(days - 1, (before + step / 2) / Timeline.DAY_S);
            sum[day] += step * figure.applyAsDouble(i);
            span[day] += step;
            before = hours.atS(i);
        }
        for (int day = 0; day < days; day++) {
            sum[day] = span[day] > 0 ? sum[day] / span[day] : sum[Math.max(0, day - 1)];
        }
        return sum;
    }

    /** Mean of any figure over the whole run. */
    static double whole(Hours hours, IntToDoubleFunction figure) {
        double sum = 0;
        double before = 0;
        for (int i = 0; i < hours.size(); i++) {
            sum += (hours.atS(i) - before) * figure.applyAsDouble(i);
            before = hours.atS(i);
        }
        return before > 0 ? sum / before : 0;
    }
}

package org.wardon.air.normals;

import java.time.LocalDate;
import java.time.Year;
import java.time.YearMonth;
import java.util.List;
import java.util.function.IntToDoubleFunction;

/**
 * Monthly means drawn out to days: straight lines between values at the middle of each month, the
 * values chosen so that the days of each calendar month have its mean. There is no step between
 * months, nor between years.
 *
 * <p>Source: Taylor, Williamson and Zwiers 2000, The sea surface temperature and sea-ice
 * concentration boundary conditions for AMIP II simulations, PCMDI report 60 (from memory): the
 * cyclic system of twelve equations; where a bound cuts days off, it is solved by the same
 * iteration.
 */
final class MonthBlend {
    private static final int MONTHS = MonthlyNormals.MONTHS;

    /** Share of its own month's mean that the middle value of a month makes up. */
    private static final double OWN_SHARE = 0.75;

    private static final int ROUNDS = 2_000;
    private static final double NEAR = 1e-10;
    private static final double REACH = 3;

    private final double[] common;
    private final double[] leap;

    private MonthBlend(double[] common, double[] leap) {
        this.common = common;
        this.leap = leap;
    }

    /** Blends means that have no bounds. */
    static MonthBlend of(List<Double> means) {
        return within(means, Double.NEGATIVE_INFINITY, Double.POSITIVE_INFINITY);
    }

    /** Blends means to days that stay within bounds, as the means do. */
    static MonthBlend within(List<Double> means, double low, double high) {
        return weighted(means, low, high, day -> 1);
    }

    /** Blends means over a month's days that count by a weight by day of the year, 0 or more. */
    static MonthBlend weighted(
            List<Double> means, double low, double high, IntToDoubleFunction weight) {
        return new MonthBlend(
                new OneYear(2001, low, high, weight).blend(means),
                new OneYear(2000, low, high, weight).blend(means));
    }

    /** The value of a day. */
    double at(LocalDate day) {
        return (Year.isLeap(day.getYear()) ? leap : common)[day.getDayOfYear() - 1];
    }

    /** A year's days between the middles of its months. */
    private static final class OneYear {
        private final double low;
        private final double high;
        private final double[] weight;
        private final int[] month;
        private final int[] before;
        private final double[] share;

        OneYear(int year, double low, double high, IntToDoubleFunction weightOfDay) {
            this.low = low;
            this.high = high;
            int days = Year.of(year).length();
            weight = new double[days];
            month = new int[days];
            before = new int[days];
            share = new double[days];
            for (int d = 0; d < days; d++) {
                LocalDate day = LocalDate.ofYearDay(year, d + 1);
                weight[d] = weightOfDay.applyAsDouble(d + 1);
                month[d] = day.getMonthValue() - 1;
                place(d, day);
            }
        }

        /** Between which two middles a day lies, and how far it has come. */
        private void place(int d, LocalDate day) {
            YearMonth own = YearMonth.from(day);
            double into = day.getDayOfMonth() - 0.5;
            double middle = 0.5 * own.lengthOfMonth();
            boolean late = into >= middle;
            double other = 0.5 * (late ? own.plusMonths(1) : own.minusMonths(1)).lengthOfMonth();
            before[d] = late ? month[d] : (month[d] + MONTHS - 1) % MONTHS;
            share[d] =
                    late
                            ? (into - middle) / (middle + other)
                            : 1 - (middle - into) / (middle + other);
        }

        double[] blend(List<Double> means) {
            double[] middles = means.stream().mapToDouble(Double::doubleValue).toArray();
            for (int i = 0; i < ROUNDS; i++) {
                double[] got = meansOf(days(middles));
                double worst = 0;
                for (int m = 0; m < MONTHS; m++) {
                    double miss = means.get(m) - got[m];
                    worst = Math.max(worst, Math.abs(miss));
                    middles[m] = within(middles[m] + miss / OWN_SHARE, REACH);
                }
                if (worst < NEAR) {
                    break;
                }
            }
            return days(middles);
        }

        /** Beyond its bounds a middle value may lie by some spans of them, no further. */
        private double within(double value, double reach) {
            double span = high - low;
            return Double.isInfinite(span)
                    ? value
                    : Math.max(low - reach * span, Math.min(high + reach * span, value));
        }

        private double[] days(double[] middles) {
            double[] days = new double[weight.length];
            for (int d = 0; d < days.length; d++) {
                double from = middles[before[d]];
                double to = middles[(before[d] + 1) % MONTHS];
                days[d] = Math.max(low, Math.min(high, from + share[d] * (to - from)));
            }
            return days;
        }

        /** Weighted means of the months; plain ones where nothing in a month counts. */
        private double[] meansOf(double[] days) {
            double[] sum = new double[MONTHS];
            double[] weights = new double[MONTHS];
            double[] plain = new double[MONTHS];
            int[] n = new int[MONTHS];
            for (int d = 0; d < days.length; d++) {
                sum[month[d]] += weight[d] * days[d];
                weights[month[d]] += weight[d];
                plain[month[d]] += days[d];
                n[month[d]]++;
            }
            for (int m = 0; m < MONTHS; m++) {
                sum[m] = weights[m] > 0 ? sum[m] / weights[m] : plain[m] / n[m];
            }
            return sum;
        }
    }
}

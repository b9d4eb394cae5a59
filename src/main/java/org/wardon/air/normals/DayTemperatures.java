package org.wardon.air.normals;

import java.time.LocalDate;
import java.util.ArrayList;
import java.util.List;

/**
 * Highest and lowest temperature of each day: the blended normals and the day's departure.
 *
 * <p>Spread of daily highest and lowest about the time of year, standard deviation: 1.2 K and 0.12
 * of the year's range of monthly means, three tenths more in its coldest month and less in its
 * warmest (assumption, set by eye: about 1.5 K at the equator, 3 to 5 K in temperate lands), never
 * above 0.6 of the mean daily range, of which changes from day to day are part. The range of a day
 * never falls below 0.15 of the usual one (assumption).
 *
 * <p>A day that grows colder towards the next has its lowest at its end, so the days' extremes as
 * one reads them off are wider than those the days are made from. How much is found from a fixed
 * set of made days and taken off first, so that the means of what one reads are the normals.
 */
final class DayTemperatures {
    private static final double LEAST_SPREAD_K = 1.2;
    private static final double SPREAD_OF_YEAR = 0.12;
    private static final double SEASON = 0.3;
    private static final double MOST_OF_RANGE = 0.6;
    private static final double LEAST_RANGE = 0.15;

    private static final int DAYS_TRIED = 3_000;
    private static final int ROUNDS = 4;
    private static final long TRIAL_KEY = 20_261_201;
    private static final int MONTHS = MonthlyNormals.MONTHS;

    private final MonthBlend highest;
    private final MonthBlend range;
    private final MonthBlend spread;
    private final Spells spells;

    /**
     * Extremes of one day.
     *
     * @param lowestC its morning's lowest, °C
     * @param highestC its afternoon's highest, °C
     */
    record Extremes(double lowestC, double highestC) {}

    DayTemperatures(MonthlyNormals normals, Spells spells) {
        this.spells = spells;
        List<Double> spreads = spreads(normals);
        List<Double> highs = new ArrayList<>();
        List<Double> ranges = new ArrayList<>();
        double[][] trial = trial();
        for (int m = 0; m < MONTHS; m++) {
            Made made = made(normals.rangeK(m), spreads.get(m), trial);
            highs.add(normals.dailyMaxC().get(m) - made.tooHighK);
            ranges.add(made.rangeK);
        }
        highest = MonthBlend.of(highs);
        range = MonthBlend.within(ranges, 0, 100);
        spread = MonthBlend.within(spreads, 0, 100);
    }

    /** Spread of the days of each month, K. */
    static List<Double> spreads(MonthlyNormals normals) {
        double coldest = Double.POSITIVE_INFINITY;
        double warmest = Double.NEGATIVE_INFINITY;
        for (int m = 0; m < MONTHS; m++) {
            coldest = Math.min(coldest, normals.middleC(m));
            warmest = Math.max(warmest, normals.middleC(m));
        }
        List<Double> spreads = new ArrayList<>();
        double yearK = warmest - coldest;
        for (int m = 0; m < MONTHS; m++) {
            double place = yearK > 0 ? 2 * (normals.middleC(m) - coldest) / yearK - 1 : 0;
            double usual = LEAST_SPREAD_K + SPREAD_OF_YEAR * yearK * (1 - SEASON * place);
            spreads.add(Math.min(usual, MOST_OF_RANGE * normals.rangeK(m)));
        }
        return spreads;
    }

    /** Extremes of a day. */
    Extremes on(LocalDate day) {
        return extremes(highest.at(day), range.at(day), spread.at(day), spells.on(day));
    }

    private static Extremes extremes(
            double highC, double rangeK, double spreadK, Spells.Departure departure) {
        double middle =
                highC - 0.5 * rangeK + 0.5 * spreadK * (departure.highest() + departure.lowest());
        double wide = rangeK + spreadK * (departure.highest() - departure.lowest());
        double half = 0.5 * Math.max(wide, LEAST_RANGE * rangeK);
        return new Extremes(middle - half, middle + half);
    }

    /** What days have to be made from, so that their extremes as read have a mean range. */
    private record Made(double tooHighK, double rangeK) {}

    private static Made made(double rangeK, double spreadK, double[][] trial) {
        double made = rangeK;
        double tooHigh = 0;
        for (int i = 0; i < ROUNDS && spreadK > 0; i++) {
            double[] read = readOff(made, spreadK, trial);
            tooHigh = read[1];
            made = Math.max(0, made + rangeK - (read[1] - read[0]));
        }
        return new Made(tooHigh, made);
    }

    /** Mean lowest and highest read from made days whose usual highest is 0, K. */
    private static double[] readOff(double rangeK, double spreadK, double[][] trial) {
        double low = 0;
        double high = 0;
        Extremes before = extremes(0, rangeK, spreadK, departure(trial[0]));
        Extremes today = extremes(0, rangeK, spreadK, departure(trial[1]));
        for (int d = 2; d < trial.length; d++) {
            Extremes after = extremes(0, rangeK, spreadK, departure(trial[d]));
            DayCurve.Extremes day =
                    new DayCurve.Extremes(
                            before.highestC, today.lowestC, today.highestC, after.lowestC);
            double early = DayCurve.temperatureC(0, day);
            double late = DayCurve.temperatureC(23, day);
            low += Math.min(today.lowestC, Math.min(early, late));
            high += Math.max(today.highestC, Math.max(early, late));
            before = today;
            today = after;
        }
        int n = trial.length - 2;
        return new double[] {low / n, high / n};
    }

    private static Spells.Departure departure(double[] x) {
        return new Spells.Departure(x[0], x[1], x[2]);
    }

    /** The fixed set of days, and the same turned round, so that their mean is nothing. */
    private static double[][] trial() {
        double[][] days = new double[2 * DAYS_TRIED][];
        double[] x = new double[3];
        for (int d = 0; d < DAYS_TRIED; d++) {
            x = Spells.next(x, Spells.draws(TRIAL_KEY, d));
            days[d] = x;
            days[DAYS_TRIED + d] = new double[] {-x[0], -x[1], -x[2]};
        }
        return days;
    }
}

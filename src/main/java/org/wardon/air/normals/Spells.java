package org.wardon.air.normals;

import java.time.LocalDate;
import java.util.HashMap;
import java.util.Map;
import java.util.SplittableRandom;
import org.apache.commons.math3.special.Erf;

/**
 * How far each day's highest, lowest and radiation lie from what is usual, in standard deviations:
 * a first-order autoregression in three dimensions, so that warm, cold, clear and dull days come in
 * spells and clear days are warm by day and cold by night.
 *
 * <p>Source: Richardson and Wright 1984, WGEN: a model for generating daily weather variables,
 * USDA-ARS 8, matrices A and B, means over the United States (from memory), here without its
 * parting of wet from dry days.
 *
 * <p>A day's departure hangs on the seed and the days before it, not on where a run starts: what it
 * sums is drawn for each day of the calendar by itself. Chance alone would put the mean of a month
 * over thirty years some tenths of a kelvin off; so the departures of each calendar day are centred
 * over five years (2026 to 2030) and over five seeds (0 to 4), and wherever whole fives of either
 * are averaged the normals come out.
 */
final class Spells {
    /** Lag-one terms of highest, lowest, radiation. */
    private static final double[][] A = {
        {0.567, 0.086, -0.002}, {0.253, 0.504, -0.050}, {-0.006, -0.039, 0.244}
    };

    /** What a day's own draws bring. */
    private static final double[][] B = {{0.781, 0, 0}, {0.328, 0.637, 0}, {0.238, -0.341, 0.873}};

    /** Years, and seeds, centred together. */
    private static final int FIVE = 5;

    /** Days after which nothing is left of a departure: 0.7 to this power is below 1e-15. */
    private static final int FORGOTTEN_DAYS = 100;

    private static final long DAY_STEP = 0xD1342543DE82EF95L;

    private final long seed;
    private final Map<Integer, Map<Long, Departure>> fives = new HashMap<>();

    /**
     * Departures of a day, standard deviations.
     *
     * @param highest of its highest
     * @param lowest of its lowest
     * @param sun of its radiation
     */
    record Departure(double highest, double lowest, double sun) {
        static final Departure NONE = new Departure(0, 0, 0);
    }

    Spells(long seed) {
        this.seed = seed;
    }

    /** Returns the departures of a day. */
    Departure on(LocalDate day) {
        int five = Math.floorDiv(day.getYear() - 1, FIVE);
        return fives.computeIfAbsent(five, this::five)
                .getOrDefault(day.toEpochDay(), Departure.NONE);
    }

    private Map<Long, Departure> five(int five) {
        LocalDate from = LocalDate.of(five * FIVE + 1, 1, 1);
        int days = (int) (from.plusYears(FIVE).toEpochDay() - from.toEpochDay());
        long firstSeed = Math.floorDiv(seed, (long) FIVE) * FIVE;
        double[][] own = drawn(seed, from, days);
        double[][] all = new double[days][3];
        for (int i = 0; i < FIVE; i++) {
            double[][] one = drawn(firstSeed + i, from, days);
            for (int d = 0; d < days; d++) {
                add(one[d], 1.0 / FIVE, all[d]);
            }
        }
        // Less the mean of the seeds, then less the mean of the years: both then vanish.
        for (int d = 0; d < days; d++) {
            add(all[d], -1, own[d]);
        }
        return centred(own, from);
    }

    private static void add(double[] x, double share, double[] into) {
        for (int i = 0; i < into.length; i++) {
            into[i] += share * x[i];
        }
    }

    private static double[][] drawn(long seed, LocalDate from, int days) {
        long key = new SplittableRandom(seed).nextLong();
        double[][] drawn = new double[days][];
        double[] x = new double[3];
        for (int d = -FORGOTTEN_DAYS; d < days; d++) {
            x = next(x, draws(key, from.toEpochDay() + d));
            if (d >= 0) {
                drawn[d] = x;
            }
        }
        return drawn;
    }

    /** Number of a day of the calendar; 29 February, too rare by itself, goes with the 28th. */
    private static int calendarDay(LocalDate day) {
        int ofMonth =
                day.getMonthValue() == 2 ? Math.min(day.getDayOfMonth(), 28) : day.getDayOfMonth();
        return 32 * day.getMonthValue() + ofMonth;
    }

    /** The autoregression, one day on. */
    static double[] next(double[] x, double[] drawn) {
        double[] next = new double[3];
        for (int i = 0; i < 3; i++) {
            for (int j = 0; j < 3; j++) {
                next[i] += A[i][j] * x[j] + B[i][j] * drawn[j];
            }
        }
        return next;
    }

    /** Three normal numbers that belong to a day. */
    static double[] draws(long key, long epochDay) {
        SplittableRandom random = new SplittableRandom(key + DAY_STEP * epochDay);
        double[] drawn = new double[3];
        for (int i = 0; i < 3; i++) {
            // Never 0 or 1, where the inverse has no value.
            double u = (random.nextLong() >>> 12) * 0x1p-52 + 0x1p-53;
            drawn[i] = Math.sqrt(2) * Erf.erfInv(2 * u - 1);
        }
        return drawn;
    }

    /** Takes the mean off the same calendar day of all years; widens by what centring narrowed. */
    private static Map<Long, Departure> centred(double[][] days, LocalDate from) {
        Map<Integer, double[]> sum = new HashMap<>();
        Map<Integer, Integer> count = new HashMap<>();
        for (int d = 0; d < days.length; d++) {
            int same = calendarDay(from.plusDays(d));
            add(days[d], 1, sum.computeIfAbsent(same, any -> new double[3]));
            count.merge(same, 1, Integer::sum);
        }
        Map<Long, Departure> centred = new HashMap<>();
        for (int d = 0; d < days.length; d++) {
            int same = calendarDay(from.plusDays(d));
            double n = count.getOrDefault(same, 1);
            double[] mean = sum.getOrDefault(same, new double[3]);
            double wider = Math.sqrt(n / (n - 1) * FIVE / (FIVE - 1));
            centred.put(
                    from.toEpochDay() + d,
                    new Departure(
                            wider * (days[d][0] - mean[0] / n),
                            wider * (days[d][1] - mean[1] / n),
                            wider * (days[d][2] - mean[2] / n)));
        }
        return centred;
    }
}

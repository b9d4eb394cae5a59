package org.wardon.keeping.experience;

import java.util.List;
import org.apache.commons.math3.distribution.NormalDistribution;

/**
 * What is believed of the level of life in a store, in standard deviations of the published spread.
 *
 * <p>Before anything is seen the level is standard normal: the published spread. A life seen is
 * normal about the level, so the two give a normal level again (the conjugate pair of a normal mean
 * and normal figures); a life known only to be longer than a time brings the level the probability
 * of being longer, and the level stands on a grid.
 *
 * <p>The next lot lies off the level as lots differ. How much of the published spread lies between
 * lots nobody prints; so as far as the level is still as open as in print, the published spread
 * holds, and as far as it is known, the spread between lots takes its place: the square of a lot's
 * distance is that of the level plus r (1 - V), r the square of the spread between lots and V that
 * of the level. Nothing seen leaves exactly what is published; however many lots are seen, the next
 * one stays spread as lots are.
 */
public final class Belief {
    private static final double LEAST_VARIANCE = 1e-12;
    private static final NormalDistribution NORMAL = new NormalDistribution(null, 0, 1);

    /**
     * One thing seen.
     *
     * @param z life seen, standard deviations of the published spread
     * @param variance how far it may lie from the store's level, square of the same
     * @param atLeast whether the life was at least as long
     */
    public record Reading(double z, double variance, boolean atLeast) {
        /** Keeps the variance above nothing. */
        public Reading {
            variance = Math.max(LEAST_VARIANCE, variance);
        }
    }

    private final LevelGrid.Level level;

    private Belief(LevelGrid.Level level) {
        this.level = level;
    }

    /**
     * Returns the belief after some readings; their order does not matter.
     *
     * @param readings what was seen
     * @return the belief
     */
    public static Belief after(List<Reading> readings) {
        double precision = 1;
        double pull = 0;
        for (Reading seen : readings) {
            if (!seen.atLeast()) {
                precision += 1 / seen.variance();
                pull += seen.z() / seen.variance();
            }
        }
        List<Reading> bounds = readings.stream().filter(Reading::atLeast).toList();
        double mean = pull / precision;
        double deviation = Math.sqrt(1 / precision);
        return new Belief(
                bounds.isEmpty()
                        ? new LevelGrid.Normal(mean, deviation)
                        : new LevelGrid(mean, deviation, bounds).level());
    }

    /**
     * Returns the level at a place in its spread.
     *
     * @param z standard normal: 0 for the middle
     * @return standard deviations of the published spread
     */
    public double level(double z) {
        return level.quantile(z, NORMAL.cumulativeProbability(z));
    }

    /**
     * Returns the next lot.
     *
     * @param z its place among lots, standard normal: 0 for the middle
     * @param spread the published spread
     * @return standard deviations of the published spread
     */
    public double lot(double z, LevelSpread spread) {
        double middle = level(0);
        double away = level(z) - middle;
        double lots = Math.min(1, LevelSpread.BETWEEN_LOTS / spread.side(middle + away));
        double open = Math.min(1, level.variance());
        double square = away * away + lots * lots * z * z * (1 - open);
        return middle + Math.copySign(Math.sqrt(square), z);
    }
}

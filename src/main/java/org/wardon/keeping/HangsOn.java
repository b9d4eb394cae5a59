package org.wardon.keeping;

import java.util.Arrays;
import java.util.List;
import java.util.Optional;
import java.util.function.ToDoubleFunction;
import org.apache.commons.math3.stat.correlation.SpearmansCorrelation;

/**
 * The published range the days left of a lot hang on most: the one whose order along the draws
 * explains most of the order of the days (Spearman's rank correlation, squared).
 *
 * @param range the range
 * @param share share of the order of the days it explains, 0 to 1
 */
public record HangsOn(Range range, double share) {
    /** Below this share, and what chance does with few draws beside it, nothing is named. */
    private static final double LEAST_SHARE = 0.2;

    /** Draws times the share that chance alone explains once in a few hundred times. */
    private static final double BY_CHANCE = 6;

    private static final int LEAST_DRAWS = 16;

    /** Ranges of a draw. */
    public enum Range {
        /** How long the crop keeps. */
        LIFE_LEVEL("life-level", Draw::lifeLevel),
        /** How much faster it ages in warmth. */
        SLOPE("slope", Draw::slope),
        /** How much cold it bears. */
        CHILLING("chilling", Draw::chilling),
        /** How fast it loses water. */
        TRANSPIRATION("transpiration", Draw::transpiration),
        /** How much heat it breathes. */
        RESPIRATION("respiration", Draw::respiration),
        /** How fast its package cools. */
        PACKAGING("packaging", Draw::packaging),
        /** How old it was at the door. */
        DELAY("delay", Draw::delay),
        /** How clean the air of the published trials was. */
        ETHYLENE_REFERENCE("ethylene-reference", Draw::ethyleneReference),
        /** How much ethylene is given off. */
        ETHYLENE_GIVEN("ethylene-given", Draw::ethyleneGiven),
        /** How warm the way to market is. */
        MARKET("market", Draw::market),
        /** How long it stays good once ripe. */
        RIPENING("ripening", Draw::ripening),
        /** How long it rests before it sprouts. */
        DORMANCY("dormancy", Draw::dormancy),
        /** What a lot that may not be cured still keeps. */
        CURING("curing", Draw::curing),
        /** How fast it ripens. */
        RIPENING_PACE("ripening-pace", Draw::ripeningPace);

        private final String word;
        private final ToDoubleFunction<Draw> quantile;

        Range(String word, ToDoubleFunction<Draw> quantile) {
            this.word = word;
            this.quantile = quantile;
        }

        /**
         * Returns the range's name in answers.
         *
         * @return its code
         */
        public String word() {
            return word;
        }

        double quantile(Draw draw) {
            return quantile.applyAsDouble(draw);
        }
    }

    /**
     * Returns what days hang on most.
     *
     * @param draws the draws
     * @param days days left in each
     * @return the range; empty where the days do not differ, draws are few, or none stands out
     */
    static Optional<HangsOn> of(List<Draw> draws, double[] days) {
        boolean alike = Arrays.stream(days).allMatch(one -> one == days[0]);
        if (alike || draws.size() < LEAST_DRAWS) {
            return Optional.empty();
        }
        SpearmansCorrelation ranks = new SpearmansCorrelation();
        Range strongest = Range.LIFE_LEVEL;
        double most = 0;
        for (Range range : Range.values()) {
            double[] along = draws.stream().mapToDouble(range::quantile).toArray();
            double correlation = ranks.correlation(along, days);
            if (correlation * correlation > most) {
                most = correlation * correlation;
                strongest = range;
            }
        }
        return most >= LEAST_SHARE ? Optional.of(new HangsOn(strongest, most)) : Optional.empty();
    }
}

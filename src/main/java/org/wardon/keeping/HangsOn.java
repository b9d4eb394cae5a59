package org.wardon.keeping;

import java.util.Arrays;
import java.util.List;
import java.util.Optional;
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
        LIFE_LEVEL("life-level"),
        /** How much faster it ages in warmth. */
        SLOPE("slope"),
        /** How much cold it bears. */
        CHILLING("chilling"),
        /** How fast it loses water. */
        TRANSPIRATION("transpiration"),
        /** How much heat it breathes. */
        RESPIRATION("respiration"),
        /** How fast its package cools. */
        PACKAGING("packaging"),
        /** How old it was at the door. */
        DELAY("delay"),
        /** How clean the air of the published trials was. */
        ETHYLENE_REFERENCE("ethylene-reference"),
        /** How much ethylene is given off. */
        ETHYLENE_GIVEN("ethylene-given"),
        /** How warm the way to market is. */
        MARKET("market"),
        /** How long it stays good once ripe. */
        RIPENING("ripening"),
        /** How long it rests before it sprouts. */
        DORMANCY("dormancy"),
        /** What a lot that may not be cured still keeps. */
        CURING("curing"),
        /** How fast it ripens. */
        RIPENING_PACE("ripening-pace");

        private final String word;

        Range(String word) {
            this.word = word;
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
            return switch (this) {
                case LIFE_LEVEL -> draw.lifeLevel();
                case SLOPE -> draw.slope();
                case CHILLING -> draw.chilling();
                case TRANSPIRATION -> draw.transpiration();
                case RESPIRATION -> draw.respiration();
                case PACKAGING -> draw.packaging();
                case DELAY -> draw.delay();
                case ETHYLENE_REFERENCE -> draw.ethyleneReference();
                case ETHYLENE_GIVEN -> draw.ethyleneGiven();
                case MARKET -> draw.market();
                case RIPENING -> draw.ripening();
                case DORMANCY -> draw.dormancy();
                case CURING -> draw.curing();
                case RIPENING_PACE -> draw.ripeningPace();
            };
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
        return most >= LEAST_SHARE + BY_CHANCE / draws.size()
                ? Optional.of(new HangsOn(strongest, most))
                : Optional.empty();
    }
}

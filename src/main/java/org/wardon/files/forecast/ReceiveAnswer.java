package org.wardon.files.forecast;

import java.time.LocalDateTime;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;

/**
 * The answer of {@code receive}: where a lot that comes to the door goes.
 *
 * @param lot id it would have in the plan
 * @param commodity id of the commodity
 * @param massKg its mass, kg
 * @param at local time it comes
 * @param sentence what to do, for a keeper
 * @param choices all that can be done with it, best first
 * @param assumed what nobody gave and was taken instead
 * @param notes what to know of the lot wherever it goes
 * @param draws how many draws of the published ranges stand behind the ranges of days
 */
public record ReceiveAnswer(
        String lot,
        String commodity,
        double massKg,
        LocalDateTime at,
        String sentence,
        List<Choice> choices,
        List<Because> assumed,
        List<Because> notes,
        int draws) {
    /** The lot goes into a chamber. */
    public static final String CHAMBER = "chamber";

    /** The lot stays in the shade. */
    public static final String SHADE = "shade";

    /** The lot is sold at once. */
    public static final String SELL_NOW = "sell-now";

    /** Copies the lists. */
    public ReceiveAnswer {
        choices = List.copyOf(choices);
        assumed = List.copyOf(assumed);
        notes = List.copyOf(notes);
    }

    /**
     * One thing that can be done with the lot.
     *
     * @param kind {@code chamber}, {@code shade} or {@code sell-now}
     * @param chamber id of the chamber; absent where there is none
     * @param verdict {@code good}, {@code tolerable} or {@code no}
     * @param text why it is the best, or why it is not
     * @param reasons what speaks against it
     * @param keeps how the lot keeps there
     * @param worth what it is worth
     * @param inside what happens in the chamber; absent where there is none
     */
    public record Choice(
            String kind,
            Optional<String> chamber,
            String verdict,
            String text,
            List<Because> reasons,
            Keeps keeps,
            Worth worth,
            Optional<Inside> inside) {
        /** Copies the list. */
        public Choice {
            reasons = List.copyOf(reasons);
        }

        /**
         * Returns the choice with its sentence.
         *
         * @param other the sentence
         * @return the changed copy
         */
        public Choice because(String other) {
            return new Choice(kind, chamber, verdict, other, reasons, keeps, worth, inside);
        }
    }

    /**
     * How the lot keeps.
     *
     * @param daysLeft days it keeps from now
     * @param limitedBy the mechanism that ends it first
     * @param chillingRisk risk of injury by cold
     * @param coolHalfHours time until half cooled, h; absent where it has nothing to cool or does
     *     not get there
     * @param coolSevenEighthsHours time until seven-eighths cooled, h; likewise
     */
    public record Keeps(
            Quantiles daysLeft,
            String limitedBy,
            ChillingRisk chillingRisk,
            OptionalDouble coolHalfHours,
            OptionalDouble coolSevenEighthsHours) {}

    /**
     * What a choice is worth.
     *
     * @param valueKept value of the lot when sold, currency
     * @param othersLose value the lots that stand there lose, currency
     * @param energyCost what its cooling costs more, currency
     * @param net the first less the others, currency
     */
    public record Worth(double valueKept, double othersLose, double energyCost, double net) {
        /**
         * Adds up.
         *
         * @param valueKept value of the lot when sold, currency
         * @param othersLose value the lots that stand there lose, currency
         * @param energyCost what its cooling costs more, currency
         * @return with their net
         */
        public static Worth of(double valueKept, double othersLose, double energyCost) {
            return new Worth(
                    valueKept, othersLose, energyCost, valueKept - othersLose - energyCost);
        }
    }

    /**
     * What happens in the chamber.
     *
     * @param holds whether it holds its setting with the lot
     * @param heldBefore whether it holds without it
     * @param airRisesK by how much its hourly air rises at most through the lot, K
     * @param airRisesUntil when that is over; absent where it never was half a kelvin
     * @param freeKg mass it still takes with the lot in it, kg; below 0 where it is too full
     * @param freeM3 of its volume, what is not stowed yet at 150 kg a gross m3, m3; likewise
     * @param lots the lots that stand there meanwhile
     */
    public record Inside(
            boolean holds,
            boolean heldBefore,
            double airRisesK,
            Optional<LocalDateTime> airRisesUntil,
            double freeKg,
            double freeM3,
            List<OfLot> lots) {
        /** Copies the list. */
        public Inside {
            lots = List.copyOf(lots);
        }
    }

    /**
     * What the new lot does to one that stands there.
     *
     * @param id the lot
     * @param daysLeft days it keeps from now on with the new lot beside it
     * @param daysLost what the new lot costs it, draw by draw, likely
     * @param warmsK by how much it warms at most through the new lot, K
     * @param ethylenePpm mean ethylene around it with the new lot, ppm
     * @param ethylenePpmBefore the same without it, ppm
     * @param tooWarmByDoor whether it comes to stand too warm at the door end
     */
    public record OfLot(
            String id,
            Quantiles daysLeft,
            double daysLost,
            double warmsK,
            double ethylenePpm,
            double ethylenePpmBefore,
            boolean tooWarmByDoor) {}
}

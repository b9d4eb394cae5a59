package org.wardon.advice.size;

import java.util.List;
import org.wardon.errors.Require;
import org.wardon.produce.Reason;

/**
 * The design heat load of a cold room: the sum of its terms over a day, raised by a margin, to be
 * taken within the hours a day the plant may run.
 *
 * <p>Source: the hand method of the handbooks (ASHRAE Handbook - Refrigeration, chapter on
 * refrigerated-facility loads; Dossat, Principles of Refrigeration, cooling-load chapter), from
 * memory of both.
 *
 * @param terms each heat that comes in or is given off inside
 * @param safetyPct margin on the sum, percent, 0 to 100
 * @param runningHoursPerDay hours a day the plant cools, 1 to 24
 */
public record DesignLoad(List<Term> terms, double safetyPct, double runningHoursPerDay) {
    /** Margin on the sum, percent. Source: internal loads, row safety_factor (ASHRAE-R, memory). */
    public static final double USUAL_SAFETY_PCT = 10;

    /** Hours a day the plant cools where room air defrosts the coil (common practice). */
    public static final double AIR_DEFROST_HOURS = 16;

    /** Hours a day the plant cools where heaters defrost the coil (common practice). */
    public static final double HEATER_DEFROST_HOURS = 20;

    private static final double DAY_H = 24;

    /** What a term stands for. */
    public enum Kind {
        /** Through a face, sunshine included. */
        TRANSMISSION,
        /** Outdoor air that comes in by door and leakage. */
        AIR_CHANGE,
        /** Field heat of produce that comes in warm. */
        PRODUCT,
        /** Heat of the packages that come in with it. */
        PACKAGES,
        /** Breathing of the produce. */
        RESPIRATION,
        /** Lights. */
        LIGHTS,
        /** People. */
        PEOPLE,
        /** Fans of the coolers and others. */
        FANS,
        /** Heat of the defrost that stays in the room. */
        DEFROST
    }

    /**
     * One term of the sum.
     *
     * @param kind what it stands for
     * @param meanW mean of the day, W, positive into the room
     * @param formula its formula with its figures, and the source of the formula
     */
    public record Term(Kind kind, double meanW, Reason formula) {
        /** Refuses a figure that is none. */
        public Term {
            Require.within("load of " + formula.code(), meanW, -1e9, 1e9, "W", "");
        }

        /**
         * Returns the heat of a day.
         *
         * @return kWh
         */
        public double kilowattHoursPerDay() {
            return meanW * DAY_H / 1_000;
        }
    }

    /** Copies the terms and checks the bounds. */
    public DesignLoad {
        terms = List.copyOf(terms);
        Require.that(!terms.isEmpty(), "a design load needs at least one term");
        Require.within("safetyPct", safetyPct, 0, 100, "%", "Give the margin on the sum.");
        Require.within(
                "runningHoursPerDay",
                runningHoursPerDay,
                1,
                DAY_H,
                "h",
                "Give 16, 20 or your own.");
    }

    /**
     * Returns the hours a day the plant may be counted on (common practice, no source).
     *
     * @param heaterDefrost whether heaters defrost the coil; else room air does
     * @return h
     */
    public static double runningHours(boolean heaterDefrost) {
        return heaterDefrost ? HEATER_DEFROST_HOURS : AIR_DEFROST_HOURS;
    }

    /**
     * Returns the sum of all terms, the mean of the day without margin.
     *
     * @return W
     */
    public double meanW() {
        return terms.stream().mapToDouble(Term::meanW).sum();
    }

    /**
     * Returns the sum of one kind.
     *
     * @param kind which
     * @return W
     */
    public double meanW(Kind kind) {
        return terms.stream().filter(t -> t.kind == kind).mapToDouble(Term::meanW).sum();
    }

    /**
     * Returns the heat of a day with its margin.
     *
     * @return kWh
     */
    public double kilowattHoursPerDay() {
        return meanW() * (1 + safetyPct / 100) * DAY_H / 1_000;
    }

    /**
     * Returns the capacity the plant needs while it runs.
     *
     * @return W
     */
    public double requiredW() {
        return kilowattHoursPerDay() * 1_000 / runningHoursPerDay;
    }
}

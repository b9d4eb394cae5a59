package org.wardon.files.forecast;

import java.util.List;
import java.util.OptionalDouble;

/**
 * The answer of {@code advise}.
 *
 * @param forecast version of the format, 1
 * @param chambers a chamber each, in the order of the plan
 * @param value money
 * @param lots a lot each
 * @param sharing a chamber each that holds more than one lot
 * @param warnings what to beware of
 * @param actions what to do, first things first
 */
public record Forecast(
        int forecast,
        List<ChamberForecast> chambers,
        Value value,
        List<LotForecast> lots,
        List<Sharing> sharing,
        List<Warning> warnings,
        List<Action> actions) {
    /** Version of the format. */
    public static final int VERSION = 1;

    /** Copies the lists. */
    public Forecast {
        chambers = List.copyOf(chambers);
        lots = List.copyOf(lots);
        sharing = List.copyOf(sharing);
        warnings = List.copyOf(warnings);
        actions = List.copyOf(actions);
    }

    /**
     * Money of the whole plan.
     *
     * @param kept value of the lots at the end of their market legs, currency
     * @param energyCost cost of energy, currency
     * @param net the first less the second, currency
     */
    public record Value(double kept, double energyCost, double net) {}

    /**
     * Whether the lots of a chamber may share it.
     *
     * @param chamber its id
     * @param verdict {@code good}, {@code tolerable} or {@code no}
     * @param reasons why
     * @param accepted what conflicts cost that the keeper accepts, told among the reasons too
     */
    public record Sharing(
            String chamber,
            String verdict,
            List<Because> reasons,
            List<ShareAnswer.Accepted> accepted) {
        /** Copies the lists. */
        public Sharing {
            reasons = List.copyOf(reasons);
            accepted = List.copyOf(accepted);
        }
    }

    /**
     * Something to beware of.
     *
     * @param code its code
     * @param level {@code note}, {@code caution} or {@code danger}
     * @param subject id of the lot or chamber
     * @param text the sentence
     * @param source what it rests on
     */
    public record Warning(String code, String level, String subject, String text, String source) {}

    /**
     * Something to do.
     *
     * @param order place in the list, from 1
     * @param text the sentence
     * @param subject id of the lot or chamber
     * @param gainDays days it gains; absent where there is no answer
     * @param gainValue value it gains, currency; absent where there is no answer
     */
    public record Action(
            int order,
            String text,
            String subject,
            OptionalDouble gainDays,
            OptionalDouble gainValue) {}
}

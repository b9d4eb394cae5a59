package org.wardon.sharing;

import java.util.List;
import java.util.OptionalDouble;
import org.wardon.produce.Conflict;
import org.wardon.produce.Reason;
import org.wardon.produce.Reason.Argument;

/**
 * What a conflict that is accepted costs a lot.
 *
 * @param conflict what is accepted
 * @param id the lot that bears it
 * @param from id of the lot it comes from; of ethylene, the one that gives most
 * @param daysLost days of its life, in the middle of its range; empty where it cannot be counted
 * @param days days together
 */
public record Price(
        Conflict conflict, String id, String from, OptionalDouble daysLost, double days) {
    /** Days of life below this are not worth a word. */
    public static final double LEAST_DAYS = 0.05;

    private static final String RULE = "assumption";

    /**
     * Returns it as a reason to be put into words.
     *
     * @return what is borne, from whom, at what price
     */
    public Reason told() {
        List<String> subjects = List.of(id, from);
        Argument together = Argument.of(days, "day");
        return conflict == Conflict.ODOUR
                ? new Reason("borne-odour", subjects, List.of(together), RULE)
                : new Reason(
                        "borne-ethylene",
                        subjects,
                        List.of(Argument.of(daysLost.orElse(0), "day"), together),
                        RULE);
    }
}

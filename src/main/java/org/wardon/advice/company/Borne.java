package org.wardon.advice.company;

import java.util.ArrayList;
import java.util.EnumSet;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import java.util.stream.Collectors;
import org.wardon.advice.wording.Words;
import org.wardon.errors.BadInput;
import org.wardon.errors.Fault;
import org.wardon.files.forecast.ShareAnswer;
import org.wardon.produce.Conflict;
import org.wardon.produce.Reason;
import org.wardon.produce.Reason.Argument;
import org.wardon.sharing.Price;

/** Conflicts a keeper accepts, and what is told of them. */
public final class Borne {
    private static final String RULE = "assumption";

    /** What lots do to each other; that one is not cured is between it and the cold. */
    private static final List<Conflict> OF_LOTS = List.of(Conflict.ETHYLENE, Conflict.ODOUR);

    private Borne() {}

    /**
     * Reads the words of an option.
     *
     * @param option name of the option, for messages
     * @param words as typed
     * @return what is accepted
     * @throws BadInput with one fault a word that names no conflict of sharing
     */
    public static Set<Conflict> named(String option, List<String> words) {
        Set<Conflict> accepted = EnumSet.noneOf(Conflict.class);
        List<Fault> faults = new ArrayList<>();
        for (String word : words) {
            Optional<Conflict> found =
                    OF_LOTS.stream()
                            .filter(one -> one.word().equalsIgnoreCase(word.strip()))
                            .findFirst();
            found.ifPresentOrElse(
                    accepted::add,
                    () ->
                            faults.add(
                                    new Fault(
                                            option,
                                            "",
                                            "'" + word + "' is no conflict of lots",
                                            "accepted: " + all())));
        }
        if (!faults.isEmpty()) {
            throw new BadInput(faults);
        }
        return accepted;
    }

    private static String all() {
        return OF_LOTS.stream().map(Conflict::word).collect(Collectors.joining(", "));
    }

    static Reason told(Price price) {
        List<String> subjects = List.of(price.id(), price.from());
        Argument days = Argument.of(price.days(), "day");
        return price.conflict() == Conflict.ODOUR
                ? new Reason("borne-odour", subjects, List.of(days), RULE)
                : new Reason(
                        "borne-ethylene",
                        subjects,
                        List.of(Argument.of(price.daysLost().orElse(0), "day"), days),
                        RULE);
    }

    static ShareAnswer.Accepted answer(Price price, Words words) {
        return new ShareAnswer.Accepted(
                price.conflict().word(),
                price.id(),
                price.from(),
                price.daysLost(),
                words.sentence(told(price)));
    }
}

package org.wardon.advice.company;

import java.util.ArrayList;
import java.util.EnumSet;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import org.wardon.errors.BadInput;
import org.wardon.errors.Fault;
import org.wardon.files.json.Nearest;
import org.wardon.produce.Conflict;

/** Conflicts a keeper accepts, as they are named on the command line and in a request. */
public final class Borne {
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
                                            Nearest.question(word.strip(), all())
                                                    + "accepted: "
                                                    + String.join(", ", all()))));
        }
        if (!faults.isEmpty()) {
            throw new BadInput(faults);
        }
        return accepted;
    }

    private static List<String> all() {
        return OF_LOTS.stream().map(Conflict::word).toList();
    }
}

package org.wardon.advice.company;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.EnumSet;
import java.util.HashSet;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import org.wardon.errors.BadInput;
import org.wardon.errors.Fault;
import org.wardon.files.json.Nearest;
import org.wardon.plan.ChamberPlan;
import org.wardon.plan.PlaceWish;
import org.wardon.plan.StorePlan;
import org.wardon.produce.Conflict;

/** Conflicts a keeper accepts, as they are named on the command line and in a request. */
public final class Borne {
    /** What lots do to each other; that one is not cured is between it and the cold. */
    private static final List<Conflict> OF_LOTS = List.of(Conflict.ETHYLENE, Conflict.ODOUR);

    private static final List<Conflict> OF_PLANS = Arrays.asList(Conflict.values());

    private Borne() {}

    /**
     * Reads the words of an option about lots that share a chamber.
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
            conflict(word, OF_LOTS)
                    .ifPresentOrElse(
                            accepted::add,
                            () -> faults.add(strange(option, "", word, "of lots", OF_LOTS)));
        }
        refuse(faults);
        return accepted;
    }

    /**
     * Reads the words of an option about a plan: a conflict alone is accepted in all its chambers,
     * {@code CHAMBER:CONFLICT} in one.
     *
     * @param option name of the option, for messages
     * @param words as typed
     * @param plan the plan
     * @return the plan accepting these beside what it accepts already
     * @throws BadInput with one fault a word that names no chamber of the plan or no conflict
     */
    public static StorePlan within(String option, List<String> words, StorePlan plan) {
        Set<Conflict> everywhere = new HashSet<>(plan.wish().accepts());
        Map<String, Set<Conflict>> there = new LinkedHashMap<>();
        for (ChamberPlan chamber : plan.chambers()) {
            there.put(chamber.id(), new HashSet<>(chamber.use().accepts()));
        }
        List<Fault> faults = new ArrayList<>();
        for (String word : words) {
            int colon = word.lastIndexOf(':');
            String chamber = word.substring(0, Math.max(0, colon)).strip();
            String named = word.substring(colon + 1);
            Optional<Conflict> found = conflict(named, OF_PLANS);
            Set<Conflict> accepted = colon < 0 ? everywhere : there.get(chamber);
            if (accepted == null) {
                faults.add(stranger(option, chamber, plan));
            }
            if (found.isEmpty()) {
                String in = colon < 0 ? "" : chamber;
                faults.add(strange(option, in, named, "a keeper accepts", OF_PLANS));
            } else if (accepted != null) {
                accepted.add(found.get());
            }
        }
        refuse(faults);
        PlaceWish wish = plan.wish();
        List<ChamberPlan> chambers =
                plan.chambers().stream()
                        .map(one -> one.accepting(there.getOrDefault(one.id(), Set.of())))
                        .toList();
        return plan.with(chambers, plan.lots())
                .wishing(new PlaceWish(wish.aim(), wish.lots(), everywhere));
    }

    private static Optional<Conflict> conflict(String word, List<Conflict> among) {
        return among.stream().filter(one -> one.word().equalsIgnoreCase(word.strip())).findFirst();
    }

    private static Fault strange(
            String option, String chamber, String word, String whose, List<Conflict> among) {
        List<String> all = among.stream().map(Conflict::word).toList();
        return new Fault(
                option,
                chamber,
                "'" + word + "' is no conflict " + whose,
                Nearest.question(word.strip(), all) + "accepted: " + String.join(", ", all));
    }

    private static Fault stranger(String option, String chamber, StorePlan plan) {
        List<String> all = plan.chambers().stream().map(ChamberPlan::id).toList();
        return new Fault(
                option,
                "",
                "the plan has no chamber '" + chamber + "'",
                Nearest.question(chamber, all) + "accepted: " + String.join(", ", all));
    }

    private static void refuse(List<Fault> faults) {
        if (!faults.isEmpty()) {
            throw new BadInput(faults);
        }
    }
}

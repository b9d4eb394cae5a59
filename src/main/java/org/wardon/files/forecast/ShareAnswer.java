package org.wardon.files.forecast;

import java.time.LocalDateTime;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.SortedMap;
import java.util.TreeMap;

/**
 * The answer of {@code share}.
 *
 * @param verdict {@code good}, {@code tolerable} or {@code no}
 * @param workableC temperatures at which all reach their days, °C; absent where none
 * @param workableHumidityPct humidities likewise, percent; absent where none
 * @param pairs every pair of those that are there at one time
 * @param compromise the nearest compromise; absent where one setting suits all, or every one
 *     freezes or chills one of them
 * @param takeOut id of the one without which the others may share; absent where all may, or where
 *     taking out one does not help
 * @param spells times in which different lots stand together, each with what suits them; empty
 *     where all are there at one time
 * @param accepted what conflicts that are accepted cost
 */
public record ShareAnswer(
        String verdict,
        Optional<Bounds> workableC,
        Optional<Bounds> workableHumidityPct,
        List<Pair> pairs,
        Optional<Compromise> compromise,
        Optional<String> takeOut,
        List<Spell> spells,
        List<Accepted> accepted) {
    /** Copies the lists. */
    public ShareAnswer {
        pairs = List.copyOf(pairs);
        spells = List.copyOf(spells);
        accepted = List.copyOf(accepted);
    }

    /**
     * Two that would share.
     *
     * @param a one of them
     * @param b the other
     * @param verdict {@code good}, {@code tolerable} or {@code no}
     * @param reasons why
     */
    public record Pair(String a, String b, String verdict, List<Because> reasons) {
        /** Copies the list. */
        public Pair {
            reasons = List.copyOf(reasons);
        }
    }

    /**
     * A time in which the same lots stand together.
     *
     * @param from since when all of them are there, local time
     * @param to until when, local time
     * @param lots who they are
     * @param verdict {@code good}, {@code tolerable} or {@code no}, by the setting alone
     * @param workableC temperatures at which they reach their days, °C; absent where none
     * @param workableHumidityPct humidities likewise, percent; absent where none
     */
    public record Spell(
            LocalDateTime from,
            LocalDateTime to,
            List<String> lots,
            String verdict,
            Optional<Bounds> workableC,
            Optional<Bounds> workableHumidityPct) {
        /** Copies the list. */
        public Spell {
            lots = List.copyOf(lots);
        }
    }

    /**
     * What a conflict that is accepted costs.
     *
     * @param conflict {@code ethylene} or {@code odour}
     * @param lot who bears it
     * @param by who it comes from; of ethylene, who gives most
     * @param daysLost days of its life in the middle of its range; absent where it cannot be
     *     counted
     * @param text it in plain words
     */
    public record Accepted(
            String conflict, String lot, String by, OptionalDouble daysLost, String text) {}

    /**
     * The nearest compromise.
     *
     * @param atC temperature, °C
     * @param humidityPct humidity, percent
     * @param daysLost what it costs whom, days by id
     */
    public record Compromise(double atC, double humidityPct, Map<String, Double> daysLost) {
        /** Copies the map in the order of its ids. */
        public Compromise {
            SortedMap<String, Double> sorted = new TreeMap<>(daysLost);
            daysLost = java.util.Collections.unmodifiableSortedMap(sorted);
        }
    }
}

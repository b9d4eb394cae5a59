package org.wardon.files.forecast;

import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.SortedMap;
import java.util.TreeMap;

/**
 * The answer of {@code share}.
 *
 * @param verdict {@code good}, {@code tolerable} or {@code no}
 * @param workableC temperatures at which all reach their days, °C; absent where none
 * @param workableHumidityPct humidities likewise, percent; absent where none
 * @param pairs every pair
 * @param compromise the nearest compromise; absent where one setting suits all, or every one
 *     freezes or chills one of them
 * @param takeOut id of the one without which the others may share; absent where all may, or where
 *     taking out one does not help
 */
public record ShareAnswer(
        String verdict,
        Optional<Bounds> workableC,
        Optional<Bounds> workableHumidityPct,
        List<Pair> pairs,
        Optional<Compromise> compromise,
        Optional<String> takeOut) {
    /** Copies the list. */
    public ShareAnswer {
        pairs = List.copyOf(pairs);
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

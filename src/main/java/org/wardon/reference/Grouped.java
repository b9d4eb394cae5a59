package org.wardon.reference;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;

/**
 * Rows of a table by the commodity they speak of.
 *
 * @param byCommodity rows in the order they were read, by id
 */
record Grouped<T>(Map<String, List<T>> byCommodity) {
    /** Groups what was read; a row without a value is left out. */
    static <T> Grouped<T> of(List<Map.Entry<String, Optional<T>>> read) {
        Map<String, List<T>> byCommodity = new HashMap<>();
        read.forEach(
                row ->
                        row.getValue()
                                .ifPresent(
                                        value ->
                                                byCommodity
                                                        .computeIfAbsent(
                                                                row.getKey(),
                                                                id -> new ArrayList<>())
                                                        .add(value)));
        return new Grouped<>(byCommodity);
    }

    /** Returns the rows of a commodity; none if the table does not name it. */
    List<T> of(String id) {
        return byCommodity.getOrDefault(id, List.of());
    }
}

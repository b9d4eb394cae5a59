package org.wardon.reference;

import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.function.Function;

/**
 * Which commodities are read: one, or all in one pass of each table. Both go through the same
 * queries and readings; only the condition differs.
 *
 * @param database the tables
 * @param id the one commodity; empty for all
 */
record Selection(ReferenceDatabase database, Optional<String> id) {
    static Selection all(ReferenceDatabase database) {
        return new Selection(database, Optional.empty());
    }

    static Selection one(ReferenceDatabase database, String id) {
        return new Selection(database, Optional.of(id));
    }

    /** Returns the rows by commodity, each in the order of the query. */
    <T> Grouped<T> rows(Query query, Function<Row, T> reading) {
        return present(query, reading.andThen(Optional::of));
    }

    /** Returns the rows that have a value by commodity, each in the order of the query. */
    <T> Grouped<T> present(Query query, Function<Row, Optional<T>> reading) {
        Function<Row, Map.Entry<String, Optional<T>>> named =
                row -> Map.entry(row.text(Query.COMMODITY), reading.apply(row));
        return Grouped.of(list(query, named));
    }

    /** Returns the rows of the commodities selected as one list, in the order of the query. */
    <T> List<T> list(Query query, Function<Row, T> reading) {
        return id.map(one -> database.list(query.ofOne(), reading, one))
                .orElseGet(() -> database.list(query.ofAll(), reading));
    }

    /** Returns the rows that have a value under one name, such as those for any commodity. */
    <T> Grouped<T> general(String name, Query query, Function<Row, Optional<T>> reading) {
        return one(database, name).present(query, reading);
    }
}

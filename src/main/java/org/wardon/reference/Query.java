package org.wardon.reference;

/**
 * A question to the tables whose rows each speak of one commodity.
 *
 * @param columns what to read, {@code *} for all
 * @param from table or join
 * @param commodity column that holds the id of the commodity
 * @param order columns to sort by
 */
record Query(String columns, String from, String commodity, String order) {
    /** Label under which an answer carries the id of the commodity. */
    static final String COMMODITY = "speaks_of";

    /** Returns the question for all columns of a table in its own order. */
    static Query table(String table) {
        return new Query("*", table, "commodity_id", "line");
    }

    String ofAll() {
        return select() + " order by " + order;
    }

    String ofOne() {
        return select() + " where " + commodity + " = ? order by " + order;
    }

    private String select() {
        return "select " + columns + ", " + commodity + " as " + COMMODITY + " from " + from;
    }
}

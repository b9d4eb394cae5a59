package org.wardon.reference;

import java.sql.ResultSet;
import java.sql.SQLException;
import java.util.Arrays;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.function.Function;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import java.util.stream.Collectors;
import org.wardon.produce.Evidence;
import org.wardon.produce.Fact;

/** One row of an answer of a database, read by column name. */
final class Row {
    /** What stands for a source where a table rests on the practice of the trade. */
    static final String PRACTICE = "common-practice";

    /** What stands for a source where a row is an assumption. */
    static final String ASSUMPTION = "assumption";

    private static final Map<String, Evidence> EVIDENCE =
            Arrays.stream(Evidence.values())
                    .collect(Collectors.toMap(Evidence::word, Function.identity()));
    private static final Pattern RANGE = Pattern.compile("([0-9.]+)-([0-9.]+)");
    private static final Pattern NUMBER = Pattern.compile("-?[0-9]+(\\.[0-9]+)?");

    private final ResultSet results;
    private final Map<String, Integer> columns;

    Row(ResultSet results, Map<String, Integer> columns) {
        this.results = results;
        this.columns = columns;
    }

    /** Where a column stands; the driver's own search by name costs more than the cell. */
    private int place(String column) {
        Integer place = columns.get(column);
        if (place == null) {
            throw new IllegalStateException("no column " + column + " in " + columns.keySet());
        }
        return place;
    }

    /** Returns the text; an empty cell is an empty text. */
    String text(String column) {
        try {
            String text = results.getString(place(column));
            return text == null ? "" : text;
        } catch (SQLException e) {
            throw new IllegalStateException("no text in column " + column, e);
        }
    }

    OptionalDouble number(String column) {
        try {
            double value = results.getDouble(place(column));
            return results.wasNull() ? OptionalDouble.empty() : OptionalDouble.of(value);
        } catch (SQLException e) {
            throw new IllegalStateException("no number in column " + column, e);
        }
    }

    /** Returns a figure that every row of the table has. */
    double value(String column) {
        return number(column)
                .orElseThrow(() -> new IllegalStateException("empty cell in column " + column));
    }

    Evidence evidence() {
        return evidence("evidence");
    }

    Evidence evidence(String column) {
        String word = text(column);
        Evidence evidence = EVIDENCE.get(word);
        if (evidence == null) {
            throw new IllegalStateException("no evidence called '" + word + "'");
        }
        return evidence;
    }

    /**
     * Returns the source; a row without one rests on the practice of the trade or an assumption.
     */
    String source() {
        if (columns.containsKey("source_id") && !text("source_id").isEmpty()) {
            return text("source_id");
        }
        return evidence() == Evidence.PRACTICE ? PRACTICE : ASSUMPTION;
    }

    /** Returns the figure or range of two columns with the row's source and evidence. */
    Optional<Fact> fact(String low, String high, String unit) {
        return fact(number(low), number(high), unit);
    }

    Optional<Fact> fact(String column, String unit) {
        return fact(column, column, unit);
    }

    /** Returns the figure or range of a column of print; empty where it holds words or nothing. */
    Optional<Fact> printed(String column, String unit) {
        String text = text(column);
        Matcher range = RANGE.matcher(text);
        if (range.matches()) {
            return fact(
                    OptionalDouble.of(Double.parseDouble(range.group(1))),
                    OptionalDouble.of(Double.parseDouble(range.group(2))),
                    unit);
        }
        OptionalDouble value = figure(column);
        return fact(value, value, unit);
    }

    /** Returns the figure of a column of print; empty where it holds a range, words or nothing. */
    OptionalDouble figure(String column) {
        String text = text(column);
        return NUMBER.matcher(text).matches()
                ? OptionalDouble.of(Double.parseDouble(text))
                : OptionalDouble.empty();
    }

    private Optional<Fact> fact(OptionalDouble low, OptionalDouble high, String unit) {
        return low.isEmpty() && high.isEmpty()
                ? Optional.empty()
                : Optional.of(new Fact(low, high, unit, source(), evidence(), false));
    }
}

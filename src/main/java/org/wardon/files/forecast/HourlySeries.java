package org.wardon.files.forecast;

import java.util.List;
import java.util.Optional;

/**
 * Hourly series of one chamber or lot, in memory; the CSV files are written from it.
 *
 * @param of id of the chamber or lot
 * @param timeS ends of the hours, s since the plan's start; the last may be shorter
 * @param columns the values, one a time each
 */
public record HourlySeries(String of, List<Double> timeS, List<Column> columns) {
    /**
     * One series.
     *
     * @param name its name with its unit, as in the CSV files
     * @param values one a time; not a number where there is none
     */
    public record Column(String name, List<Double> values) {
        /** Copies the list. */
        public Column {
            values = List.copyOf(values);
        }
    }

    /** Copies the lists and refuses columns of another length. */
    public HourlySeries {
        timeS = List.copyOf(timeS);
        columns = List.copyOf(columns);
        for (Column column : columns) {
            if (column.values().size() != timeS.size()) {
                throw new IllegalArgumentException(
                        column.name()
                                + " of "
                                + of
                                + " has "
                                + column.values().size()
                                + " values for "
                                + timeS.size()
                                + " times");
            }
        }
    }

    /**
     * Returns a column.
     *
     * @param name its name
     * @return its values, empty where the series has none of that name
     */
    public Optional<List<Double>> column(String name) {
        return columns.stream()
                .filter(column -> column.name().equals(name))
                .findFirst()
                .map(Column::values);
    }

    /**
     * Returns the names of the columns.
     *
     * @return in their order
     */
    public List<String> names() {
        return columns.stream().map(Column::name).toList();
    }
}

package org.wardon.web.chamber;

import java.time.LocalDateTime;
import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import org.jspecify.annotations.Nullable;
import org.wardon.files.forecast.HourlySeries;
import org.wardon.plan.StorePlan;

/**
 * Hourly series of a chamber or lot.
 *
 * @param of id of the chamber or lot
 * @param time ends of the hours, local
 * @param columns the values, as in the CSV files of the command line
 */
public record SeriesTold(String of, List<LocalDateTime> time, List<Column> columns) {
    /** Copies the lists. */
    public SeriesTold {
        time = List.copyOf(time);
        columns = List.copyOf(columns);
    }

    /**
     * One series.
     *
     * @param name its name with its unit
     * @param values as many as there are times; null where there is none
     */
    public record Column(String name, List<@Nullable Double> values) {
        /** Copies the list. */
        public Column {
            values = Collections.unmodifiableList(new ArrayList<>(values));
        }
    }

    /**
     * Tells series.
     *
     * @param series the series
     * @param plan the plan, which knows the calendar
     * @return the same
     */
    public static SeriesTold of(HourlySeries series, StorePlan plan) {
        return new SeriesTold(
                series.of(),
                series.timeS().stream().map(s -> plan.timeline().localAt(s)).toList(),
                series.columns().stream()
                        .map(one -> new Column(one.name(), Curves.rounded(one.values())))
                        .toList());
    }
}

package org.wardon.web.pages;

import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import org.jspecify.annotations.Nullable;

/**
 * Data of a chart, as its route writes it.
 *
 * @param unit unit of the values
 * @param time {@code [row]}, local time as seconds since 1970
 * @param lines its lines
 * @param levels levels across it, such as a setting
 */
public record ChartData(String unit, List<Long> time, List<Line> lines, List<Level> levels) {
    /** Copies the lists. */
    public ChartData {
        time = List.copyOf(time);
        lines = List.copyOf(lines);
        levels = List.copyOf(levels);
    }

    /**
     * A line.
     *
     * @param name its name
     * @param tone {@code main}, {@code second}, {@code third} or {@code fourth}; each has dashes of
     *     its own
     * @param values {@code [row]}, as many as there are times; null where there is none
     */
    public record Line(String name, String tone, List<@Nullable Double> values) {
        /** Copies the list. */
        public Line {
            values = Collections.unmodifiableList(new ArrayList<>(values));
        }
    }

    /**
     * A level across.
     *
     * @param name its name
     * @param value its value
     */
    public record Level(String name, double value) {}
}

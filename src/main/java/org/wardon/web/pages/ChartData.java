package org.wardon.web.pages;

import java.time.LocalDateTime;
import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import org.jspecify.annotations.Nullable;

/**
 * Data of a chart, always in °C and SI units; the page's script shows them as the person likes.
 *
 * @param unit unit of the values
 * @param time local times, ends of the hours
 * @param lines its lines
 * @param levels levels across it, such as a setting
 */
public record ChartData(
        String unit, List<LocalDateTime> time, List<Line> lines, List<Level> levels) {
    /** Copies the lists. */
    public ChartData {
        time = List.copyOf(time);
        lines = List.copyOf(lines);
        levels = List.copyOf(levels);
    }

    /**
     * A line.
     *
     * @param id its name with its unit, as in the CSV files
     * @param name its name in words
     * @param tone {@code main}, {@code second}, {@code third} or {@code fourth}; each has dashes of
     *     its own
     * @param values as many as there are times; null where there is none
     */
    public record Line(String id, String name, String tone, List<@Nullable Double> values) {
        /** Copies the list. */
        public Line {
            values = Collections.unmodifiableList(new ArrayList<>(values));
        }
    }

    /**
     * A level across.
     *
     * @param id what it is
     * @param name its name in words
     * @param value its value
     */
    public record Level(String id, String name, double value) {}
}

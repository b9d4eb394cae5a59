package org.wardon.files.readings;

import de.siegmar.fastcsv.reader.CsvParseException;
import de.siegmar.fastcsv.reader.CsvReader;
import de.siegmar.fastcsv.reader.CsvRecord;
import de.siegmar.fastcsv.reader.FieldMismatchStrategy;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.Set;
import java.util.regex.Pattern;
import org.wardon.files.TextFile;
import org.wardon.files.json.Faults;
import org.wardon.files.json.Json;
import org.wardon.produce.Reason;
import org.wardon.produce.Reason.Argument;

/**
 * Reads a logger's file as it comes: commas, semicolons or tabs between cells, a decimal comma,
 * names in the logger's own words, days in any order that can be told.
 */
final class LoggerCsv {
    private static final Column CELSIUS = new Column("temperatureC", true, -40, 70, "°C");
    private static final Column FAHRENHEIT = new Column("temperatureF", true, -40, 158, "°F");
    private static final Column HUMIDITY = new Column("humidityPct", false, 0, 100, "%");
    private static final Pattern NUMBER =
            Pattern.compile("[-+\u2212]?([0-9]+[.,]?[0-9]*|[.,][0-9]+)([eE][-+]?[0-9]{1,3})?");
    private static final Set<String> SILENT =
            Set.of("", "-", "--", "---", "nan", "na", "n/a", "null", "err", "error", "fault");

    private final LimitedFaults faults;
    private final LoggerHead head;
    private final LoggerTimes times = new LoggerTimes();
    private final LongList lines = new LongList();
    private final DoubleList temperature = new DoubleList();
    private final DoubleList humidity = new DoubleList();
    private int silent;

    /**
     * What a file holds, in the order of its lines.
     *
     * @param times local seconds
     * @param temperatureC °C, NaN for none
     * @param humidityPct percent, NaN for none
     * @param notes what had to be assumed
     */
    record Logged(
            LongList times, DoubleList temperatureC, DoubleList humidityPct, List<Reason> notes) {}

    private LoggerCsv(LoggerHead head, LimitedFaults faults) {
        this.head = head;
        this.faults = faults;
    }

    /** Returns the readings; the faults hear where there are none. */
    static Optional<Logged> read(Path file, String shown, Faults all) {
        String text = TextFile.read(file, shown, ReadingsCsv.LARGEST_MB);
        LimitedFaults faults = new LimitedFaults(all);
        Optional<Logged> logged =
                LoggerHead.find(text, faults)
                        .flatMap(head -> new LoggerCsv(head, faults).lines(text));
        faults.close();
        return faults.any() ? Optional.empty() : logged;
    }

    private Optional<Logged> lines(String text) {
        try (CsvReader<CsvRecord> reader =
                CsvReader.builder()
                        .fieldSeparator(head.separator())
                        .allowUnclosedQuote(false)
                        .extraFieldStrategy(FieldMismatchStrategy.IGNORE)
                        .missingFieldStrategy(FieldMismatchStrategy.IGNORE)
                        .ofCsvRecord(text)) {
            for (CsvRecord record : reader) {
                if (record.getStartingLineNumber() > head.lineNumber()) {
                    line(record);
                }
            }
        } catch (CsvParseException e) {
            faults.add("", "the quotes do not match", "accepted: CSV; numbers need no quotes");
        } catch (java.io.IOException e) {
            throw new java.io.UncheckedIOException("a text in memory", e);
        }
        if (faults.any()) {
            return Optional.empty();
        }
        LongList seconds = times.seconds(faults);
        return faults.any()
                ? Optional.empty()
                : Optional.of(new Logged(seconds, temperature, humidity, notes()));
    }

    private void line(CsvRecord record) {
        long line = record.getStartingLineNumber();
        List<String> cells = record.getFields();
        if (cells.stream().allMatch(String::isBlank)) {
            return;
        }
        if (cells.size() < head.cells() && cells.size() <= last()) {
            faults.add(
                    "line " + line,
                    "cells: " + cells.size() + ", in the line of names: " + head.cells(),
                    "accepted: a cell a column");
            return;
        }
        if (cells.size() > head.cells() && head.separator() == ',') {
            faults.add(
                    "line " + line,
                    "cells: " + cells.size() + ", in the line of names: " + head.cells(),
                    "accepted: a cell a column; with a decimal comma semicolons between cells");
            return;
        }
        String time = cells.get(head.date()).strip();
        if (head.clock().isPresent()) {
            time += " " + cells.get(head.clock().getAsInt()).strip();
        }
        if (times.add(time, line, faults)) {
            lines.add(line);
            double read =
                    number(
                            cells.get(head.temperature()).strip(),
                            head.fahrenheit() ? FAHRENHEIT : CELSIUS,
                            line);
            temperature.add(head.fahrenheit() ? celsiusFromFahrenheit(read) : read);
            humidity.add(
                    head.humidity().isPresent()
                            ? number(cells.get(head.humidity().getAsInt()).strip(), HUMIDITY, line)
                            : Double.NaN);
        }
    }

    private int last() {
        int last = Math.max(head.date(), head.temperature());
        return Math.max(last, Math.max(head.clock().orElse(0), head.humidity().orElse(0)));
    }

    private double number(String cell, Column column, long line) {
        String bare = cell.replaceAll("\\s*(°?\\s*[CcFf]|%)$", "");
        if (SILENT.contains(bare.toLowerCase(Locale.ROOT))) {
            silent += column.needed() ? 1 : 0;
            return Double.NaN;
        }
        String where = "line " + line + ", column " + column.name();
        if (!NUMBER.matcher(bare).matches()) {
            faults.add(
                    where,
                    "is " + Json.quoted(cell),
                    column.accepted() + "; an empty cell for no reading");
            return Double.NaN;
        }
        double value = Double.parseDouble(bare.replace(',', '.').replace('\u2212', '-'));
        if (value < column.low() || value > column.high()) {
            faults.add(where, "is " + bare + " " + column.unit(), column.accepted());
        }
        return value;
    }

    private static double celsiusFromFahrenheit(double fahrenheit) {
        return (fahrenheit - 32) * 5 / 9;
    }

    private List<Reason> notes() {
        List<Reason> notes = new ArrayList<>();
        if (times.assumed()) {
            notes.add(note(times.dayFirst() ? "history-day-first" : "history-month-first"));
        }
        if (times.offsetChanges()) {
            notes.add(note("history-offset-changes"));
        }
        if (silent > 0) {
            notes.add(note("history-silent", Argument.of(silent, "1")));
        }
        if (!head.unused().isEmpty()) {
            notes.add(note("history-unused", Argument.text(String.join(", ", head.unused()))));
        }
        return notes;
    }

    static Reason note(String code, Argument... arguments) {
        return Reason.about(code, "history", "own", arguments);
    }
}

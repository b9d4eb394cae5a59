package org.wardon.files.readings;

import de.siegmar.fastcsv.reader.CsvParseException;
import de.siegmar.fastcsv.reader.CsvReader;
import de.siegmar.fastcsv.reader.CsvRecord;
import de.siegmar.fastcsv.reader.FieldMismatchStrategy;
import java.time.DateTimeException;
import java.time.LocalDateTime;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.Iterator;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.regex.Pattern;
import org.wardon.files.json.Faults;
import org.wardon.files.json.Json;
import org.wardon.files.json.Nearest;

/** Reads a CSV of readings: a first line of names, then a line a time. */
final class ReadingsCsv {
    static final int LARGEST_MB = 64;

    private static final String TIME = "time";
    private static final Pattern LOCAL =
            Pattern.compile("[0-9]{4}-[0-9]{2}-[0-9]{2}T[0-9]{2}:[0-9]{2}(:[0-9]{2}(\\.[0-9]+)?)?");
    private static final String MINUTE_SHAPE = "0000-00-00T00:00";
    private static final Pattern NUMBER =
            Pattern.compile("[-+]?([0-9]+\\.?[0-9]*|\\.[0-9]+)([eE][-+]?[0-9]{1,3})?");

    private final List<Column> columns;
    private final LimitedFaults faults;
    private final List<String> header = new ArrayList<>();
    private final LongList times = new LongList();
    private final LongList lines = new LongList();
    private final Map<String, DoubleList> values = new HashMap<>();

    private ReadingsCsv(List<Column> columns, LimitedFaults faults) {
        this.columns = columns;
        this.faults = faults;
    }

    /** Returns the readings, absent where anything is wrong, which the faults then hear. */
    static Optional<Readings> read(String text, List<Column> columns, Faults faults) {
        LimitedFaults limited = new LimitedFaults(faults);
        ReadingsCsv csv = new ReadingsCsv(columns, limited);
        try {
            csv.whole(text);
        } catch (CsvParseException e) {
            limited.add(
                    "after line " + Math.max(1, csv.lastLine()),
                    "the quotes do not match",
                    "accepted: CSV; numbers and times need no quotes");
        }
        limited.close();
        return limited.any()
                ? Optional.empty()
                : Optional.of(new Readings(csv.times, csv.lines, csv.values));
    }

    private void whole(String text) {
        Iterator<CsvRecord> records =
                CsvReader.builder()
                        .allowUnclosedQuote(false)
                        .extraFieldStrategy(FieldMismatchStrategy.IGNORE)
                        .missingFieldStrategy(FieldMismatchStrategy.IGNORE)
                        .ofCsvRecord(text)
                        .iterator();
        if (!records.hasNext()) {
            faults.add("", "the file is empty", "accepted: a first line " + firstLine());
            return;
        }
        if (!head(records.next().getFields())) {
            return;
        }
        while (records.hasNext()) {
            line(records.next());
        }
        if (times.size() == 0 && !faults.any()) {
            faults.add("", "there are no readings below the first line", "accepted: a line a time");
        }
    }

    private long lastLine() {
        return lines.size() == 0 ? 1 : lines.get(lines.size() - 1);
    }

    private String firstLine() {
        List<String> names = new ArrayList<>(List.of(TIME));
        columns.stream().filter(Column::needed).map(Column::name).forEach(names::add);
        return String.join(",", names);
    }

    private boolean head(List<String> names) {
        names.forEach(name -> header.add(name.strip()));
        if (header.size() == 1 && (header.get(0).contains(";") || header.get(0).contains("\t"))) {
            faults.add(
                    "line 1",
                    "the names are not separated by commas",
                    "accepted: " + firstLine() + ", commas between, a point as decimal mark");
            return false;
        }
        List<String> known = new ArrayList<>(List.of(TIME));
        columns.stream().map(Column::name).forEach(known::add);
        List<String> meant = strangers(known);
        for (String name : known) {
            boolean needed =
                    name.equals(TIME)
                            || columns.stream().anyMatch(c -> c.needed() && c.name().equals(name));
            if (needed && !header.contains(name) && !meant.contains(name)) {
                faults.add(
                        "line 1, column " + name,
                        "the column is missing",
                        "accepted: a first line " + firstLine());
            }
        }
        return !faults.any();
    }

    private List<String> strangers(List<String> known) {
        List<String> meant = new ArrayList<>();
        List<String> free = known.stream().filter(name -> !header.contains(name)).toList();
        for (int i = 0; i < header.size(); i++) {
            String name = header.get(i);
            String where = "line 1, column " + (name.isEmpty() ? String.valueOf(i + 1) : name);
            if (header.indexOf(name) != i) {
                faults.add(where, "the column stands twice", "accepted: each column once");
            } else if (!known.contains(name)) {
                Nearest.of(name, free).ifPresent(meant::add);
                faults.add(
                        where,
                        "is not a column known here",
                        Nearest.question(name, free) + "accepted: " + String.join(", ", known));
            } else if (!name.equals(TIME)) {
                values.put(name, new DoubleList());
            }
        }
        return meant;
    }

    private void line(CsvRecord record) {
        long line = record.getStartingLineNumber();
        if (record.getFieldCount() != header.size()) {
            faults.add(
                    "line " + line,
                    "cells: " + record.getFieldCount() + ", in the first line: " + header.size(),
                    "accepted: a cell a column, commas between, a point as decimal mark");
            return;
        }
        time(record.getField(header.indexOf(TIME)).strip(), line);
        for (Column column : columns) {
            DoubleList list = values.get(column.name());
            if (list != null) {
                String cell = record.getField(header.indexOf(column.name())).strip();
                list.add(number(cell, column, line));
            }
        }
    }

    private void time(String cell, long line) {
        Optional<LocalDateTime> time = local(cell, line);
        if (time.isPresent()) {
            long seconds = Readings.seconds(time.get());
            int last = times.size() - 1;
            if (last >= 0 && seconds <= times.get(last)) {
                boolean same = seconds == times.get(last);
                faults.add(
                        "line " + line + ", column " + TIME,
                        cell
                                + (same ? " is the same time as" : " is before the time of")
                                + " line "
                                + lines.get(last),
                        "accepted: times that rise from line to line, in one offset from UTC"
                                + " throughout");
            }
            times.add(seconds);
            lines.add(line);
        }
    }

    private Optional<LocalDateTime> local(String cell, long line) {
        String trouble = "";
        if (toTheMinute(cell) || LOCAL.matcher(cell).matches()) {
            try {
                return Optional.of(LocalDateTime.parse(cell));
            } catch (DateTimeException e) {
                trouble = ", no day and time of the calendar";
            }
        }
        faults.add(
                "line " + line + ", column " + TIME,
                "is " + Json.quoted(cell) + trouble,
                "accepted: a local time such as 2026-03-02T15:00, without zone or offset");
        return Optional.empty();
    }

    private static String where(long line, Column column) {
        return "line " + line + ", column " + column.name();
    }

    /** The usual shape of a number, told without the cost of the pattern: digits and one point. */
    private static boolean decimal(String cell) {
        int points = 0;
        for (int i = 0; i < cell.length(); i++) {
            char c = cell.charAt(i);
            points += c == '.' ? 1 : 0;
            if (!digit(c) && (c != '.' || i == 0 || points > 1)) {
                return false;
            }
        }
        return !cell.isEmpty();
    }

    /** The usual shape of a time, likewise. */
    private static boolean toTheMinute(String cell) {
        if (cell.length() != MINUTE_SHAPE.length()) {
            return false;
        }
        for (int i = 0; i < cell.length(); i++) {
            char shape = MINUTE_SHAPE.charAt(i);
            char c = cell.charAt(i);
            if (shape == '0' ? !digit(c) : c != shape) {
                return false;
            }
        }
        return true;
    }

    private static boolean digit(char c) {
        return c >= '0' && c <= '9';
    }

    private double number(String cell, Column column, long line) {
        if (cell.isEmpty()) {
            return Double.NaN;
        }
        if (!decimal(cell) && !NUMBER.matcher(cell).matches()) {
            faults.add(
                    where(line, column),
                    "is " + Json.quoted(cell),
                    column.accepted()
                            + " with a point as decimal mark; an empty cell for no reading");
            return Double.NaN;
        }
        double value = Double.parseDouble(cell);
        if (value < column.low() || value > column.high()) {
            faults.add(where(line, column), "is " + cell + " " + column.unit(), column.accepted());
        }
        return value;
    }
}

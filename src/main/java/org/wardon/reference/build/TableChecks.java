package org.wardon.reference.build;

import java.util.Arrays;
import java.util.HashMap;
import java.util.HashSet;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.regex.Pattern;
import org.wardon.errors.Fault;

/** Checks every cell of every table against its column and against the other tables. */
final class TableChecks {
    private static final Pattern ID = Pattern.compile("[A-Za-z0-9._()-]{1,80}");
    private static final Pattern COMMODITY = Pattern.compile("[a-z0-9-]{2,40}");

    private final List<Fault> faults;
    private final Set<String> sources;
    private final Set<String> commodities;
    private final Set<String> waiting;
    private final Set<String> packages;

    TableChecks(List<Table> tables, List<Fault> faults) {
        this.faults = faults;
        sources = ids(tables, "sources", "source_id");
        commodities = ids(tables, "commodities", "commodity_id");
        waiting = ids(tables, "waiting", "commodity_id");
        packages = ids(tables, "packages", "package_id");
    }

    private static Set<String> ids(List<Table> tables, String table, String column) {
        Set<String> ids = new HashSet<>();
        for (Table candidate : tables) {
            if (candidate.name().equals(table)) {
                ids.addAll(candidate.cellsOf(column));
            }
        }
        return ids;
    }

    /** Adds every fault of the table. */
    void check(Table table) {
        Map<List<String>, Long> seen = new HashMap<>();
        Map<String, Long> keys = new HashMap<>();
        for (Table.Row row : table.rows()) {
            Long twin = seen.putIfAbsent(row.cells(), row.line());
            if (twin != null) {
                fault(table, row, "", "repeats line " + twin, "delete one of them");
            }
            for (int i = 0; i < table.columns().size(); i++) {
                checkCell(table, row, table.columns().get(i), row.cells().get(i), keys);
            }
        }
    }

    private void checkCell(
            Table table, Table.Row row, Column column, String cell, Map<String, Long> keys) {
        switch (column.kind()) {
            case KEY -> checkKey(table, row, column, cell, keys);
            case NUMBER -> checkNumber(table, row, column, cell);
            case WORD -> {
                if (!cell.isEmpty() && !column.words().contains(cell)) {
                    fault(table, row, column.name(), quoted(cell), "one of " + column.words());
                }
            }
            case EVIDENCE, EVIDENCE_OR_EMPTY, EVIDENCE_PROSE ->
                    checkEvidence(table, row, column, cell);
            case PRINTED, TEXT -> checkText(table, row, column, cell);
            default -> checkReference(table, row, column, cell);
        }
    }

    private void checkKey(
            Table table, Table.Row row, Column column, String cell, Map<String, Long> keys) {
        Pattern form = column.name().equals("commodity_id") ? COMMODITY : ID;
        if (!form.matcher(cell).matches()) {
            fault(table, row, column.name(), quoted(cell), "an id of the form " + form);
        }
        Long twin = keys.putIfAbsent(cell, row.line());
        if (twin != null) {
            fault(table, row, column.name(), quoted(cell) + " stands in line " + twin, "a new id");
        }
    }

    private void checkNumber(Table table, Table.Row row, Column column, String cell) {
        if (cell.isEmpty()) {
            return;
        }
        double value;
        try {
            value = Double.parseDouble(cell);
        } catch (NumberFormatException e) {
            fault(table, row, column.name(), quoted(cell), "a number or an empty cell");
            return;
        }
        if (!(value >= column.low() && value <= column.high())) {
            fault(table, row, column.name(), cell, column.low() + " to " + column.high());
        }
        String below = column.pair().isEmpty() ? "" : cellOf(table, row, column.pair());
        if (isNumber(below) && Double.parseDouble(below) > value) {
            fault(
                    table,
                    row,
                    column.name(),
                    cell + " lies below " + column.pair() + " " + below,
                    "a figure not below it");
        }
    }

    private void checkEvidence(Table table, Table.Row row, Column column, String cell) {
        boolean known =
                switch (column.kind()) {
                    case EVIDENCE_PROSE -> EvidenceWord.ofProse(cell).isPresent();
                    case EVIDENCE_OR_EMPTY -> cell.isEmpty() || EvidenceWord.of(cell).isPresent();
                    default -> EvidenceWord.of(cell).isPresent();
                };
        if (!known) {
            fault(table, row, column.name(), quoted(cell), "a word of evidence, then prose");
        }
    }

    private void checkText(Table table, Table.Row row, Column column, String cell) {
        if (!cell.equals(cell.strip()) || cell.chars().anyMatch(Character::isISOControl)) {
            fault(table, row, column.name(), quoted(cell), "text without blanks at its ends");
        }
    }

    private void checkReference(Table table, Table.Row row, Column column, String cell) {
        String name = column.name();
        switch (column.kind()) {
            case SOURCE -> known(table, row, name, cell, sources, "sources.csv");
            case SOURCE_OR_EMPTY -> {
                if (!cell.isEmpty()) {
                    known(table, row, name, cell, sources, "sources.csv");
                }
            }
            case SOURCES ->
                    Arrays.stream(cell.split(";"))
                            .filter(id -> !id.isEmpty())
                            .forEach(id -> known(table, row, name, id, sources, "sources.csv"));
            case KNOWN_PACKAGE -> known(table, row, name, cell, packages, "packages.csv");
            case KNOWN_COMMODITY -> {
                if (!column.words().contains(cell)) {
                    known(table, row, name, cell, commodities, "commodities.csv");
                }
            }
            default -> {
                if (!column.words().contains(cell) && !waiting.contains(cell)) {
                    known(table, row, name, cell, commodities, "commodities.csv or waiting.csv");
                }
            }
        }
    }

    private void known(
            Table table, Table.Row row, String column, String id, Set<String> ids, String where) {
        if (!ids.contains(id)) {
            fault(table, row, column, quoted(id), "an id of " + where);
        }
    }

    private static String cellOf(Table table, Table.Row row, String column) {
        return row.cells().get(table.indexOf(column));
    }

    private static boolean isNumber(String cell) {
        try {
            Double.parseDouble(cell);
            return true;
        } catch (NumberFormatException e) {
            return false;
        }
    }

    private static String quoted(String cell) {
        return "'" + cell + "'";
    }

    private void fault(Table table, Table.Row row, String column, String found, String accepted) {
        String where = "line " + row.line() + (column.isEmpty() ? "" : ", column " + column);
        faults.add(new Fault(table.file(), where, found, accepted));
    }
}

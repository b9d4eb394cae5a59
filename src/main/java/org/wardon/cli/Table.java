package org.wardon.cli;

import java.util.ArrayList;
import java.util.List;

/** Rows under heads, each column as wide as its widest word. */
final class Table {
    private final List<List<String>> rows = new ArrayList<>();

    Table(String... heads) {
        rows.add(List.of(heads));
    }

    void row(String... cells) {
        rows.add(List.of(cells));
    }

    /** Returns the lines, each ended by a line feed. */
    String text() {
        int columns = rows.get(0).size();
        int[] widths = new int[columns];
        for (List<String> row : rows) {
            for (int i = 0; i < columns; i++) {
                widths[i] = Math.max(widths[i], row.get(i).length());
            }
        }
        StringBuilder page = new StringBuilder();
        for (List<String> row : rows) {
            StringBuilder line = new StringBuilder();
            for (int i = 0; i < columns; i++) {
                String cell = row.get(i);
                line.append("  ").append(cell).append(" ".repeat(widths[i] - cell.length()));
            }
            page.append(line.toString().stripTrailing()).append('\n');
        }
        return page.toString();
    }
}

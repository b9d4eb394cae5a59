package org.wardon.reference.build;

import java.util.List;

/**
 * One published table as it stands in its file.
 *
 * @param name file name without its ending
 * @param file path from the folder of tables, for messages
 * @param columns its columns, in the order of the file
 * @param notes the lines at its top that explain it, without the mark
 * @param rows its rows
 */
record Table(String name, String file, List<Column> columns, List<String> notes, List<Row> rows) {
    /**
     * One row.
     *
     * @param line line of the file, counted from 1
     * @param cells its cells, one a column
     */
    record Row(long line, List<String> cells) {
        Row {
            cells = List.copyOf(cells);
        }
    }

    Table {
        columns = List.copyOf(columns);
        notes = List.copyOf(notes);
        rows = List.copyOf(rows);
    }

    int indexOf(String column) {
        for (int i = 0; i < columns.size(); i++) {
            if (columns.get(i).name().equals(column)) {
                return i;
            }
        }
        return -1;
    }

    List<String> cellsOf(String column) {
        int index = indexOf(column);
        return rows.stream().map(row -> row.cells().get(index)).toList();
    }
}

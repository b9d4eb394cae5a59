package org.wardon.reference.fits;

import de.siegmar.fastcsv.reader.CommentStrategy;
import de.siegmar.fastcsv.reader.CsvReader;
import de.siegmar.fastcsv.reader.CsvRecord;
import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.OptionalDouble;

/** Rows of a printed table by the names of its columns; the build has checked the cells. */
final class PrintedTable {
    private PrintedTable() {}

    /**
     * One row.
     *
     * @param line line of the file
     * @param cells cell by column
     */
    record Line(long line, Map<String, String> cells) {
        Line {
            cells = Map.copyOf(cells);
        }

        String text(String column) {
            String cell = cells.get(column);
            if (cell == null) {
                throw new IllegalArgumentException("no column " + column + " in " + cells.keySet());
            }
            return cell;
        }

        OptionalDouble number(String column) {
            String cell = text(column);
            return cell.isEmpty()
                    ? OptionalDouble.empty()
                    : OptionalDouble.of(Double.parseDouble(cell));
        }
    }

    static List<Line> read(Path file) {
        List<Line> lines = new ArrayList<>();
        try (CsvReader<CsvRecord> reader =
                CsvReader.builder().commentStrategy(CommentStrategy.SKIP).ofCsvRecord(file)) {
            List<String> head = List.of();
            for (CsvRecord record : reader) {
                if (head.isEmpty()) {
                    head = record.getFields();
                } else {
                    Map<String, String> cells = new HashMap<>();
                    for (int i = 0; i < head.size(); i++) {
                        cells.put(head.get(i), record.getField(i));
                    }
                    lines.add(new Line(record.getStartingLineNumber(), cells));
                }
            }
        } catch (IOException e) {
            throw new UncheckedIOException(file + " cannot be read", e);
        }
        return lines;
    }
}

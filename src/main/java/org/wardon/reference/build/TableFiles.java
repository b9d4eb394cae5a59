package org.wardon.reference.build;

import de.siegmar.fastcsv.reader.CommentStrategy;
import de.siegmar.fastcsv.reader.CsvParseException;
import de.siegmar.fastcsv.reader.CsvReader;
import de.siegmar.fastcsv.reader.CsvRecord;
import de.siegmar.fastcsv.reader.FieldMismatchStrategy;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.stream.Stream;
import org.wardon.errors.BadInput;
import org.wardon.errors.Fault;

/** Reads every table of a folder by its list of columns. */
final class TableFiles {
    private static final String LIST = "columns.csv";

    private final Path folder;
    private final List<Fault> faults;

    TableFiles(Path folder, List<Fault> faults) {
        this.folder = folder;
        this.faults = faults;
    }

    /**
     * Returns the tables that could be read; what is wrong with their shape is added to the faults.
     */
    List<Table> read() {
        Map<String, List<Column>> listed = columns();
        List<Table> tables = new ArrayList<>();
        for (Path path : files()) {
            String name = nameOf(path);
            List<Column> columns = listed.remove(name);
            if (columns == null) {
                fault(path, "", "a table that " + LIST + " does not list", "list its columns");
            } else {
                tables.add(table(path, name, columns));
            }
        }
        listed.keySet()
                .forEach(
                        name ->
                                faults.add(
                                        new Fault(
                                                LIST,
                                                name,
                                                "lists a table that has no file",
                                                "add the file or delete its lines")));
        return tables;
    }

    private Map<String, List<Column>> columns() {
        Map<String, List<Column>> columns = new LinkedHashMap<>();
        for (CsvRecord record : records(folder.resolve(LIST))) {
            if (record.isComment() || record.getField(0).equals("table")) {
                continue;
            }
            columns.computeIfAbsent(record.getField(0), name -> new ArrayList<>())
                    .add(
                            Column.of(
                                    record.getField(1),
                                    record.getField(2),
                                    record.getField(4),
                                    record.getField(5),
                                    record.getField(6)));
        }
        return columns;
    }

    private Iterable<Path> files() {
        try (Stream<Path> paths = Files.walk(folder)) {
            return paths.filter(path -> path.toString().endsWith(".csv"))
                    .filter(path -> !path.endsWith(LIST))
                    .sorted()
                    .toList();
        } catch (IOException e) {
            throw new BadInput(folder.toString(), "", "cannot be read: " + e, "give the folder");
        }
    }

    private Table table(Path path, String name, List<Column> columns) {
        List<String> notes = new ArrayList<>();
        List<Table.Row> rows = new ArrayList<>();
        List<String> head = columns.stream().map(Column::name).toList();
        boolean headSeen = false;
        for (CsvRecord record : records(path)) {
            if (record.isComment()) {
                notes.add(record.getField(0).strip());
            } else if (!headSeen) {
                headSeen = true;
                if (!record.getFields().equals(head)) {
                    fault(path, "head", "reads " + record.getFields(), LIST + " lists " + head);
                }
            } else if (record.getFieldCount() == columns.size()) {
                rows.add(new Table.Row(record.getStartingLineNumber(), record.getFields()));
            } else {
                fault(
                        path,
                        "line " + record.getStartingLineNumber(),
                        "has " + record.getFieldCount() + " cells",
                        "its head has " + columns.size());
            }
        }
        return new Table(name, relative(path), columns, notes, rows);
    }

    private List<CsvRecord> records(Path path) {
        try (CsvReader<CsvRecord> reader =
                CsvReader.builder()
                        .commentStrategy(CommentStrategy.READ)
                        .extraFieldStrategy(FieldMismatchStrategy.IGNORE)
                        .missingFieldStrategy(FieldMismatchStrategy.IGNORE)
                        .ofCsvRecord(path)) {
            return reader.stream().toList();
        } catch (IOException | CsvParseException e) {
            fault(path, "", "cannot be read: " + e.getMessage(), "a CSV file in UTF-8");
            return List.of();
        }
    }

    private void fault(Path path, String where, String found, String accepted) {
        faults.add(new Fault(relative(path), where, found, accepted));
    }

    private String relative(Path path) {
        return folder.relativize(path).toString().replace('\\', '/');
    }

    private static String nameOf(Path path) {
        String file = String.valueOf(path.getFileName());
        return file.substring(0, file.length() - ".csv".length());
    }
}

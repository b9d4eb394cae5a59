package org.wardon.reference;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import de.siegmar.fastcsv.reader.CommentStrategy;
import de.siegmar.fastcsv.reader.CsvReader;
import de.siegmar.fastcsv.reader.CsvRecord;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.stream.Stream;
import org.junit.jupiter.api.AfterAll;
import org.junit.jupiter.api.DynamicTest;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.TestFactory;
import org.wardon.Source;

/** The shipped database holds every cell of every table and refuses every change. */
class ReferenceDatabaseTest {
    private static final ReferenceDatabase DATABASE = ReferenceDatabase.open();

    @AfterAll
    static void close() {
        DATABASE.close();
    }

    @TestFactory
    Stream<DynamicTest> everyCellOfEveryTableIsThere() throws IOException {
        try (Stream<Path> paths = Files.walk(Path.of("reference-tables"))) {
            List<Path> tables =
                    paths.filter(path -> path.toString().endsWith(".csv"))
                            .filter(path -> !path.endsWith("columns.csv"))
                            .sorted()
                            .toList();
            assertTrue(tables.size() >= 43, "only " + tables.size() + " tables");
            return tables.stream()
                    .map(path -> DynamicTest.dynamicTest(path.toString(), () -> compare(path)));
        }
    }

    private static void compare(Path path) throws IOException {
        String name = path.getFileName().toString().replace(".csv", "");
        String table = name.replace('-', '_');
        List<CsvRecord> records = records(path);
        List<String> notes =
                records.stream()
                        .filter(CsvRecord::isComment)
                        .map(record -> record.getField(0).strip())
                        .toList();
        assertEquals(
                notes,
                DATABASE.list(
                        "select text from table_note where table_name = ? order by ord",
                        row -> row.text("text"),
                        name));
        List<CsvRecord> rows = records.stream().filter(record -> !record.isComment()).toList();
        List<String> head = rows.get(0).getFields();
        List<CsvRecord> data = rows.subList(1, rows.size());
        assertFalse(data.isEmpty());
        for (int i = 0; i < head.size(); i++) {
            int column = i;
            String stored = head.get(i) + (head.get(i).endsWith("evidence") ? "_text" : "");
            List<String> expected =
                    data.stream().map(record -> plain(record.getField(column))).toList();
            List<String> found =
                    DATABASE.list(
                            "select \"" + stored + "\" as cell from " + table + " order by line",
                            row -> plain(row.text("cell")));
            assertEquals(expected, found, table + "." + stored);
        }
    }

    private static List<CsvRecord> records(Path path) throws IOException {
        try (CsvReader<CsvRecord> reader =
                CsvReader.builder().commentStrategy(CommentStrategy.READ).ofCsvRecord(path)) {
            return reader.stream().toList();
        }
    }

    /** Writes a figure in one way, so that 0.10 equals 0.1. */
    private static String plain(String cell) {
        try {
            return String.valueOf(Double.parseDouble(cell));
        } catch (NumberFormatException e) {
            return cell;
        }
    }

    @Test
    void refusesEveryChange() {
        assertThrows(
                IllegalStateException.class,
                () -> DATABASE.list("delete from commodities returning line", row -> row));
        assertEquals(
                List.of(106.0),
                DATABASE.list("select count(*) as n from commodities", row -> row.value("n")));
    }

    @Source("Cantwell 2001 (needs); ASHRAE Refrigeration 2006 chapter 9 table 9 (heat)")
    @Test
    void commodityNeedsHoldsWhatIsPrintedForMango() {
        List<String> rows =
                DATABASE.list(
                        "select * from commodity_needs where commodity_id = 'mango'"
                                + " and heat_table = 'heat' order by heat_at_C",
                        row ->
                                String.join(
                                        " ",
                                        row.text("temperature_low_C"),
                                        row.text("temperature_high_C"),
                                        row.text("humidity_low_pct"),
                                        row.text("humidity_high_pct"),
                                        row.text("needs_source_id"),
                                        row.text("heat_at_C"),
                                        row.text("heat_low_W_per_tonne"),
                                        row.text("heat_high_W_per_tonne"),
                                        row.text("heat_source_id"),
                                        row.text("heat_evidence")));
        assertEquals(
                List.of(
                        "13.0 13.0 85.0 90.0 cantwell-2001 15.0 133.4 133.4 ASHRAE-R06-09 memory",
                        "13.0 13.0 85.0 90.0 cantwell-2001 20.0 222.6 449.1 ASHRAE-R06-09 memory",
                        "13.0 13.0 85.0 90.0 cantwell-2001 25.0 356.0 356.0 ASHRAE-R06-09 memory"),
                rows);
    }

    @Test
    void commodityNeedsNamesEveryCommodity() {
        assertEquals(
                List.of(106.0),
                DATABASE.list(
                        "select count(distinct commodity_id) as n from commodity_needs",
                        row -> row.value("n")));
    }
}

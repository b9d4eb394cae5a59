package org.wardon.checks;

import de.siegmar.fastcsv.reader.CsvReader;
import de.siegmar.fastcsv.reader.NamedCsvRecord;
import java.io.IOException;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;
import tools.jackson.databind.JsonNode;
import tools.jackson.databind.json.JsonMapper;

/** One row of a table of published checks. */
record CheckRow(
        String name,
        JsonNode inputs,
        double expected,
        String unit,
        double tolerancePct,
        String source,
        String evidence) {
    private static final Path TABLES = Path.of("reference-tables");
    private static final JsonMapper JSON = JsonMapper.builder().build();

    static List<CheckRow> read(String file) throws IOException {
        Map<String, String> citations = citations();
        List<CheckRow> rows = new ArrayList<>();
        try (CsvReader<NamedCsvRecord> csv =
                CsvReader.builder().ofNamedCsvRecord(TABLES.resolve("checks").resolve(file))) {
            for (NamedCsvRecord r : csv) {
                String id = r.getField("source_id");
                rows.add(
                        new CheckRow(
                                r.getField("name"),
                                JSON.readTree(r.getField("inputs")),
                                Double.parseDouble(r.getField("expected")),
                                r.getField("unit"),
                                Double.parseDouble(r.getField("tolerance_pct")),
                                id + ": " + citations.getOrDefault(id, "own arithmetic"),
                                r.getField("evidence")));
            }
        }
        return rows;
    }

    private static Map<String, String> citations() throws IOException {
        Map<String, String> citations = new TreeMap<>();
        try (CsvReader<NamedCsvRecord> csv =
                CsvReader.builder().ofNamedCsvRecord(TABLES.resolve("sources.csv"))) {
            for (NamedCsvRecord r : csv) {
                citations.put(r.getField("source_id"), r.getField("citation"));
            }
        }
        return citations;
    }

    String title() {
        return name + " = " + expected + " " + unit + " (" + source + ", " + evidence + ")";
    }

    double d(String input) {
        JsonNode node = inputs.get(input);
        if (node == null) {
            throw new IllegalArgumentException(name + " has no input " + input);
        }
        return node.asDouble();
    }

    boolean has(String input) {
        return inputs.has(input);
    }
}

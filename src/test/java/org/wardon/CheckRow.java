package org.wardon;

import de.siegmar.fastcsv.reader.CommentStrategy;
import de.siegmar.fastcsv.reader.CsvReader;
import de.siegmar.fastcsv.reader.NamedCsvRecord;
import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.file.Path;
import java.util.List;
import java.util.function.ToDoubleFunction;
import org.junit.jupiter.api.Assertions;
import org.junit.jupiter.api.DynamicTest;
import tools.jackson.databind.JsonNode;
import tools.jackson.databind.json.JsonMapper;

/**
 * A row of the published checks: what goes in, what must come out, and how near.
 *
 * @param name name of the row
 * @param inputs inputs, units in the names
 * @param expected the answer
 * @param unit its unit
 * @param tolerancePct how near, percent of the answer
 * @param sourceId its source
 * @param evidence how it reached us
 */
public record CheckRow(
        String name,
        JsonNode inputs,
        double expected,
        String unit,
        double tolerancePct,
        String sourceId,
        String evidence) {
    private static final JsonMapper JSON = JsonMapper.builder().build();

    /** All rows of a file of checks. */
    public static List<CheckRow> of(String file) {
        return rows(Path.of("reference-tables/checks", file)).stream().map(CheckRow::of).toList();
    }

    /** The rows of a table, comments left out. */
    public static List<NamedCsvRecord> rows(Path table) {
        try (CsvReader<NamedCsvRecord> reader =
                CsvReader.builder().commentStrategy(CommentStrategy.SKIP).ofNamedCsvRecord(table)) {
            return reader.stream().toList();
        } catch (IOException e) {
            throw new UncheckedIOException(table.toString(), e);
        }
    }

    private static CheckRow of(NamedCsvRecord row) {
        return new CheckRow(
                row.getField("name"),
                JSON.readTree(row.getField("inputs")),
                Double.parseDouble(row.getField("expected")),
                row.getField("unit"),
                Double.parseDouble(row.getField("tolerance_pct")),
                row.getField("source_id"),
                row.getField("evidence"));
    }

    /** A numeric input. */
    public double in(String input) {
        JsonNode node = inputs.get(input);
        Assertions.assertNotNull(node, name + " has no input " + input);
        return node.asDouble();
    }

    /** A worded input. */
    public String word(String input) {
        return inputs.get(input).asString();
    }

    /** The test of this row: its name shows what is expected and where it was published. */
    public DynamicTest answeredBy(ToDoubleFunction<CheckRow> part) {
        String title =
                "%s = %s %s within %s %% [%s, %s]"
                        .formatted(name, expected, unit, tolerancePct, sourceId, evidence);
        return DynamicTest.dynamicTest(
                title,
                () -> {
                    double answer = part.applyAsDouble(this);
                    Assertions.assertEquals(
                            expected,
                            answer,
                            Math.abs(expected) * tolerancePct / 100,
                            () -> "missed by %.3f %%".formatted(100 * (answer / expected - 1)));
                });
    }
}

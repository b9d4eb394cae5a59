package org.wardon.checks;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;
import java.util.function.ToDoubleFunction;
import java.util.stream.Stream;
import org.junit.jupiter.api.DynamicTest;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.TestFactory;

/** Every row of checks-enclosure.csv runs against the part it concerns. */
class EnclosureChecksTest {
    private static final String FILE = "checks-enclosure.csv";

    private static final Map<String, ToDoubleFunction<CheckRow>> BUILT = built();

    private static Map<String, ToDoubleFunction<CheckRow>> built() {
        Map<String, ToDoubleFunction<CheckRow>> laws = new TreeMap<>();
        laws.putAll(MoistAirChecks.laws());
        laws.putAll(FaceChecks.laws());
        laws.putAll(ConvectionChecks.laws());
        laws.putAll(SunChecks.laws());
        laws.putAll(StoreChecks.laws());
        return laws;
    }

    /** The law of a row: the longest beginning of its name that is listed. */
    private static List<String> lawsOf(String row) {
        return BUILT.keySet().stream()
                .filter(row::startsWith)
                .sorted((a, b) -> b.length() - a.length())
                .toList();
    }

    @TestFactory
    Stream<DynamicTest> publishedValueIsMet() throws IOException {
        List<CheckRow> all = CheckRow.read(FILE);
        return all.stream()
                .filter(row -> !lawsOf(row.name()).isEmpty())
                .map(
                        row ->
                                DynamicTest.dynamicTest(
                                        row.title(),
                                        () -> check(row, BUILT.get(lawsOf(row.name()).get(0)))));
    }

    private static void check(CheckRow row, ToDoubleFunction<CheckRow> law) {
        double allowed = Math.abs(row.expected()) * row.tolerancePct() / 100;
        assertEquals(row.expected(), law.applyAsDouble(row), allowed, row.name());
    }

    @Test
    void everyRowRuns() throws IOException {
        List<CheckRow> rows = CheckRow.read(FILE);
        assertEquals(
                List.of(),
                rows.stream().map(CheckRow::name).filter(row -> lawsOf(row).isEmpty()).toList());
        assertEquals(218, rows.size(), "rows in the table");
    }

    @Test
    void everyLawMeetsARow() throws IOException {
        List<String> names = CheckRow.read(FILE).stream().map(CheckRow::name).toList();
        for (String law : BUILT.keySet()) {
            assertTrue(
                    names.stream().anyMatch(name -> lawsOf(name).indexOf(law) == 0),
                    law + " meets no row");
        }
    }
}

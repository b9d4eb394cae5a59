package org.wardon.checks;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;
import java.util.function.ToDoubleFunction;
import java.util.stream.Stream;
import org.junit.jupiter.api.DynamicTest;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.TestFactory;

/**
 * Every row of checks-enclosure.csv runs against the part it concerns, or is named as not built.
 */
class EnclosureChecksTest {
    private static final String FILE = "checks-enclosure.csv";

    /** Rows of parts that do not stand yet, and the type whose coming makes them due. */
    private static final Map<String, String> NOT_BUILT =
            Map.of(
                    "fao340_product", "org.wardon.advice.size.DesignLoad",
                    "fao340_first_six", "org.wardon.advice.size.DesignLoad");

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
    void noRowIsSkippedInSilence() throws IOException {
        List<String> lost = new ArrayList<>();
        for (CheckRow row : CheckRow.read(FILE)) {
            boolean runs = !lawsOf(row.name()).isEmpty();
            if (runs == NOT_BUILT.containsKey(row.name())) {
                lost.add(
                        row.name()
                                + (runs ? " runs and is listed" : " neither runs nor is listed"));
            }
        }
        assertEquals(List.of(), lost);
        assertEquals(218, CheckRow.read(FILE).size(), "rows in the table");
    }

    @Test
    void everyLawAndEveryListedRowIsInTheTable() throws IOException {
        List<String> names = CheckRow.read(FILE).stream().map(CheckRow::name).toList();
        assertTrue(names.containsAll(NOT_BUILT.keySet()));
        for (String law : BUILT.keySet()) {
            assertTrue(
                    names.stream().anyMatch(name -> lawsOf(name).indexOf(law) == 0),
                    law + " meets no row");
        }
    }

    @TestFactory
    Stream<DynamicTest> rowsOfPartsNotBuiltWaitForThem() {
        return NOT_BUILT.entrySet().stream()
                .map(
                        row ->
                                DynamicTest.dynamicTest(
                                        row.getKey() + " waits for " + row.getValue(),
                                        () ->
                                                assertThrows(
                                                        ClassNotFoundException.class,
                                                        () -> Class.forName(row.getValue()),
                                                        "built now: let the row run")));
    }
}

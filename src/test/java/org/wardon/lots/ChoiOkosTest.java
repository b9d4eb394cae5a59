package org.wardon.lots;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import de.siegmar.fastcsv.reader.NamedCsvRecord;
import java.nio.file.Path;
import java.util.Arrays;
import java.util.List;
import java.util.Locale;
import java.util.stream.Stream;
import org.junit.jupiter.api.DynamicTest;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.TestFactory;
import org.wardon.CheckRow;
import org.wardon.Source;

/** The coefficients in code are those of the table we carry. */
class ChoiOkosTest {
    private static final List<NamedCsvRecord> TABLE =
            CheckRow.rows(Path.of("reference-tables/crops/choi-okos.csv"));
    private static final List<String> PROPERTIES =
            List.of("thermal-conductivity", "density", "specific-heat");

    @Source("Choi and Okos 1986, as carried in choi-okos.csv")
    @TestFactory
    Stream<DynamicTest> matchesTheTable() {
        return PROPERTIES.stream()
                .flatMap(
                        property ->
                                Arrays.stream(Component.values())
                                        .map(component -> matches(property, component)));
    }

    private static DynamicTest matches(String property, Component component) {
        NamedCsvRecord row = row(property, component);
        return DynamicTest.dynamicTest(
                property + " of " + component + " [" + row.getField("source_id") + "]",
                () -> {
                    for (double c : new double[] {0, 10, 40, 100}) {
                        double printed =
                                number(row, "a") + number(row, "b") * c + number(row, "c") * c * c;
                        assertEquals(
                                printed, inUnitOfTable(property, component, c), 1e-9 * printed);
                    }
                });
    }

    private static NamedCsvRecord row(String property, Component component) {
        String name = component.name().toLowerCase(Locale.ROOT);
        return TABLE.stream()
                .filter(r -> r.getField("property").equals(property))
                .filter(r -> r.getField("component").equals(name))
                .findFirst()
                .orElseThrow();
    }

    private static double number(NamedCsvRecord row, String column) {
        return Double.parseDouble(row.getField(column));
    }

    private static double inUnitOfTable(String property, Component component, double c) {
        return switch (property) {
            case "density" -> ChoiOkos.densityKgM3(component, c);
            case "specific-heat" -> ChoiOkos.specificHeatJkgK(component, c) / 1000;
            default -> ChoiOkos.conductivityWmK(component, c);
        };
    }

    @Test
    void fatConductsLessWhenWarmerAsInTheCorrectPrint() {
        double slope =
                ChoiOkos.conductivityWmK(Component.FAT, 1)
                        - ChoiOkos.conductivityWmK(Component.FAT, 0);
        assertEquals(-2.7604e-4, slope, 1e-6);
    }

    @Test
    void airSpacesLowerTheConductivityAndOnlyThen() {
        Composition made = Composition.ofParts(84, 0.2, 0.4, 12.5, 2.7, 0.3);
        assertTrue(made.conductivityWmK(10, 840) < made.conductivityWmK(10));
        assertEquals(made.conductivityWmK(10), made.conductivityWmK(10, 1300), 0);
    }

    @Test
    void partsAreSummedInOneOrder() {
        Composition any = Composition.ofParts(85, 1, 0.3, 12, 1.2, 0.5);
        assertEquals(List.of(Component.values()), List.copyOf(any.fraction().keySet()));
    }
}

package org.wardon.reference.build;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.io.InputStream;
import java.nio.file.Files;
import java.nio.file.Path;
import java.sql.SQLException;
import java.util.List;
import java.util.Objects;
import java.util.stream.Stream;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.wardon.errors.BadInput;
import org.wardon.errors.Fault;
import org.wardon.reference.ReferenceBook;

/** The build refuses bad tables, naming every fault, and writes the same file every time. */
class BuildReferenceTest {
    private static final Path TABLES = Path.of("reference-tables");

    @TempDir Path folder;

    @BeforeEach
    void copyTables() throws IOException {
        try (Stream<Path> paths = Files.walk(TABLES)) {
            for (Path path : paths.filter(Files::isRegularFile).toList()) {
                Path copy = folder.resolve(TABLES.relativize(path).toString());
                Files.createDirectories(copy.getParent());
                Files.copy(path, copy);
            }
        }
    }

    @Test
    void sameTablesGiveTheSameBytesAsTheShippedFile() throws IOException, SQLException {
        byte[] once = BuildReference.build(TABLES);
        assertArrayEquals(once, BuildReference.build(folder));
        try (InputStream shipped = ReferenceBook.class.getResourceAsStream("reference.db")) {
            assertArrayEquals(once, Objects.requireNonNull(shipped).readAllBytes());
        }
    }

    @ParameterizedTest(name = "{0}: {1} -> {2}")
    @CsvSource(
            delimiter = '|',
            quoteCharacter = '"',
            value = {
                "crops/respiration.csv|apple,0,3,3,ah66-2016|apple,0,3,3,ah66-2061"
                        + "|column source_id: 'ah66-2061'; an id of sources.csv",
                "crops/respiration.csv|apple,0,3,3,|aple,0,3,3,"
                        + "|column commodity_id: 'aple'; an id of commodities.csv or waiting.csv",
                "crops/respiration.csv|apple,0,3,3,|apple,0,4,3,"
                        + "|column mgCO2_kg_h_high: 3 lies below mgCO2_kg_h_low 4",
                "crops/respiration.csv|apple,0,3,3,|apple,0,3,3000,"
                        + "|column mgCO2_kg_h_high: 3000; 0.0 to 2000.0",
                "crops/respiration.csv|apple,0,3,3,|apple,O,3,3,"
                        + "|column temp_C: 'O'; a number or an empty cell",
                "crops/respiration.csv|apple,0,3,3,|apple,NaN,3,3,|column temp_C: NaN; -5.0 to 60.0",
                "crops/respiration.csv|apple,0,3,3,ah66-2016,memory|apple,0,3,3,ah66-2016,remembered"
                        + "|column evidence: 'remembered'; a word of evidence",
                "crops/respiration.csv|apple,0,3,3,ah66-2016,memory|apple,0,3,3,ah66-2016,seenish"
                        + "|column evidence: 'seenish'; a word of evidence",
                "crops/respiration.csv|apple,0,3,3,ah66-2016,memory|apple,0,3,3,ah66-2016"
                        + "|line 2: has 5 cells; its head has 6",
                "crops/respiration.csv|apple,0,3,3,ah66-2016,memory|apple,0,3,3,ah66-2016,memory,more"
                        + "|line 2: has 7 cells; its head has 6",
                "crops/respiration.csv|commodity_id,temp_C|commodity_id,temp_F|head: reads",
                "crops/commodities.csv|Malus domestica,fruit|Malus domestica,berry"
                        + "|column plant_part: 'berry'; one of [fruit,",
                "crops/commodities.csv|pear,Pear|apple,Pear"
                        + "|column commodity_id: 'apple' stands in line 2; a new id",
                "crops/odour-transfer.csv|apple,cabbage,PSU1998|apple,cabage,PSU1998"
                        + "|column taker_id: 'cabage'; an id of commodities.csv",
                "crops/aliases.csv|pawpaw,papaya|pawpaw,paw|column commodity_id: 'paw'",
                "stores/package-classes.csv|hydro-ratio,open|hydro-rate,open"
                        + "|column package_id: 'hydro-rate'; an id of packages.csv",
                "crops/geometry.csv|USDA-SR26;CENGEL-HT|USDA-SR26;CENGEL"
                        + "|column source_id: 'CENGEL'; an id of sources.csv",
                "stores/materials.csv|Phenolic foam|\"Phenolic foam \"|column name: 'Phenolic foam '"
            })
    void refusesABadCell(String file, String from, String to, String message) throws IOException {
        replace(file, from, to);
        BadInput refused = assertThrows(BadInput.class, () -> BuildReference.build(folder));
        assertTrue(
                refused.faults().stream()
                        .filter(fault -> fault.file().equals(file))
                        .map(Fault::sentence)
                        .anyMatch(sentence -> sentence.contains(message)),
                refused.getMessage());
    }

    @Test
    void tellsAllFaultsAtOnce() throws IOException {
        replace("crops/respiration.csv", "apple,0,3,3,", "aple,0,30,3,");
        replace("crops/ethylene.csv", ",exact,", ",exactly,");
        replace("stores/doorways.csv", "strip-curtain-aged", "strip-curtain");
        Files.writeString(folder.resolve("crops/new.csv"), "a\n1\n");
        Files.delete(folder.resolve("stores/packages.csv"));
        BadInput refused = assertThrows(BadInput.class, () -> BuildReference.build(folder));
        List<String> files = refused.faults().stream().map(Fault::file).distinct().toList();
        assertEquals(
                List.of(
                        "crops/new.csv",
                        "columns.csv",
                        "crops/ethylene.csv",
                        "crops/respiration.csv",
                        "stores/doorways.csv",
                        "stores/package-classes.csv"),
                files);
        assertEquals(
                2,
                refused.faults().stream()
                        .filter(fault -> fault.file().equals("crops/respiration.csv"))
                        .count());
    }

    @Test
    void refusesARepeatedRow() throws IOException {
        Path file = folder.resolve("crops/respiration.csv");
        List<String> lines = Files.readAllLines(file);
        Files.writeString(file, String.join("\n", lines) + "\n" + lines.get(1) + "\n");
        BadInput refused = assertThrows(BadInput.class, () -> BuildReference.build(folder));
        assertEquals(
                "crops/respiration.csv line "
                        + (lines.size() + 1)
                        + ": repeats line 2; delete one of them",
                refused.getMessage());
    }

    private void replace(String file, String from, String to) throws IOException {
        Path path = folder.resolve(file);
        String before = Files.readString(path);
        assertTrue(before.contains(from), file + " has no " + from);
        Files.writeString(path, before.replaceFirst(java.util.regex.Pattern.quote(from), to));
    }
}

package org.wardon.reference;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertNotEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.sql.Connection;
import java.sql.DriverManager;
import java.sql.SQLException;
import java.sql.Statement;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.wardon.errors.BadInput;
import org.wardon.keeping.RestsOn;
import org.wardon.keeping.chilling.Chilling;
import org.wardon.keeping.life.LifeCurve;
import org.wardon.lots.ClassValues;
import org.wardon.lots.Respirations;
import org.wardon.produce.Commodity;
import org.wardon.produce.NamedFact;
import org.wardon.produce.Ripeness;

/** A keeper's own values lie over print and are shown as own. */
class OwnValuesTest {
    private static final String NOW = "2026-03-02T09:00:00Z";

    /** Has a figure for everything the class values ask for. */
    private static final Commodity APPLE = apple();

    @TempDir Path folder;

    private static Commodity apple() {
        try (ReferenceBook book = ReferenceBook.open()) {
            return book.get("apple");
        }
    }

    @Test
    void ownValuesComeFirstAndPrintStaysVisible() {
        OwnValues own = new OwnValues(folder);
        own.set(OwnValue.of("mango", "storage-temperature", 10, 11, NOW));
        own.set(OwnValue.of("mango", "storage-humidity", 80, 85, NOW));
        own.set(OwnValue.of("mango", "storage-life", 9, 12, NOW));
        own.set(OwnValue.of("mango", "highest-freezing-point", -1.4, -1.4, NOW));
        own.set(OwnValue.of("mango", "chilling-floor", 9, 9, NOW));
        own.set(OwnValue.of("mango", "permissible-loss", 6, 6, NOW));
        own.set(OwnValue.of("mango", "respiration-heat@12.5C", 80, 90, NOW));
        own.set(OwnValue.of("mango", "life@10C", 9, 9, NOW));
        try (ReferenceBook book = ReferenceBook.open(own)) {
            Commodity mango = book.get("mango");
            assertEquals(10, mango.needs().temperatureC().orElseThrow().lowest());
            assertTrue(mango.needs().temperatureC().orElseThrow().own());
            assertEquals(80, mango.needs().humidityPct().orElseThrow().lowest());
            assertEquals(9, mango.needs().lifeDays().orElseThrow().lowest());
            assertEquals(-1.4, mango.needs().highestFreezingC().orElseThrow().lowest());
            assertEquals(9, mango.keeping().floors().get(0).lowestSafeC().orElseThrow().lowest());
            assertTrue(mango.keeping().floors().size() > 1);
            assertEquals(6, mango.water().limits().get(0).maxLossPct().lowest());
            assertEquals(12.5, mango.breath().respiration().get(0).temperatureC());
            assertTrue(mango.breath().respiration().get(0).wattsPerTonne().own());
            assertEquals("heat", mango.breath().respiration().get(1).table());
            assertEquals(10, mango.keeping().lives().get(0).temperatureC().orElseThrow());
            List<NamedFact> facts = book.facts("mango");
            assertTrue(facts.stream().limit(8).allMatch(NamedFact::own));
            assertTrue(facts.stream().skip(8).noneMatch(NamedFact::own));
            NamedFact printed =
                    facts.stream()
                            .filter(fact -> !fact.own())
                            .filter(fact -> fact.name().equals("storage-temperature"))
                            .findFirst()
                            .orElseThrow();
            assertEquals(13, printed.low().orElseThrow());
        }
    }

    @Test
    void theModelReckonsWithOwnValues() {
        OwnValues own = new OwnValues(folder);
        own.set(OwnValue.of("mango", "chilling-floor", 8, 8, NOW));
        own.set(OwnValue.of("mango", "life@10C", 9, 9, NOW));
        own.set(OwnValue.of("mango", "respiration-heat@13C", 50, 50, NOW));
        own.set(OwnValue.of("mango", "permissible-loss", 6, 6, NOW));
        try (ReferenceBook book = ReferenceBook.open(own);
                ReferenceBook print = ReferenceBook.open()) {
            Commodity mango = book.get("mango");
            Commodity printed = print.get("mango");
            assertTrue(book.all().contains(mango));
            assertFalse(book.all().contains(printed));
            assertEquals(8, floor(mango));
            assertEquals(10, floor(printed), 3);
            assertNotEquals(8, floor(printed));
            assertEquals(RestsOn.KNOWN_LIFE, life(mango).restsOn());
            assertNotEquals(RestsOn.KNOWN_LIFE, life(printed).restsOn());
            assertEquals(0.050, wattsPerKg(mango), 1e-9);
            assertTrue(wattsPerKg(printed) > 0.080);
        }
    }

    private static double floor(Commodity commodity) {
        return Chilling.of(commodity, Ripeness.GREEN).orElseThrow().zone().topC();
    }

    private static LifeCurve life(Commodity commodity) {
        return LifeCurve.of(commodity, Optional.empty());
    }

    private static double wattsPerKg(Commodity commodity) {
        ClassValues classes = ClassValues.of(List.of(commodity, APPLE));
        return Respirations.of(commodity, Ripeness.UNKNOWN, classes, 0.5).value().wattsPerKg(13);
    }

    @Test
    void othersKeepWhatIsPrinted() {
        OwnValues own = new OwnValues(folder);
        own.set(OwnValue.of("mango", "storage-temperature", 10, 11, NOW));
        try (ReferenceBook book = ReferenceBook.open(own)) {
            assertFalse(book.get("okra").needs().temperatureC().orElseThrow().own());
        }
    }

    @Test
    void setReplacesAndDeleteBringsPrintBack() {
        OwnValues own = new OwnValues(folder);
        own.set(OwnValue.of("mango", "storage-temperature", 10, 11, NOW));
        own.set(OwnValue.of("mango", "storage-temperature", 12, 12, NOW));
        assertEquals(
                List.of(new OwnValue("mango", "storage-temperature", 12, 12, "C", NOW)),
                own.list());
        assertTrue(own.delete("mango", "storage-temperature"));
        assertFalse(own.delete("mango", "storage-temperature"));
        assertEquals(List.of(), own.list());
    }

    @Test
    void readingCreatesNothing() throws IOException {
        Path nowhere = folder.resolve("not-there");
        OwnValues own = new OwnValues(nowhere);
        assertEquals(List.of(), own.list());
        assertFalse(own.delete("mango", "storage-life"));
        try (ReferenceBook book = ReferenceBook.open(own)) {
            assertEquals("mango", book.get("mango").id());
        }
        assertFalse(Files.exists(nowhere));
        try (Stream<Path> files = Files.list(folder)) {
            assertEquals(0, files.count());
        }
    }

    @Test
    void readingAnExistingFileLeavesNoFileBeside() throws IOException {
        new OwnValues(folder).set(OwnValue.of("mango", "storage-life", 9, 12, NOW));
        assertEquals(1, new OwnValues(folder).list().size());
        try (Stream<Path> files = Files.list(folder)) {
            assertEquals(List.of("store.db"), files.map(f -> f.getFileName().toString()).toList());
        }
    }

    @Test
    void refusesWhatCannotBeSet() {
        BadInput name =
                assertThrows(BadInput.class, () -> OwnValue.of("mango", "colour", 1, 1, NOW));
        assertEquals(
                "mango colour: no fact of this name can be set; one of storage-temperature,"
                        + " storage-humidity, storage-life, life@10C, highest-freezing-point,"
                        + " chilling-floor, permissible-loss, respiration-heat@10C; the"
                        + " temperature from -2.0 to 40.0 C",
                name.getMessage());
        BadInput range =
                assertThrows(
                        BadInput.class,
                        () -> OwnValue.of("mango", "storage-humidity", 120, 110, NOW));
        assertEquals(3, range.faults().size());
        assertThrows(BadInput.class, () -> OwnValue.of("mango", "life", 9, 9, NOW));
        assertThrows(
                BadInput.class, () -> OwnValue.of("mango", "storage-temperature@10C", 9, 9, NOW));
    }

    @Test
    void refusesAFileOfALaterVersion() throws SQLException {
        Path file = folder.resolve("store.db");
        try (Connection connection = DriverManager.getConnection("jdbc:sqlite:" + file);
                Statement statement = connection.createStatement()) {
            statement.execute("pragma user_version = 99");
        }
        BadInput refused = assertThrows(BadInput.class, () -> new OwnValues(folder).list());
        assertEquals(
                file
                        + ": was written by a later version of the program (99); version 3 or"
                        + " lower; bring the program up to date",
                refused.getMessage());
    }

    @Test
    void refusesAFileThatIsNone() throws IOException {
        Files.writeString(folder.resolve("store.db"), "not a database, but long enough to look");
        assertThrows(BadInput.class, () -> new OwnValues(folder).list());
    }

    @Test
    void refusesAFolderThatIsAFile() throws IOException {
        Path file = Files.writeString(folder.resolve("taken"), "x");
        OwnValue value = OwnValue.of("mango", "storage-life", 9, 12, NOW);
        BadInput refused = assertThrows(BadInput.class, () -> new OwnValues(file).set(value));
        assertTrue(refused.getMessage().contains("cannot be created"), refused.getMessage());
        assertEquals("x", Files.readString(file));
    }

    @Test
    void folderIsTheOneGivenThenTheVariableThenTheUsersData() {
        Path home = Path.of("/home/k");
        Map<String, String> set =
                Map.of("WARDON_HOME", "/w", "XDG_DATA_HOME", "/x", "LOCALAPPDATA", "/l");
        assertEquals(Path.of("/g"), StoreFolder.of(Optional.of(Path.of("/g")), set, "Linux", home));
        assertEquals(Path.of("/w"), StoreFolder.of(Optional.empty(), set, "Linux", home));
        Map<String, String> unset = Map.of("XDG_DATA_HOME", "/x", "LOCALAPPDATA", "/l");
        assertEquals(Path.of("/x/wardon"), StoreFolder.of(Optional.empty(), unset, "Linux", home));
        assertEquals(
                Path.of("/l/wardon"), StoreFolder.of(Optional.empty(), unset, "Windows 11", home));
        assertEquals(
                Path.of("/home/k/Library/Application Support/wardon"),
                StoreFolder.of(Optional.empty(), Map.of(), "Mac OS X", home));
        assertEquals(
                Path.of("/home/k/.local/share/wardon"),
                StoreFolder.of(Optional.empty(), Map.of(), "Linux", home));
    }
}

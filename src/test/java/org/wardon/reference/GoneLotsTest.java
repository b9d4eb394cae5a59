package org.wardon.reference;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.sql.Connection;
import java.sql.DriverManager;
import java.sql.SQLException;
import java.sql.Statement;
import java.time.LocalDate;
import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.wardon.errors.BadInput;
import org.wardon.produce.Ripeness;
import org.wardon.produce.rows.OwnLot;

/** Lots that are gone stay in the keeper's file and come to the commodity. */
class GoneLotsTest {
    /** Tables that a file of the first version has not, those that are pointed to last. */
    private static final List<String> LATER_TABLES =
            List.of("kept_file", "kept_body", "kept_version", "kept_plan", "gone_lot");

    @TempDir Path folder;

    private static GoneLot gone(String commodity, double days, String note) {
        OwnLot.Began began = new OwnLot.Began("x", Ripeness.GREEN, Optional.of(true), 0.25);
        List<OwnLot.Spell> spells =
                List.of(new OwnLot.Spell(12.125, 24 * days), new OwnLot.Spell(-0.5, 7));
        LocalDate day = LocalDate.parse("2026-03-02");
        return new GoneLot(
                commodity, "M1", note, new OwnLot(0, day, OwnLot.Ended.SPOILT, began, spells));
    }

    @Test
    void whatIsRememberedComesBackAndReachesTheCommodity() {
        GoneLots file = new GoneLots(folder);
        assertEquals(1, file.add(gone("mango", 9, "it's \"wet\"")));
        assertEquals(2, file.add(gone("okra", 4, "")));
        GoneLot back = file.list().get(0);
        GoneLot same = gone("mango", 9, "it's \"wet\"");
        assertEquals(same.note(), back.note());
        assertEquals(same.lot().began(), back.lot().began());
        assertEquals(same.lot().spells(), back.lot().spells());
        assertEquals(OwnLot.Ended.SPOILT, back.lot().ended());
        try (ReferenceBook book = ReferenceBook.open(new OwnValues(folder), file.list())) {
            assertEquals(List.of(back.lot()), book.get("mango").keeping().ownLots());
            assertEquals(List.of(), book.get("kale").keeping().ownLots());
        }
        assertTrue(file.delete(1));
        assertFalse(file.delete(1));
        assertEquals(List.of("okra"), file.list().stream().map(GoneLot::commodityId).toList());
        assertEquals(3, file.add(gone("mango", 9, "")), "a number is not given twice");
    }

    @Test
    void readingCreatesNothingAndAFileOfTheFirstVersionIsCarriedOn()
            throws IOException, SQLException {
        assertEquals(List.of(), new GoneLots(folder).list());
        assertFalse(Files.exists(folder.resolve("store.db")));
        new OwnValues(folder).set(OwnValue.of("mango", "life@10C", 9, 9, "2026-03-02T09:00:00Z"));
        try (Connection connection =
                        DriverManager.getConnection("jdbc:sqlite:" + folder.resolve("store.db"));
                Statement statement = connection.createStatement()) {
            for (String later : LATER_TABLES) {
                statement.execute("drop table " + later);
            }
            statement.execute("pragma user_version = 1");
        }
        GoneLots file = new GoneLots(folder);
        assertEquals(List.of(), file.list());
        assertEquals(1, file.add(gone("mango", 9, "")));
        assertEquals(1, new OwnValues(folder).list().size());
    }

    @Test
    void aLineThatCannotBeReadIsNamed() throws SQLException {
        new GoneLots(folder).add(gone("mango", 9, ""));
        Path file = folder.resolve("store.db");
        try (Connection connection = DriverManager.getConnection("jdbc:sqlite:" + file);
                Statement statement = connection.createStatement()) {
            statement.execute("update gone_lot set spells = 'warm'");
        }
        BadInput refused = assertThrows(BadInput.class, () -> new GoneLots(folder).list());
        assertEquals(
                "store.db: lot 1 cannot be read; accepted: as the program wrote it; restore it from"
                        + " a copy",
                refused.getMessage());
    }
}

package org.wardon.logbook;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.Clock;
import java.time.Instant;
import java.time.ZoneOffset;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.concurrent.ExecutorService;
import java.util.concurrent.Executors;
import java.util.concurrent.Future;
import java.util.stream.IntStream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.wardon.errors.BadInput;
import org.wardon.reference.OwnValue;
import org.wardon.reference.OwnValues;

/** Plans keep every version, and nobody's save is lost to another's. */
class KeptPlansTest {
    private static final Clock NOON =
            Clock.fixed(Instant.parse("2026-03-02T12:00:00Z"), ZoneOffset.UTC);
    private static final Map<String, String> WEATHER = Map.of("weather.csv", "time\n");

    @TempDir Path home;

    private KeptPlans plans() {
        return new KeptPlans(home, NOON);
    }

    private static PlanText text(String text) {
        return new PlanText(text, WEATHER);
    }

    @Test
    void readingCreatesNothing() {
        assertEquals(List.of(), plans().list());
        assertEquals(Optional.empty(), plans().find(1));
        assertFalse(Files.exists(home.resolve("store.db")));
    }

    @Test
    void undoAndRedoWalkTheHistoryAndNothingIsLost() {
        KeptPlans plans = plans();
        KeptPlan first = plans.add("Quay", "", text("one"), "begun");
        assertEquals(
                new KeptPlan(first.id(), "Quay", 1, NOON.instant(), "begun", false, false), first);
        assertEquals(new Saved.Kept(2), plans.save(first.id(), 1, "Quay 2", text("two"), "mango"));
        assertEquals(new Saved.Kept(1), plans.undo(first.id(), 2));
        KeptPlan undone = plans.find(first.id()).orElseThrow();
        assertEquals("Quay", undone.name());
        assertTrue(undone.canRedo());
        assertFalse(undone.canUndo());
        assertEquals(new Saved.Nothing(), plans.undo(first.id(), 1));
        assertEquals(new Saved.Kept(2), plans.redo(first.id(), 1));
        assertEquals(new Saved.Kept(1), plans.undo(first.id(), 2));
        assertEquals(new Saved.Kept(3), plans.save(first.id(), 1, "Quay", text("three"), "okra"));
        assertEquals(new Saved.Nothing(), plans.redo(first.id(), 3));
        assertEquals(
                List.of(
                        new PlanVersion(3, 1, "okra", NOON.instant()),
                        new PlanVersion(2, 1, "mango", NOON.instant()),
                        new PlanVersion(1, 0, "begun", NOON.instant())),
                plans.history(first.id()));
        assertEquals(Optional.of(text("two")), plans.text(first.id(), 2));
        assertEquals(Optional.of(text("three")), plans.text(first.id(), 3));
    }

    @Test
    void aSaveFromAnOldVersionIsRefusedAndChangesNothing() {
        KeptPlans plans = plans();
        long id = plans.add("Quay", "", text("one"), "begun").id();
        plans.save(id, 1, "Quay", text("mine"), "mine");
        Saved.Outdated outdated = new Saved.Outdated(1, 2, "mine");
        assertEquals(outdated, plans.save(id, 1, "Quay", text("theirs"), "theirs"));
        assertEquals(outdated, plans.undo(id, 1));
        assertEquals(outdated, plans.delete(id, 1));
        assertEquals(2, plans.history(id).size());
        assertEquals(new Saved.Nothing(), plans.save(99, 1, "Quay", text("x"), "x"));
    }

    @Test
    void deletingTakesAllVersionsAndLeavesOtherPlans() {
        KeptPlans plans = plans();
        long gone = plans.add("Quay", "a", text("one"), "begun").id();
        long stays = plans.add("Hill", "b", text("one"), "begun").id();
        assertEquals(new Saved.Kept(1), plans.delete(gone, 1));
        assertEquals(Optional.empty(), plans.text(gone, 1));
        assertEquals(Optional.of(text("one")), plans.text(stays, 1));
        assertEquals(stays, plans.from("b").orElseThrow().id());
        assertEquals(Optional.empty(), plans.from("a"));
    }

    @Test
    void ofManyWritersFromOneVersionExactlyOneIsKeptEachTime() throws Exception {
        long id = plans().add("Quay", "", text("one"), "begun").id();
        int rounds = 8;
        int writers = 4;
        ExecutorService people = Executors.newFixedThreadPool(writers);
        try {
            for (int round = 1; round <= rounds; round++) {
                int from = round;
                List<Future<Saved>> saves = new ArrayList<>();
                IntStream.range(0, writers)
                        .forEach(
                                who ->
                                        saves.add(
                                                people.submit(
                                                        () ->
                                                                plans().save(
                                                                                id,
                                                                                from,
                                                                                "Quay",
                                                                                text("by " + who),
                                                                                "w" + who))));
                int kept = 0;
                for (Future<Saved> save : saves) {
                    kept += save.get() instanceof Saved.Kept ? 1 : 0;
                }
                assertEquals(1, kept);
            }
        } finally {
            people.shutdown();
        }
        assertEquals(rounds + 1, plans().history(id).size());
    }

    @Test
    void manyOpenANewFileAtOnceAndNoneMeetsAHalfMadeOne() throws Exception {
        ExecutorService people = Executors.newFixedThreadPool(6);
        List<Future<Long>> added = new ArrayList<>();
        for (int i = 0; i < 12; i++) {
            String name = "plan " + i;
            added.add(people.submit(() -> plans().add(name, "", text("one"), "begun").id()));
        }
        for (Future<Long> one : added) {
            one.get();
        }
        people.shutdown();
        assertEquals(12, plans().list().size());
    }

    @Test
    void aFileOfAnEarlierVersionIsBroughtUpAndKeepsWhatItHad() throws Exception {
        new OwnValues(home)
                .set(OwnValue.of("mango", "storage-life", 9, 12, "2026-03-02T09:00:00Z"));
        try (var open =
                        java.sql.DriverManager.getConnection(
                                "jdbc:sqlite:" + home.resolve("store.db"));
                var statement = open.createStatement()) {
            for (String table : List.of("kept_file", "kept_body", "kept_version", "kept_plan")) {
                statement.execute("drop table " + table);
            }
            statement.execute("pragma user_version = 2");
        }
        assertEquals(List.of(), plans().list());
        plans().add("Quay", "", text("one"), "begun");
        assertEquals(1, plans().list().size());
        assertEquals(1, new OwnValues(home).list().size());
    }

    @Test
    void aBrokenFileIsRefusedInWords() throws IOException {
        Path file = home.resolve("store.db");
        Files.writeString(file, "no database at all, but long enough to be looked at".repeat(40));
        BadInput bad = assertThrows(BadInput.class, () -> plans().list());
        assertEquals(
                file
                        + ": cannot be used: [SQLITE_NOTADB] File opened that is not a database file"
                        + " (file is not a database); a store.db that can be read and written;"
                        + " restore it from a copy",
                bad.getMessage());
    }
}

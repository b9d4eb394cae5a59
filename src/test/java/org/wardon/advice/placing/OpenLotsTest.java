package org.wardon.advice.placing;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertSame;

import java.nio.file.Path;
import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.AfterAll;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.wardon.errors.Progress;
import org.wardon.plan.ChamberPlan;
import org.wardon.plan.LotPlan;
import org.wardon.plan.StorePlan;
import org.wardon.reference.ReferenceBook;

class OpenLotsTest {
    private static ReferenceBook book;

    @TempDir Path folder;

    @BeforeAll
    static void open() {
        book = ReferenceBook.open();
    }

    @AfterAll
    static void close() {
        book.close();
    }

    private OpenLots.Housed house(StorePlan plan) {
        return OpenLots.house(plan, book, Progress.SILENT);
    }

    private static String lot(String id, String crop, double kg, double price, String more) {
        return """
        {"id": "%s", "commodity": "%s", "massKg": %s, "package": "room-cooling-any",
         "arrives": "2026-03-02T12:00", "temperatureC": 20, "wantedDays": 4,
         "pricePerKg": %s%s}"""
                .formatted(id, crop, kg, price, more);
    }

    private StorePlan store(String... lots) {
        DrawnStore store = new DrawnStore().chamber("cold", 2, 3000, 600);
        for (String lot : lots) {
            store.lot(lot);
        }
        return store.plan(folder, book);
    }

    private static List<Optional<String>> homes(OpenLots.Housed housed) {
        return housed.plan().lots().stream().map(LotPlan::chamber).toList();
    }

    @Test
    void whereOnlyOneHasRoomTheDearerOneGoesInThoughItWasNamedLater() {
        OpenLots.Housed housed =
                house(
                        store(
                                lot("CHEAP", "carrot-topped", 500, 1, ""),
                                lot("DEAR", "carrot-topped", 500, 3, "")));
        assertEquals(List.of(Optional.empty(), Optional.of("cold")), homes(housed));
        assertEquals(
                List.of("DEAR", "cold"), housed.told().get(0).reason().subjects(), "what is told");
    }

    @Test
    void aLotThatStandsThereIsNeitherMovedNorRippedOutAndSettingsStay() {
        StorePlan plan =
                store(
                        lot("IN", "carrot-topped", 500, 1, ", \"chamber\": \"cold\""),
                        lot("OPEN", "carrot-topped", 500, 3, ""));
        OpenLots.Housed housed = house(plan);
        assertEquals(List.of(Optional.of("cold"), Optional.empty()), homes(housed));
        assertEquals(
                plan.chambers().stream().map(ChamberPlan::setting).toList(),
                housed.plan().chambers().stream().map(ChamberPlan::setting).toList());
    }

    @Test
    void aChamberThatIsOffTakesNoneAndKeepsItsOwn() {
        DrawnStore store = new DrawnStore().chamber("cold", 2, 3000, 600);
        store.chamber("rests", 2, 3000, 5000);
        store.lot(lot("IN", "carrot-topped", 500, 1, ", \"chamber\": \"rests\""));
        store.lot(lot("ONE", "carrot-topped", 500, 2, ""));
        store.lot(lot("TWO", "carrot-topped", 500, 1, ""));
        StorePlan plan = store.plan(folder, book);
        ChamberPlan rests = plan.chambers().get(1).switchedOff();
        StorePlan off = plan.with(List.of(plan.chambers().get(0), rests), plan.lots());
        assertEquals(
                List.of(Optional.of("rests"), Optional.of("cold"), Optional.empty()),
                homes(house(off)));
        StorePlan allOff =
                plan.with(List.of(plan.chambers().get(0).switchedOff(), rests), plan.lots());
        assertSame(allOff, house(allOff).plan());
    }

    @Test
    void aPlanWithoutOpenLotsIsGivenBack() {
        StorePlan plan = store(lot("IN", "carrot-topped", 500, 1, ", \"chamber\": \"cold\""));
        assertSame(plan, house(plan).plan());
    }
}

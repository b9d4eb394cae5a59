package org.wardon.advice.crops;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import org.junit.jupiter.api.AfterAll;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.wardon.produce.Commodity;
import org.wardon.reference.ReferenceBook;

/** Crops found by what people type. */
class CropSearchTest {
    private static final ReferenceBook BOOK = ReferenceBook.open();
    private static final CropSearch SEARCH = new CropSearch(BOOK);

    @AfterAll
    static void close() {
        BOOK.close();
    }

    @ParameterizedTest(name = "{0} finds {1}")
    @CsvSource({
        "mango, mango",
        "MANGO, mango",
        "mang, mango",
        "Mangifera, mango",
        "mangoe, mango",
        "brokoli, broccoli",
        "lady's finger, okra",
        "màngo, mango",
        "avocados, avocado"
    })
    void firstHit(String typed, String id) {
        assertEquals(id, SEARCH.find(typed).get(0).commodity().id());
    }

    @Test
    void aWordOfSeveralNamesFindsThemAll() {
        List<String> ids = SEARCH.find("pepper").stream().map(hit -> hit.commodity().id()).toList();
        assertTrue(ids.size() >= 2, ids.toString());
        assertTrue(
                SEARCH.find("pepper").stream()
                        .allMatch(
                                hit ->
                                        hit.by()
                                                .toLowerCase(java.util.Locale.ROOT)
                                                .contains("pepper")),
                ids.toString());
    }

    @Test
    void nothingTypedListsAllAndNonsenseNone() {
        assertEquals(BOOK.list().size(), SEARCH.find("  ").size());
        assertEquals(List.of(), SEARCH.find("qqqqqqqqzzzz"));
    }

    @Test
    void everyCropStandsInOnePart() {
        List<String> ids =
                SEARCH.byPart().values().stream()
                        .flatMap(List::stream)
                        .map(Commodity::id)
                        .sorted()
                        .toList();
        assertEquals(BOOK.list().stream().sorted().toList(), ids);
    }
}

package org.wardon.reference;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import org.junit.jupiter.api.AfterAll;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.wardon.produce.Commodity;
import org.wardon.reference.NameMatch.How;

/** Commodities by what is typed. */
class NameSearchTest {
    private static final ReferenceBook BOOK = ReferenceBook.open();

    @AfterAll
    static void close() {
        BOOK.close();
    }

    @ParameterizedTest(name = "{0} is {1}, {2}")
    @CsvSource({
        "mango, mango, NAME",
        "Mangó, mango, NAME",
        "MANGOES, mango, NAME",
        "lady's finger, okra, NAME",
        "mangifera indica, mango, NAME",
        "broc, broccoli, BEGINNING",
        "mangif, mango, BEGINNING",
        "esculentus, okra, WORD",
        "brokoli, broccoli, SLIP",
        "avacado, avocado, SLIP",
        "cassaba root, cassava, ALIKE",
        "leaves of spinach, spinach, ALIKE"
    })
    void findsAndTellsHow(String typed, String id, How how) {
        NameMatch first = BOOK.search(typed).get(0);
        assertEquals(id, first.id(), BOOK.search(typed).toString());
        assertEquals(how, first.how(), first.toString());
    }

    @Test
    void surerMeetingsComeFirstAndEachCommodityOnce() {
        for (String typed : List.of("pepper", "man", "onion", "bean", "pea")) {
            List<NameMatch> found = BOOK.search(typed);
            assertTrue(found.size() >= 2, typed + ": " + found);
            for (int i = 1; i < found.size(); i++) {
                assertTrue(
                        found.get(i - 1).how().compareTo(found.get(i).how()) <= 0,
                        typed + ": " + found);
            }
            assertEquals(found.size(), found.stream().map(NameMatch::id).distinct().count(), typed);
        }
    }

    @Test
    void everyNameOfACommodityLeadsToOneThatBearsIt() {
        for (Commodity commodity : BOOK.all()) {
            NameMatch byId = BOOK.search(commodity.id()).get(0);
            assertEquals(commodity.id(), byId.id());
            assertEquals(How.NAME, byId.how());
        }
    }

    @Test
    void nothingAndNonsenseMeanNothing() {
        assertEquals(List.of(), BOOK.search("  "));
        assertEquals(List.of(), BOOK.search("qqqqqqqqzzzz"));
    }
}

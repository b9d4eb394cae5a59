package org.wardon.web.work;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertSame;
import static org.junit.jupiter.api.Assertions.assertThrows;

import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.wardon.reference.OwnValue;
import org.wardon.reference.OwnValues;
import org.wardon.reference.ReferenceBook;

/** Reference books by the keeper's own values. */
class BooksTest {
    @TempDir private Path home;

    /** Each holds the tables in memory: who changes values all day must not fill it. */
    @Test
    void theLastBooksStayOpenAndTheOldestAreClosed() {
        OwnValues own = new OwnValues(home);
        List<ReferenceBook> all = new ArrayList<>();
        try (Books books = new Books(home)) {
            for (int i = 0; i < 20; i++) {
                double days = 10 + i;
                own.set(
                        new OwnValue(
                                "mango", "storage-life", days, days, "d", "2026-03-01T10:00:00Z"));
                all.add(books.current());
                assertSame(all.get(i), books.current());
            }
            int crops = all.get(19).list().size();
            for (ReferenceBook book : all.subList(4, 20)) {
                assertEquals(crops, book.list().size());
            }
            for (ReferenceBook book : all.subList(0, 4)) {
                assertThrows(IllegalStateException.class, book::list);
            }
        }
    }
}

package org.wardon.web.work;

import java.nio.file.Path;
import java.util.ArrayDeque;
import java.util.Deque;
import java.util.List;
import org.jspecify.annotations.Nullable;
import org.wardon.reference.GoneLot;
import org.wardon.reference.GoneLots;
import org.wardon.reference.OwnValue;
import org.wardon.reference.OwnValues;
import org.wardon.reference.ReferenceBook;

/**
 * The reference book with the keeper's own values as they are now: another one where they have
 * changed. Books handed out stay open while others follow, as work with them may go on.
 */
final class Books implements AutoCloseable {
    /** Books open at most; work goes on with one for minutes, a person changes a value in one. */
    private static final int OPEN = 16;

    private final OwnValues values;
    private final GoneLots lots;
    private final Deque<ReferenceBook> open = new ArrayDeque<>();
    private @Nullable Edition edition;

    /** A book and what of the keeper's own lies over it. */
    private record Edition(ReferenceBook book, List<OwnValue> values, List<GoneLot> lots) {}

    Books(Path home) {
        values = new OwnValues(home);
        lots = new GoneLots(home);
    }

    synchronized ReferenceBook current() {
        List<OwnValue> valuesNow = values.list();
        List<GoneLot> lotsNow = lots.list();
        Edition now = edition;
        if (now == null || !now.values.equals(valuesNow) || !now.lots.equals(lotsNow)) {
            now = new Edition(ReferenceBook.open(values, lotsNow), valuesNow, lotsNow);
            open.add(now.book);
            edition = now;
            if (open.size() > OPEN) {
                open.remove().close();
            }
        }
        return now.book;
    }

    @Override
    public synchronized void close() {
        open.forEach(ReferenceBook::close);
    }
}

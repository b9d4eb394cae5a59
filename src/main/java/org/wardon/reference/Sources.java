package org.wardon.reference;

import java.util.Map;
import java.util.function.Function;
import java.util.stream.Collectors;
import org.wardon.errors.Require;
import org.wardon.produce.Source;

/** The published sources, and the three that are none: the keeper, the trade, an assumption. */
final class Sources {
    private final Map<String, Source> byId;

    Sources(ReferenceDatabase database) {
        byId =
                database
                        .list(
                                "select * from sources",
                                row ->
                                        new Source(
                                                row.text("source_id"),
                                                row.text("citation"),
                                                row.text("year"),
                                                row.text("publisher"),
                                                row.text("note")))
                        .stream()
                        .collect(Collectors.toMap(Source::id, Function.identity()));
        add(OwnValue.SOURCE, "the keeper's own value");
        add(Row.PRACTICE, "common practice, no source");
        add(Row.ASSUMPTION, "assumption");
    }

    private void add(String id, String citation) {
        byId.put(id, new Source(id, citation, "", "", ""));
    }

    Source get(String id) {
        Source source = byId.get(id);
        if (source == null) {
            throw new IllegalArgumentException(
                    "no source called '" + Require.text("source id", id) + "' in sources.csv");
        }
        return source;
    }
}

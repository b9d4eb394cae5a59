package org.wardon.reference.build;

import java.util.Arrays;
import java.util.List;

/**
 * One column of a table as {@code columns.csv} lists it.
 *
 * @param name name in the head of the table
 * @param kind what a cell may hold
 * @param pair the column a figure must not lie below, may be empty
 * @param low lowest figure accepted
 * @param high highest figure accepted
 * @param words words accepted
 */
record Column(String name, Kind kind, String pair, double low, double high, List<String> words) {
    /** What a cell may hold. */
    enum Kind {
        KEY,
        COMMODITY,
        KNOWN_COMMODITY,
        KNOWN_PACKAGE,
        SOURCE,
        SOURCE_OR_EMPTY,
        SOURCES,
        EVIDENCE,
        EVIDENCE_OR_EMPTY,
        EVIDENCE_PROSE,
        NUMBER,
        PRINTED,
        WORD,
        TEXT;

        static Kind of(String name) {
            return switch (name) {
                case "source?" -> SOURCE_OR_EMPTY;
                case "evidence?" -> EVIDENCE_OR_EMPTY;
                default ->
                        name.startsWith("high:")
                                ? NUMBER
                                : valueOf(
                                        name.toUpperCase(java.util.Locale.ROOT).replace('-', '_'));
            };
        }
    }

    Column {
        words = List.copyOf(words);
    }

    static Column of(String name, String kind, String low, String high, String words) {
        String pair = kind.startsWith("high:") ? kind.substring("high:".length()) : "";
        return new Column(
                name,
                Kind.of(kind),
                pair,
                low.isEmpty() ? Double.NEGATIVE_INFINITY : Double.parseDouble(low),
                high.isEmpty() ? Double.POSITIVE_INFINITY : Double.parseDouble(high),
                words.isEmpty()
                        ? List.of()
                        : Arrays.asList(words.split(words.contains("|") ? "\\|" : " ")));
    }

    boolean isEvidence() {
        return kind == Kind.EVIDENCE
                || kind == Kind.EVIDENCE_OR_EMPTY
                || kind == Kind.EVIDENCE_PROSE;
    }
}

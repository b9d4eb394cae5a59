package org.wardon.reference.build;

import java.util.Optional;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

/**
 * The word of evidence that stands at the head of a cell, which may go on in prose: {@code seen;
 * confirmed by X} is seen, {@code memory: gives ...} is memory, {@code seen, derived} is derived,
 * {@code seen-k} (only the conductivity was seen) is mixed.
 */
final class EvidenceWord {
    private static final String PRACTICE = "common practice, no source";
    private static final Pattern HEAD =
            Pattern.compile("(seen|memory|mixed|derived|computed|assumption)(-[A-Za-z-]+)?\\b.*");
    private static final Pattern DERIVED = Pattern.compile("seen, derived\\b.*");

    private EvidenceWord() {}

    /** Returns the word at the head of the cell; empty if there is none. */
    static Optional<String> of(String cell) {
        if (cell.equals(PRACTICE)) {
            return Optional.of(PRACTICE);
        }
        if (DERIVED.matcher(cell).matches()) {
            return Optional.of("derived");
        }
        Matcher head = HEAD.matcher(cell);
        if (!head.matches()) {
            return Optional.empty();
        }
        return head.group(2) == null ? Optional.of(head.group(1)) : partly(head.group(2));
    }

    /** Returns the word for a cell of prose, which names several ways at once. */
    static Optional<String> ofProse(String cell) {
        if (cell.contains("seen") || cell.contains("recalled") || cell.contains("memory")) {
            return Optional.of("mixed");
        }
        return cell.startsWith("no published") ? Optional.of("assumption") : Optional.empty();
    }

    private static Optional<String> partly(String part) {
        return switch (part) {
            case "-R", "-range" -> Optional.of("seen");
            case "-inputs" -> Optional.of("computed");
            case "-k", "-k-rho", "-k-c", "-alpha" -> Optional.of("mixed");
            default -> Optional.empty();
        };
    }
}

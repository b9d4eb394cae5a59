package org.wardon.produce;

import java.util.Optional;
import java.util.OptionalDouble;
import org.wardon.errors.Require;

/**
 * One fact as it is shown to a person: a name, a figure or range or a word, and where it comes
 * from.
 *
 * @param name stable name such as {@code storage-temperature} or {@code life@13C}
 * @param low lower bound in {@code unit}; empty if not printed or if the fact is a word
 * @param high upper bound in {@code unit}; empty if not printed or if the fact is a word
 * @param unit unit of both bounds, empty for a word
 * @param text the word, where the fact is one; else empty
 * @param sourceId id in the table of sources
 * @param evidence how it reached us
 * @param own whether it is the keeper's own value
 * @param note what belongs to it: symptom, variant, what the figure rests on; may be empty
 * @param table the table it stands in
 */
public record NamedFact(
        String name,
        OptionalDouble low,
        OptionalDouble high,
        String unit,
        String text,
        String sourceId,
        Evidence evidence,
        boolean own,
        String note,
        String table) {
    /** Refuses a blank name or source. */
    public NamedFact {
        Require.text("name", name);
        Require.text("sourceId of " + name, sourceId);
    }

    /**
     * Returns the figure.
     *
     * @return the range; empty where the fact is a word
     */
    public Optional<Fact> fact() {
        return low.isEmpty() && high.isEmpty()
                ? Optional.empty()
                : Optional.of(new Fact(low, high, unit, sourceId, evidence, own));
    }
}

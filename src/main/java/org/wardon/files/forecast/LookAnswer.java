package org.wardon.files.forecast;

import java.util.List;
import java.util.OptionalDouble;

/**
 * The answer of {@code look}.
 *
 * @param commodity its id
 * @param names its names
 * @param facts all facts on it
 */
public record LookAnswer(String commodity, List<String> names, List<Line> facts) {
    /** Copies the lists. */
    public LookAnswer {
        names = List.copyOf(names);
        facts = List.copyOf(facts);
    }

    /**
     * One fact.
     *
     * @param name what it is
     * @param low lower bound; absent where open
     * @param high upper bound; absent where open
     * @param unit unit of both
     * @param source source id
     * @param evidence how it came to us
     * @param own whether it is the keeper's own
     */
    public record Line(
            String name,
            OptionalDouble low,
            OptionalDouble high,
            String unit,
            String source,
            String evidence,
            boolean own) {}
}

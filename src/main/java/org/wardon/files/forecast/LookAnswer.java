package org.wardon.files.forecast;

import java.util.List;
import java.util.OptionalDouble;
import org.wardon.produce.Commodity;
import org.wardon.produce.NamedFact;

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
     * Returns the answer for a commodity.
     *
     * @param commodity the commodity
     * @param facts all facts on it
     * @return the answer
     */
    public static LookAnswer of(Commodity commodity, List<NamedFact> facts) {
        return new LookAnswer(
                commodity.id(), commodity.names(), facts.stream().map(Line::of).toList());
    }

    /**
     * One fact.
     *
     * @param name what it is
     * @param low lower bound; absent where open
     * @param high upper bound; absent where open
     * @param unit unit of both
     * @param text what the source says where it gives a word and no figure, else empty
     * @param source source id
     * @param evidence how it came to us
     * @param own whether it is the keeper's own
     */
    public record Line(
            String name,
            OptionalDouble low,
            OptionalDouble high,
            String unit,
            String text,
            String source,
            String evidence,
            boolean own) {
        private static Line of(NamedFact fact) {
            return new Line(
                    fact.name(),
                    fact.low(),
                    fact.high(),
                    fact.unit(),
                    fact.text(),
                    fact.sourceId(),
                    fact.evidence().word(),
                    fact.own());
        }
    }
}

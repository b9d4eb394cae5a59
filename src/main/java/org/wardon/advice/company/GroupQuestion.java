package org.wardon.advice.company;

import java.util.Collections;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Set;
import org.wardon.produce.Conflict;

/**
 * Who of a plan is to share, with whom beside.
 *
 * @param lots ids of lots of the plan
 * @param crops days wanted of crops beside them, by id or any common name, in the order asked
 * @param accepts conflicts that are accepted beside those the plan accepts
 */
public record GroupQuestion(List<String> lots, Map<String, Double> crops, Set<Conflict> accepts) {
    /** Copies all three; crops keep their order. */
    public GroupQuestion {
        lots = List.copyOf(lots);
        crops = Collections.unmodifiableMap(new LinkedHashMap<>(crops));
        accepts = Set.copyOf(accepts);
    }
}

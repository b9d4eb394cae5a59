package org.wardon.sharing;

import java.util.List;
import java.util.Map;
import org.wardon.produce.Reason;

/**
 * Whether the lots of one chamber share it well.
 *
 * @param verdict whether they do
 * @param reasons why not better; empty where nothing speaks against it
 * @param each what they come to each, by id; the worst of a lot's places
 */
public record ChamberVerdict(Verdict verdict, List<Reason> reasons, Map<String, Verdict> each) {
    /** Copies list and map. */
    public ChamberVerdict {
        reasons = List.copyOf(reasons);
        each = Map.copyOf(each);
    }
}

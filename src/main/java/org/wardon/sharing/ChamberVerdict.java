package org.wardon.sharing;

import java.util.List;
import java.util.Map;
import org.wardon.produce.Reason;

/**
 * Whether the lots of one chamber share it well.
 *
 * @param verdict whether they do
 * @param reasons why not better; empty where nothing speaks against it
 * @param borne what conflicts cost that its keeper accepts; the days among the reasons too
 * @param each what they come to each, by id; the worst of a lot's places
 */
public record ChamberVerdict(
        Verdict verdict, List<Reason> reasons, List<Price> borne, Map<String, Verdict> each) {
    /** Copies lists and map. */
    public ChamberVerdict {
        reasons = List.copyOf(reasons);
        borne = List.copyOf(borne);
        each = Map.copyOf(each);
    }
}

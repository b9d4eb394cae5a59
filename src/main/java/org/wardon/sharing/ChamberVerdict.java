package org.wardon.sharing;

import java.util.List;
import org.wardon.produce.Reason;

/**
 * Whether the lots of one chamber share it well.
 *
 * @param verdict whether they do
 * @param reasons why not better; empty where nothing speaks against it
 */
public record ChamberVerdict(Verdict verdict, List<Reason> reasons) {
    /** Copies the list. */
    public ChamberVerdict {
        reasons = List.copyOf(reasons);
    }
}

package org.wardon.sharing;

import java.util.List;
import org.wardon.produce.Reason;

/**
 * Whether two lots may share.
 *
 * @param a id of the one
 * @param b id of the other
 * @param verdict whether they may
 * @param reasons why, worst first; empty where nothing speaks against it
 */
public record PairVerdict(String a, String b, Verdict verdict, List<Reason> reasons) {
    /** Copies the list. */
    public PairVerdict {
        reasons = List.copyOf(reasons);
    }
}

package org.wardon.keeping;

import java.util.List;
import org.wardon.produce.Reason;

/**
 * What an answer rests on.
 *
 * @param restsOn what the life rests on
 * @param reasons why, and what to know
 */
public record Basis(RestsOn restsOn, List<Reason> reasons) {
    /** Copies the list. */
    public Basis {
        reasons = List.copyOf(reasons);
    }
}

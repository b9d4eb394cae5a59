package org.wardon.advice.outlook;

import java.util.List;
import org.wardon.files.forecast.OwnLotsAnswer;
import org.wardon.produce.Commodity;
import org.wardon.produce.Reason;

/**
 * The keeper's own lots of a commodity and what they say of its life.
 *
 * @param commodity the commodity
 * @param answer the lots and figures
 * @param reasons what to know
 */
public record OwnLotReport(Commodity commodity, OwnLotsAnswer answer, List<Reason> reasons) {
    /** Copies the list. */
    public OwnLotReport {
        reasons = List.copyOf(reasons);
    }
}

package org.wardon.advice.forecast;

import org.wardon.keeping.Mechanism;

/** Risks of a lot read off its fates. */
final class LotRisk {
    private LotRisk() {}

    /** Share of draws in which chilling injury shows by the end of the market leg. */
    static double chilling(LotFates fates, double soldS) {
        double injured =
                fates.sold().stream()
                        .filter(fate -> fate.endS(Mechanism.CHILLING) <= soldS)
                        .count();
        return injured / fates.sold().size();
    }
}

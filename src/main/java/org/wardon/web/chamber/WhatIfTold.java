package org.wardon.web.chamber;

import java.util.List;
import org.wardon.files.forecast.Because;
import org.wardon.files.forecast.WhatIfAnswer;
import org.wardon.web.pages.ChartData;

/**
 * One chamber with something changed, against the plan unchanged.
 *
 * @param chamber id of the chamber
 * @param now with the change
 * @param unchanged without it
 * @param lots its lots
 * @param whyNot why it does not hold with the change; empty where it holds
 * @param draws how many draws stand behind the days
 * @param air its air with the change and without it
 */
public record WhatIfTold(
        String chamber,
        WhatIfAnswer.Outcome now,
        WhatIfAnswer.Outcome unchanged,
        List<WhatIfAnswer.OfLot> lots,
        List<Because> whyNot,
        int draws,
        ChartData air) {
    /** Copies the lists. */
    public WhatIfTold {
        lots = List.copyOf(lots);
        whyNot = List.copyOf(whyNot);
    }

    static WhatIfTold of(WhatIfAnswer answer, ChartData air) {
        return new WhatIfTold(
                answer.chamber(),
                answer.now(),
                answer.unchanged(),
                answer.lots(),
                answer.whyNot(),
                answer.draws(),
                air);
    }
}

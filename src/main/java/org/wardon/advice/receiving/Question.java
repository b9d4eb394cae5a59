package org.wardon.advice.receiving;

import org.wardon.advice.forecast.OneMoreLot;
import org.wardon.air.Timeline;
import org.wardon.plan.LotPlan;
import org.wardon.plan.StorePlan;

/**
 * The lot in question and the span it is about.
 *
 * @param plan the plan without the lot
 * @param more what was worked out of it
 * @param fromS when it comes, s since the plan's start
 * @param toS when it leaves, s
 */
record Question(StorePlan plan, OneMoreLot more, double fromS, double toS) {
    static Question of(StorePlan plan, OneMoreLot more) {
        Timeline timeline = plan.timeline();
        LotPlan lot = more.lot();
        return new Question(
                plan, more, timeline.secondsAt(lot.arrives()), timeline.secondsAt(lot.leaves()));
    }

    LotPlan lot() {
        return more.lot();
    }

    /** What the lot would be worth if nothing of it were lost, currency. */
    double fullValue() {
        return lot().massKg() * lot().market().pricePerKg();
    }

    double marketDays() {
        return lot().market().days();
    }
}

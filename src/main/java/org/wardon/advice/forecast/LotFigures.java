package org.wardon.advice.forecast;

import java.util.Optional;
import java.util.OptionalDouble;
import org.wardon.advice.Ranges;
import org.wardon.air.Timeline;
import org.wardon.files.forecast.ChillingRisk;
import org.wardon.files.forecast.LotForecast;
import org.wardon.files.forecast.LotForecast.TemperatureC;
import org.wardon.heat.LotCourse;
import org.wardon.keeping.Outlook;
import org.wardon.lots.LotHistory;
import org.wardon.plan.ChamberPlan;

/** Figures of one lot over the horizon. */
final class LotFigures {
    private final LotSheet sheet;
    private final ChamberPlan chamber;
    private final StoreOutcome outcome;
    private final LotFates fates;
    private final LotHistory history;
    private final LotCourse inHorizon;

    LotFigures(LotSheet sheet, ChamberPlan chamber, StoreOutcome outcome) {
        this.sheet = sheet;
        this.chamber = chamber;
        this.outcome = outcome;
        fates = outcome.fates(sheet.id());
        history = outcome.history(sheet.id());
        inHorizon = outcome.lot(sheet.id());
    }

    LotForecast forecast() {
        double fromS = sheet.clock().hereFromS();
        Outlook outlook = outlook();
        Cooling cooling = Cooling.of(history, sheet, chamber, outcome);
        double leaveBy =
                Outlook.leaveByS(fates.staying(), sheet.clock().arrivesS(), sheet.marketDays());
        return new LotForecast(
                sheet.id(),
                Optional.of(chamber.id()),
                valueKept(),
                cooling.halfHours(),
                cooling.sevenEighthsHours(),
                temperature(),
                inHorizon.totals().respirationJ() / ChamberFigures.J_PER_KWH,
                inHorizon.totals().weightLossPct(),
                weightLossValue(),
                outlook.lifeUsedPct(),
                outlook.restsOn().word(),
                outlook.greenLeft().map(Ranges::told),
                outlook.edibleLeft().map(Ranges::told),
                outlook.ripeFrom().map(Ranges::told),
                RipeWanted.of(sheet, outcome).flatMap(RipeWanted::figures),
                Ranges.told(outlook.daysLeft()),
                outlook.hangsOn().map(Ranges::told),
                Ranges.told(fates.daysLeftWithout(fromS)),
                Ranges.told(fates.daysGained(fromS)),
                outlook.limitedBy().word(),
                risk(outlook),
                outcome.model().plan().timeline().localAt(leaveBy));
    }

    Outlook outlook() {
        return fates.outlook(sheet.clock().hereFromS(), outcome.horizonS(), sheet.soldS());
    }

    private ChillingRisk risk(Outlook outlook) {
        OptionalDouble safe = outlook.chilling().safeDays();
        return new ChillingRisk(LotRisk.chilling(fates, sheet.soldS()), safe);
    }

    double valueKept() {
        return valueKept(sheet, history, fates.shareSoundWhenSold(sheet.soldS()));
    }

    /** Price x what is left of the mass at leaving x share of draws still sound when sold. */
    static double valueKept(LotSheet sheet, LotHistory history, double shareSound) {
        return sheet.plan().market().pricePerKg() * massAtLeaving(sheet, history) * shareSound;
    }

    /** Price x mass lost until it leaves, of a lot that would be sold by weight. */
    private double weightLossValue() {
        double lost = Math.max(0, history.massKg(0) - massAtLeaving(sheet, history));
        return sheet.plan().market().pricePerKg() * lost;
    }

    static double massAtLeaving(LotSheet sheet, LotHistory history) {
        double atS = Math.min(sheet.clock().leavesS(), history.timeS(history.size() - 1));
        double mass = history.massKg(0);
        for (int i = 0; i < history.size() && history.timeS(i) <= atS; i++) {
            mass = history.massKg(i);
        }
        return mass;
    }

    private TemperatureC temperature() {
        double untilS = Math.min(sheet.clock().leavesS(), outcome.horizonS());
        double sum = 0;
        double span = 0;
        double least = history.meanC(0);
        double most = history.meanC(0);
        double end = history.meanC(0);
        for (int i = 1; i < history.size() && history.timeS(i) <= untilS + 1; i++) {
            double step = (history.timeS(i) - history.timeS(i - 1)) / Timeline.HOUR_S;
            sum += step * 0.5 * (history.meanC(i) + history.meanC(i - 1));
            span += step;
            least = Math.min(least, history.meanC(i));
            most = Math.max(most, history.meanC(i));
            end = history.meanC(i);
        }
        double mean = span > 0 ? sum / span : end;
        return new TemperatureC(mean, least, most, end);
    }
}

package org.wardon.advice.forecast;

import java.util.Comparator;
import java.util.Optional;
import java.util.function.IntToDoubleFunction;
import org.wardon.air.Timeline;
import org.wardon.enclosure.Enclosure;
import org.wardon.heat.Hours;
import org.wardon.keeping.Draw;
import org.wardon.lots.Lot;
import org.wardon.lots.LotHistory;
import org.wardon.lots.PackageFit;
import org.wardon.lots.StackCooling;
import org.wardon.produce.Caution;
import org.wardon.produce.Caution.Level;
import org.wardon.produce.Reason;
import org.wardon.produce.Reason.Argument;

/**
 * How far a lot at rest stands above its air by its own breathing, in the warmest of the chambers
 * it stands in: what its breathing gives at its own temperature over what its package lets out, but
 * no more than it stands above the air in the run. Evaporation carries heat off besides, and a
 * danger the run itself denies would be a false alarm.
 */
final class SelfHeating {
    private static final String OWN_RULE = "assumption";

    /** A lot that gains more from one day to the next is still warming, K. */
    private static final double WARMS_K_A_DAY = 0.3;

    private SelfHeating() {}

    static Optional<Caution> of(LotSheet sheet, StoreOutcome outcome) {
        if (!outcome.has(sheet.id())) {
            return Optional.empty();
        }
        return sheet.visits().stream()
                .filter(visit -> visit.hereFromS() < outcome.horizonS())
                .map(visit -> last(visit, outcome))
                .max(Comparator.comparingDouble(LastDay::aboveK))
                .flatMap(day -> said(sheet, day));
    }

    /**
     * Means of the last day in a chamber.
     *
     * @param airC air, °C
     * @param lotC lot, °C
     * @param gainedK what the lot gained since the day before, K
     */
    private record LastDay(double airC, double lotC, double gainedK) {
        double aboveK() {
            return lotC - airC;
        }
    }

    private static Optional<Caution> said(LotSheet sheet, LastDay day) {
        Lot lot = sheet.stay(Draw.MEDIAN).lot();
        double halfS = PackageFit.halfCoolingS(lot.item(), lot.packing());
        double heat = lot.item().specificHeatJkgK();
        double given =
                StackCooling.selfHeatingK(lot.respiration().wattsPerKg(day.lotC), halfS, heat);
        double excessK = Math.min(given, day.aboveK());
        Argument mean = Argument.of(excessK, "K");
        Argument core = Argument.of(StackCooling.CORE_OVER_MEAN * excessK, "K");
        if (excessK > StackCooling.RUNAWAY_K) {
            Argument most = Argument.of(StackCooling.RUNAWAY_K, "K");
            return told(Level.DANGER, "stack-near-runaway", sheet, mean, core, most);
        }
        if (excessK <= StackCooling.CAUTION_K) {
            return Optional.empty();
        }
        boolean rests = StackCooling.restsAtK(lot.respiration(), day.airC, halfS, heat).isPresent();
        return rests || day.gainedK <= WARMS_K_A_DAY
                ? told(Level.CAUTION, "stack-heats-itself", sheet, mean, core)
                : told(Level.DANGER, "stack-runs-away", sheet, Argument.of(day.airC, "C"));
    }

    private static Optional<Caution> told(
            Level level, String code, LotSheet sheet, Argument... arguments) {
        return Optional.of(new Caution(level, Reason.about(code, sheet.id(), OWN_RULE, arguments)));
    }

    private static LastDay last(Visit visit, StoreOutcome outcome) {
        double to = Math.min(visit.leavesS(), outcome.horizonS());
        LotHistory history = visit.within(outcome.history(visit.id()));
        double lotC = meanC(history, to - Timeline.DAY_S, to);
        double before = meanC(history, to - 2 * Timeline.DAY_S, to - Timeline.DAY_S);
        return new LastDay(
                airC(visit, outcome, to), lotC, Double.isNaN(before) ? 0 : lotC - before);
    }

    private static double airC(Visit visit, StoreOutcome outcome, double to) {
        Hours hours = outcome.course(visit.chamber()).hours();
        Enclosure built = outcome.model().plan().getChamber(visit.chamber()).enclosure();
        IntToDoubleFunction airC = visit.sheet().airC(built, hours);
        double sum = 0;
        int n = 0;
        for (int i = 0; i < hours.size(); i++) {
            if (hours.atS(i) > to - Timeline.DAY_S && hours.atS(i) <= to + 1) {
                sum += airC.applyAsDouble(i);
                n++;
            }
        }
        return n > 0 ? sum / n : airC.applyAsDouble(hours.size() - 1);
    }

    /** NaN where the history does not reach there; its last value where it ends before. */
    private static double meanC(LotHistory history, double fromS, double toS) {
        double sum = 0;
        int n = 0;
        for (int i = 0; i < history.size(); i++) {
            if (history.timeS(i) > fromS && history.timeS(i) <= toS + 1) {
                sum += history.meanC(i);
                n++;
            }
        }
        if (n > 0) {
            return sum / n;
        }
        int last = history.size() - 1;
        return history.timeS(last) <= fromS ? history.meanC(last) : Double.NaN;
    }
}

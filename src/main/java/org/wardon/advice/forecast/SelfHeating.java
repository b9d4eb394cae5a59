package org.wardon.advice.forecast;

import java.util.Optional;
import java.util.OptionalDouble;
import org.wardon.air.Timeline;
import org.wardon.heat.Hours;
import org.wardon.keeping.Draw;
import org.wardon.lots.Lot;
import org.wardon.lots.PackageFit;
import org.wardon.lots.StackCooling;
import org.wardon.produce.Caution;
import org.wardon.produce.Caution.Level;
import org.wardon.produce.Reason;
import org.wardon.produce.Reason.Argument;

/**
 * How far a lot at rest stands above its air by its own breathing, in the warmest of the chambers
 * it stands in.
 */
final class SelfHeating {
    private static final String OWN_RULE = "assumption";

    private SelfHeating() {}

    static Optional<Caution> of(LotSheet sheet, StoreOutcome outcome) {
        if (!outcome.has(sheet.id())) {
            return Optional.empty();
        }
        double airC =
                sheet.visits().stream()
                        .filter(visit -> visit.hereFromS() < outcome.horizonS())
                        .mapToDouble(visit -> lastDayC(visit, outcome))
                        .max()
                        .orElseThrow();
        Lot lot = sheet.stay(Draw.MEDIAN).lot();
        OptionalDouble rest =
                StackCooling.restsAtK(
                        lot.respiration(),
                        airC,
                        PackageFit.halfCoolingS(lot.item(), lot.packing()),
                        lot.item().specificHeatJkgK());
        if (rest.isEmpty()) {
            return Optional.of(
                    new Caution(
                            Level.DANGER,
                            Reason.about(
                                    "stack-runs-away",
                                    sheet.id(),
                                    OWN_RULE,
                                    Argument.of(airC, "C"))));
        }
        double excessK = rest.getAsDouble();
        Argument mean = Argument.of(excessK, "K");
        Argument core = Argument.of(StackCooling.CORE_OVER_MEAN * excessK, "K");
        if (excessK > StackCooling.RUNAWAY_K) {
            Argument most = Argument.of(StackCooling.RUNAWAY_K, "K");
            Reason near =
                    Reason.about("stack-near-runaway", sheet.id(), OWN_RULE, mean, core, most);
            return Optional.of(new Caution(Level.DANGER, near));
        }
        if (excessK > StackCooling.CAUTION_K) {
            Reason warm = Reason.about("stack-heats-itself", sheet.id(), OWN_RULE, mean, core);
            return Optional.of(new Caution(Level.CAUTION, warm));
        }
        return Optional.empty();
    }

    /** Mean air of the last day of its stay in a chamber. */
    private static double lastDayC(Visit visit, StoreOutcome outcome) {
        Hours hours = outcome.course(visit.chamber()).hours();
        double to = Math.min(visit.leavesS(), outcome.horizonS());
        double sum = 0;
        int n = 0;
        for (int i = 0; i < hours.size(); i++) {
            if (hours.atS(i) > to - Timeline.DAY_S && hours.atS(i) <= to + 1) {
                sum += hours.airC(i);
                n++;
            }
        }
        return n > 0 ? sum / n : hours.airC(hours.size() - 1);
    }
}

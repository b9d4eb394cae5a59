package org.wardon.advice.forecast;

import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.stream.Collectors;
import org.wardon.errors.Progress;
import org.wardon.heat.Course;
import org.wardon.keeping.Draw;
import org.wardon.keeping.Draws;
import org.wardon.keeping.Fate;
import org.wardon.keeping.Mechanism;
import org.wardon.keeping.Outlook;
import org.wardon.keeping.Spread;
import org.wardon.keeping.StoreEthylene;
import org.wardon.lots.LotHistory;
import org.wardon.plan.ChamberPlan;

/**
 * Runs a store as a forecast does, once in full and once a draw, and keeps what a placing is judged
 * by: the same money, without what it would come to otherwise.
 */
final class TrialRun {
    private final StoreModel model;
    private final Fates fates;
    private final double horizonS;

    TrialRun(StoreModel model) {
        this.model = model;
        fates = new Fates(model);
        horizonS = model.plan().durationS();
    }

    Tried run() {
        Map<String, Course> courses = model.plain(horizonS, Progress.SILENT);
        Settling ends = Settling.of(model, courses, horizonS);
        StoreEthylene ethylene = fates.ethylene(courses, Draw.MEDIAN);
        List<Map<String, Fates.Two>> drawn =
                Draws.seeded(model.plan().seed(), StoreRun.DRAWS).parallelStream()
                        .map(draw -> drawn(draw, courses, ends))
                        .toList();
        Map<String, Tried.OfLot> lots = new HashMap<>();
        for (LotSheet sheet : model.sheets()) {
            LotHistory history = ethylene.histories().get(sheet.id());
            if (history != null) {
                lots.put(sheet.id(), lot(sheet, history, drawn));
            }
        }
        // Summed in the order of the plan, as the forecast does.
        double kept =
                model.sheets().stream()
                        .filter(sheet -> lots.containsKey(sheet.id()))
                        .mapToDouble(sheet -> ById.get(lots, sheet.id()).valueKept())
                        .sum();
        double energy = 0;
        for (ChamberPlan chamber : model.plan().chambers()) {
            Course course = ById.get(courses, chamber.id());
            energy += ChamberFigures.energyCost(chamber, course, model.plan());
        }
        return new Tried(model.plan(), kept, energy, courses, ethylene.chambers(), lots);
    }

    private Map<String, Fates.Two> drawn(Draw draw, Map<String, Course> plain, Settling ends) {
        Map<String, Course> courses = model.drawn(draw, ends::chamberS, plain);
        Map<String, LotHistory> histories = fates.ethylene(courses, draw).histories();
        Map<String, Fates.Two> found = new HashMap<>();
        for (LotSheet sheet : model.sheets()) {
            LotHistory history = histories.get(sheet.id());
            if (history != null) {
                found.put(sheet.id(), fates.inside(sheet, history, draw).brief());
            }
        }
        return found;
    }

    private Tried.OfLot lot(
            LotSheet sheet, LotHistory history, List<Map<String, Fates.Two>> drawn) {
        List<Fates.Two> here =
                drawn.stream().map(draw -> ById.get(draw, sheet.id())).collect(Collectors.toList());
        List<Fate> sold = here.stream().map(Fates.Two::sold).toList();
        double from = sheet.clock().hereFromS();
        double sound = Outlook.shareSound(sold, sheet.soldS());
        double chilled =
                sold.stream().filter(f -> f.endS(Mechanism.CHILLING) <= sheet.soldS()).count();
        return new Tried.OfLot(
                LotFigures.valueKept(sheet, history, sound),
                sound,
                LotFigures.massAtLeaving(sheet, history) / history.massKg(0),
                chilled / sold.size(),
                Spread.of(here.stream().mapToDouble(f -> f.staying().daysLeft(from)).toArray()),
                here.get(0).staying().limitedBy());
    }
}

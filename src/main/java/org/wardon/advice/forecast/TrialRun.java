package org.wardon.advice.forecast;

import java.util.HashMap;
import java.util.List;
import java.util.Map;
import org.wardon.errors.Progress;
import org.wardon.heat.Course;
import org.wardon.heat.Hours;
import org.wardon.keeping.Draw;
import org.wardon.keeping.Draws;
import org.wardon.keeping.Mechanism;
import org.wardon.keeping.Outlook;
import org.wardon.keeping.StoreEthylene;
import org.wardon.lots.LotHistory;
import org.wardon.plan.ChamberPlan;
import org.wardon.produce.Reason;

/**
 * Runs a store as a forecast does, once in full and once a draw, and keeps what a placing is judged
 * by: the same money, without what it would come to otherwise.
 */
final class TrialRun {
    private final StoreModel model;
    private final Progress progress;
    private final Fates fates;
    private final double horizonS;

    TrialRun(StoreModel model, Progress progress) {
        this.model = model;
        this.progress = progress;
        fates = new Fates(model);
        horizonS = model.plan().durationS();
    }

    Tried run() {
        Map<String, Course> courses = model.plain(horizonS, progress);
        Settling ends = Settling.of(model, courses, horizonS);
        StoreEthylene ethylene = fates.ethylene(courses, Draw.MEDIAN);
        List<Map<String, Fates.Two>> drawn =
                Draws.seeded(model.plan().seed(), StoreRun.DRAWS).parallelStream()
                        .map(draw -> drawn(draw, courses, ends))
                        .toList();
        StoreOutcome outcome = outcome(courses, ethylene, drawn);
        Map<String, Tried.OfLot> lots = new HashMap<>();
        for (LotSheet sheet : model.sheets()) {
            LotHistory history = ethylene.histories().get(sheet.id());
            if (history != null) {
                lots.put(sheet.id(), lot(sheet, history, outcome.fates(sheet.id())));
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
        return new Tried(
                model.plan(),
                kept,
                energy,
                courses,
                ethylene.chambers(),
                lots,
                reachedH(courses),
                notHeld(outcome));
    }

    /** What the verdict on chambers asks for; nothing of lots without a chamber. */
    private StoreOutcome outcome(
            Map<String, Course> courses,
            StoreEthylene ethylene,
            List<Map<String, Fates.Two>> drawn) {
        Map<String, LotFates> ends = new HashMap<>();
        for (LotSheet sheet : model.sheets()) {
            LotHistory history = ethylene.histories().get(sheet.id());
            if (history != null) {
                List<Fates.Two> here =
                        drawn.stream().map(draw -> ById.get(draw, sheet.id())).toList();
                ends.put(
                        sheet.id(),
                        new LotFates(
                                fates.inside(sheet, history, Draw.MEDIAN).staying(),
                                here.stream().map(Fates.Two::staying).toList(),
                                here.stream().map(Fates.Two::sold).toList(),
                                List.of(),
                                sheet.model().basis(history)));
            }
        }
        return new StoreOutcome(
                model,
                horizonS,
                courses,
                ethylene.chambers(),
                ethylene.histories(),
                ends,
                Map.of());
    }

    private Map<String, Double> reachedH(Map<String, Course> courses) {
        Map<String, Double> reached = new HashMap<>();
        for (ChamberPlan chamber : model.plan().chambers()) {
            Hours hours = ById.get(courses, chamber.id()).hours();
            Stretches air = new Stretches(chamber, model.settings(chamber), hours, horizonS);
            air.from(0).get(0).hoursToReach().ifPresent(h -> reached.put(chamber.id(), h));
        }
        return reached;
    }

    private static Map<String, List<Reason>> notHeld(StoreOutcome outcome) {
        Map<String, List<Reason>> why = new HashMap<>();
        for (ChamberPlan chamber : outcome.model().plan().chambers()) {
            why.put(chamber.id(), Holding.of(chamber, outcome).reasons());
        }
        return why;
    }

    private Map<String, Fates.Two> drawn(Draw draw, Map<String, Course> plain, Settling ends) {
        progress.at("trial", 0);
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

    private Tried.OfLot lot(LotSheet sheet, LotHistory history, LotFates fates) {
        double from = sheet.clock().hereFromS();
        double sound = fates.shareSoundWhenSold(sheet.soldS());
        double chilled =
                fates.sold().stream()
                        .filter(f -> f.endS(Mechanism.CHILLING) <= sheet.soldS())
                        .count();
        Outlook outlook = fates.outlook(from, horizonS, sheet.soldS());
        return new Tried.OfLot(
                LotFigures.valueKept(sheet, history, sound),
                sound,
                LotFigures.massAtLeaving(sheet, history) / history.massKg(0),
                chilled / fates.sold().size(),
                outlook.daysLeft(),
                outlook.limitedBy());
    }
}

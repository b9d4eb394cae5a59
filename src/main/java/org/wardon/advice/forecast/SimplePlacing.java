package org.wardon.advice.forecast;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import org.wardon.heat.Course;
import org.wardon.keeping.Draw;
import org.wardon.keeping.StoreEthylene;
import org.wardon.plan.ChamberPlan;
import org.wardon.plan.LotPlan;
import org.wardon.plan.StorePlan;
import org.wardon.produce.Caution;
import org.wardon.produce.Reason;
import org.wardon.produce.Reason.Argument;

/**
 * A simple placing of the lots that have no chamber: in order of arrival, each goes where most of
 * it is sold sound, in the air the chambers make without it, where there is room. No setting is
 * changed and no lot that has a chamber is moved.
 */
final class SimplePlacing {
    private final StoreModel model;

    SimplePlacing(StoreModel model) {
        this.model = model;
    }

    /**
     * A plan with every lot placed.
     *
     * @param plan the plan
     * @param told what was placed where, and where it is too full
     */
    record Placed(StorePlan plan, List<Caution> told) {
        Placed {
            told = List.copyOf(told);
        }
    }

    Placed place() {
        StorePlan plan = model.plan();
        if (plan.lots().stream().allMatch(lot -> lot.chamber().isPresent())) {
            return new Placed(plan, List.of());
        }
        double durationS = plan.durationS();
        Map<String, Course> courses = model.sketch(durationS);
        StoreEthylene levels = new Fates(model).ethylene(courses, Draw.MEDIAN);
        List<LotSheet> open =
                model.sheets().stream()
                        .filter(sheet -> sheet.plan().chamber().isEmpty())
                        .sorted(
                                java.util.Comparator.comparingDouble(
                                        sheet -> sheet.clock().arrivesS()))
                        .toList();
        Map<String, String> chosen = new LinkedHashMap<>();
        List<Caution> told = new ArrayList<>();
        for (LotSheet sheet : open) {
            Map<String, OtherChambers.There> there = new LinkedHashMap<>();
            Map<String, OtherChambers.There> withRoom = new LinkedHashMap<>();
            for (ChamberPlan chamber : plan.chambers()) {
                OtherChambers.There at =
                        new OtherChambers(model)
                                .of(
                                        sheet,
                                        ById.get(courses, chamber.id()),
                                        levels.chamber(chamber.id()),
                                        durationS);
                there.put(chamber.id(), at);
                if (hasRoom(chamber, sheet, chosen)) {
                    withRoom.put(chamber.id(), at);
                }
            }
            Map<String, OtherChambers.There> among = withRoom.isEmpty() ? there : withRoom;
            String best = OtherChambers.best(among, sheet);
            chosen.put(sheet.id(), best);
            told.add(
                    new Caution(
                            Caution.Level.NOTE,
                            new Reason(
                                    "placed-simply",
                                    List.of(sheet.id(), best),
                                    List.of(
                                            Argument.of(
                                                    100 * ById.get(among, best).shareSound(),
                                                    "pct")),
                                    "assumption")));
        }
        List<LotPlan> lots =
                plan.lots().stream()
                        .map(
                                lot ->
                                        chosen.containsKey(lot.id())
                                                ? lot.placedIn(chosen.get(lot.id()))
                                                : lot)
                        .toList();
        return new Placed(plan.withLots(lots), told);
    }

    private boolean hasRoom(ChamberPlan chamber, LotSheet sheet, Map<String, String> chosen) {
        List<Visit> there = new ArrayList<>(model.visitsIn(chamber.id()));
        for (LotSheet other : model.sheets()) {
            if (chamber.id().equals(chosen.get(other.id()))) {
                there.add(Visit.whole(other, chamber.id()));
            }
        }
        there.add(Visit.whole(sheet, chamber.id()));
        return OtherChambers.mostKg(there) <= chamber.capacityKg();
    }
}

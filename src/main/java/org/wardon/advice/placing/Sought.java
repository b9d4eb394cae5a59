package org.wardon.advice.placing;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalInt;
import org.wardon.plan.ChamberPlan;
import org.wardon.plan.LotPlan;
import org.wardon.plan.StorePlan;
import org.wardon.sharing.placing.Placing;

/**
 * A placing as the search found it, and what it is worth by what was assumed.
 *
 * @param task what was to be placed
 * @param chambers the chambers, in the order of the placing
 * @param chosen the option of each chamber, empty where it rests
 * @param placing which items stand where
 * @param bound no placing is worth more by what was assumed, currency; of money only where money
 *     was sought
 * @param proven whether it is known to be a best one by what was assumed
 * @param companions what lots cost each other
 */
record Sought(
        Task task,
        List<ChamberPlan> chambers,
        List<Optional<Option>> chosen,
        Placing placing,
        double bound,
        boolean proven,
        Companions companions) {
    Sought {
        chambers = List.copyOf(chambers);
        chosen = List.copyOf(chosen);
    }

    /** Items in a chamber. */
    List<Task.Item> in(int chamber) {
        return placing.chambers().get(chamber).lots().stream().map(task.items()::get).toList();
    }

    /** Number of the chamber an item stands in. */
    OptionalInt chamberOf(int item) {
        int chamber = placing.chamberOf(item);
        return chamber < 0 ? OptionalInt.empty() : OptionalInt.of(chamber);
    }

    /** What is kept net of energy by what was assumed, currency. */
    double assumed() {
        double sum = 0;
        for (int c = 0; c < chambers.size(); c++) {
            if (chosen.get(c).isPresent()) {
                sum += assumed(chosen.get(c).get(), in(c));
            }
        }
        return sum;
    }

    /** What lots of one option are worth together, net of its energy. */
    double assumed(Option option, List<Task.Item> items) {
        double sum = -option.figures().idleCost();
        for (int i = 0; i < items.size(); i++) {
            Task.Item item = items.get(i);
            sum += alone(option, item);
            for (int j = 0; j < i; j++) {
                double loss = companions.loss(option, item, items.get(j));
                sum -= Double.isFinite(loss) ? loss : 0;
            }
        }
        return sum;
    }

    /** What one item is worth in an option less the energy of its heat. */
    static double alone(Option option, Task.Item item) {
        Cell cell = option.cell(item.number());
        double[] heat = cell.there().heatW(option.takesW().size());
        double watts = 0;
        for (int day = item.firstDay(); day <= item.lastDay(); day++) {
            watts += heat[day];
        }
        double worth = item.whole() ? cell.worth() : 0;
        return worth - watts * option.figures().costPerWDay();
    }

    /** The plan that it proposes. */
    StorePlan plan(StorePlan now) {
        List<ChamberPlan> set = new ArrayList<>();
        for (ChamberPlan chamber : now.chambers()) {
            set.add(proposed(chamber));
        }
        List<LotPlan> lots = new ArrayList<>(now.lots());
        for (int i = 0; i < task.items().size(); i++) {
            Task.Item item = task.items().get(i);
            if (!item.isFixed()) {
                LotPlan lot = now.lots().get(item.number());
                OptionalInt chamber = chamberOf(i);
                lots.set(
                        item.number(),
                        chamber.isPresent()
                                ? lot.placedIn(chambers.get(chamber.getAsInt()).id())
                                : lot.unplaced());
            }
        }
        return now.with(set, lots);
    }

    private ChamberPlan proposed(ChamberPlan now) {
        for (int c = 0; c < chambers.size(); c++) {
            if (chambers.get(c).id().equals(now.id())) {
                return chosen.get(c)
                        .map(option -> Begins.as(now, option.chamber()))
                        .orElse(hasSwitch(now) ? now.switchedOff() : now);
            }
        }
        return now;
    }

    private static boolean hasSwitch(ChamberPlan chamber) {
        return !chamber.coolers().isEmpty() || chamber.heaterW() > 0 || chamber.humidifierKgH() > 0;
    }
}

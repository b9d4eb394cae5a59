package org.wardon.advice.placing;

import java.util.List;
import java.util.Map;
import org.wardon.advice.forecast.StoreTrial;
import org.wardon.plan.PlaceWish;
import org.wardon.sharing.placing.Climate;

/**
 * What is at stake beside money, in its currency: lots that have to stay weigh more than all money,
 * and where days or few chambers come first, these do.
 */
final class Stakes {
    /** A day of a lot whose days come first weighs this share of all money. */
    private static final double DAY = 1;

    private final StoreTrial trial;
    private final PlaceWish.Aim aim;
    private final double money;
    private final double stays;
    private final double placed;
    private final double runs;
    private final double all;

    private Stakes(StoreTrial trial, Task task, PlaceWish.Aim aim, double money, int chambers) {
        this.trial = trial;
        this.aim = aim;
        this.money = money;
        boolean few = aim == PlaceWish.Aim.FEWEST_CHAMBERS;
        double days =
                aim == PlaceWish.Aim.MOST_DAYS ? 1_000 * trial.plan().wish().lots().size() : 0;
        runs = few ? money : 0;
        placed = few ? money * (chambers + 1) : 0;
        stays = 4 * (money * (1 + DAY * days) + placed);
        all = stays * task.items().stream().filter(Task.Item::isFixed).count();
    }

    static Stakes of(
            StoreTrial trial, Task task, Map<String, List<Option>> options, PlaceWish.Aim aim) {
        double money = 1;
        for (Task.Item item : task.items()) {
            double most = 0;
            for (List<Option> chamber : options.values()) {
                for (Option option : mayTake(item, chamber)) {
                    most = Math.max(most, option.cell(item.number()).worth());
                }
            }
            money += most;
        }
        for (List<Option> chamber : options.values()) {
            money += chamber.stream().mapToDouble(o -> o.figures().idleCost()).max().orElse(0);
        }
        return new Stakes(trial, task, aim, money, options.size());
    }

    private static List<Option> mayTake(Task.Item item, List<Option> chamber) {
        boolean may = chamber.isEmpty() || Task.mayStand(item, chamber.get(0).chamber().id());
        return may ? chamber : List.of();
    }

    /** All money that can be at stake. */
    double money() {
        return money;
    }

    /** What the lots that have to stay weigh together. */
    double all() {
        return all;
    }

    /** What a chamber that runs weighs beside its energy. */
    double running() {
        return runs;
    }

    /** What an item weighs in an option. */
    double worth(Task.Item item, Cell cell) {
        if (item.isFixed()) {
            return stays + (item.whole() ? cell.worth() : 0) + days(cell);
        }
        // Days are days even where they do not last until it is sold.
        boolean may = cell.allowed() || (first(cell) && cell.forbidden() == Cell.Forbidden.LOST);
        return may ? cell.worth() + placed + days(cell) : Climate.NEVER;
    }

    private boolean first(Cell cell) {
        return aim == PlaceWish.Aim.MOST_DAYS
                && trial.plan().wish().lots().contains(cell.lot().id());
    }

    private double days(Cell cell) {
        return first(cell) ? DAY * money * cell.daysStaying(trial).p50() : 0;
    }
}

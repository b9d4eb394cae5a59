package org.wardon.advice.placing;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalInt;
import java.util.stream.IntStream;
import org.wardon.advice.forecast.StoreTrial;
import org.wardon.plan.ChamberPlan;
import org.wardon.plan.LotPlan;
import org.wardon.plan.StorePlan;
import org.wardon.sharing.placing.Placing;

/** Placings that are not sought: the present one. */
final class Trials {
    private Trials() {}

    /** Options at the settings of the plan only. */
    static Map<String, List<Option>> asSet(StorePlan plan, Map<String, List<Option>> all) {
        Map<String, List<Option>> set = new LinkedHashMap<>();
        for (ChamberPlan chamber : plan.chambers()) {
            List<Option> options = all.getOrDefault(chamber.id(), List.of());
            set.put(
                    chamber.id(),
                    options.stream().filter(option -> option.setAs(chamber)).toList());
        }
        return set;
    }

    /** The arrangement of the plan, in the words of the search. */
    static Sought present(
            StoreTrial trial, Task task, Map<String, List<Option>> all, Companions companions) {
        StorePlan plan = trial.plan();
        Map<String, List<Option>> set = asSet(plan, all);
        List<Optional<Option>> chosen = new ArrayList<>();
        List<Placing.Filled> filled = new ArrayList<>();
        for (ChamberPlan chamber : plan.chambers()) {
            List<Integer> here =
                    IntStream.range(0, task.items().size())
                            .filter(i -> stands(plan, task.items().get(i), chamber.id()))
                            .boxed()
                            .toList();
            chosen.add(
                    chamber.off()
                            ? Optional.empty()
                            : set.getOrDefault(chamber.id(), List.of()).stream().findFirst());
            filled.add(new Placing.Filled(chamber.off() ? Placing.RESTS : 0, here));
        }
        List<Integer> unplaced =
                IntStream.range(0, task.items().size())
                        .filter(i -> at(plan, task.items().get(i)).isEmpty())
                        .boxed()
                        .toList();
        return new Sought(
                task,
                plan.chambers(),
                chosen,
                new Placing(filled, unplaced, 0),
                Double.NEGATIVE_INFINITY,
                false,
                companions);
    }

    private static boolean stands(StorePlan plan, Task.Item item, String chamberId) {
        return at(plan, item).equals(Optional.of(chamberId));
    }

    private static Optional<String> at(StorePlan plan, Task.Item item) {
        if (item.isFixed()) {
            return item.fixed();
        }
        LotPlan lot = plan.lots().get(item.number());
        return lot.chamber();
    }

    /** Number of the first item of a lot. */
    static OptionalInt item(Task task, String lotId) {
        return IntStream.range(0, task.items().size())
                .filter(i -> task.items().get(i).lot().id().equals(lotId))
                .findFirst();
    }
}

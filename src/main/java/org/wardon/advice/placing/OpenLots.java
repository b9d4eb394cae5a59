package org.wardon.advice.placing;

import java.util.ArrayList;
import java.util.List;
import java.util.OptionalInt;
import org.wardon.advice.forecast.StoreTrial;
import org.wardon.errors.Progress;
import org.wardon.plan.ChamberPlan;
import org.wardon.plan.LotPlan;
import org.wardon.plan.StorePlan;
import org.wardon.produce.Caution;
import org.wardon.produce.Reason;
import org.wardon.produce.Reason.Argument;
import org.wardon.reference.ReferenceBook;

/**
 * Finds chambers for lots that have none, by the search of a placing, at the settings of the plan:
 * no setting is changed, no chamber switched on, no lot that has a chamber is moved.
 */
public final class OpenLots {
    private OpenLots() {}

    /**
     * A plan with chambers for its lots.
     *
     * @param plan the plan; a lot that no chamber may take stays without one
     * @param told what was placed where
     */
    public record Housed(StorePlan plan, List<Caution> told) {
        /** Copies the list. */
        public Housed {
            told = List.copyOf(told);
        }
    }

    /**
     * Finds chambers for the lots that have none.
     *
     * @param plan the plan
     * @param book the reference book
     * @param progress may stop the work
     * @return the plan itself where every lot has a chamber
     * @throws org.wardon.errors.RunStopped where a chamber meets a state that cannot be
     */
    public static Housed house(StorePlan plan, ReferenceBook book, Progress progress) {
        List<ChamberPlan> running = plan.chambers().stream().filter(c -> !c.off()).toList();
        boolean housed = plan.lots().stream().allMatch(lot -> lot.chamber().isPresent());
        if (housed || running.isEmpty()) {
            return new Housed(plan, List.of());
        }
        StoreTrial trial = StoreTrial.of(plan, book, progress);
        Task task = new Task(trial, PlaceQuestion.NONE_MOVES);
        Options options = new Options(trial, task);
        Draft draft = new Draft(trial, task, new Companions(trial, options));
        Sought sought = draft.seek(running, options.asSet(), plan.wish().aim(), 1);
        return housed(plan, task, sought);
    }

    private static Housed housed(StorePlan plan, Task task, Sought sought) {
        List<LotPlan> lots = new ArrayList<>(plan.lots());
        List<Caution> told = new ArrayList<>();
        for (int i = 0; i < task.items().size(); i++) {
            Task.Item item = task.items().get(i);
            OptionalInt chamber = sought.chamberOf(i);
            LotPlan lot = plan.lots().get(item.number());
            if (lot.chamber().isEmpty() && chamber.isPresent()) {
                String home = sought.chambers().get(chamber.getAsInt()).id();
                double sound =
                        sought.chosen()
                                .get(chamber.getAsInt())
                                .map(option -> option.cell(item.number()).there().shareSound())
                                .orElse(0.0);
                lots.set(item.number(), lot.placedIn(home));
                told.add(put(lot.id(), home, sound));
            }
        }
        return new Housed(plan.withLots(lots), told);
    }

    private static Caution put(String lotId, String chamberId, double shareSound) {
        return new Caution(
                Caution.Level.NOTE,
                new Reason(
                        "placed-by-search",
                        List.of(lotId, chamberId),
                        List.of(Argument.of(100 * shareSound, "pct")),
                        "assumption"));
    }
}

package org.wardon.advice.placing;

import java.time.LocalDateTime;
import java.time.LocalTime;
import java.time.temporal.ChronoUnit;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Map;
import java.util.OptionalDouble;
import java.util.SortedMap;
import java.util.TreeMap;
import org.wardon.advice.forecast.StoreTrial;
import org.wardon.advice.forecast.TrialLot;
import org.wardon.plan.ChamberPlan;
import org.wardon.plan.SettingChange;

/**
 * Courses of two settings worth a try in a chamber: one until a time at which lots leave or others
 * come, another from then on. By what each lot comes to at either setting alone, a lot that stands
 * through the change by the worse of the two, a course must promise more than any one setting does.
 * Whether the chamber is brought down in time with the lots that are there, and what the change
 * does to them, is left to the sketch of the course, to what the chamber can take on that day, and
 * to the full model.
 */
final class Courses {
    /** Most courses a chamber is tried with. */
    private static final int MOST = 3;

    /** Share of the best single setting that a course must promise beside it. */
    private static final double WORTH_A_TRY = 0.02;

    /** Before work begins (assumption). */
    private static final LocalTime MORNING = LocalTime.of(6, 0);

    private final StoreTrial trial;
    private final Task task;
    private final SortedMap<LocalDateTime, Double> times = new TreeMap<>();

    Courses(StoreTrial trial, Task task) {
        this.trial = trial;
        this.task = task;
        for (TrialLot lot : trial.lots()) {
            leaving(lot);
            coming(lot);
        }
    }

    private void leaving(TrialLot lot) {
        LocalDateTime left = trial.plan().timeline().localAt(lot.leavesS());
        LocalDateTime hour = left.truncatedTo(ChronoUnit.HOURS);
        add(hour.isBefore(left) ? hour.plusHours(1) : hour);
    }

    private void coming(TrialLot lot) {
        LocalDateTime comes = trial.plan().timeline().localAt(lot.hereFromS());
        LocalDateTime morning = comes.toLocalDate().atTime(MORNING);
        add(morning.isAfter(comes) ? comes.truncatedTo(ChronoUnit.HOURS) : morning);
    }

    private void add(LocalDateTime at) {
        double seconds = trial.plan().timeline().secondsAt(at);
        if (seconds > 0 && seconds < trial.plan().durationS()) {
            times.put(at, seconds);
        }
    }

    /** Two settings, the time between them, and what they promise. */
    private record Promise(Option first, Option then, LocalDateTime at, double worth) {}

    /**
     * Courses of a chamber, the most promising first.
     *
     * @param steady what it makes at single settings
     */
    List<ChamberPlan> of(List<Option> steady) {
        double best = 0;
        List<Integer> may =
                steady.isEmpty() ? List.of() : task.mayStand(steady.get(0).chamber().id());
        List<Promise> promises = new ArrayList<>();
        for (Option first : steady) {
            best = Math.max(best, promised(may, first, first, Double.POSITIVE_INFINITY));
            for (Option then : steady) {
                if (first.settingC() != then.settingC()) {
                    best(may, first, then, promises);
                }
            }
        }
        double least = best * (1 + WORTH_A_TRY);
        return promises.stream()
                .filter(promise -> promise.worth() > least)
                .sorted(
                        Comparator.comparingDouble((Promise one) -> -one.worth())
                                .thenComparing(Promise::at)
                                .thenComparingDouble(one -> one.first().settingC())
                                .thenComparingDouble(one -> one.then().settingC()))
                .limit(MOST)
                .map(Courses::set)
                .toList();
    }

    /** The best time between two settings. */
    private void best(List<Integer> may, Option first, Option then, List<Promise> promises) {
        Promise best = null;
        for (Map.Entry<LocalDateTime, Double> time : times.entrySet()) {
            double worth = promised(may, first, then, time.getValue());
            if (best == null || worth > best.worth()) {
                best = new Promise(first, then, time.getKey(), worth);
            }
        }
        if (best != null) {
            promises.add(best);
        }
    }

    private double promised(List<Integer> may, Option first, Option then, double changeS) {
        double sum = 0;
        for (int i : may) {
            TrialLot lot = trial.lots().get(i);
            double before = worth(first.cell(i));
            double after = worth(then.cell(i));
            boolean leaves = lot.leavesS() <= changeS;
            boolean comes = lot.hereFromS() >= changeS;
            sum += leaves ? before : comes ? after : Math.min(before, after);
        }
        return sum;
    }

    private static double worth(Cell cell) {
        return cell.allowed() ? cell.worth() : 0;
    }

    private static ChamberPlan set(Promise promise) {
        ChamberPlan first = promise.first().chamber();
        return first.changing(
                List.of(
                        new SettingChange(
                                promise.at(), promise.then().settingC(), OptionalDouble.empty())));
    }
}

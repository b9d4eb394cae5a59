package org.wardon.heat;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;
import java.util.stream.Stream;
import org.wardon.errors.Progress;

/**
 * Chambers that carry lots to each other, run in step: before a lot is handed over both chambers
 * stand at that time, all that is handed over then is taken out as it is, and only then does any of
 * them go on. So every hand-over knows the lot's true state, whichever way lots go and change
 * places, in one pass.
 */
final class TogetherRun {
    /** Hand-overs and arrivals of one lot belong together within, s. */
    private static final double SAME_S = 1e-6;

    private record HandOver(ChamberRunner from, int lot, ChamberRunner to, int place) {}

    private final List<ChamberRun> runs;
    private final Progress progress;
    private final Map<String, ChamberRunner> taking = new HashMap<>();
    private final TreeMap<Double, List<HandOver>> handOvers = new TreeMap<>();

    private TogetherRun(List<ChamberRun> runs, Progress progress) {
        this.runs = runs;
        this.progress = progress;
    }

    static List<Course> of(List<ChamberRun> runs, Accuracy accuracy, Progress progress) {
        TogetherRun together = new TogetherRun(List.copyOf(runs), progress);
        together.prepare(accuracy);
        together.handOver();
        return together.runs.parallelStream().map(run -> together.finish(run, accuracy)).toList();
    }

    private void prepare(Accuracy accuracy) {
        for (ChamberRun run : runs) {
            for (int i = 0; i < run.stays().size(); i++) {
                Stay stay = run.stays().get(i);
                if (stay.carriedOn() && stay.leavesS() < run.durationS()) {
                    handOvers
                            .computeIfAbsent(stay.leavesS(), at -> new ArrayList<>())
                            .add(handOver(run, i, accuracy));
                }
            }
        }
    }

    private HandOver handOver(ChamberRun run, int lot, Accuracy accuracy) {
        Stay stay = run.stays().get(lot);
        String to = stay.berth().to().orElseThrow();
        ChamberRun other =
                runs.stream()
                        .filter(one -> one.chamberId().equals(to))
                        .findFirst()
                        .orElseThrow(() -> nowhere(stay, to));
        for (int i = 0; i < other.stays().size(); i++) {
            Stay there = other.stays().get(i);
            if (there.lot().id().equals(stay.lot().id())
                    && there.berth().from().filter(run.chamberId()::equals).isPresent()
                    && Math.abs(there.arrivesS() - stay.leavesS()) < SAME_S) {
                return new HandOver(runner(run, accuracy), lot, runner(other, accuracy), i);
            }
        }
        throw nowhere(stay, to);
    }

    private static IllegalArgumentException nowhere(Stay stay, String to) {
        return new IllegalArgumentException(
                "lot "
                        + stay.lot().id()
                        + " is carried to "
                        + to
                        + " at "
                        + stay.leavesS()
                        + " s, where no such lot comes in");
    }

    private ChamberRunner runner(ChamberRun run, Accuracy accuracy) {
        return taking.computeIfAbsent(
                run.chamberId(), id -> ChamberRunner.of(run, accuracy, false));
    }

    private void handOver() {
        handOvers.forEach(
                (atS, group) -> {
                    group.stream()
                            .flatMap(one -> Stream.of(one.from, one.to))
                            .distinct()
                            .toList()
                            .parallelStream()
                            .forEach(runner -> runner.goTo(atS, progress));
                    List<LotState> states =
                            group.stream().map(one -> one.from.carryOut(one.lot)).toList();
                    for (int i = 0; i < states.size(); i++) {
                        group.get(i).to.carryIn(group.get(i).place, states.get(i));
                    }
                });
    }

    private Course finish(ChamberRun run, Accuracy accuracy) {
        ChamberRunner begun = taking.get(run.chamberId());
        ChamberRunner runner = begun == null ? ChamberRunner.of(run, accuracy, false) : begun;
        return runner.run(progress);
    }
}

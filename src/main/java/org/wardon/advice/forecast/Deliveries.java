package org.wardon.advice.forecast;

import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;
import java.util.TreeMap;
import java.util.stream.Collectors;
import org.wardon.air.Timeline;
import org.wardon.lots.LotHistory;
import org.wardon.plan.ChamberPlan;
import org.wardon.produce.Caution;
import org.wardon.produce.Caution.Level;
import org.wardon.produce.Reason;
import org.wardon.produce.Reason.Argument;

/**
 * What deliveries do to the lots that stand cold in a chamber already: by how much each warms and
 * how long it takes to be cold again. In a chamber with a cooler; in one that follows the weather a
 * rise says nothing of the delivery.
 */
final class Deliveries {
    /** A rise below this is not worth a word, and a lot this near to before is cold again, K. */
    private static final double NOTICED_K = 0.5;

    private final StoreOutcome outcome;
    private final ChamberPlan chamber;
    private final List<Visit> visits;

    Deliveries(StoreOutcome outcome, ChamberPlan chamber) {
        this.outcome = outcome;
        this.chamber = chamber;
        visits =
                outcome.model().visitsIn(chamber.id()).stream()
                        .filter(visit -> outcome.has(visit.id()))
                        .filter(visit -> visit.arrivesS() < outcome.horizonS())
                        .toList();
    }

    /**
     * A cold lot that warms through a delivery.
     *
     * @param cold the lot that was cold
     * @param comes ids of what came in then
     * @param atS when, s since the start of the run
     * @param riseK by how much its mean rises within twelve hours, K
     * @param backHours until it is within half a kelvin of before, h; empty where it is not by the
     *     next delivery, its leaving or the end
     * @param followedHours how long it was followed, h
     */
    record Rise(
            Visit cold,
            List<String> comes,
            double atS,
            double riseK,
            OptionalDouble backHours,
            double followedHours) {
        Rise {
            comes = List.copyOf(comes);
        }
    }

    /** All rises, small ones too. */
    List<Rise> rises() {
        TreeMap<Double, List<Visit>> arrivals =
                visits.stream()
                        .collect(
                                Collectors.groupingBy(
                                        Visit::arrivesS, TreeMap::new, Collectors.toList()));
        List<Rise> rises = new ArrayList<>();
        for (Visit visit : visits) {
            LotHistory history = visit.within(outcome.history(visit.id()));
            Cooling cooling = Cooling.of(history, visit.sheet(), chamber, outcome);
            if (cooling.wasWarm() && cooling.sevenEighthsHours().isEmpty()) {
                continue;
            }
            double coldS =
                    history.timeS(0) + cooling.sevenEighthsHours().orElse(0) * Timeline.HOUR_S;
            arrivals.forEach(
                    (atS, group) -> {
                        Double next = arrivals.higherKey(atS);
                        double untilS =
                                Math.min(
                                        Math.min(visit.leavesS(), outcome.horizonS()),
                                        next == null ? Double.POSITIVE_INFINITY : next);
                        boolean other = group.stream().noneMatch(v -> v.id().equals(visit.id()));
                        if (other && atS > coldS && atS < visit.leavesS()) {
                            rises.add(rise(visit, history, group, untilS));
                        }
                    });
        }
        return rises;
    }

    private Rise rise(Visit visit, LotHistory history, List<Visit> comes, double untilS) {
        double atS = comes.get(0).arrivesS();
        double peakUntilS =
                Math.min(visit.leavesS(), atS + Holding.DISTURBED_HOURS * Timeline.HOUR_S);
        double before = Double.POSITIVE_INFINITY;
        int peak = -1;
        for (int i = 0; i < history.size(); i++) {
            double t = history.timeS(i);
            if (Math.abs(t - atS) <= Timeline.HOUR_S) {
                before = Math.min(before, history.meanC(i));
            }
            if (t >= atS
                    && t <= peakUntilS
                    && (peak < 0 || history.meanC(i) > history.meanC(peak))) {
                peak = i;
            }
        }
        OptionalDouble backS =
                peak < 0
                        ? OptionalDouble.of(atS)
                        : backS(history, peak, untilS, before + NOTICED_K);
        return new Rise(
                visit,
                comes.stream().map(Visit::id).toList(),
                atS,
                peak < 0 ? 0 : Math.max(0, history.meanC(peak) - before),
                backS.isPresent()
                        ? OptionalDouble.of((backS.getAsDouble() - atS) / Timeline.HOUR_S)
                        : OptionalDouble.empty(),
                (untilS - atS) / Timeline.HOUR_S);
    }

    /** When the mean first comes down to a mark after its peak, s. */
    private static OptionalDouble backS(LotHistory history, int peak, double untilS, double markC) {
        for (int i = peak; i < history.size() && history.timeS(i) <= untilS; i++) {
            if (history.meanC(i) <= markC) {
                return OptionalDouble.of(history.timeS(i));
            }
        }
        return OptionalDouble.empty();
    }

    /** The rises worth a word. */
    List<Caution> all() {
        if (chamber.coolers().isEmpty()) {
            return List.of();
        }
        return rises().stream().filter(rise -> rise.riseK() > NOTICED_K).map(this::told).toList();
    }

    private Caution told(Rise rise) {
        Level level = rise.riseK() > Holding.RISE_MOST_K ? Level.CAUTION : Level.NOTE;
        String code = rise.backHours().isPresent() ? "warms-and-cools" : "warms-and-stays";
        return new Caution(
                level,
                new Reason(
                        code,
                        List.of(rise.cold().id(), chamber.id()),
                        List.of(
                                Argument.of(rise.riseK(), "K"),
                                Argument.text(String.join(", ", rise.comes())),
                                Argument.of(rise.backHours().orElse(rise.followedHours()), "h"),
                                Argument.of(NOTICED_K, "K")),
                        "own"));
    }
}

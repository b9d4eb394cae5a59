package org.wardon.advice.forecast;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.function.IntToDoubleFunction;
import java.util.stream.IntStream;
import org.wardon.air.Timeline;
import org.wardon.heat.Course;
import org.wardon.heat.Hours;
import org.wardon.lots.LotHistory;
import org.wardon.plan.ChamberPlan;
import org.wardon.produce.Caution;
import org.wardon.produce.Caution.Level;
import org.wardon.produce.Fact;
import org.wardon.produce.Reason;
import org.wardon.produce.Reason.Argument;

/**
 * The warm corner of a chamber whose air is two: how far apart its ends are, and which lots stand
 * too warm at the door end. Too warm is a lot that has cooled, is in the mean of its last day above
 * both what its crop is kept at and the band of the chamber, while the coil end's air is not.
 */
final class DoorEnd {
    private static final String RULE = "assumption";

    private final StoreOutcome outcome;
    private final ChamberPlan chamber;
    private final Course course;
    private final Hours hours;

    private DoorEnd(StoreOutcome outcome, ChamberPlan chamber) {
        this.outcome = outcome;
        this.chamber = chamber;
        course = outcome.course(chamber.id());
        hours = course.hours();
    }

    /** What is to be told; nothing of a chamber whose air is one. */
    static List<Caution> of(StoreOutcome outcome, ChamberPlan chamber) {
        if (chamber.enclosure().zones().isEmpty()) {
            return List.of();
        }
        DoorEnd end = new DoorEnd(outcome, chamber);
        List<Caution> told = new ArrayList<>();
        told.add(end.spread());
        for (Visit visit : outcome.model().visitsIn(chamber.id())) {
            if (outcome.has(visit.id()) && visit.arrivesS() < outcome.horizonS()) {
                end.tooWarm(visit).ifPresent(told::add);
            }
        }
        return told;
    }

    private Caution spread() {
        double warmer = mean(0, hours.size(), i -> hours.doorEndC(i) - hours.airC(i));
        double most =
                IntStream.range(0, hours.size())
                        .mapToDouble(i -> hours.doorEndC(i) - hours.airC(i))
                        .max()
                        .orElseThrow();
        Argument door = Argument.of(mean(0, hours.size(), hours::doorEndC), "C");
        Argument coil = Argument.of(mean(0, hours.size(), hours::airC), "C");
        return new Caution(
                Level.NOTE,
                warmer >= 0
                        ? Reason.about(
                                "door-end-warmer",
                                chamber.id(),
                                RULE,
                                Argument.of(warmer, "K"),
                                Argument.of(most, "K"),
                                door,
                                coil)
                        : Reason.about(
                                "door-end-colder",
                                chamber.id(),
                                RULE,
                                Argument.of(-warmer, "K"),
                                door,
                                coil));
    }

    private Optional<Caution> tooWarm(Visit visit) {
        LotSheet sheet = visit.sheet();
        OptionalDouble keptAt =
                sheet.commodity()
                        .needs()
                        .temperatureC()
                        .map(Fact::high)
                        .orElse(OptionalDouble.empty());
        if (keptAt.isEmpty() || !sheet.spot().atDoorEnd(chamber.enclosure())) {
            return Optional.empty();
        }
        double untilS = Math.min(visit.leavesS(), outcome.horizonS());
        double setC =
                outcome.model()
                        .settings(chamber)
                        .warmestC(Math.max(0, untilS - Timeline.DAY_S), untilS);
        double most = Math.max(keptAt.getAsDouble(), setC + chamber.setting().bandK());
        LotHistory history = visit.within(outcome.history(visit.id()));
        Cooling cooling = Cooling.of(history, sheet, chamber, outcome);
        double lotC = lastDayC(history, untilS);
        int until = row(untilS);
        double coilC = mean(Math.max(0, until - 24), until, hours::airC);
        boolean cooled = !cooling.wasWarm() || cooling.sevenEighthsHours().isPresent();
        if (!cooled || lotC <= most || coilC > most) {
            return Optional.empty();
        }
        return Optional.of(
                new Caution(
                        Level.CAUTION,
                        new Reason(
                                "door-end-too-warm",
                                List.of(sheet.id(), chamber.id()),
                                List.of(
                                        Argument.of(lotC, "C"),
                                        Argument.of(most, "C"),
                                        Argument.of(coilC, "C")),
                                RULE)));
    }

    /** Rows that end by a time; 1 or more. */
    private int row(double atS) {
        int n = 1;
        while (n < hours.size() && hours.atS(n) <= atS) {
            n++;
        }
        return n;
    }

    /** Mean of a lot over its last day here, as far as it was here, °C. */
    private static double lastDayC(LotHistory history, double untilS) {
        return IntStream.range(0, history.size())
                .filter(i -> history.timeS(i) <= untilS + 1)
                .filter(i -> history.timeS(i) > untilS - Timeline.DAY_S)
                .mapToDouble(history::meanC)
                .average()
                .orElseGet(() -> history.meanC(history.size() - 1));
    }

    private static double mean(int from, int to, IntToDoubleFunction value) {
        return IntStream.range(from, to).mapToDouble(value).average().orElseThrow();
    }
}

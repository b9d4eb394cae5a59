package org.wardon.advice.forecast;

import java.util.ArrayList;
import java.util.List;
import java.util.Set;
import java.util.stream.Collectors;
import org.wardon.air.MoistAir;
import org.wardon.air.StandardAtmosphere;
import org.wardon.air.Timeline;
import org.wardon.heat.Course;
import org.wardon.heat.CourseEvent;
import org.wardon.heat.Hours;
import org.wardon.lots.LotHistory;
import org.wardon.produce.Caution;
import org.wardon.produce.Caution.Level;
import org.wardon.produce.Reason;
import org.wardon.produce.Reason.Argument;

/** Tells of the lots that are carried from one chamber to another, and where they sweat by it. */
final class Carried {
    private static final String PRACTICE = "common-practice";
    private static final String SWEATS = "sweats-when-moved";

    private final StoreOutcome outcome;

    Carried(StoreOutcome outcome) {
        this.outcome = outcome;
    }

    List<Caution> all() {
        List<Caution> told = new ArrayList<>();
        for (LotSheet sheet : outcome.model().sheets()) {
            for (Visit visit : sheet.visits()) {
                if (visit.from().isPresent() && outcome.has(sheet.id())) {
                    tell(visit, visit.from().get(), told);
                }
            }
        }
        return told;
    }

    /** Chambers a lot is told to sweat in because it was carried there. */
    static Set<String> sweatsIn(String lotId, List<Caution> carried) {
        return carried.stream()
                .map(Caution::reason)
                .filter(reason -> reason.code().equals(SWEATS))
                .filter(reason -> reason.subjects().get(0).equals(lotId))
                .map(reason -> reason.subjects().get(2))
                .collect(Collectors.toSet());
    }

    private void tell(Visit visit, String from, List<Caution> told) {
        LotHistory history = outcome.history(visit.id());
        int sample = at(history, visit.arrivesS());
        Hours hours = outcome.course(visit.chamber()).hours();
        int hour = before(hours, visit.arrivesS());
        List<String> subjects = List.of(visit.id(), from, visit.chamber());
        String when = outcome.model().plan().timeline().localAt(visit.arrivesS()).toString();
        told.add(
                new Caution(
                        Level.NOTE,
                        new Reason(
                                "moved",
                                subjects,
                                List.of(
                                        Argument.text(when.replace('T', ' ')),
                                        Argument.of(history.meanC(sample), "C"),
                                        Argument.of(hours.airC(hour), "C")),
                                "own")));
        double dewC = dewPointC(hours.humidityRatio(hour));
        double wetH = wetHours(visit);
        if (history.surfaceC(sample) < dewC && wetH > 0) {
            told.add(
                    new Caution(
                            Level.CAUTION,
                            new Reason(
                                    SWEATS,
                                    subjects,
                                    List.of(
                                            Argument.of(history.surfaceC(sample), "C"),
                                            Argument.of(dewC, "C"),
                                            Argument.of(wetH, "h")),
                                    PRACTICE)));
        }
    }

    private double dewPointC(double ratio) {
        double elevationM = outcome.model().plan().site().elevationM();
        return MoistAir.dewPointC(ratio, StandardAtmosphere.pressurePa(elevationM));
    }

    /** Hours in which free water lies on the lot in the place it was carried to. */
    private double wetHours(Visit visit) {
        Course course = outcome.course(visit.chamber());
        return course.events().stream()
                        .filter(event -> event.kind() == CourseEvent.Kind.WET_LOT)
                        .filter(event -> event.subject().equals(visit.id()))
                        .filter(event -> event.fromS() >= visit.arrivesS())
                        .filter(event -> event.fromS() < visit.leavesS())
                        .mapToDouble(
                                event -> Math.min(event.untilS(), visit.leavesS()) - event.fromS())
                        .sum()
                / Timeline.HOUR_S;
    }

    private static int at(LotHistory history, double atS) {
        int i = 0;
        while (i < history.size() - 1 && history.timeS(i) < atS) {
            i++;
        }
        return i;
    }

    /** The last row of a chamber's hours that knows nothing of what comes in then. */
    private static int before(Hours hours, double atS) {
        int i = 0;
        while (i < hours.size() - 1 && hours.atS(i + 1) < atS) {
            i++;
        }
        return i;
    }
}

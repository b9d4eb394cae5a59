package org.wardon.advice.forecast;

import java.util.Collection;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import org.wardon.air.Timeline;
import org.wardon.cooling.Outage;
import org.wardon.heat.Course;
import org.wardon.heat.LotCourse;
import org.wardon.keeping.Draw;
import org.wardon.lots.LotHistory;
import org.wardon.plan.ChamberPlan;

/**
 * How far past the horizon a draw has to follow each chamber, and each lot without one: until the
 * daily means of its lots drift no more, ten days at most. Beyond, every mechanism goes on at its
 * mean rate of the last day.
 */
final class Settling {
    private static final double SETTLED_K_A_DAY = 0.3;

    private final Map<String, Double> chambers = new HashMap<>();
    private final Map<String, Double> without = new HashMap<>();

    private Settling() {}

    /** Looks at the plain run; what it does not show at rest is sketched further. */
    static Settling of(StoreModel model, Map<String, Course> plain, double horizonS) {
        Settling settling = new Settling();
        double lastS = horizonS + StoreRun.MOST_BEYOND_DAYS * Timeline.DAY_S;
        for (ChamberPlan chamber : model.plan().chambers()) {
            Course course = ById.get(plain, chamber.id());
            List<Outage> outages = model.singleOutages(chamber);
            double atS = horizonS;
            if (!settled(course.lots(), outages, atS)) {
                Course sketch = model.sketch(chamber, lastS, plain);
                do {
                    atS += Timeline.DAY_S;
                } while (atS < lastS && !settled(sketch.lots(), outages, atS));
            }
            settling.chambers.put(chamber.id(), atS);
        }
        if (model.sheets().stream().anyMatch(sheet -> !sheet.clock().moves().isEmpty())) {
            settling.inStep();
        }
        for (LotSheet sheet : model.sheets()) {
            settling.without.put(sheet.id(), withoutS(model, sheet, horizonS, lastS));
        }
        return settling;
    }

    /** Chambers that carry lots to each other run over one span. */
    private void inStep() {
        double last = chambers.values().stream().mapToDouble(at -> at).max().orElseThrow();
        chambers.replaceAll((id, at) -> last);
    }

    /** How far a lot without a chamber is to be followed, s. */
    static double withoutS(StoreModel model, LotSheet sheet, double horizonS, double lastS) {
        double atS = Math.max(horizonS, sheet.clock().hereFromS() + 2 * Timeline.DAY_S);
        LotHistory outside = model.without(sheet, Draw.MEDIAN, lastS).history();
        while (atS < lastS && !settled(outside, atS)) {
            atS += Timeline.DAY_S;
        }
        return Math.min(atS, lastS);
    }

    /** End of a chamber's run in a draw, s. */
    double chamberS(String id) {
        return ById.get(chambers, id);
    }

    /** End of a lot's run without a chamber in a draw, s. */
    double withoutS(String id) {
        return ById.get(without, id);
    }

    /** Whether every lot's daily mean has come to rest a day after the last outage. */
    static boolean settled(Collection<LotCourse> lots, List<Outage> outages, double durationS) {
        for (Outage outage : outages) {
            if (outage.startS() < durationS && outage.endS() > durationS - Timeline.DAY_S) {
                return false;
            }
        }
        return lots.stream()
                .filter(lot -> lot.stay().arrivesS() < durationS && lot.carriedOut().isEmpty())
                .allMatch(lot -> settled(lot.history(), durationS));
    }

    private static boolean settled(LotHistory history, double durationS) {
        if (durationS - history.timeS(0) < 2 * Timeline.DAY_S) {
            return false;
        }
        double last = meanC(history, durationS - Timeline.DAY_S, durationS);
        double before = meanC(history, durationS - 2 * Timeline.DAY_S, durationS - Timeline.DAY_S);
        return Math.abs(last - before) < SETTLED_K_A_DAY;
    }

    private static double meanC(LotHistory history, double fromS, double toS) {
        double sum = 0;
        double weight = 0;
        for (int i = 1; i < history.size(); i++) {
            if (history.timeS(i) > fromS && history.timeS(i) <= toS) {
                double span = history.timeS(i) - history.timeS(i - 1);
                sum += span * 0.5 * (history.meanC(i) + history.meanC(i - 1));
                weight += span;
            }
        }
        return weight > 0 ? sum / weight : Double.NaN;
    }
}

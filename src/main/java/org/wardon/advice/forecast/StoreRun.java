package org.wardon.advice.forecast;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.concurrent.atomic.AtomicInteger;
import org.wardon.air.Timeline;
import org.wardon.cooling.Outage;
import org.wardon.errors.Progress;
import org.wardon.heat.Course;
import org.wardon.keeping.Draw;
import org.wardon.keeping.Draws;
import org.wardon.keeping.Fate;
import org.wardon.keeping.StoreEthylene;
import org.wardon.lots.LotHistory;
import org.wardon.plan.ChamberPlan;

/**
 * Runs a store once in full and once a draw, and follows its lots. The draws, from which days left
 * are told, go on past the horizon until the lots have settled, ten days at most; the full run,
 * from which everything else is told, ends with the horizon.
 */
final class StoreRun {
    /** Draws of a forecast. */
    static final int DRAWS = 32;

    /** Most days a run goes on beyond its horizon. */
    static final int MOST_BEYOND_DAYS = 10;

    private static final double SETTLED_K_A_DAY = 0.3;

    private final StoreModel model;
    private final Fates fates;
    private final double horizonS;

    StoreRun(StoreModel model) {
        this.model = model;
        this.fates = new Fates(model);
        this.horizonS = model.plan().durationS();
    }

    StoreOutcome run(Progress progress) {
        Map<String, Course> courses = model.plain(horizonS, progress);
        double durationS = settledS(courses);
        StoreEthylene ethylene = fates.ethylene(courses, Draw.MEDIAN);
        Map<String, LotHistory> histories = ethylene.histories();
        Map<String, Fates.Three> plain = fates.follow(histories, Draw.MEDIAN, horizonS);
        List<Map<String, Fates.Three>> drawn = draws(courses, durationS, progress);
        return new StoreOutcome(
                model,
                horizonS,
                courses,
                ethylene.chambers(),
                histories,
                together(plain, drawn, histories));
    }

    private List<Map<String, Fates.Three>> draws(
            Map<String, Course> plain, double durationS, Progress progress) {
        AtomicInteger done = new AtomicInteger();
        return Draws.seeded(model.plan().seed(), DRAWS).parallelStream()
                .map(
                        draw -> {
                            Map<String, Course> courses = model.drawn(draw, durationS, plain);
                            Map<String, LotHistory> histories =
                                    fates.ethylene(courses, draw).histories();
                            progress.at("draws", done.incrementAndGet() / (double) DRAWS);
                            return fates.ends(histories, draw, durationS);
                        })
                .toList();
    }

    private Map<String, LotFates> together(
            Map<String, Fates.Three> plain,
            List<Map<String, Fates.Three>> drawn,
            Map<String, LotHistory> histories) {
        Map<String, LotFates> all = new HashMap<>();
        for (LotSheet sheet : model.sheets()) {
            Fates.Three median = plain.get(sheet.id());
            if (median == null) {
                continue;
            }
            List<Fate> staying = new ArrayList<>();
            List<Fate> sold = new ArrayList<>();
            List<Fate> without = new ArrayList<>();
            for (Map<String, Fates.Three> draw : drawn) {
                Fates.Three three = ById.get(draw, sheet.id());
                staying.add(three.staying());
                sold.add(three.sold());
                without.add(three.without());
            }
            LotHistory history = ById.get(histories, sheet.id());
            all.put(
                    sheet.id(),
                    new LotFates(
                            median.staying(),
                            staying,
                            sold,
                            without,
                            sheet.model().basis(history)));
        }
        return all;
    }

    /** When every lot's daily mean has come to rest, s: the horizon, or found by a sketch. */
    private double settledS(Map<String, Course> horizon) {
        if (settled(horizon, horizonS)) {
            return horizonS;
        }
        double lastS = horizonS + MOST_BEYOND_DAYS * Timeline.DAY_S;
        Map<String, Course> sketch = model.sketch(lastS);
        double atS = horizonS + Timeline.DAY_S;
        while (atS < lastS && !settled(sketch, atS)) {
            atS += Timeline.DAY_S;
        }
        return atS;
    }

    /** Whether every lot's daily mean has come to rest a day after the last outage. */
    private boolean settled(Map<String, Course> courses, double durationS) {
        for (ChamberPlan chamber : model.plan().chambers()) {
            for (Outage outage : model.outages(chamber)) {
                if (outage.startS() < durationS && outage.endS() > durationS - Timeline.DAY_S) {
                    return false;
                }
            }
        }
        return courses.values().stream()
                .flatMap(course -> course.lots().stream())
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

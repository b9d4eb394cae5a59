package org.wardon.advice.forecast;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.concurrent.atomic.AtomicInteger;
import org.wardon.errors.Progress;
import org.wardon.heat.Course;
import org.wardon.keeping.Draw;
import org.wardon.keeping.Draws;
import org.wardon.keeping.Fate;
import org.wardon.keeping.StoreEthylene;
import org.wardon.lots.LotHistory;

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
        Settling ends = Settling.of(model, courses, horizonS);
        StoreEthylene ethylene = fates.ethylene(courses, Draw.MEDIAN);
        Map<String, LotHistory> histories = ethylene.histories();
        Map<String, Fates.Three> plain = fates.follow(histories, Draw.MEDIAN, id -> horizonS);
        CleanerAir cleaner = new CleanerAir(model, fates, histories);
        List<Drawn> drawn = draws(courses, ends, cleaner, progress);
        return new StoreOutcome(
                model,
                horizonS,
                courses,
                ethylene.chambers(),
                histories,
                together(plain, drawn.stream().map(Drawn::ends).toList(), histories),
                cleaner.together(drawn.stream().map(Drawn::cleaner).toList()));
    }

    /** What a draw leaves: ends of the lots, and what cleaner air gains them. */
    private record Drawn(Map<String, Fates.Three> ends, Map<String, CleanerAir.Gain> cleaner) {}

    private List<Drawn> draws(
            Map<String, Course> plain, Settling ends, CleanerAir cleaner, Progress progress) {
        AtomicInteger done = new AtomicInteger();
        return Draws.seeded(model.plan().seed(), DRAWS).parallelStream()
                .map(
                        draw -> {
                            Map<String, Course> courses = model.drawn(draw, ends::chamberS, plain);
                            Map<String, LotHistory> histories =
                                    fates.ethylene(courses, draw).histories();
                            progress.at("draws", done.incrementAndGet() / (double) DRAWS);
                            return new Drawn(
                                    fates.ends(histories, draw, ends::withoutS),
                                    cleaner.gains(courses, draw, histories));
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
}

package org.wardon.advice.placing;

import java.util.ArrayList;
import java.util.HashSet;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Objects;
import java.util.Optional;
import java.util.Set;
import org.wardon.advice.forecast.StoreTrial;
import org.wardon.advice.forecast.Tried;
import org.wardon.heat.AirSeries;
import org.wardon.heat.Course;
import org.wardon.plan.ChamberPlan;
import org.wardon.plan.PlaceWish;

/**
 * Search and full model in turn: what is placed is run in full; where a chamber does not hold what
 * was assumed, what it can take is cut to what it does hold; where it holds, its lots are judged in
 * the air it really makes; then the search runs again.
 */
final class Coupling {
    /** A mean of a day so far above what holds is no overload, K. */
    private static final double HOLDS_K = 0.05;

    private static final double BESIDE_BAND_K = 0.5;

    /** Share of the usual work that the searches after the first do. */
    private static final double LATER = 0.3;

    private final StoreTrial trial;
    private final Options options;
    private final Draft draft;
    private final List<Candidate> candidates = new ArrayList<>();
    private final Set<List<Object>> seen = new HashSet<>();
    private Map<String, List<Option>> known = Map.of();

    Coupling(StoreTrial trial, Options options, Draft draft) {
        this.trial = trial;
        this.options = options;
        this.draft = draft;
    }

    /** Places that were run, in the order they were found. */
    List<Candidate> candidates() {
        return candidates;
    }

    /** What is known of the chambers in the end. */
    Map<String, List<Option>> known() {
        return known;
    }

    /**
     * Runs the placing at the settings of the plan, then so many rounds of any setting at most,
     * fewer where the same placing comes back; last, settings a kelvin beside the best.
     *
     * @param all what each chamber can make
     * @param aim what comes first
     * @param rounds most rounds
     * @param beside whether to look beside the best
     */
    void run(Map<String, List<Option>> all, PlaceWish.Aim aim, int rounds, boolean beside) {
        known = all;
        consider(draft.seek(chambers(), Trials.asSet(trial.plan(), all), aim, 1));
        for (int round = 0; round < rounds; round++) {
            if (!consider(draft.seek(chambers(), known, aim, round == 0 ? 1 : LATER))) {
                break;
            }
        }
        if (beside) {
            lookBeside();
            consider(draft.seek(chambers(), known, aim, LATER));
        }
    }

    private List<ChamberPlan> chambers() {
        return trial.plan().chambers();
    }

    /** Runs a placing that is new; false where it was run before. */
    private boolean consider(Sought sought) {
        if (!seen.add(key(sought))) {
            return false;
        }
        Tried tried = trial.run(sought.plan(trial.plan()));
        candidates.add(new Candidate(sought, tried));
        known = learnt(known, sought, tried);
        return true;
    }

    /** Adds settings a kelvin beside those of the best placing so far. */
    private void lookBeside() {
        Candidate best = new Ranked(trial.plan().wish()).best(candidates);
        List<Options.Dial> dials = new ArrayList<>();
        for (Optional<Option> option : best.sought().chosen()) {
            if (option.isPresent() && option.get().riseK() == 0 && !option.get().changes()) {
                ChamberPlan on = option.get().chamber();
                dials.add(Options.Dial.at(on, option.get().settingC() - 1));
                dials.add(Options.Dial.at(on, option.get().settingC() + 1));
            }
        }
        Map<String, List<Option>> more = new LinkedHashMap<>(known);
        for (Option option : options.of(dials)) {
            more.computeIfPresent(option.chamber().id(), (id, before) -> with(before, option));
        }
        known = more;
    }

    private static List<Option> with(List<Option> before, Option option) {
        if (before.stream().anyMatch(one -> one.setAs(option.chamber()))) {
            return before;
        }
        List<Option> all = new ArrayList<>(before);
        all.add(option);
        all.sort(java.util.Comparator.comparingDouble(Option::settingC));
        return all;
    }

    private static List<Object> key(Sought sought) {
        List<Object> key = new ArrayList<>();
        for (int c = 0; c < sought.chambers().size(); c++) {
            key.add(sought.chosen().get(c).map(Option::settingC));
            key.add(sought.chosen().get(c).map(o -> o.chamber().use().changes()));
            key.add(sought.placing().chambers().get(c).lots());
        }
        return key;
    }

    private Map<String, List<Option>> learnt(
            Map<String, List<Option>> known, Sought sought, Tried tried) {
        Map<String, List<Option>> next = new LinkedHashMap<>(known);
        for (int c = 0; c < sought.chambers().size(); c++) {
            Optional<Option> used = sought.chosen().get(c);
            if (used.isPresent()) {
                String id = sought.chambers().get(c).id();
                Course course = Objects.requireNonNull(tried.chambers().get(id));
                List<Option> before = Objects.requireNonNull(known.get(id));
                next.put(id, learnt(before, used.get(), sought.in(c), course));
            }
        }
        return next;
    }

    private List<Option> learnt(
            List<Option> before, Option used, List<Task.Item> items, Course course) {
        double[] overW = overloadW(used, course);
        double worst = 0;
        for (double watts : overW) {
            worst = Math.max(worst, watts);
        }
        if (worst > 0) {
            double[] heat = heat(used, items);
            return before.stream().map(option -> cut(option, used, overW, heat)).toList();
        }
        List<Option> next = new ArrayList<>(before);
        int place = place(before, used);
        if (place >= 0) {
            next.set(place, inRealAir(before.get(place), course));
        }
        return next;
    }

    private static int place(List<Option> among, Option used) {
        for (int i = 0; i < among.size(); i++) {
            if (like(among.get(i), used)) {
                return i;
            }
        }
        return -1;
    }

    private static boolean like(Option a, Option b) {
        return a.setAs(b.chamber()) && a.riseK() == b.riseK();
    }

    /** How much more heat its lots gave on each day than what it holds its setting with, W. */
    private double[] overloadW(Option used, Course course) {
        double[] mean = DayMeans.of(course, trial.days());
        double[] over = new double[mean.length];
        double[] assumed = assumedC(used, mean.length);
        for (int day = 0; day < mean.length; day++) {
            double above = mean[day] - assumed[day];
            if (above > HOLDS_K) {
                Reach reach = options.reach(used.chamber().id());
                over[day] = above * Math.max(0, reach.perKelvinW(day, mean[day]));
            }
        }
        return over;
    }

    /** Warmest mean of each day at which the option still is what it was taken for, °C. */
    private double[] assumedC(Option used, int days) {
        double[] most = new double[days];
        for (int day = 0; day < days; day++) {
            double sum = 0;
            for (int h = 1; h <= 24; h++) {
                sum += used.air().temperatureC((24.0 * day + h) * 3_600);
            }
            double band = used.chamber().setting().bandK();
            double mean =
                    Math.max(sum / 24, used.riseK() > 0 || used.changes() ? -100 : used.settingC());
            double kept = mean + (used.riseK() > 0 ? 0 : band + BESIDE_BAND_K);
            most[day] = Math.max(kept, Begins.onTheWayC(used.chamber(), day));
        }
        return most;
    }

    private double[] heat(Option used, List<Task.Item> items) {
        double[] heat = new double[trial.days()];
        for (Task.Item item : items) {
            double[] one = used.cell(item.number()).there().heatW(heat.length);
            for (int day = item.firstDay(); day <= item.lastDay(); day++) {
                heat[day] += one[day];
            }
        }
        return heat;
    }

    private static Option cut(Option option, Option used, double[] overW, double[] heatW) {
        List<Double> takes = new ArrayList<>();
        for (int day = 0; day < overW.length; day++) {
            double now = option.takesW().get(day);
            double held = like(option, used) && overW[day] > 0 ? Math.min(now, heatW[day]) : now;
            takes.add(Math.max(0, held - overW[day]));
        }
        return option.taking(takes);
    }

    private Option inRealAir(Option used, Course course) {
        AirSeries air = StoreTrial.air(course, course, 0);
        Option.Figures was = used.figures();
        Option.Figures figures =
                new Option.Figures(
                        DayMeans.whole(course.hours(), course.hours()::airC),
                        Options.humidityPct(course),
                        was.exchangeM3h(),
                        was.idleCost(),
                        was.costPerWDay(),
                        was.blastK());
        Lazily<Cell.Alone> alone = options.alone(air, figures.meanC());
        return options.learnt(
                used.inAir(air, figures, options.cells(used.chamber(), figures, alone)));
    }
}

package org.wardon.advice.forecast;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.TreeSet;
import java.util.stream.Collectors;
import org.wardon.advice.Ranges;
import org.wardon.air.Timeline;
import org.wardon.files.forecast.ChamberForecast;
import org.wardon.heat.Course;
import org.wardon.heat.Hours;
import org.wardon.keeping.Draw;
import org.wardon.keeping.Spread;
import org.wardon.keeping.StoreEthylene;
import org.wardon.keeping.ethylene.Response;
import org.wardon.lots.LotHistory;
import org.wardon.plan.ChamberPlan;
import org.wardon.plan.Defaults;
import org.wardon.produce.Reason;
import org.wardon.produce.Reason.Argument;

/**
 * What cleaner air is worth in days, where ethylene costs lots days: one air change an hour of
 * fresh air more, or a scrubber that draws as much, beside what the plan has. The ethylene of the
 * store is stepped again in the same draws; since it does not act back on heat, no heat is run
 * again, and what more fresh air costs in cooling is told beside it. All chambers that need it are
 * cleaned at once, which matters only to lots that move between them.
 */
final class CleanerAir {
    /** Gross volumes an hour, of fresh air or through the scrubber (ours, stated in the answer). */
    static final double CHANGES_PER_HOUR = 1;

    /** Fewer days are not worth a word. */
    private static final double LEAST_DAYS = 0.1;

    /** Heat capacity of a cubic metre of air, J/(m3 K), about 1.2 kg at 1006 J/(kg K). */
    private static final double AIR_J_M3K = 1_207;

    private final Fates fates;
    private final List<LotSheet> suffering = new ArrayList<>();
    private final More fresh;
    private final More scrubbed;

    /** Finds the lots that ethylene costs days in the plain run. */
    CleanerAir(StoreModel model, Fates fates, Map<String, LotHistory> histories) {
        this.fates = fates;
        Set<String> chambers = new TreeSet<>();
        for (LotSheet sheet : model.sheets()) {
            LotHistory history = histories.get(sheet.id());
            if (history != null && fates.costDays(sheet, history) >= LEAST_DAYS) {
                suffering.add(sheet);
                chambers.add(sheet.endsIn());
            }
        }
        Map<String, Double> volumes = new HashMap<>();
        chambers.forEach(id -> volumes.put(id, volumeM3(model.plan().getChamber(id))));
        double perS = CHANGES_PER_HOUR / Timeline.HOUR_S;
        fresh = new More(volumes, perS, 0);
        scrubbed = new More(volumes, 0, perS * Defaults.SCRUB_EFFICIENCY_PCT.value() / 100);
    }

    private static double volumeM3(ChamberPlan chamber) {
        return chamber.enclosure().box().volumeM3();
    }

    /**
     * Air cleaned beside what the plan has.
     *
     * @param volumes gross volumes of the chambers it is done in, m3, by id
     * @param freshPerS volumes of fresh air, 1/s
     * @param cleanedPerS volumes as good as freed of ethylene, 1/s
     */
    record More(Map<String, Double> volumes, double freshPerS, double cleanedPerS) {
        static final More NOTHING = new More(Map.of(), 0, 0);

        More {
            volumes = Map.copyOf(volumes);
        }

        double freshM3s(String chamberId) {
            return freshPerS * volumes.getOrDefault(chamberId, 0.0);
        }

        double cleanedM3s(String chamberId) {
            return cleanedPerS * volumes.getOrDefault(chamberId, 0.0);
        }
    }

    /**
     * Days a lot gains in one draw, or over the draws.
     *
     * @param freshDays by the fresh air
     * @param scrubDays by the scrubber
     */
    record Gain(double freshDays, double scrubDays) {}

    /**
     * Days a lot gains over the draws.
     *
     * @param fresh by the fresh air
     * @param scrub by the scrubber
     */
    record Worth(Spread fresh, Spread scrub) {}

    /** Gains of one draw, by lot. */
    Map<String, Gain> gains(
            Map<String, Course> courses, Draw draw, Map<String, LotHistory> histories) {
        Map<String, Gain> gains = new HashMap<>();
        if (suffering.isEmpty()) {
            return gains;
        }
        Map<String, LotHistory> aired = fates.cleaned(courses, draw, fresh).histories();
        StoreEthylene scrubs = fates.cleaned(courses, draw, scrubbed);
        Map<String, LotHistory> clean = scrubs.histories();
        for (LotSheet sheet : suffering) {
            String id = sheet.id();
            double as = fates.daysStaying(sheet, ById.get(histories, id), draw);
            gains.put(
                    id,
                    new Gain(
                            fates.daysStaying(sheet, ById.get(aired, id), draw) - as,
                            fates.daysStaying(sheet, ById.get(clean, id), draw) - as));
        }
        return gains;
    }

    /** Puts the draws together. */
    Map<String, Worth> together(List<Map<String, Gain>> draws) {
        Map<String, Worth> worth = new HashMap<>();
        for (LotSheet sheet : suffering) {
            List<Gain> all = draws.stream().map(draw -> ById.get(draw, sheet.id())).toList();
            worth.put(
                    sheet.id(),
                    new Worth(
                            Spread.of(all.stream().mapToDouble(Gain::freshDays).toArray()),
                            Spread.of(all.stream().mapToDouble(Gain::scrubDays).toArray())));
        }
        return worth;
    }

    private static List<LotSheet> in(ChamberPlan chamber, StoreOutcome outcome) {
        return outcome.model().sheets().stream()
                .filter(sheet -> outcome.cleaner().containsKey(sheet.id()))
                .filter(sheet -> sheet.endsIn().equals(chamber.id()))
                .toList();
    }

    /** The answer in figures; empty where ethylene costs no lot of the chamber days. */
    static Optional<ChamberForecast.CleanerAir> figures(ChamberPlan chamber, StoreOutcome outcome) {
        List<ChamberForecast.CleanerAir.OfLot> lots =
                in(chamber, outcome).stream()
                        .map(
                                sheet -> {
                                    Worth worth = ById.get(outcome.cleaner(), sheet.id());
                                    return new ChamberForecast.CleanerAir.OfLot(
                                            sheet.id(),
                                            Ranges.told(worth.fresh()),
                                            Ranges.told(worth.scrub()));
                                })
                        .toList();
        double perHour = CHANGES_PER_HOUR * volumeM3(chamber);
        return lots.isEmpty()
                ? Optional.empty()
                : Optional.of(
                        new ChamberForecast.CleanerAir(
                                perHour,
                                coolingW(perHour, outcome.course(chamber.id())),
                                perHour,
                                Defaults.SCRUB_EFFICIENCY_PCT.value(),
                                lots));
    }

    /** Cooling of dry fresh air from outdoors to the chamber's own, means of the run, W. */
    private static double coolingW(double freshM3PerHour, Course course) {
        Hours hours = course.hours();
        double sum = 0;
        for (int i = 0; i < hours.size(); i++) {
            sum += hours.outdoorC(i) - hours.airC(i);
        }
        double warmerK = Math.max(0, sum / hours.size());
        return freshM3PerHour / Timeline.HOUR_S * AIR_J_M3K * warmerK;
    }

    /** The answer in a sentence; empty where neither is worth a word. */
    static Optional<Reason> told(ChamberPlan chamber, StoreOutcome outcome) {
        List<LotSheet> worthIt =
                in(chamber, outcome).stream()
                        .filter(
                                sheet -> {
                                    Worth worth = ById.get(outcome.cleaner(), sheet.id());
                                    return Math.max(worth.fresh().p50(), worth.scrub().p50())
                                            >= LEAST_DAYS;
                                })
                        .toList();
        if (worthIt.isEmpty()) {
            return Optional.empty();
        }
        String each =
                worthIt.stream()
                        .map(sheet -> days(sheet.id(), ById.get(outcome.cleaner(), sheet.id())))
                        .collect(Collectors.joining(", "));
        double perHour = CHANGES_PER_HOUR * volumeM3(chamber);
        return Optional.of(
                Reason.about(
                        "cleaner-air",
                        chamber.id(),
                        Response.SOURCE_ID,
                        Argument.of(perHour, "m3/h"),
                        Argument.text(each),
                        Argument.of(Defaults.SCRUB_EFFICIENCY_PCT.value(), "pct"),
                        Argument.of(coolingW(perHour, outcome.course(chamber.id())), "W")));
    }

    private static String days(String id, Worth worth) {
        return String.format(
                Locale.ROOT, "%s %.1f and %.1f", id, worth.fresh().p50(), worth.scrub().p50());
    }
}

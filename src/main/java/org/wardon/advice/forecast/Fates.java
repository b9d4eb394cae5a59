package org.wardon.advice.forecast;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.function.ToDoubleFunction;
import org.wardon.air.Timeline;
import org.wardon.cooling.Outage;
import org.wardon.heat.AirSeries;
import org.wardon.heat.Course;
import org.wardon.heat.Hours;
import org.wardon.heat.LotCourse;
import org.wardon.keeping.Draw;
import org.wardon.keeping.Fate;
import org.wardon.keeping.Giver;
import org.wardon.keeping.HistoryLegs;
import org.wardon.keeping.Mechanism;
import org.wardon.keeping.StoreEthylene;
import org.wardon.keeping.Window;
import org.wardon.keeping.ethylene.ChamberAir;
import org.wardon.lots.LotHistory;
import org.wardon.plan.ChamberPlan;
import org.wardon.plan.EthyleneAround;
import org.wardon.plan.EthyleneScrub;

/** Follows the lots of a store through one draw: staying, sold, and without a chamber. */
final class Fates {
    /** Market legs shorter than this are not followed apart, days. */
    private static final double SHORTEST_LEG_DAYS = 0.05;

    private final StoreModel model;
    private final EthyleneAround around;
    private final Map<String, MarketAir> markets = new HashMap<>();

    Fates(StoreModel model) {
        this.model = model;
        this.around = model.plan().ethylene();
        model.sheets().forEach(sheet -> markets.put(sheet.id(), market(sheet)));
    }

    /**
     * The three fates of one lot in one draw.
     *
     * @param staying staying in its chamber for good
     * @param sold leaving as planned, market leg included
     * @param without without a chamber
     */
    record Three(Fate staying, Fate sold, Fate without) {
        /** The same ends without the courses to them, for draws of which many are kept. */
        Three brief() {
            return new Three(staying.brief(), sold.brief(), without.brief());
        }
    }

    /**
     * The fates of one lot in its chamber in one draw.
     *
     * @param staying staying for good
     * @param sold leaving as planned, market leg included
     */
    record Two(Fate staying, Fate sold) {
        /** The same ends without the courses to them. */
        Two brief() {
            return new Two(staying.brief(), sold.brief());
        }
    }

    /** Ethylene of all chambers in a draw, and with it the completed histories of the lots. */
    StoreEthylene ethylene(Map<String, Course> courses, Draw draw) {
        return ethylene(courses, draw, true, CleanerAir.More.NOTHING);
    }

    /** The same with more fresh air or another scrubber; the heat of the chambers stays. */
    StoreEthylene cleaned(Map<String, Course> courses, Draw draw, CleanerAir.More more) {
        return ethylene(courses, draw, true, more);
    }

    /** Ethylene of all chambers in the middle draw as if no scrubber ran. */
    StoreEthylene unscrubbed(Map<String, Course> courses) {
        return ethylene(courses, Draw.MEDIAN, false, CleanerAir.More.NOTHING);
    }

    private StoreEthylene ethylene(
            Map<String, Course> courses, Draw draw, boolean scrubbed, CleanerAir.More more) {
        Map<String, ChamberAir> air = new HashMap<>();
        courses.forEach((id, course) -> air.put(id, air(course, scrubbed, more)));
        return StoreEthylene.of(air, givers(courses), around.outdoorPpm(), draw);
    }

    /** Follows every lot that has a history. */
    Map<String, Three> follow(
            Map<String, LotHistory> histories, Draw draw, ToDoubleFunction<String> withoutS) {
        Map<String, Three> fates = new HashMap<>();
        for (LotSheet sheet : model.sheets()) {
            LotHistory history = histories.get(sheet.id());
            if (history != null) {
                LotHistory alone =
                        clean(
                                model.without(sheet, draw, withoutS.applyAsDouble(sheet.id()))
                                        .history());
                fates.put(sheet.id(), three(sheet, history, alone, draw));
            }
        }
        return fates;
    }

    /** Follows every lot and keeps the ends only, each before the next is begun. */
    Map<String, Three> ends(
            Map<String, LotHistory> histories, Draw draw, ToDoubleFunction<String> withoutS) {
        Map<String, Three> ends = new HashMap<>();
        histories.forEach(
                (id, history) ->
                        follow(Map.of(id, history), draw, withoutS)
                                .forEach((lot, three) -> ends.put(lot, three.brief())));
        return ends;
    }

    private Three three(LotSheet sheet, LotHistory history, LotHistory outside, Draw draw) {
        Two inside = inside(sheet, history, draw);
        return new Three(inside.staying(), inside.sold(), sheet.model().follow(outside, draw));
    }

    /** Follows a lot in its chamber alone. */
    Two inside(LotSheet sheet, LotHistory history, Draw draw) {
        Fate staying = sheet.model().follow(history, draw, beyond(sheet, history));
        return new Two(staying, sold(sheet, history, staying, draw));
    }

    /** Follows a lot without a chamber in one draw to a time. */
    Fate outside(LotSheet sheet, Draw draw, double untilS) {
        return sheet.model().follow(clean(model.without(sheet, draw, untilS).history()), draw);
    }

    /** Days left of a lot staying in its chamber for good. */
    double daysStaying(LotSheet sheet, LotHistory history, Draw draw) {
        return sheet.model()
                .follow(history, draw, beyond(sheet, history))
                .daysLeft(sheet.clock().hereFromS());
    }

    /**
     * Days that the ethylene it felt costs a lot in the middle draw, beside clean outdoor air, were
     * nothing else to end it.
     */
    double costDays(LotSheet sheet, LotHistory history) {
        return ethyleneDays(sheet, clean(history)) - ethyleneDays(sheet, history);
    }

    /** Days that the ethylene of a chamber costs a lot that leaves as planned, a draw each. */
    List<Double> lostToEthylene(Visit visit, LotHistory history, List<Draw> draws) {
        LotSheet sheet = visit.sheet();
        double[] ppm = new double[history.size()];
        for (int i = 0; i < ppm.length; i++) {
            boolean here =
                    history.timeS(i) >= visit.hereFromS() && history.timeS(i) <= visit.leavesS();
            ppm[i] = here ? around.outdoorPpm() : history.ethylenePpm(i);
        }
        LotHistory clean = history.withEthylene(ppm);
        double fromS = sheet.clock().hereFromS();
        return draws.stream()
                .map(
                        draw ->
                                inside(sheet, clean, draw).sold().daysLeft(fromS)
                                        - inside(sheet, history, draw).sold().daysLeft(fromS))
                .map(lost -> Math.max(0, lost))
                .toList();
    }

    private double ethyleneDays(LotSheet sheet, LotHistory history) {
        return sheet.model()
                .follow(history, Draw.MEDIAN, beyond(sheet, history))
                .daysLeft(Mechanism.ETHYLENE, sheet.clock().hereFromS());
    }

    /** History of a lot in another air than that of its chamber, market leg included. */
    LotHistory inOtherAir(LotSheet sheet, LotHistory history, double ppm) {
        double[] felt = new double[history.size()];
        Arrays.fill(felt, ppm);
        LotHistory there = history.withEthylene(felt);
        return isSold(sheet, there) ? withMarket(sheet, there) : there;
    }

    private static boolean isSold(LotSheet sheet, LotHistory history) {
        return sheet.marketDays() >= SHORTEST_LEG_DAYS
                && sheet.clock().leavesS() > history.timeS(0);
    }

    private Fate sold(LotSheet sheet, LotHistory history, Fate staying, Draw draw) {
        return isSold(sheet, history)
                ? sheet.model().follow(withMarket(sheet, history), draw)
                : staying;
    }

    /** History of a lot up to its leaving, carried on through the market leg. */
    LotHistory withMarket(LotSheet sheet, LotHistory history) {
        MarketAir market = ById.get(markets, sheet.id());
        return HistoryLegs.then(
                history,
                sheet.clock().leavesS(),
                market.temperatureC(),
                market.humidityFraction(),
                around.marketPpm(),
                sheet.marketDays());
    }

    /**
     * Air of the market leg.
     *
     * @param temperatureC mean temperature, °C
     * @param humidityFraction mean humidity, 0 to 1
     */
    record MarketAir(double temperatureC, double humidityFraction) {}

    /** Air of a lot's market leg: as given, else the mean of the air without a chamber. */
    private MarketAir market(LotSheet sheet) {
        AirSeries outside = model.withoutAir();
        double from = sheet.clock().leavesS();
        double hours = Math.max(1, Math.ceil(sheet.marketDays() * 24));
        double sumC = 0;
        double sumHumidity = 0;
        for (int h = 0; h < hours; h++) {
            sumC += outside.temperatureC(from + (h + 0.5) * Timeline.HOUR_S);
            sumHumidity += outside.humidityFraction(from + (h + 0.5) * Timeline.HOUR_S);
        }
        double given = sheet.plan().market().temperatureC().orElse(sumC / hours);
        return new MarketAir(given, sumHumidity / hours);
    }

    private LotHistory clean(LotHistory history) {
        double[] ppm = new double[history.size()];
        Arrays.fill(ppm, around.outdoorPpm());
        return history.withEthylene(ppm);
    }

    /**
     * The last 24 hours of a history without a single outage where it ends, or its last 24 hours.
     */
    private Window beyond(LotSheet sheet, LotHistory history) {
        Window whole = Window.lastDay(history);
        List<Visit> visits = sheet.visits();
        if (visits.isEmpty()) {
            return whole;
        }
        Visit end = visits.get(visits.size() - 1);
        double hereS = Math.max(history.timeS(0), end.hereFromS());
        Window last = new Window(fromS(whole.fromS(), hereS, whole.toS()), whole.toS());
        List<Outage> outages = model.singleOutages(model.plan().getChamber(end.chamber()));
        Window window = last;
        for (int i = outages.size() - 1; i >= 0; i--) {
            Outage outage = outages.get(i);
            if (outage.startS() < window.toS() && outage.endS() > window.fromS()) {
                double to = outage.startS();
                double from = Math.max(hereS, to - Timeline.DAY_S);
                if (to - from < Timeline.HOUR_S) {
                    return last;
                }
                window = new Window(from, to);
            }
        }
        return window;
    }

    /** Where a window starts that is to lie in the last place, but is an hour long at least. */
    private static double fromS(double fromS, double hereS, double toS) {
        return Math.max(fromS, Math.min(hereS, toS - Timeline.HOUR_S));
    }

    private List<Giver> givers(Map<String, Course> courses) {
        Map<String, LotCourse> lots = Legs.joined(courses.values());
        List<Giver> givers = new ArrayList<>();
        for (LotSheet sheet : model.sheets()) {
            LotCourse lot = lots.get(sheet.id());
            if (lot != null) {
                givers.add(
                        new Giver(
                                sheet.model(),
                                lot.history(),
                                sheet.plan().massKg(),
                                sheet.clock().leavesS(),
                                sheet.visits().stream()
                                        .map(v -> new Giver.Place(v.arrivesS(), v.chamber()))
                                        .toList()));
            }
        }
        return givers;
    }

    /** Exchange of a run as keeping reads it: each value holds from its time on. */
    private ChamberAir air(Course course, boolean scrubbed, CleanerAir.More more) {
        Hours hours = course.hours();
        int lead = hours.atS(0) > 0 ? 1 : 0;
        int n = hours.size() + lead;
        double[] time = new double[n];
        double[] exchange = new double[n];
        double[] free = new double[n];
        for (int i = 0; i < n; i++) {
            int row = i - lead;
            time[i] = row < 0 ? 0 : hours.atS(row);
            free[i] = hours.freeM3(Math.max(0, row));
            exchange[i] =
                    hours.exchangeM3s(Math.min(row + 1, hours.size() - 1))
                            + more.freshM3s(course.chamberId());
        }
        return scrubbed
                ? new ChamberAir(time, exchange, free, cleaned(course, time, more))
                : new ChamberAir(time, exchange, free);
    }

    /** Air a scrubber cleans from each time to the next, less what has no power, m3/s. */
    private double[] cleaned(Course course, double[] timeS, CleanerAir.More more) {
        double[] cleaned = new double[timeS.length];
        ChamberPlan chamber = model.plan().getChamber(course.chamberId());
        double most =
                chamber.ethyleneScrub().map(EthyleneScrub::cleanedM3s).orElse(0.0)
                        + more.cleanedM3s(course.chamberId());
        if (most > 0) {
            List<Outage> outages = BatteryNights.with(model.outages(chamber), course);
            for (int i = 0; i + 1 < timeS.length; i++) {
                double out = 0;
                for (Outage outage : outages) {
                    double from = Math.max(timeS[i], outage.startS());
                    out += Math.max(0, Math.min(timeS[i + 1], outage.endS()) - from);
                }
                cleaned[i] = most * (1 - out / (timeS[i + 1] - timeS[i]));
            }
        }
        return cleaned;
    }
}

package org.wardon.advice.forecast;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.wardon.air.Timeline;
import org.wardon.cooling.Outage;
import org.wardon.heat.AirSeries;
import org.wardon.heat.Course;
import org.wardon.heat.Hours;
import org.wardon.keeping.ChamberEthylene;
import org.wardon.keeping.Draw;
import org.wardon.keeping.Fate;
import org.wardon.keeping.Giver;
import org.wardon.keeping.HistoryLegs;
import org.wardon.keeping.Window;
import org.wardon.keeping.ethylene.ChamberAir;
import org.wardon.lots.LotHistory;
import org.wardon.plan.EthyleneAround;
import org.wardon.plan.StorePlan;

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

    /** Ethylene of each chamber in a draw, and with it the completed histories of its lots. */
    Map<String, ChamberEthylene> ethylene(Map<String, Course> courses, Draw draw) {
        Map<String, ChamberEthylene> levels = new HashMap<>();
        courses.forEach(
                (id, course) ->
                        levels.put(
                                id,
                                ChamberEthylene.of(
                                        air(course.hours()),
                                        givers(id, course),
                                        around.outdoorPpm(),
                                        draw)));
        return levels;
    }

    /** Lots of a chamber that are in the run, in the order of the run. */
    List<LotSheet> present(String chamberId, Course course) {
        return model.sheetsIn(chamberId).stream()
                .filter(
                        sheet ->
                                course.lots().stream()
                                        .anyMatch(lot -> lot.stay().lot().id().equals(sheet.id())))
                .toList();
    }

    /** Histories of all lots by id, with their ethylene. */
    Map<String, LotHistory> histories(
            Map<String, Course> courses, Map<String, ChamberEthylene> levels) {
        Map<String, LotHistory> histories = new HashMap<>();
        courses.forEach(
                (id, course) -> {
                    List<LotSheet> lots = present(id, course);
                    for (int i = 0; i < lots.size(); i++) {
                        histories.put(lots.get(i).id(), ById.get(levels, id).histories().get(i));
                    }
                });
        return histories;
    }

    /** Follows every lot that has a history. */
    Map<String, Three> follow(Map<String, LotHistory> histories, Draw draw, double durationS) {
        Map<String, Three> fates = new HashMap<>();
        for (LotSheet sheet : model.sheets()) {
            LotHistory history = histories.get(sheet.id());
            if (history != null) {
                LotHistory alone = clean(model.without(sheet, draw, durationS).history());
                fates.put(sheet.id(), three(sheet, history, alone, draw));
            }
        }
        return fates;
    }

    /** Follows every lot and keeps the ends only, each before the next is begun. */
    Map<String, Three> ends(Map<String, LotHistory> histories, Draw draw, double durationS) {
        Map<String, Three> ends = new HashMap<>();
        histories.forEach(
                (id, history) ->
                        follow(Map.of(id, history), draw, durationS)
                                .forEach((lot, three) -> ends.put(lot, three.brief())));
        return ends;
    }

    private Three three(LotSheet sheet, LotHistory history, LotHistory outside, Draw draw) {
        Fate staying = sheet.model().follow(history, draw, beyond(sheet, history));
        Fate alone = sheet.model().follow(outside, draw);
        return new Three(staying, sold(sheet, history, staying, draw), alone);
    }

    /** The fate of a lot in another air than that of its chamber. */
    Fate inOtherAir(LotSheet sheet, LotHistory history, double ppm, Draw draw) {
        double[] felt = new double[history.size()];
        Arrays.fill(felt, ppm);
        LotHistory there = history.withEthylene(felt);
        return sold(sheet, there, sheet.model().follow(there, draw), draw);
    }

    private Fate sold(LotSheet sheet, LotHistory history, Fate staying, Draw draw) {
        double leavesS = sheet.clock().leavesS();
        if (sheet.marketDays() < SHORTEST_LEG_DAYS || leavesS <= history.timeS(0)) {
            return staying;
        }
        return sheet.model().follow(withMarket(sheet, history), draw);
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

    /** The last 24 hours of a history without an outage, or its last 24 hours. */
    private Window beyond(LotSheet sheet, LotHistory history) {
        Window last = Window.lastDay(history);
        StorePlan plan = model.plan();
        Optional<String> chamber = sheet.plan().chamber();
        List<Outage> outages =
                chamber.isEmpty() ? List.of() : model.outages(plan.getChamber(chamber.get()));
        Window window = last;
        for (int i = outages.size() - 1; i >= 0; i--) {
            Outage outage = outages.get(i);
            if (outage.startS() < window.toS() && outage.endS() > window.fromS()) {
                double to = outage.startS();
                double from = Math.max(history.timeS(0), to - Timeline.DAY_S);
                if (to - from < Timeline.HOUR_S) {
                    return last;
                }
                window = new Window(from, to);
            }
        }
        return window;
    }

    private List<Giver> givers(String chamberId, Course course) {
        List<Giver> givers = new ArrayList<>();
        for (LotSheet sheet : present(chamberId, course)) {
            givers.add(
                    new Giver(
                            sheet.model(),
                            course.lot(sheet.id()).history(),
                            sheet.plan().massKg(),
                            sheet.clock().leavesS()));
        }
        return givers;
    }

    /** Exchange of a run as keeping reads it: each value holds from its time on. */
    private static ChamberAir air(Hours hours) {
        int lead = hours.atS(0) > 0 ? 1 : 0;
        int n = hours.size() + lead;
        double[] time = new double[n];
        double[] exchange = new double[n];
        double[] free = new double[n];
        for (int i = 0; i < n; i++) {
            int row = i - lead;
            time[i] = row < 0 ? 0 : hours.atS(row);
            free[i] = hours.freeM3(Math.max(0, row));
            exchange[i] = hours.exchangeM3s(Math.min(row + 1, hours.size() - 1));
        }
        return new ChamberAir(time, exchange, free);
    }
}

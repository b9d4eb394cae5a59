package org.wardon.sharing;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.OptionalDouble;
import org.wardon.air.Timeline;
import org.wardon.keeping.ChamberEthylene;
import org.wardon.keeping.Draw;
import org.wardon.keeping.Spread;
import org.wardon.lots.LotHistory;
import org.wardon.produce.Conflict;

/**
 * What accepted conflicts cost the lots of a group: of ethylene the days of life, each lot followed
 * at the setting that suits all best with the level all make together for the days they are
 * together, and in clean air; of smell that it is borne.
 */
final class Prices {
    private final Circumstances at;
    private final Map<String, Price> ethylene = new LinkedHashMap<>();
    private final List<Price> odours = new ArrayList<>();

    private Prices(Circumstances at) {
        this.at = at;
    }

    static List<Price> of(Spells spells, Circumstances at) {
        Prices prices = new Prices(at);
        for (Spells.One one : spells.all()) {
            prices.add(one);
        }
        List<Price> all = new ArrayList<>(prices.ethylene.values());
        all.addAll(prices.odours);
        return all;
    }

    private void add(Spells.One spell) {
        if (spell.common().verdict() == Verdict.NO) {
            return;
        }
        for (Workable taker : spell.lots()) {
            if (at.accepted().contains(Conflict.ETHYLENE)) {
                ethylene(taker, spell);
            }
            if (at.accepted().contains(Conflict.ODOUR)) {
                odours(taker, spell);
            }
        }
    }

    private void ethylene(Workable taker, Spells.One spell) {
        double atC = spell.common().bestC();
        double all = ChamberEthylene.OUTDOOR_PPM;
        double most = 0;
        double days = 0;
        String from = taker.id();
        for (Workable giver : spell.lots()) {
            double ppm = at.ppm(giver, spell.lots().size(), atC);
            all += ppm;
            if (giver != taker && ppm > most) {
                most = ppm;
                from = giver.id();
                days = at.daysTogether(taker, giver);
            }
        }
        if (days > 0) {
            double own = ChamberEthylene.OUTDOOR_PPM + at.ppm(taker, spell.lots().size(), atC);
            double lost = lost(taker, spell.common(), new Levels(own, all), days);
            Price price =
                    new Price(Conflict.ETHYLENE, taker.id(), from, OptionalDouble.of(lost), days);
            if (lost >= Price.LEAST_DAYS) {
                ethylene.merge(taker.id(), price, Prices::dearer);
            }
        }
    }

    private static Price dearer(Price one, Price other) {
        return other.daysLost().orElse(0) > one.daysLost().orElse(0) ? other : one;
    }

    /** Ethylene by itself and in company, µL/L. */
    private record Levels(double own, double all) {}

    private static double lost(Workable lot, Common common, Levels levels, double days) {
        double humidity = common.bestPct() / 100;
        LotHistory alone = history(common.bestC(), humidity, levels.own, levels.own, days);
        LotHistory beside = history(common.bestC(), humidity, levels.all, levels.own, days);
        return Spread.of(
                        lot.draws().stream()
                                .mapToDouble(draw -> lost(lot, draw, List.of(alone, beside)))
                                .toArray())
                .p50();
    }

    private static double lost(Workable lot, Draw draw, List<LotHistory> histories) {
        var fates = lot.model().follow(histories, draw);
        return Math.max(0, fates.get(0).daysLeft(0) - fates.get(1).daysLeft(0));
    }

    private static LotHistory history(
            double atC, double humidity, double together, double then, double days) {
        LotHistory.Builder told = new LotHistory.Builder();
        double partS = days * Timeline.DAY_S;
        told.add(0, atC, atC, atC, humidity, together, false);
        told.add(partS, atC, atC, atC, humidity, together, false);
        told.add(partS + 1, atC, atC, atC, humidity, then, false);
        return told.add(partS + 1 + Timeline.DAY_S, atC, atC, atC, humidity, then, false).build();
    }

    private void odours(Workable taker, Spells.One spell) {
        for (Workable giver : spell.lots()) {
            double days = giver == taker ? 0 : at.daysTogether(taker, giver);
            if (days > 0 && PairConflict.ofSmell(giver.wish(), taker.wish(), days)) {
                Price price =
                        new Price(
                                Conflict.ODOUR,
                                taker.id(),
                                giver.id(),
                                OptionalDouble.empty(),
                                days);
                if (odours.stream().noneMatch(price::equals)) {
                    odours.add(price);
                }
            }
        }
    }
}

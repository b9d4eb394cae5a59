package org.wardon.keeping;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;
import org.junit.jupiter.api.Test;
import org.wardon.air.Timeline;
import org.wardon.lots.LotHistory;
import org.wardon.produce.Commodity;
import org.wardon.produce.Fact;

/** What must hold for every commodity of the tables. */
class AllCropsTest {
    private static final List<Draw> DRAWS = Draws.seeded(1, 32);
    private static final double WIDENED_SINGLE_FIGURE = 1.4;

    private static LotHistory held(double temperatureC, double humidityPct, double days) {
        return LotHistory.constant(temperatureC, humidityPct / 100, 0, days * Timeline.DAY_S);
    }

    private static double days(KeepingModel model, double atC, double humidityPct, Draw draw) {
        return model.follow(held(atC, humidityPct, 2), draw).daysLeft(0);
    }

    @Test
    void everyCommodityIsThere() {
        assertEquals(106, Crops.list().size());
    }

    /**
     * In the plain run the handbook's shortest life; in a draw the shortest that any source printed
     * for that condition, or 1.4 times less than a single figure.
     */
    @Test
    void nothingEndsALotBeforeThePublishedLifeInTheHandbooksOwnCondition() {
        List<String> early = new ArrayList<>();
        for (Commodity commodity : Crops.list()) {
            if (commodity.needs().lifeDays().isEmpty()
                    || commodity.needs().temperatureC().isEmpty()) {
                continue;
            }
            Fact life = commodity.needs().lifeDays().get();
            Fact at = commodity.needs().temperatureC().get();
            double humidity = commodity.needs().humidityPct().map(Fact::middle).orElse(92.5);
            double least =
                    life.lowest() == life.highest()
                            ? life.lowest() / WIDENED_SINGLE_FIGURE
                            : life.lowest();
            least = Math.min(least, shortestOfOthers(commodity).orElse(least));
            KeepingModel model = Crops.model(commodity.id());
            for (double t : new double[] {at.lowest(), at.middle(), at.highest()}) {
                if (t < -2) {
                    continue;
                }
                check(early, model, t, humidity, Draw.MEDIAN, life.lowest());
                for (Draw draw : DRAWS) {
                    check(early, model, t, humidity, draw, least);
                }
            }
        }
        assertTrue(early.isEmpty(), String.join("\n", early));
    }

    private static OptionalDouble shortestOfOthers(Commodity commodity) {
        return commodity.keeping().curves().get(0).shortestDays();
    }

    private static void check(
            List<String> early,
            KeepingModel model,
            double atC,
            double humidity,
            Draw draw,
            double least) {
        Fate fate = model.follow(held(atC, humidity, 2), draw);
        if (fate.daysLeft(0) < least * (1 - 1e-9)) {
            early.add(
                    String.format(
                            "%s at %.1f °C ends after %.1f of %.1f days by %s (draw %d)",
                            model.lot().id(),
                            atC,
                            fate.daysLeft(0),
                            least,
                            fate.limitedBy().word(),
                            draw.number()));
        }
    }

    /** A jump stays as high however near one looks; a steep stretch does not. */
    @Test
    void everyTemperatureHasAnAnswerWithoutHoleOrJump() {
        List<String> wrong = new ArrayList<>();
        for (Commodity commodity : Crops.list()) {
            KeepingModel model = Crops.model(commodity.id());
            for (Draw draw : List.of(Draw.MEDIAN, DRAWS.get(3), DRAWS.get(17))) {
                double before = days(model, -2, 90, draw);
                for (double t = -1.75; t <= 40.01; t += 0.25) {
                    double now = days(model, t, 90, draw);
                    boolean thaws = t - 0.25 < model.freezingC() && t >= model.freezingC();
                    boolean steep = Math.abs(now - before) > 0.1 * Math.max(now, before);
                    if (!(now >= 0 && now <= 730)
                            || (steep && !thaws && jumps(model, t - 0.25, t, draw))) {
                        wrong.add(commodity.id() + " at " + t + ": " + before + " -> " + now);
                    }
                    before = now;
                }
            }
        }
        assertTrue(wrong.isEmpty(), String.join("\n", wrong));
    }

    private static boolean jumps(KeepingModel model, double fromC, double toC, Draw draw) {
        double low = fromC;
        double high = toC;
        double atLow = days(model, low, 90, draw);
        double atHigh = days(model, high, 90, draw);
        double whole = Math.abs(atHigh - atLow);
        for (int halving = 0; halving < 16; halving++) {
            double middle = 0.5 * (low + high);
            double atMiddle = days(model, middle, 90, draw);
            if (Math.abs(atMiddle - atLow) > Math.abs(atHigh - atMiddle)) {
                high = middle;
                atHigh = atMiddle;
            } else {
                low = middle;
                atLow = atMiddle;
            }
        }
        return Math.abs(atHigh - atLow) > 0.05 * whole;
    }

    @Test
    void warmerNeverKeepsLongerOutsideTheChillingZoneAndSproutingCrops() {
        List<String> wrong = new ArrayList<>();
        for (Commodity commodity : Crops.list()) {
            KeepingModel model = Crops.model(commodity.id());
            if (model.dormancy().hump().isPresent()) {
                continue;
            }
            double from = Math.max(model.lowestSafeC(), model.freezingC() + 0.1);
            for (Draw draw : DRAWS) {
                double before = days(model, from, 90, draw);
                for (double t = from + 0.5; t <= 40; t += 0.5) {
                    double now = days(model, t, 90, draw);
                    if (now > before * (1 + 1e-9)) {
                        wrong.add(commodity.id() + " at " + t + ": " + before + " -> " + now);
                    }
                    before = now;
                }
            }
        }
        assertTrue(wrong.isEmpty(), String.join("\n", wrong));
    }

    @Test
    void damperAirNeverMeansMoreWeightLoss() {
        for (Commodity commodity : Crops.list()) {
            KeepingModel model = Crops.model(commodity.id());
            for (double t : new double[] {0, 12, 30}) {
                double before = Double.POSITIVE_INFINITY;
                for (double humidity = 30; humidity <= 100; humidity += 5) {
                    double lost =
                            model.paces(Draw.MEDIAN)
                                    .perDay(Mechanism.WATER_LOSS, t, humidity / 100, 0);
                    assertTrue(lost <= before, commodity.id() + " at " + t + " °C");
                    before = lost;
                }
            }
        }
    }

    @Test
    void constantHistoryIsTheConstantConditionAndSplittingItChangesNothing() {
        for (Commodity commodity : Crops.list()) {
            KeepingModel model = Crops.model(commodity.id());
            LotHistory.Builder split = new LotHistory.Builder();
            for (double t : new double[] {0, 7_000, 90_000, 91_000, 300_000, 864_000}) {
                split.add(t, 14, 14, 14, 0.88, 0.2, false);
            }
            Fate whole = model.follow(LotHistory.constant(14, 0.88, 0.2, 864_000), Draw.MEDIAN);
            Fate parts = model.follow(split.build(), Draw.MEDIAN);
            Fate brief = model.follow(LotHistory.constant(14, 0.88, 0.2, 86_400), Draw.MEDIAN);
            double expected = whole.daysLeft(0);
            assertEquals(expected, parts.daysLeft(0), 1e-9 * expected, commodity.id());
            assertEquals(expected, brief.daysLeft(0), 1e-3 * expected, commodity.id());
        }
    }

    @Test
    void everyAnswerSaysWhatItRestsOnAndNamesASource() {
        for (Commodity commodity : Crops.list()) {
            KeepingModel model = Crops.model(commodity.id());
            Basis basis = model.basis(held(10, 90, 7));
            assertTrue(
                    basis.reasons().stream().anyMatch(r -> r.code().equals("life-rests-on")),
                    commodity.id());
            if (commodity.needs().lifeDays().isEmpty()) {
                boolean ripening = basis.restsOn() == RestsOn.RIPENING_TIMES;
                assertTrue(ripening || basis.restsOn() == RestsOn.CLASS, commodity.id());
            }
        }
    }
}

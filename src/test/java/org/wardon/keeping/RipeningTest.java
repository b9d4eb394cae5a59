package org.wardon.keeping;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;
import org.wardon.Source;
import org.wardon.lots.LotHistory;
import org.wardon.produce.Ripeness;

/** Ripening by printed days: when ripe, until when eaten, and what starts it. */
class RipeningTest {
    private static final double DAY_S = 86_400;
    private static final double CLEAN_PPM = 0.01;
    private static final double TREATED_PPM = 100;
    private static final double HUMIDITY = 0.9;
    private static final List<Draw> DRAWS = Draws.seeded(5, 64);
    private static final LotAtDoor GREEN = LotAtDoor.SOUND.withRipeness(Ripeness.GREEN);

    /** Printed days are whole days, so half a day either way. */
    private static final double HALF_A_DAY = 0.5;

    private static LotHistory held(double atC, double ppm) {
        return LotHistory.constant(atC, HUMIDITY, ppm, 3 * DAY_S);
    }

    private static double plainRipe(String crop, double atC, double ppm) {
        Fate fate = Crops.model(crop, GREEN).follow(held(atC, ppm), Draw.MEDIAN);
        return fate.ripeDaysFrom(0).orElseThrow();
    }

    private static Spread ripe(KeepingModel model, double atC, double ppm) {
        return model.outlook(held(atC, ppm), DRAWS, 0, 3 * DAY_S).ripeFrom().orElseThrow();
    }

    @Source("United Fruit Co. 1961, banana ripening schedules, mean pulp temperatures (UC reprint)")
    @ParameterizedTest(name = "{0} °C: colour stage 4 in {1} days")
    @CsvSource({"15.7, 7", "16.2, 6", "16.8, 5", "17.2, 4"})
    void bananasFollowThePrintedSchedules(double atC, double days) {
        assertEquals(days, plainRipe("banana-green", atC, TREATED_PPM) - 1, 0.01 * days);
    }

    @Source("Suslow & Cantwell, Tomato produce facts, breaker to full red, from memory")
    @ParameterizedTest(name = "{0} °C: {1} days")
    @CsvSource({"12.5, 16", "15, 13", "17.5, 10", "20, 8", "22.5, 6", "25, 5"})
    void tomatoesGoFromBreakerToRedAsPrinted(double atC, double days) {
        KeepingModel model = Crops.model("tomato-mature-green", GREEN);
        double perDay = model.paces(Draw.MEDIAN).ripening().orElseThrow().ripensPerDay(atC);
        assertEquals(days, 1 / perDay, 0.01 * days);
    }

    @Source("Suslow & Cantwell (from memory) and Lipton & Uota 1968 (seen): mature-green to red")
    @ParameterizedTest(name = "{0} °C: {1} days")
    @CsvSource({"12.5, 18", "15, 15", "17.5, 12", "20, 10", "22.5, 8", "25, 7", "25, 8"})
    void untreatedTomatoesAreRedWhenPrintSays(double atC, double days) {
        Spread ripe = ripe(Crops.model("tomato-mature-green", GREEN), atC, CLEAN_PPM);
        assertTrue(ripe.p10() <= days + HALF_A_DAY, atC + " °C: " + ripe);
        assertTrue(days - HALF_A_DAY <= ripe.p90(), atC + " °C: " + ripe);
        assertEquals(1, ripe.p50() / days, 0.25, atC + " °C: " + ripe);
    }

    @Source("National Mango Board 2014: 5 to 9 days at 18-22 °C after 24 h of ethylene")
    @Test
    void treatedMangoesAreRipeInFiveToNineDays() {
        Spread after = ripe(Crops.model("mango", GREEN), 20, TREATED_PPM);
        assertTrue(after.p10() >= 1 + 5 && after.p90() <= 1 + 9, after.toString());
    }

    @Source("FoodRisk.org, avocado: one to two weeks at room temperature, untreated")
    @Test
    void untreatedAvocadosTakeOneToTwoWeeks() {
        Spread ripe = ripe(Crops.model("avocado", GREEN), 21, CLEAN_PPM);
        assertTrue(ripe.p50() >= 7 && ripe.p50() <= 14, ripe.toString());
    }

    @Source("Widjanarko & Wills 1997: no papaya ripened in 7 to 21 days at 5 to 15 °C")
    @Test
    void coldPapayasDoNotRipen() {
        Spread ripe = ripe(Crops.model("papaya", GREEN), 15, CLEAN_PPM);
        assertTrue(ripe.p10() > 21, ripe.toString());
    }

    @Source("Kader, UC Davis: below 12 °C injury prevents ripening of bananas")
    @Test
    void bananasDoNotRipenInTheCold() {
        Spread ripe = ripe(Crops.model("banana-green", GREEN), 11.5, TREATED_PPM);
        assertEquals(Fate.MOST_DAYS, ripe.p10(), 1e-9);
        assertTrue(plainRipe("banana-green", 13.5, TREATED_PPM) < 15, "but a little warmer");
    }

    @Source("J. Japan. Soc. Hort. Sci. 53:66 (banana, 35 °C); An & Paull 1990 (papaya, 32.5 °C)")
    @ParameterizedTest
    @CsvSource({"banana-green, 35", "papaya, 32.5"})
    void inTheHeatFruitGoesSoftButDoesNotRipen(String crop, double atC) {
        Outlook hot = Crops.model(crop, GREEN).outlook(held(atC, TREATED_PPM), DRAWS, 0, DAY_S);
        assertEquals(Fate.MOST_DAYS, hot.ripeFrom().orElseThrow().p10(), 1e-9);
        assertTrue(hot.edibleLeft().orElseThrow().p90() < 40, "and it does not keep for it");
    }

    @ParameterizedTest
    @ValueSource(strings = {"banana-green", "tomato-mature-green", "mango", "papaya", "avocado"})
    void warmerNeverRipensLaterNorKeepsLonger(String crop) {
        for (Ripeness ripeness : List.of(Ripeness.GREEN, Ripeness.TURNING)) {
            KeepingModel model = Crops.model(crop, LotAtDoor.SOUND.withRipeness(ripeness));
            double most = model.ripening().orElseThrow().suffersAboveC();
            for (double ppm : new double[] {CLEAN_PPM, TREATED_PPM}) {
                for (Draw draw : DRAWS.subList(0, 16)) {
                    double ripe = Double.POSITIVE_INFINITY;
                    double edible = Double.POSITIVE_INFINITY;
                    for (double atC = model.lowestSafeC(); atC <= most; atC += 0.5) {
                        Fate fate = model.follow(held(atC, ppm), draw);
                        double now = fate.ripeDaysFrom(0).orElseThrow();
                        double end = fate.edibleDaysLeft(0).orElseThrow();
                        assertTrue(now <= ripe + 1e-9, atC + " °C, " + draw + ": " + now);
                        assertTrue(end <= edible + 1e-9, atC + " °C, " + draw + ": " + end);
                        boolean never = now == Fate.MOST_DAYS;
                        assertTrue(never || now <= end, "ripe before it is overripe");
                        ripe = now;
                        edible = end;
                    }
                }
            }
        }
    }

    @ParameterizedTest
    @ValueSource(strings = {"banana-green", "tomato-mature-green", "mango", "papaya", "avocado"})
    void ethyleneNeverLengthensGreenLifeAndRipensNothingLater(String crop) {
        KeepingModel model = Crops.model(crop, GREEN);
        for (double atC : new double[] {14, 18, 22, 26}) {
            for (Draw draw : DRAWS) {
                double green = Double.POSITIVE_INFINITY;
                double ripe = Double.POSITIVE_INFINITY;
                for (double ppm : new double[] {0.001, 0.01, 0.1, 1, 10, 100}) {
                    Fate fate = model.follow(held(atC, ppm), draw);
                    double nowGreen = fate.greenDaysLeft(0).orElseThrow();
                    double nowRipe = fate.ripeDaysFrom(0).orElseThrow();
                    assertTrue(nowGreen <= green + 1e-9, ppm + " ppm");
                    assertTrue(nowRipe <= ripe + 1e-9, ppm + " ppm");
                    green = nowGreen;
                    ripe = nowRipe;
                }
            }
        }
    }

    @ParameterizedTest
    @ValueSource(strings = {"banana-green", "mango", "tomato-mature-green"})
    void ethyleneInTheColdStartsNothing(String crop) {
        KeepingModel model = Crops.model(crop, GREEN);
        double ppm = 1.5 * model.response().triggerPpm(Draw.MEDIAN).orElseThrow();
        double safe = model.lowestSafeC();
        Fate cold = model.follow(held(safe - 0.5, ppm), Draw.MEDIAN);
        Fate warm = model.follow(held(safe + 0.1, ppm), Draw.MEDIAN);
        assertEquals(1, warm.greenDaysLeft(0).orElseThrow(), 1e-9, "24 hours start it");
        assertTrue(cold.greenDaysLeft(0).orElseThrow() > 2, "too cold to answer");
        double later = cold.ripeDaysFrom(0).orElseThrow() - warm.ripeDaysFrom(0).orElseThrow();
        assertTrue(crop.startsWith("tomato") || later > 0.5, "ripe later by " + later);
        assertTrue(later > 0, "nor ripe as early");
    }

    @Test
    void onceStartedRipeningIsNeverUndone() {
        KeepingModel model = Crops.model("banana-green", GREEN);
        LotHistory.Builder treated = new LotHistory.Builder();
        for (int hour = 0; hour <= 240; hour++) {
            double ppm = hour <= 26 ? TREATED_PPM : 0.001;
            double atC = hour <= 26 ? 17.2 : 14.4;
            treated.add(hour * 3_600.0, atC, atC, atC, HUMIDITY, ppm, false);
        }
        Fate fate = model.follow(treated.build(), Draw.MEDIAN);
        // From hour 24 on: 2 hours of a 4-day leg, an hour between, then an 8-day leg.
        double left = 1 - 2 / 24.0 / 4 - 1 / 24.0 * 0.5 * (1 / 4.0 + 1 / 8.0);
        double days = 27 / 24.0 + 8 * left;
        assertEquals(days, fate.ripeDaysFrom(0).orElseThrow(), 0.01);
        assertTrue(!fate.ripeAt((days - 0.1) * DAY_S) && fate.ripeAt((days + 0.1) * DAY_S));
        double before = 0;
        for (double atS = 0; atS < 20 * DAY_S; atS += 3_600) {
            double used = fate.usedAt(atS);
            assertTrue(used >= before, "at " + atS);
            before = used;
        }
    }

    @ParameterizedTest
    @ValueSource(strings = {"banana-green", "tomato-mature-green", "mango", "papaya", "avocado"})
    void aSteadyHistoryIsTheSteadyCondition(String crop) {
        List<KeepingModel> models = new ArrayList<>();
        models.add(Crops.model(crop, GREEN.withPurpose(Purpose.SELL_RIPE)));
        models.add(Crops.model(crop, LotAtDoor.SOUND.withRipeness(Ripeness.TURNING)));
        models.add(Crops.model(crop, LotAtDoor.SOUND.withRipeness(Ripeness.RIPE)));
        for (KeepingModel model : models) {
            for (Draw draw : DRAWS.subList(0, 16)) {
                for (double atC : new double[] {13, 18, 26}) {
                    Fate fate = model.follow(held(atC, CLEAN_PPM), draw);
                    Paces paces = model.paces(draw);
                    double perDay = paces.perDay(Mechanism.SENESCENCE, atC, HUMIDITY, CLEAN_PPM);
                    double left = fate.daysLeft(Mechanism.SENESCENCE, 0);
                    assertEquals(1, left * perDay, 1e-9);
                    LotHistory.Builder hourly = new LotHistory.Builder();
                    for (int hour = 0; hour <= 1_000; hour++) {
                        double atS = hour * 3_600.0;
                        hourly.add(atS, atC, atC, atC, HUMIDITY, CLEAN_PPM, false);
                    }
                    Fate sampled = model.follow(hourly.build(), draw);
                    assertEquals(
                            fate.ripeDaysFrom(0).orElseThrow(),
                            sampled.ripeDaysFrom(0).orElseThrow(),
                            1e-6);
                    assertEquals(left, sampled.daysLeft(Mechanism.SENESCENCE, 0), 1e-6);
                }
            }
        }
    }

    @Test
    void ripeAndOverripeSurviveTheShortForm() {
        Fate fate = Crops.model("mango", GREEN).follow(held(20, TREATED_PPM), DRAWS.get(3));
        double ripe = fate.ripeDaysFrom(0).orElseThrow();
        assertEquals(ripe, fate.brief().ripeDaysFrom(0).orElseThrow(), 0);
        assertEquals(
                fate.edibleDaysLeft(0).orElseThrow(),
                fate.brief().edibleDaysLeft(0).orElseThrow(),
                1e-9);
    }

    @Test
    void nothingIsToldWherePrintOrTheKeeperIsSilent() {
        assertTrue(Crops.model("apple").ripening().isEmpty(), "no printed times");
        assertTrue(Crops.model("mango").ripening().isEmpty(), "nobody said how ripe");
        assertTrue(Crops.model("banana-green").ripening().isPresent(), "green by its name");
    }
}

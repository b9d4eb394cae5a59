package org.wardon.keeping;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.time.LocalDate;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import org.wardon.advice.wording.Units;
import org.wardon.advice.wording.Words;
import org.wardon.keeping.experience.Sighting;
import org.wardon.lots.LotHistory;
import org.wardon.produce.Commodity;
import org.wardon.produce.Ripeness;
import org.wardon.produce.rows.OwnLot;
import org.wardon.produce.rows.OwnLot.Ended;
import org.wardon.produce.rows.OwnLot.Spell;

/** Own figures and lots in the answers for a commodity. */
class OwnLotsTest {
    private static final double DAY_S = 86_400;
    private static final Words WORDS = Words.english(new Units(false, false));
    private static final List<Draw> DRAWS = Draws.seeded(1, 128);
    private static final LocalDate DAY = LocalDate.parse("2026-03-02");

    private static OwnLot lot(Ended ended, Ripeness ripeness, Spell... spells) {
        OwnLot.Began began = new OwnLot.Began("", ripeness, Optional.empty(), 0);
        return new OwnLot(1, DAY, ended, began, List.of(spells));
    }

    private static Spell days(double days, double atC) {
        return new Spell(atC, 24 * days);
    }

    private static KeepingModel with(String id, OwnLot... lots) {
        Commodity c = Crops.get(id);
        Commodity.Keeping k = c.keeping();
        Commodity own =
                new Commodity(
                        c.id(),
                        c.names(),
                        c.plantPart(),
                        c.climacteric(),
                        c.needs(),
                        c.body(),
                        c.breath(),
                        c.water(),
                        new Commodity.Keeping(
                                k.lives(),
                                k.q10s(),
                                k.floors(),
                                k.exposures(),
                                k.sprouting(),
                                k.curing(),
                                k.ambient(),
                                k.curves(),
                                k.ripening(),
                                List.of(lots)),
                        c.company());
        return KeepingModel.of(Crops.lot(own));
    }

    private static Spread ageing(KeepingModel model, double atC) {
        return Spread.of(
                DRAWS.stream().mapToDouble(draw -> model.life().at(draw).lifeDays(atC)).toArray());
    }

    @Test
    void aVeryCertainFigureIsTheMiddleOfTheAnswer() {
        for (String id : List.of("strawberry", "mango", "cabbage", "broccoli")) {
            LotAtDoor sure = LotAtDoor.SOUND.withKnownLife(new KnownLife(6.5, 10, 1e-4));
            KeepingModel own = Crops.model(id, sure);
            Spread answer = ageing(own, 10);
            // The middle of 128 draws lies between two of them.
            assertEquals(6.5, answer.p50(), 0.01 * 6.5, id);
            assertTrue(answer.p90() / answer.p50() > 1.1, id + ": lots still differ");
        }
    }

    @Test
    void lotsWeighAsMuchAsTheyAre() {
        KeepingModel printed = with("broccoli");
        double life = printed.life().published(Draw.MEDIAN).lifeDays(5);
        double before = 1;
        List<OwnLot> lots = new ArrayList<>();
        for (int n = 0; n < 12; n++) {
            lots.add(lot(Ended.AGED, Ripeness.UNKNOWN, days(0.7 * life, 5)));
            double now = with("broccoli", lots.toArray(OwnLot[]::new)).life().factor();
            assertTrue(now < before && now > 0.7, n + 1 + " lots: " + now);
            before = now;
        }
        assertEquals(0.7, before, 0.05);
        assertEquals(RestsOn.OWN_LOTS, with("broccoli", lots.get(0)).life().restsOn());
    }

    @Test
    void aLotThatWentThroughBothHalvesCountsLikeOneThatWentThroughTheWhole() {
        double atFive = with("broccoli").life().published(Draw.MEDIAN).lifeDays(5);
        double atTwenty = with("broccoli").life().published(Draw.MEDIAN).lifeDays(20);
        OwnLot mixed =
                lot(Ended.AGED, Ripeness.UNKNOWN, days(0.4 * atFive, 5), days(0.4 * atTwenty, 20));
        OwnLot steady = lot(Ended.AGED, Ripeness.UNKNOWN, days(0.8 * atFive, 5));
        assertEquals(
                with("broccoli", steady).life().factor(),
                with("broccoli", mixed).life().factor(),
                1e-9);
    }

    @Test
    void aSoldOrSpoiltLotOnlySaysAtLeast() {
        double life = with("broccoli").life().published(Draw.MEDIAN).lifeDays(2);
        for (Ended ended : List.of(Ended.SOLD, Ended.SPOILT)) {
            OwnLot early = lot(ended, Ripeness.UNKNOWN, days(0.3 * life, 2));
            assertEquals(1, with("broccoli", early).life().factor(), 0.01);
            OwnLot late = lot(ended, Ripeness.UNKNOWN, days(1.6 * life, 2));
            assertTrue(with("broccoli", late).life().factor() > 1.3);
        }
    }

    @Test
    void aGreenFruitKeptUntilItWasOldHadItsRipeDaysToo() {
        double life = with("banana-green").life().published(Draw.MEDIAN).lifeDays(14);
        OwnLot ripened = lot(Ended.RIPE, Ripeness.GREEN, days(life, 14));
        OwnLot old = lot(Ended.AGED, Ripeness.GREEN, days(life, 14));
        KeepingModel model = with("banana-green");
        assertEquals(1, model.timesPublished(ripened), 1e-9);
        double ripe = LifeSpan.ripeShare(Draw.MEDIAN);
        assertEquals(1 / (1 + ripe), model.timesPublished(old), 1e-9);
        OwnLot cameRipe = lot(Ended.AGED, Ripeness.RIPE, days(ripe * life, 14));
        assertEquals(1, model.timesPublished(cameRipe), 1e-9);
        // Where days of ripening are printed they end ripe fruit, not the level of life.
        assertEquals(List.of(), with("banana-green", cameRipe).life().seen());
    }

    @Test
    void aContradictionIsToldAndStillWeighs() {
        double life = with("broccoli").life().published(Draw.MEDIAN).lifeDays(5);
        KeepingModel model =
                with("broccoli", lot(Ended.AGED, Ripeness.UNKNOWN, days(0.2 * life, 5)));
        List<String> told = model.ownGrounds().stream().map(WORDS::sentence).toList();
        assertEquals(2, told.size(), told.toString());
        assertTrue(
                told.get(0).startsWith("broccoli: one lot of your own counts, 1 seen to age out;"),
                told.get(0));
        assertTrue(
                told.get(1)
                        .startsWith(
                                "broccoli: your lot 1 kept 0.20 times the published life, far"
                                        + " outside print ("),
                told.get(1));
        assertTrue(model.life().factor() < 0.6, "factor " + model.life().factor());
        assertTrue(
                model.basis(LotHistory.constant(5, 0.9, 0, DAY_S)).reasons().stream()
                        .anyMatch(reason -> reason.sourceId().equals("own")));
    }

    @Test
    void withoutOwnLotsEveryCropKeepsWhatIsPublished() {
        for (Commodity crop : Crops.list()) {
            KeepingModel model = Crops.model(crop.id());
            assertEquals(List.of(), model.life().seen());
            // A lot sold at once says nothing, whichever way the answer is worked out.
            KeepingModel silent = with(crop.id(), lot(Ended.SOLD, Ripeness.UNKNOWN, days(0.01, 5)));
            assertEquals(Sighting.Kind.LOT_AT_LEAST, silent.life().seen().get(0).kind());
            for (Draw draw : DRAWS.subList(0, 8)) {
                double printed = model.life().at(draw).lifeDays(5);
                assertEquals(
                        printed, silent.life().at(draw).lifeDays(5), 0.002 * printed, crop.id());
            }
        }
    }
}

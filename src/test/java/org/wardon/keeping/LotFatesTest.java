package org.wardon.keeping;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.Map;
import org.junit.jupiter.api.Test;
import org.wardon.Source;
import org.wardon.keeping.ethylene.ChamberAir;
import org.wardon.keeping.ethylene.Response;
import org.wardon.lots.LotHistory;
import org.wardon.produce.Ripeness;

/** What single lots come to. */
class LotFatesTest {
    private static final double DAY_S = 86_400;
    private static final List<Draw> DRAWS = Draws.seeded(1, 32);

    private static LotHistory held(double atC, double humidity, double ppm, double days) {
        return LotHistory.constant(atC, humidity, ppm, days * DAY_S);
    }

    @Test
    void ownFigureSetsTheLevelAndKeepsTheShape() {
        LotAtDoor known = LotAtDoor.SOUND.withKnownLife(new KnownLife(9, 10, 0));
        KeepingModel own = Crops.model("strawberry", known);
        KeepingModel printed = Crops.model("strawberry");
        assertEquals(9, 1 / own.paces(Draw.MEDIAN).perDay(Mechanism.SENESCENCE, 10, 1, 0), 1e-9);
        assertEquals(
                printed.paces(Draw.MEDIAN).perDay(Mechanism.SENESCENCE, 20, 1, 0)
                        / printed.paces(Draw.MEDIAN).perDay(Mechanism.SENESCENCE, 5, 1, 0),
                own.paces(Draw.MEDIAN).perDay(Mechanism.SENESCENCE, 20, 1, 0)
                        / own.paces(Draw.MEDIAN).perDay(Mechanism.SENESCENCE, 5, 1, 0),
                1e-9);
        assertEquals(RestsOn.KNOWN_LIFE, own.basis(held(10, 0.9, 0, 2)).restsOn());
    }

    @Test
    void uncuredOrUnknownLotsKeepThreeTenthsToAllOfTheirLife() {
        LotAtDoor cured = LotAtDoor.SOUND.withCured(true);
        KeepingModel unknown = Crops.model("sweet-potato", LotAtDoor.SOUND);
        KeepingModel known = Crops.model("sweet-potato", cured);
        for (Draw draw : DRAWS) {
            double share =
                    known.paces(draw).perDay(Mechanism.SENESCENCE, 14, 0.9, 0)
                            / unknown.paces(draw).perDay(Mechanism.SENESCENCE, 14, 0.9, 0);
            assertTrue(share >= 0.3 && share <= 1, "share " + share);
        }
        assertTrue(unknown.uncured());
        assertTrue(
                unknown.basis(held(14, 0.9, 0, 2)).reasons().stream()
                        .anyMatch(r -> r.code().equals("cure-first")));
    }

    @Test
    void coldBeforeArrivalCounts() {
        LotAtDoor chilled = LotAtDoor.SOUND.withChilledBefore(List.of(new ColdSpell(5, 24)));
        Outlook before = Crops.model("cucumber").outlook(held(8, 0.95, 0, 2), DRAWS, 0, 4 * DAY_S);
        Outlook after =
                Crops.model("cucumber", chilled).outlook(held(8, 0.95, 0, 2), DRAWS, 0, 4 * DAY_S);
        assertTrue(after.chilling().probability() > before.chilling().probability());
        assertTrue(
                after.chilling().safeDays().getAsDouble()
                        < before.chilling().safeDays().getAsDouble());
    }

    @Test
    void usedAndAgeShortenWhatIsLeft() {
        KeepingModel fresh = Crops.model("broccoli");
        KeepingModel half = Crops.model("broccoli", LotAtDoor.SOUND.withUsed(0.5));
        LotHistory cold = held(0, 0.98, 0, 2);
        assertEquals(
                0.5 * fresh.follow(cold, Draw.MEDIAN).daysLeft(Mechanism.SENESCENCE, 0),
                half.follow(cold, Draw.MEDIAN).daysLeft(Mechanism.SENESCENCE, 0),
                1e-9);
        KeepingModel aged =
                Crops.model("broccoli", LotAtDoor.SOUND.withAge(Age.known(24, 30, 0.6)));
        double perDay = fresh.paces(Draw.MEDIAN).perDay(Mechanism.SENESCENCE, 30, 0.6, 0);
        assertEquals(perDay, aged.follow(cold, Draw.MEDIAN).usedAt(Mechanism.SENESCENCE, 0), 1e-9);
    }

    @Test
    @Source("wills-1999 (derived): 46 percent of the life at 0.1 µL/L a decade")
    void ethyleneCostsTheLifeThatThePublishedLineSays() {
        Response broccoli = Crops.model("broccoli").response();
        assertEquals(0.54, broccoli.lifeFactor(1, 0.1), 1e-9);
        assertEquals(1, broccoli.lifeFactor(0.01, 0.1), 1e-9);
        assertTrue(!Crops.model("strawberry").response().sensitive());
    }

    @Test
    void greenBananasHaveTwoClocksAndEthyleneStartsTheSecond() {
        KeepingModel bananas = Crops.model("banana-green");
        Fate clean = bananas.follow(held(14, 0.9, 0.01, 10), Draw.MEDIAN);
        Fate foul = bananas.follow(held(14, 0.9, 10, 10), Draw.MEDIAN);
        assertEquals(Mechanism.RIPENING, clean.limitedBy());
        assertTrue(clean.edibleDaysLeft(0).getAsDouble() > clean.greenDaysLeft(0).getAsDouble());
        assertEquals(1, foul.greenDaysLeft(0).getAsDouble(), 1e-6);
        assertEquals(Mechanism.ETHYLENE, foul.limitedBy());
        assertTrue(foul.edibleDaysLeft(0).getAsDouble() > 1);
    }

    @Test
    void purposeChoosesTheClock() {
        LotAtDoor green = LotAtDoor.SOUND.withRipeness(Ripeness.GREEN);
        LotHistory cool = held(13, 0.9, 0.01, 4);
        Fate ship = Crops.model("mango", green).follow(cool, Draw.MEDIAN);
        Fate sell =
                Crops.model("mango", green.withPurpose(Purpose.SELL_RIPE))
                        .follow(cool, Draw.MEDIAN);
        assertEquals(
                ship.greenDaysLeft(0).getAsDouble(), ship.daysLeft(Mechanism.ETHYLENE, 0), 1e-9);
        assertEquals(
                sell.edibleDaysLeft(0).getAsDouble(), sell.daysLeft(Mechanism.ETHYLENE, 0), 1e-9);
        assertTrue(sell.daysLeft(Mechanism.SENESCENCE, 0) > ship.daysLeft(Mechanism.RIPENING, 0));
    }

    @Test
    void frozenLotIsLostAtOnce() {
        Fate fate = Crops.model("lettuce-crisphead").follow(held(-1, 0.98, 0, 2), Draw.MEDIAN);
        assertEquals(0, fate.daysLeft(0), 0);
        assertEquals(Mechanism.FREEZING, fate.limitedBy());
    }

    @Test
    void onionsKeepColdAndDryAndNotInDampAir() {
        KeepingModel onions = Crops.model("onion-dry");
        double dry = onions.follow(held(0, 0.68, 0, 2), Draw.MEDIAN).daysLeft(0);
        double damp = onions.follow(held(0, 0.95, 0, 2), Draw.MEDIAN).daysLeft(0);
        assertTrue(dry > 60 && damp < 40, dry + " dry, " + damp + " damp");
        Paces paces = onions.paces(Draw.MEDIAN);
        assertTrue(
                paces.perDay(Mechanism.SPROUTING, 15, 0.7, 0)
                        > paces.perDay(Mechanism.SPROUTING, 5, 0.7, 0));
        assertTrue(
                paces.perDay(Mechanism.SPROUTING, 15, 0.7, 0)
                        > paces.perDay(Mechanism.SPROUTING, 28, 0.7, 0));
    }

    @Test
    void marketLegGoesOnFromWhereTheChamberEnds() {
        LotHistory chamber = held(0, 0.98, 0, 5);
        LotHistory both = HistoryLegs.then(chamber, 5 * DAY_S, 25, 0.7, 0.06, 2);
        KeepingModel model = Crops.model("broccoli");
        double end = model.follow(both, Draw.MEDIAN).usedAt(Mechanism.SENESCENCE, 7 * DAY_S);
        Paces paces = model.paces(Draw.MEDIAN);
        double expected =
                5 * paces.perDay(Mechanism.SENESCENCE, 0, 1, 0)
                        + 2 * paces.perDay(Mechanism.SENESCENCE, 25, 1, 0);
        assertEquals(expected, end, 0.02 * expected);
        LotHistory same = HistoryLegs.then(chamber, 2.3 * DAY_S, 0, 0.98, 0, 2.7);
        assertEquals(
                model.follow(chamber, Draw.MEDIAN).daysLeft(0),
                model.follow(same, Draw.MEDIAN).daysLeft(0),
                1e-6);
    }

    @Test
    void chamberEthyleneComesToRestWhereWhatIsGivenIsCarriedAway() {
        double[] hours = new double[241];
        double[] exchange = new double[241];
        double[] free = new double[241];
        for (int i = 0; i < hours.length; i++) {
            hours[i] = 3_600.0 * i;
            exchange[i] = 20.0 * 6 / DAY_S;
            free[i] = 15;
        }
        KeptLot apples = Crops.lot(Crops.get("apple"));
        LotHistory cold = held(0, 0.92, 0, 10);
        StoreEthylene run =
                StoreEthylene.of(
                        Map.of("north", new ChamberAir(hours, exchange, free)),
                        List.of(inNorth(apples, cold, 20 * DAY_S)),
                        ChamberEthylene.OUTDOOR_PPM,
                        Draw.MEDIAN);
        double rate =
                Crops.model("apple").response().giving().microlitrePerKgHour(0, 1, Draw.MEDIAN);
        double rest = Response.steadyPpm(150 * rate, 6) + ChamberEthylene.OUTDOOR_PPM;
        assertEquals(rest, run.chamber("north").ppmAt(10 * DAY_S), 1e-3 * rest);
        LotHistory felt = run.histories().values().iterator().next();
        assertEquals(rest, felt.ethylenePpm(1), 1e-3 * rest);
    }

    private static Giver inNorth(KeptLot lot, LotHistory history, double leavesS) {
        List<Giver.Place> here = List.of(new Giver.Place(0, "north"));
        return new Giver(KeepingModel.of(lot), history, 3_000, leavesS, here);
    }

    @Test
    void aLotThatIsMovedTakesItsEthyleneAndItsRipeningAlong() {
        double[] hours = new double[481];
        double[] exchange = new double[481];
        double[] free = new double[481];
        for (int i = 0; i < hours.length; i++) {
            hours[i] = 3_600.0 * i;
            exchange[i] = 20.0 * 6 / DAY_S;
            free[i] = 15;
        }
        ChamberAir air = new ChamberAir(hours, exchange, free);
        KeptLot bananas = Crops.lot(Crops.get("banana-green"));
        LotHistory warm = held(20, 0.9, 0, 20);
        StoreEthylene stays =
                StoreEthylene.of(
                        Map.of("north", air),
                        List.of(inNorth(bananas, warm, 30 * DAY_S)),
                        0.01,
                        Draw.MEDIAN);
        double ripens = stays.ripensS(bananas.id());
        double moves = ripens + 2 * DAY_S;
        StoreEthylene goes =
                StoreEthylene.of(
                        Map.of("north", air, "south", air),
                        List.of(
                                new Giver(
                                        KeepingModel.of(bananas),
                                        warm,
                                        3_000,
                                        30 * DAY_S,
                                        List.of(
                                                new Giver.Place(0, "north"),
                                                new Giver.Place(moves, "south")))),
                        0.01,
                        Draw.MEDIAN);
        assertEquals(ripens, goes.ripensS(bananas.id()), 0, "it began in the first chamber");
        double before = stays.chamber("north").ppmAt(moves - 3_600);
        assertEquals(before, goes.chamber("north").ppmAt(moves - 3_600), 1e-12);
        double after = moves + 2 * DAY_S;
        assertEquals(0.01, goes.chamber("north").ppmAt(after), 0.01, "nothing gives there");
        assertTrue(goes.chamber("south").ppmAt(after) > 0.9 * before, "it gives on as ripe");
        LotHistory felt = goes.histories().get(bananas.id());
        assertEquals(
                goes.chamber("south").ppmAt(20 * DAY_S), felt.ethylenePpm(felt.size() - 1), 1e-12);
    }

    @Test
    void bananasThatBeginToRipenGiveMore() {
        double[] hours = new double[481];
        double[] exchange = new double[481];
        double[] free = new double[481];
        for (int i = 0; i < hours.length; i++) {
            hours[i] = 3_600.0 * i;
            exchange[i] = 20.0 * 6 / DAY_S;
            free[i] = 15;
        }
        KeptLot bananas = Crops.lot(Crops.get("banana-green"));
        LotHistory warm = held(20, 0.9, 0, 20);
        StoreEthylene run =
                StoreEthylene.of(
                        Map.of("north", new ChamberAir(hours, exchange, free)),
                        List.of(inNorth(bananas, warm, 30 * DAY_S)),
                        ChamberEthylene.OUTDOOR_PPM,
                        Draw.MEDIAN);
        double ripens = run.ripensS(bananas.id());
        assertTrue(ripens > DAY_S && ripens < 15 * DAY_S, "ripens at " + ripens / DAY_S + " d");
        ChamberEthylene level = run.chamber("north");
        assertTrue(level.ppmAt(20 * DAY_S) > 2 * level.ppmAt(ripens - 7_200));
    }
}

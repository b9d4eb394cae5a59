package org.wardon.lots;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.stream.Collectors;
import org.apache.commons.math3.stat.descriptive.rank.Median;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;
import org.junit.jupiter.params.provider.ValueSource;
import org.wardon.Source;
import org.wardon.air.SaturatedAir;
import org.wardon.produce.Commodity;
import org.wardon.produce.Fact;
import org.wardon.produce.PackageKind;
import org.wardon.produce.Reason;
import org.wardon.produce.Ripeness;
import org.wardon.produce.rows.RespirationRow;
import org.wardon.reference.ReferenceBook;

/** Every commodity of the tables gives a lot that breathes, sweats and cools. */
class AllCommoditiesTest {
    /** Above it heat kills the tissue and its breathing ceases. */
    private static final double DYING_FROM_C = 44;

    private static List<Commodity> all = List.of();
    private static Map<String, PackageKind> kinds = Map.of();
    private static ClassValues classes = ClassValues.of(List.of(Crops.apple()));

    @BeforeAll
    static void openTheBook() {
        try (ReferenceBook book = ReferenceBook.open()) {
            all = book.all();
            kinds = Map.copyOf(book.packageKinds());
        }
        classes = ClassValues.of(all);
    }

    private static WithReasons<Lot> lot(Commodity commodity, PackageKind kind, double share) {
        Shares shares = new Shares(share, share, share);
        return LotRange.of("L1", commodity, 1000, kind, Ripeness.UNKNOWN, classes).at(shares);
    }

    @ParameterizedTest(name = "share {0} of every range")
    @ValueSource(doubles = {0, 0.5, 1})
    void everyCommodityGivesALotThatTakesItsPackagesTime(double share) {
        assertEquals(106, all.size());
        PackageKind kind = kinds.get("room-cooling-any");
        double wantedS = 3600 * kind.halfCoolingHours().atLogShare(share);
        for (Commodity commodity : all) {
            WithReasons<Lot> lot = lot(commodity, kind, share);
            double halfS = PackageFit.halfCoolingS(lot.value().item(), lot.value().packing());
            assertEquals(wantedS, halfS, 0.03 * wantedS, commodity.id());
            assertTrue(lot.restsOn().size() >= 5, commodity.id() + " rests on too little");
        }
    }

    @Test
    void everyPackageOfTheTableIsMetOrTheItemsTimeIsKeptAndSaid() {
        for (PackageKind kind : kinds.values()) {
            double wantedS = 3600 * kind.halfCoolingHours().atLogShare(0.5);
            for (Commodity commodity : all.subList(0, 20)) {
                WithReasons<Lot> lot = lot(commodity, kind, 0.5);
                double halfS = PackageFit.halfCoolingS(lot.value().item(), lot.value().packing());
                boolean said =
                        lot.restsOn().stream()
                                .map(Reason::code)
                                .anyMatch("item-slower-than-package"::equals);
                assertTrue(
                        said ? halfS >= wantedS : Math.abs(halfS / wantedS - 1) < 0.03,
                        commodity.id() + " in " + kind.id() + ": " + halfS + " s");
            }
        }
    }

    @ParameterizedTest
    @EnumSource(Ripeness.class)
    void respirationIsPositiveAndWithoutJumpsFromMinusFiveToFifty(Ripeness ripeness) {
        for (Commodity commodity : all) {
            for (double share : new double[] {0, 0.5, 1}) {
                RespirationCurve curve =
                        Respirations.of(commodity, ripeness, classes, share).value();
                double last = curve.wattsPerKg(-5);
                for (double c = -5; c <= 50; c += 0.05) {
                    double now = curve.wattsPerKg(c);
                    String where = commodity.id() + " at " + c + " °C: " + now;
                    boolean alive = c <= DYING_FROM_C;
                    assertTrue(now > (alive ? 1e-4 : 1e-7) && now < 10, where);
                    double step = Math.abs(now / last - 1);
                    assertTrue(step < (alive ? 0.03 : 0.07), "jump of " + where);
                    assertTrue(Double.isFinite(curve.slopeWattsPerKgK(c)), where);
                    last = now;
                }
            }
        }
    }

    @Test
    void respirationRisesWhereThePrintedRatesRise() {
        int risen = 0;
        for (Commodity commodity : all) {
            if (rises(commodity)) {
                risen++;
                RespirationCurve curve =
                        Respirations.of(commodity, Ripeness.UNKNOWN, classes, 0.5).value();
                double last = 0;
                for (double c = -5; c <= DYING_FROM_C; c += 0.25) {
                    assertTrue(curve.wattsPerKg(c) >= last, commodity.id() + " falls at " + c);
                    last = curve.wattsPerKg(c);
                }
            }
        }
        assertTrue(risen >= 60, risen + " commodities have rising rates only");
    }

    /** Whether all rows of the chosen table rise with temperature, low and high. */
    private static boolean rises(Commodity commodity) {
        List<RespirationRow> rows = commodity.breath().respiration();
        if (rows.isEmpty()) {
            return false;
        }
        String key = rows.get(0).table() + rows.get(0).wattsPerTonne().sourceId();
        List<RespirationRow> chosen =
                rows.stream()
                        .filter(r -> (r.table() + r.wattsPerTonne().sourceId()).equals(key))
                        .toList();
        for (int i = 1; i < chosen.size(); i++) {
            Fact before = chosen.get(i - 1).wattsPerTonne();
            Fact now = chosen.get(i).wattsPerTonne();
            boolean warmer = chosen.get(i).temperatureC() > chosen.get(i - 1).temperatureC();
            if (!warmer || now.lowest() < before.lowest() || now.highest() < before.highest()) {
                return false;
            }
        }
        return true;
    }

    @Test
    void thePrintedRangeIsKept() {
        Commodity apple = byId("apple");
        RespirationRow printed = apple.breath().respiration().get(0);
        double c = printed.temperatureC();
        assertEquals(
                printed.wattsPerTonne().lowest() / 1000,
                Respirations.of(apple, Ripeness.UNKNOWN, classes, 0).value().wattsPerKg(c),
                1e-12);
        assertEquals(
                printed.wattsPerTonne().highest() / 1000,
                Respirations.of(apple, Ripeness.UNKNOWN, classes, 0).value().fresh().wattsPerKg(c),
                1e-12);
    }

    @Test
    void nothingOfAnItemIsZeroAndLeavesAreThin() {
        for (Commodity commodity : all) {
            Item item = Items.of(commodity, classes).value();
            assertTrue(item.unitMassKg() > 0, commodity.id());
            boolean leaf = item.radiusM() < 1e-3;
            assertEquals(leaf, item.shape() == Shape.SLAB && leaf, commodity.id());
        }
        assertEquals(Shape.SLAB, Items.of(byId("spinach"), classes).value().shape());
        assertEquals(Shape.SLAB, Items.of(byId("basil"), classes).value().shape());
    }

    @Test
    void kinOfTheSameSpeciesStandInFirst() {
        WithReasons<Item> ripe = Items.of(byId("banana-ripe"), classes);
        Item green = Items.of(byId("banana-green"), classes).value();
        assertEquals(green.radiusM(), ripe.value().radiusM(), 1e-12);
        assertTrue(ripe.ofClass());
    }

    @Source("crisphead lettuce bare at 10 °C and 85 %: about 12 % a day")
    @Test
    void crispheadLettuceLosesAboutTwelvePercentADay() {
        Commodity lettuce = byId("lettuce-crisphead");
        Item item = Items.of(lettuce, classes).value();
        double saturation = SaturatedAir.pressurePa(10);
        double perDay =
                86_400
                        * Transpirations.of(lettuce, item, classes, 0.5)
                                .value()
                                .waterKgPerKgS(saturation, 0.85 * saturation);
        assertEquals(0.12, perDay, 0.005);
    }

    @Test
    void theClassCurveHoldsForFiveInSix() {
        for (double c : new double[] {0, 10, 20}) {
            Map<String, List<Double>> byPart =
                    all.stream()
                            .filter(one -> ownWatts(one, c).isPresent())
                            .collect(
                                    Collectors.groupingBy(
                                            Commodity::plantPart,
                                            Collectors.mapping(
                                                    one -> ownWatts(one, c).orElseThrow(),
                                                    Collectors.toList())));
            int within = 0;
            int counted = 0;
            for (List<Double> rates : byPart.values()) {
                for (int i = 0; i < rates.size() && rates.size() > 1; i++) {
                    List<Double> others = new ArrayList<>(rates);
                    double own = others.remove(i);
                    double ratio = own / median(others);
                    counted++;
                    if (Math.max(ratio, 1 / ratio) <= Respirations.CLASS_SPREAD) {
                        within++;
                    }
                }
            }
            assertTrue(within >= 0.83 * counted, within + " of " + counted + " at " + c + " °C");
        }
    }

    private static Optional<Double> ownWatts(Commodity commodity, double c) {
        return Respirations.own(commodity, Ripeness.UNKNOWN, 0.5)
                .map(found -> found.value().wattsPerKg(c));
    }

    private static double median(List<Double> values) {
        return new Median().evaluate(values.stream().mapToDouble(Double::doubleValue).toArray());
    }

    @Test
    void whatRestsOnAClassSaysSo() {
        for (Commodity commodity : all) {
            WithReasons<Lot> lot = lot(commodity, kinds.get("room-cooling-any"), 0.5);
            boolean named =
                    lot.restsOn().stream().anyMatch(reason -> reason.code().endsWith("-class"));
            assertEquals(named, lot.ofClass(), commodity.id());
        }
        assertTrue(lot(byId("date"), kinds.get("room-cooling-any"), 0.5).ofClass());
        assertFalse(lot(byId("apple"), kinds.get("room-cooling-any"), 0.5).ofClass());
    }

    @Test
    void everySourceNamedIsInTheBookOrAnAssumption() {
        try (ReferenceBook book = ReferenceBook.open()) {
            for (PackageKind kind : kinds.values()) {
                for (Commodity commodity : all.subList(0, 10)) {
                    named(book, lot(commodity, kind, 0.5));
                }
            }
            all.forEach(one -> named(book, lot(one, kinds.get("room-cooling-any"), 0.5)));
        }
    }

    private static void named(ReferenceBook book, WithReasons<Lot> lot) {
        for (Reason reason : lot.restsOn()) {
            if (!reason.sourceId().equals(ClassValues.SOURCE)) {
                assertEquals(reason.sourceId(), book.source(reason.sourceId()).id(), reason.code());
            }
        }
    }

    private static Commodity byId(String id) {
        return all.stream().filter(one -> one.id().equals(id)).findFirst().orElseThrow();
    }
}

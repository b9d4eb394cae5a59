package org.wardon.lots;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import org.wardon.produce.Commodity;
import org.wardon.produce.Evidence;
import org.wardon.produce.Fact;
import org.wardon.produce.PackageKind;
import org.wardon.produce.Reason;
import org.wardon.produce.Ripeness;

/** Items and lots of made-up crops: what is printed, what stands in, and what is said of it. */
class ItemsTest {
    private static final ClassValues CLASSES = ClassValues.of(List.of(Crops.apple()));

    private static List<String> codes(WithReasons<?> found) {
        return found.restsOn().stream().map(Reason::code).toList();
    }

    @Test
    void takesWhatIsPrinted() {
        WithReasons<Item> found = Items.of(Crops.apple(), CLASSES);
        assertEquals(List.of("item-composition", "item-size"), codes(found));
        assertEquals(Shape.SPHERE, found.value().shape());
        assertEquals(0.038, found.value().radiusM(), 1e-15);
        assertEquals(840, found.value().densityKgM3(), 0);
        assertEquals(0.2, found.value().unitMassKg(), 0);
        assertEquals(3 / (840 * 0.038), found.value().areaM2PerKg(), 1e-12);
    }

    @Test
    void sizeFromTheMassOfOneItem() {
        Commodity squash =
                Crops.of(
                        "squash",
                        "fruit",
                        Crops.body(
                                Crops.composition(94),
                                Crops.geometry("cylinder", Double.NaN, 0.2, Double.NaN)),
                        Crops.breath(),
                        List.of());
        WithReasons<Item> found = Items.of(squash, CLASSES);
        assertEquals(List.of("item-composition", "item-size-from-mass"), codes(found));
        Item item = found.value();
        double length = 8 * item.radiusM();
        assertEquals(
                0.2, item.densityKgM3() * Math.PI * item.radiusM() * item.radiusM() * length, 1e-9);
    }

    @Test
    void aLeafIsAThinSlab() {
        Item mint = Items.of(Crops.unknown("herb"), CLASSES).value();
        assertEquals(Shape.SLAB, mint.shape());
        assertEquals(0.25e-3, mint.radiusM(), 0);
    }

    @Test
    void whatNobodyPrintedIsOfItsClassAndSaysSo() {
        WithReasons<Item> found = Items.of(Crops.unknown("fungus"), CLASSES);
        assertTrue(found.ofClass());
        assertEquals(List.of("item-composition-class", "item-size-class"), codes(found));
        assertEquals(0.038, found.value().radiusM(), 1e-15);
    }

    @Test
    void refusesAShapeItDoesNotKnow() {
        Commodity cube =
                Crops.of(
                        "cube",
                        "fruit",
                        Crops.body(Crops.composition(90), Crops.geometry("cube", 10, 1, 900)),
                        Crops.breath(),
                        List.of());
        assertEquals(
                "shape 'cube'; accepted are sphere, cylinder, slab and leaf",
                assertThrows(IllegalArgumentException.class, () -> Items.of(cube, CLASSES))
                        .getMessage());
    }

    @Test
    void aLotRestsOnItsRowsAndTakesItsPackagesTime() {
        PackageKind carton =
                new PackageKind(
                        "carton",
                        "a carton",
                        Fact.range(6, 24, "h", Crops.INVENTED, Evidence.ASSUMPTION),
                        Fact.of(0.7, "1", Crops.INVENTED, Evidence.ASSUMPTION),
                        Optional.empty(),
                        true);
        WithReasons<Lot> found =
                LotRange.of("A1", Crops.apple(), 500, carton, Ripeness.UNKNOWN, CLASSES)
                        .at(Shares.MIDDLE);
        Lot lot = found.value();
        assertEquals(
                List.of(
                        "item-composition",
                        "item-size",
                        "package-time-broad",
                        "respiration-table",
                        "respiration-extended",
                        "transpiration-coefficient"),
                codes(found));
        assertEquals(12 * 3600, PackageFit.halfCoolingS(lot.item(), lot.packing()), 5);
        assertEquals(42e-12 * 0.7 / 0.3, lot.packing().vapourKgPerKgSPa(), 1e-6 * 42e-12);
        assertEquals(0.08 * 1700, lot.packing().tareJPerKgK(), 1e-9);
    }
}

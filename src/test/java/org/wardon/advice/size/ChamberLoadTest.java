package org.wardon.advice.size;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;

import java.nio.file.Path;
import java.util.List;
import java.util.Map;
import org.junit.jupiter.api.AfterAll;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;
import org.wardon.advice.PlanLookups;
import org.wardon.advice.size.ChamberLoad.DesignDay;
import org.wardon.advice.size.ChamberLoad.Intake;
import org.wardon.advice.size.DesignLoad.Kind;
import org.wardon.advice.size.DesignLoad.Term;
import org.wardon.advice.wording.Units;
import org.wardon.advice.wording.Words;
import org.wardon.files.PlanReader;
import org.wardon.lots.ClassValues;
import org.wardon.lots.Lot;
import org.wardon.lots.LotRange;
import org.wardon.lots.Shares;
import org.wardon.plan.ChamberPlan;
import org.wardon.produce.Ripeness;
import org.wardon.reference.ReferenceBook;

/** The design load of a chamber of the demo, held against the same sums on paper. */
class ChamberLoadTest {
    private static final DesignDay DAY =
            new DesignDay(31, 75, 27, 12.1, 101_325, Map.of("cold", 2.0));

    private static ReferenceBook book;
    private static ChamberPlan fruit;

    @BeforeAll
    static void open() {
        book = ReferenceBook.open();
        fruit =
                PlanReader.read(Path.of("demo-data/landing.json"), PlanLookups.of(book))
                        .getChamber("fruit");
    }

    @AfterAll
    static void close() {
        book.close();
    }

    private static Lot mango() {
        return LotRange.of(
                        "M1",
                        book.get("mango"),
                        800,
                        book.packageKind("room-cooling-any"),
                        Ripeness.GREEN,
                        ClassValues.of(book.all()))
                .at(Shares.MIDDLE)
                .value();
    }

    private static DesignLoad load(Intake... intakes) {
        return ChamberLoad.of(fruit, DAY, List.of(intakes), DesignLoad.USUAL_SAFETY_PCT);
    }

    private static double through(DesignLoad load, String face) {
        return load.terms().stream()
                .filter(t -> t.kind() == Kind.TRANSMISSION)
                .filter(t -> t.formula().subjects().equals(List.of(face)))
                .mapToDouble(Term::meanW)
                .sum();
    }

    @Test
    void facesAreThoseOfThePlan() {
        DesignLoad load = load();
        double roomC = fruit.setting().temperatureC();
        double panel = 2 * 0.0005 / 50 + 0.08 / 0.028;
        double bridged = 1.1;
        // Panel of absorptance 0.4 counts as medium: 3 K on the wall that looks to the equator.
        assertEquals(
                bridged * 4.5 * 2.6 * (31 - roomC + 3) / (0.13 + panel + 0.04),
                through(load, "south"),
                1e-9);
        assertEquals(
                bridged * 3.5 * 2.6 * (31 - roomC + 4) / (0.13 + panel + 0.04),
                through(load, "west"),
                1e-9);
        // In shade no sun; under a tin roof 3 K above outdoors, films of still air on both sides.
        assertEquals(
                bridged * 4.5 * 2.6 * (31 - roomC) / (0.13 + panel + 0.04),
                through(load, "north"),
                1e-9);
        assertEquals(
                bridged * 4.5 * 3.5 * (34 - roomC) / (0.17 + panel + 0.17),
                through(load, "roof"),
                1e-9);
        assertEquals(
                bridged * 3.5 * 2.6 * (2 - roomC) / (0.13 + panel + 0.13),
                through(load, "east"),
                1e-9);
    }

    @Test
    void produceGainsAndHoursAreThoseOfThePlan() {
        Lot mango = mango();
        DesignLoad load = load(new Intake(mango, 1_500, 800, 29, 20, "ASHRAE-R"));
        double roomC = fruit.setting().temperatureC();
        double fall = 29 - roomC;
        assertEquals(
                800 * mango.item().specificHeatJkgK() * fall / (20 * 3_600),
                load.meanW(Kind.PRODUCT),
                1e-9);
        assertEquals(
                800 * mango.packing().tareJPerKgK() * fall / (20 * 3_600),
                load.meanW(Kind.PACKAGES),
                1e-9);
        assertEquals(
                1_500 * mango.respiration().wattsPerKg(roomC)
                        + 800 * mango.respiration().wattsPerKg(0.5 * (29 + roomC)),
                load.meanW(Kind.RESPIRATION),
                1e-9);
        assertEquals(60 * 2 / 24.0, load.meanW(Kind.LIGHTS), 1e-9);
        assertEquals(2 * (272 - 6 * roomC) / 24, load.meanW(Kind.PEOPLE), 1e-9);
        assertEquals(180 * 16 / 24.0, load.meanW(Kind.FANS), 1e-9);
        assertEquals(16, load.runningHoursPerDay());
        assertEquals(load.meanW() * 1.1 * 24 / 16, load.requiredW(), 1e-6);
    }

    @Test
    void airIsTheTableOfChangesAndTheFreshAirOfThePlan() {
        double volume = 4.5 * 3.5 * 2.6;
        double heat = ChamberLoad.heatJm3(fruit, DAY);
        assertEquals(
                (AirChanges.perDay(volume) * volume + 40 * 24) * heat / 86_400,
                load().meanW(Kind.AIR_CHANGE),
                1e-9);
    }

    @Test
    void everyTermHasWords() {
        Words words = Words.english(Units.METRIC);
        for (Term term : load(new Intake(mango(), 1_500, 800, 29, 20, "ASHRAE-R")).terms()) {
            assertEquals(-1, words.sentence(term.formula()).indexOf('{'), term.formula().code());
        }
    }

    @Test
    void aNeighbourWithoutAirIsRefusedByName() {
        DesignDay alone = new DesignDay(31, 75, 27, 12.1, 101_325, Map.of());
        assertEquals(
                "the air of chamber cold is not given",
                assertThrows(
                                IllegalArgumentException.class,
                                () -> ChamberLoad.of(fruit, alone, List.of(), 10))
                        .getMessage());
    }
}

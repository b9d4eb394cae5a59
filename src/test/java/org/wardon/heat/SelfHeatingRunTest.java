package org.wardon.heat;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.wardon.errors.RunStopped;
import org.wardon.lots.Item;
import org.wardon.lots.Lot;
import org.wardon.lots.PackageFit;
import org.wardon.lots.Packing;
import org.wardon.lots.Shape;
import org.wardon.lots.StackCooling;
import org.wardon.lots.TranspirationLaw;

/** The rule of a stack's self-heating against the model that carries the heat through it. */
class SelfHeatingRunTest {
    private static final double AIR_C = 8;

    /** A lot that hardly sweats, so that breathing alone sets its rest. */
    private static Lot stack(double wattsPerKgAtZero, double halfHours) {
        Item item = new Item(Shape.SPHERE, 0.03, 850, 3700, 0.5, 0.15);
        double chamber = 3700 * Math.log(2) / (halfHours * 3600);
        Packing packing = new Packing(8 * item.areaM2PerKg(), chamber, 1e-3, 0, 1e-16);
        return new Lot(
                "stack",
                1_000,
                item,
                packing,
                Chambers.breath(wattsPerKgAtZero, Math.log(2.5) / 10),
                new TranspirationLaw(1e-15, 0.98, 1e-13));
    }

    private static LotCourse in(Lot lot, double days) {
        Stay stay = new Stay(lot, 0, Double.POSITIVE_INFINITY, AIR_C);
        return HeatModel.runInGivenAir(
                stay, AirSeries.steady(AIR_C, 0.9), Chambers.SITE, Factors.PLAIN, days * 86_400);
    }

    private static double halfS(Lot lot) {
        return PackageFit.halfCoolingS(lot.item(), lot.packing());
    }

    @ParameterizedTest(name = "{0} W/kg at 0 °C, half time {1} h")
    @CsvSource({"0.015, 12", "0.01, 48", "0.02, 40"})
    void comesToRestWhereTheRuleSays(double wattsPerKg, double hours) {
        Lot lot = stack(wattsPerKg, hours);
        LotCourse course = in(lot, 60);
        double rest =
                StackCooling.restsAtK(
                                lot.respiration(), AIR_C, halfS(lot), lot.item().specificHeatJkgK())
                        .orElseThrow();
        assertEquals(rest, course.meanC(course.size() - 1) - AIR_C, 0.03 * rest);
    }

    @Test
    void runsAwayWhereTheRuleSays() {
        Lot lot = stack(0.03, 60);
        assertEquals(
                true,
                StackCooling.restsAtK(
                                lot.respiration(), AIR_C, halfS(lot), lot.item().specificHeatJkgK())
                        .isEmpty());
        assertThrows(RunStopped.class, () -> in(lot, 60));
    }
}

package org.wardon.heat;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.wardon.air.Weather;
import org.wardon.cooling.Control;
import org.wardon.errors.Progress;
import org.wardon.lots.Item;
import org.wardon.lots.Lot;
import org.wardon.lots.LotHistory;
import org.wardon.lots.PackageFit;
import org.wardon.lots.Packing;
import org.wardon.lots.Shape;
import org.wardon.lots.TranspirationLaw;

/** Lots in a chamber and in given air. */
class LotsInChamberTest {
    private static final double FOREVER = Double.POSITIVE_INFINITY;

    /** A lot that neither breathes nor sweats, in a package of a known half-cooling time. */
    private static Lot silent(Shape shape, double radiusM, double halfHours) {
        Item item = new Item(shape, radiusM, 950, 3800, 0.5, 0.2);
        Packing open = new Packing(8 * item.areaM2PerKg(), 0.5, 1e-3, 100, 2e-10);
        double factor = halfHours * 3600 / PackageFit.halfCoolingS(item, open);
        Packing packing = PackageFit.slowed(item, open, factor);
        TranspirationLaw dry = new TranspirationLaw(1e-15, 0.98, 1e-15);
        return new Lot("S", 400, item, packing, Chambers.breath(1e-9, 0.01), dry);
    }

    private static double halfCoolingH(LotHistory history, double fromC, double toC) {
        for (int i = 1; i < history.size(); i++) {
            double left = (history.meanC(i) - toC) / (fromC - toC);
            double before = (history.meanC(i - 1) - toC) / (fromC - toC);
            if (left <= 0.5) {
                double share = (before - 0.5) / (before - left);
                double t0 = history.timeS(i - 1);
                return (t0 + share * (history.timeS(i) - t0)) / 3600;
            }
        }
        return Double.NaN;
    }

    @ParameterizedTest(name = "{0}, {1} m, half in {2} h")
    @CsvSource({"SPHERE, 0.035, 9", "SPHERE, 0.01, 3", "CYLINDER, 0.02, 20", "SLAB, 0.01, 6"})
    void aCoolingLotTakesItsPackagesHalfCoolingTime(Shape shape, double radiusM, double hours) {
        Stay stay = new Stay(silent(shape, radiusM, hours), 0, FOREVER, 25);
        AirSeries air = AirSeries.steady(5, 0.7);
        LotCourse course =
                HeatModel.runInGivenAir(stay, air, Chambers.SITE, Factors.PLAIN, 4 * hours * 3600);
        assertEquals(hours, halfCoolingH(course.history(), 25, 5), 0.03 * hours);
    }

    @Test
    void thePackageFactorStretchesTheHalfCoolingTime() {
        Stay stay = new Stay(silent(Shape.SPHERE, 0.035, 9), 0, FOREVER, 25);
        Factors slower = new Factors(1, 1, 1, 1, 1, 1.5, 0);
        LotCourse course =
                HeatModel.runInGivenAir(
                        stay, AirSeries.steady(5, 0.7), Chambers.SITE, slower, 60 * 3600);
        assertEquals(13.5, halfCoolingH(course.history(), 25, 5), 0.03 * 13.5);
    }

    @Test
    void waterLostByLotsIsGainedByAirCoilFacesAndLeakage() {
        Course course = HeatModel.run(Chambers.full(Control.ON_OFF, 4, 2), Progress.SILENT);
        WaterLedger water = course.water();
        assertTrue(water.lots() > 1, "lots lost " + water.lots() + " kg");
        assertTrue(-water.coolers() > water.lots(), "the coil took " + -water.coolers());
        double gained =
                -(water.packages()
                        + water.door()
                        + water.leakage()
                        + water.people()
                        + water.faces()
                        + water.coolers()
                        + water.air());
        assertEquals(water.lots(), gained, 1e-8 * water.lots());
        double lost = 0;
        double burnt = 0;
        for (LotCourse lot : course.lots()) {
            lost += lot.totals().massLostKg();
            burnt += lot.totals().respirationJ() / 10.7e6 * (0.682 - 0.409);
        }
        // No dew is left on the lots at the end of this run.
        assertEquals(water.lots() + burnt, lost, 1e-3 * lost);
    }

    @Test
    void orderOfLotsChangesNothing() {
        ChamberRun run = Chambers.full(Control.MODULATING, 5, 2);
        List<Stay> turned = new ArrayList<>(run.stays());
        Collections.reverse(turned);
        Course one = HeatModel.run(run, Progress.SILENT);
        Course other = HeatModel.run(run.withStays(turned), Progress.SILENT);
        for (Stay stay : run.stays()) {
            LotCourse a = one.lot(stay.lot().id());
            LotCourse b = other.lot(stay.lot().id());
            for (int i = 0; i < a.size(); i++) {
                assertEquals(a.coreC(i), b.coreC(i), 1e-6);
            }
        }
    }

    @Test
    void noHeatComesFromNothing() {
        Stay stay = new Stay(silent(Shape.SPHERE, 0.03, 6), 0, FOREVER, 28);
        ChamberRun run =
                Chambers.passive(Chambers.shut(List.of(Chambers.FOAM)), Weather.steady(20, 50), 4)
                        .withStart(Start.at(10, 60))
                        .withStays(List.of(stay));
        Course course = HeatModel.run(run, Progress.SILENT);
        for (int i = 0; i < course.hours().size(); i++) {
            assertTrue(course.hours().airLowestC(i) > 10 - 1e-6);
            assertTrue(course.hours().airHighestC(i) < 28 + 1e-6);
        }
        double end = course.lots().get(0).meanC(course.lots().get(0).size() - 1);
        assertTrue(end < 28 && end > 19.9, "ends at " + end);
    }

    @Test
    void aLotThatLeftIsAShadow() {
        ChamberRun run = Chambers.full(Control.MODULATING, 2, 3);
        Stay first = run.stays().get(0);
        Stay brief = new Stay(first.lot(), 0, 86_400, first.pulpC());
        Course gone = HeatModel.run(run.withStays(List.of(brief, run.stays().get(1))), quiet());
        Course stayed = HeatModel.run(run, quiet());
        LotCourse shadow = gone.lots().get(0);
        assertEquals(3 * 86_400, shadow.history().timeS(shadow.history().size() - 1), 1e-6);
        assertEquals(
                stayed.lots().get(0).meanC(stayed.lots().get(0).size() - 1),
                shadow.meanC(shadow.size() - 1),
                0.5);
        assertTrue(gone.heat().respiration() < stayed.heat().respiration());
        double oneDay = shadow.totals().respirationJ();
        assertTrue(oneDay < stayed.lots().get(0).totals().respirationJ());
        assertTrue(gone.balanceErrorPct() < 1e-6, gone.balanceErrorPct() + " %");
    }

    @Test
    void aLateWarmLotWarmsAnEarlyColdOne() {
        ChamberRun run = Chambers.full(Control.ON_OFF, 2, 4);
        Stay early = run.stays().get(0);
        Lot big = Chambers.lot("late", 3_000, 0.03, 6);
        Stay late = new Stay(big, 2.4 * 86_400, FOREVER, 30);
        Course course = HeatModel.run(run.withStays(List.of(early, late)), quiet());
        LotCourse cold = course.lots().get(0);
        int before = (int) (2.4 * 24);
        double warmest = 0;
        for (int i = before; i < cold.size(); i++) {
            warmest = Math.max(warmest, cold.meanC(i));
        }
        assertTrue(
                warmest > cold.meanC(before) + 0.05, "rose by " + (warmest - cold.meanC(before)));
        assertEquals(2.4 * 86_400, course.lots().get(1).history().timeS(0), 1e-6);
        assertTrue(course.balanceErrorPct() < 1e-6, course.balanceErrorPct() + " %");
    }

    @Test
    void aColdLotInDampAirGetsWetAndDriesAgain() {
        Lot lot = Chambers.lot("C", 200, 0.03, 4);
        Stay stay = new Stay(lot, 0, FOREVER, 4);
        AirSeries market = AirSeries.steady(27, 0.75);
        LotCourse course =
                HeatModel.runInGivenAir(stay, market, Chambers.SITE, Factors.PLAIN, 5 * 86_400);
        LotHistory history = course.history();
        int wet = 0;
        for (int i = 0; i < history.size(); i++) {
            wet += history.wet(i) ? 1 : 0;
        }
        assertTrue(wet > 3, "wet in " + wet + " samples");
        assertTrue(!history.wet(history.size() - 1), "dry at the end");
        assertTrue(course.totals().massLostKg() > 0);
    }

    private static Progress quiet() {
        return Progress.SILENT;
    }
}

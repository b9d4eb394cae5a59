package org.wardon.heat;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import org.wardon.air.Weather;
import org.wardon.cooling.Control;
import org.wardon.cooling.Setting;
import org.wardon.errors.Progress;
import org.wardon.lots.Lot;

/** Lots carried from chamber to chamber. */
class MovesTest {
    private static final double FOREVER = Double.POSITIVE_INFINITY;
    private static final double HOUR_S = 3_600;
    private static final double DAYS = 3;

    private static ChamberRun chamber(String id, double settingC, Stay... stays) {
        return ChamberRun.of(
                        id,
                        Chambers.SITE,
                        Chambers.TIMELINE,
                        Weather.steady(27, 70),
                        Chambers.panelRoom(20),
                        new Setting(settingC, 1, 90),
                        DAYS * 86_400)
                .withCoolers(List.of(Chambers.unit(Control.MODULATING)))
                .withStays(List.of(stays));
    }

    private static Stay leaving(Lot lot, double pulpC, double atS, String to) {
        return new Stay(
                lot,
                0,
                atS,
                pulpC,
                Double.NEGATIVE_INFINITY,
                0,
                Berth.between(Optional.empty(), Optional.of(to)));
    }

    private static Stay coming(Lot lot, double atS, String from) {
        return new Stay(
                lot,
                atS,
                FOREVER,
                20,
                Double.NEGATIVE_INFINITY,
                0,
                Berth.between(Optional.of(from), Optional.empty()));
    }

    private static Lot lot(String id) {
        return Chambers.lot(id, 400, 0.03, 6);
    }

    private static LotCourse joined(List<Course> courses, String id) {
        return LotCourse.joined(
                courses.stream()
                        .flatMap(course -> course.lots().stream())
                        .filter(leg -> leg.stay().lot().id().equals(id))
                        .sorted(java.util.Comparator.comparingDouble(leg -> leg.stay().arrivesS()))
                        .toList());
    }

    @Test
    void aMoveToAnIdenticalChamberChangesNothing() {
        double atS = 31.3 * HOUR_S;
        Course stayed =
                HeatModel.run(
                        chamber("north", 4, new Stay(lot("M"), 0, FOREVER, 24)), Progress.SILENT);
        List<Course> moved =
                HeatModel.runTogether(
                        List.of(
                                chamber("north", 4, leaving(lot("M"), 24, atS, "south")),
                                chamber("south", 4, coming(lot("M"), atS, "north"))));
        LotCourse here = stayed.lot("M");
        LotCourse both = joined(moved, "M");
        assertEquals(here.size() + 1, both.size(), "a row at the hand-over besides");
        int skip = 0;
        for (int i = 0; i < here.size(); i++) {
            skip += both.atS(i + skip) < here.atS(i) - 1 ? 1 : 0;
            assertEquals(here.atS(i), both.atS(i + skip), 1e-6);
            // The other chamber's air was without the lot until then.
            assertEquals(here.meanC(i), both.meanC(i + skip), 0.1, "hour " + i);
            assertEquals(here.massKg(i), both.massKg(i + skip), 0.02, "hour " + i);
        }
        assertEquals(
                here.totals().weightLossPct(), both.totals().weightLossPct(), 0.01, "per cent");
        assertEquals(
                here.totals().respirationJ(),
                both.totals().respirationJ(),
                0.005 * here.totals().respirationJ());
    }

    @Test
    void whatOneChamberHandsOnTheOtherGets() {
        double atS = 20 * HOUR_S;
        List<Course> courses =
                HeatModel.runTogether(
                        List.of(
                                chamber("mild", 13, leaving(lot("M"), 24, atS, "cold")),
                                chamber("cold", 2, coming(lot("M"), atS, "mild"))));
        LotCourse out = courses.get(0).lot("M");
        LotCourse in = courses.get(1).lot("M");
        int last = out.size() - 1;
        assertEquals(atS, out.atS(last), 1e-9);
        assertEquals(atS, in.atS(0), 1e-9);
        assertEquals(out.meanC(last), in.meanC(0), 0);
        assertEquals(out.surfaceC(last), in.surfaceC(0), 0);
        assertEquals(out.coreC(last), in.coreC(0), 0);
        assertEquals(out.massKg(last), in.massKg(0), 0);
        assertTrue(in.massKg(0) < 400, "it lost water before");
        assertEquals(in.massKg(0), in.totals().massAtArrivalKg(), 0);
        for (Course course : courses) {
            assertTrue(course.balanceErrorPct() < 0.1, "error " + course.balanceErrorPct());
        }
        // Heat that left its flesh is what both chambers say it gave up, the liquid that became
        // vapour besides.
        LotTotals all = joined(courses, "M").totals();
        double perK = 400 * 3_700;
        LotCourse both = joined(courses, "M");
        double fell = perK * (24 - both.meanC(both.size() - 1));
        double gaveUp = courses.get(0).heat().fieldHeat() + courses.get(1).heat().fieldHeat();
        double liquidC = (gaveUp - fell) / (4_186 * all.evaporatedKg());
        assertTrue(liquidC > 2 && liquidC < 24, "the liquid left at skins of " + liquidC + " °C");
        double burnt = all.respirationJ() / 10.7e6 * (0.682 - 0.409);
        assertEquals(
                all.massLostKg(),
                courses.get(0).water().lots() + courses.get(1).water().lots() + burnt,
                0.01 * all.massLostKg(),
                "but for a little dew that lies on it at the end");
    }

    @Test
    void lotsChangePlacesAtOneTime() {
        double atS = 20 * HOUR_S;
        List<ChamberRun> runs =
                List.of(
                        chamber(
                                "cold",
                                2,
                                leaving(lot("A"), 24, atS, "mild"),
                                coming(lot("B"), atS, "mild")),
                        chamber(
                                "mild",
                                13,
                                leaving(lot("B"), 24, atS, "cold"),
                                coming(lot("A"), atS, "cold")));
        List<Course> courses = HeatModel.runTogether(runs);
        LotCourse a = joined(courses, "A");
        LotCourse b = joined(courses, "B");
        int before = 19;
        assertTrue(a.meanC(before) < 6 && b.meanC(before) > 13, "each where it began");
        assertEquals(13, a.meanC(a.size() - 1), 1);
        assertEquals(2, b.meanC(b.size() - 1), 1);
        for (int i = 1; i < a.size(); i++) {
            assertTrue(Math.abs(a.meanC(i) - a.meanC(i - 1)) < 3, "a jump at hour " + i);
            assertTrue(a.massKg(i) <= a.massKg(i - 1) + 0.2, "only dew adds to it");
        }
        List<Course> turned = HeatModel.runTogether(List.of(runs.get(1), runs.get(0)));
        LotCourse again = joined(turned, "A");
        for (int i = 0; i < a.size(); i++) {
            assertEquals(a.meanC(i), again.meanC(i), 0, "the order of chambers does not matter");
        }
    }

    @Test
    void aColdLotInWarmAirIsWet() {
        double atS = 30 * HOUR_S;
        Course warm =
                HeatModel.runTogether(
                                List.of(
                                        chamber("cold", 1, leaving(lot("M"), 10, atS, "mild")),
                                        chamber("mild", 16, coming(lot("M"), atS, "cold"))))
                        .get(1);
        assertTrue(
                warm.events().stream().anyMatch(e -> e.kind() == CourseEvent.Kind.WET_LOT),
                warm.events().toString());
    }

    @Test
    void aLotCarriedToNowhereIsRefused() {
        IllegalArgumentException none =
                assertThrows(
                        IllegalArgumentException.class,
                        () ->
                                HeatModel.runTogether(
                                        List.of(
                                                chamber(
                                                        "north",
                                                        4,
                                                        leaving(lot("M"), 24, 7_200, "south")))));
        assertEquals(
                "lot M is carried to south at 7200.0 s, where no such lot comes in",
                none.getMessage());
    }
}

package org.wardon.heat;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.EnumSet;
import java.util.List;
import java.util.Optional;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import org.wardon.air.MoistAir;
import org.wardon.cooling.Control;
import org.wardon.cooling.Outage;
import org.wardon.cooling.Setting;
import org.wardon.cooling.WaterFilm;
import org.wardon.enclosure.FaceName;
import org.wardon.errors.Progress;

/** Water over the inner side of faces: balances, limits, control, spring and chiller. */
class WaterFilmTest {
    private static final WaterFilm.Chiller SMALL = new WaterFilm.Chiller(900, 0.45, 6, 12);

    static Stream<WaterFilm> films() {
        return Stream.of(
                WaterChambers.film(true, Control.ON_OFF, 0.5, 6),
                WaterChambers.film(true, Control.MODULATING, 0.5, 6),
                WaterChambers.film(false, Control.ON_OFF, 0.5, 6),
                WaterChambers.film(false, Control.MODULATING, 0.5, 6),
                WaterChambers.film(true, Control.MODULATING, 0.5, 6, Optional.of(SMALL)),
                WaterChambers.film(false, Control.ON_OFF, 0.5, 6, Optional.of(SMALL)));
    }

    @ParameterizedTest
    @MethodSource("films")
    void balancesCloseAndTheWaterCarriesWhatWasTaken(WaterFilm film) {
        Course course = HeatModel.run(WaterChambers.ofFilm(film, 2), Progress.SILENT);
        assertTrue(course.balanceErrorPct() < 0.1, film + ": " + course.balanceErrorPct());
        assertEquals(
                course.heat().removed(), course.heat().sum(), 1e-3 * course.heat().throughput());
        assertTrue(course.heat().removed() > 1e7, "removed " + course.heat().removed());
        CoolerTotals did = course.coolers().get(0);
        assertEquals(course.heat().removed(), did.removedJ(), 1e-9 * did.removedJ());
        double pumpJ = film.pumpW() * did.ranS();
        assertEquals(pumpJ, course.heat().pumps(), 1e-9 * pumpJ);
        if (film.chiller().isEmpty()) {
            assertEquals(pumpJ, did.electricityJ(), 1e-9 * pumpJ);
            for (int i = 0; i < course.hours().size(); i++) {
                double out = course.hours().waterOutC(i);
                assertTrue(Double.isNaN(out) || (out > 6 && out < 32), "outlet " + out);
            }
        } else {
            double cop = (did.removedJ()) / (did.electricityJ() - pumpJ);
            // 0.45 x 273.15/(27 + 12 + 5 to 7 K warmer by day) = 2.6 to 3.2.
            assertTrue(cop > 2.4 && cop < 3.4, "coefficient of performance " + cop);
            assertTrue(did.removedJ() <= 1.01 * 900 * did.ranS(), "chiller's capacity");
        }
    }

    @Test
    void outletTimesFlowIsTheHeatTaken() {
        WaterFilm film = WaterChambers.film(true, Control.ON_OFF, 0.02, 6);
        ChamberRun run =
                WaterChambers.ofFilm(film, 1)
                        .withSetting(new Setting(2, 0.5, 90))
                        .withStart(Start.at(13, 90));
        Course course = HeatModel.run(run, Progress.SILENT);
        double carried = 0;
        for (int i = 0; i < course.hours().size(); i++) {
            double span = course.hours().atS(i) - (i == 0 ? 0 : course.hours().atS(i - 1));
            carried += 0.02 * MoistAir.WATER_J_KG_K * (course.hours().waterOutC(i) - 6) * span;
        }
        // It always runs: the setting is out of reach. The pump's heat is part of what is taken.
        assertEquals(86_400, course.coolers().get(0).ranS(), 1e-6);
        assertEquals(course.heat().removed(), carried, 1e-9 * carried);
    }

    @Test
    void theFilmDriesTheAirAndAJacketLeavesThatToItsSheet() {
        Course open =
                HeatModel.run(
                        WaterChambers.ofFilm(
                                WaterChambers.film(true, Control.MODULATING, 0.5, 3), 2),
                        Progress.SILENT);
        assertTrue(open.water().faces() < -0.5, "condensed on faces: " + open.water().faces());
        assertTrue(open.water().ranOff() > 0.5);
    }

    @Test
    void hugeFlowHoldsTheWallAtTheInlet() {
        WaterFilm film = WaterChambers.film(true, Control.MODULATING, 60, 8);
        ChamberRun run = WaterChambers.ofFilm(film, 1).withSetting(new Setting(2, 0.5, 90));
        Course course = HeatModel.run(run, Progress.SILENT);
        int last = course.hours().size() - 1;
        assertEquals(8, course.hours().waterOutC(last), 0.05);
    }

    @Test
    void withoutFlowItIsThePlainChamber() {
        // At a setting of 40 °C the thermostat never calls.
        ChamberRun none =
                WaterChambers.ofFilm(WaterChambers.film(true, Control.MODULATING, 0, 6), 1)
                        .withSetting(new Setting(40, 1, 90))
                        .withStart(Start.at(24, 60));
        for (boolean open : new boolean[] {true, false}) {
            ChamberRun never =
                    none.withCoolers(List.of(WaterChambers.film(open, Control.MODULATING, 0.5, 6)));
            Course bare = HeatModel.run(none, Progress.SILENT);
            Course rests = HeatModel.run(never, Progress.SILENT);
            int last = bare.hours().size() - 1;
            if (open) {
                // A jacket's standing water is mass that a plain face has not.
                assertEquals(bare.hours().airC(last), rests.hours().airC(last), 0.01);
            }
            assertEquals(0, rests.heat().removed(), 1e-9);
            assertEquals(0, bare.heat().removed(), 1e-9);
        }
    }

    @Test
    void onAndOffKeepsTheSameMeanAsBursts() {
        Course pulses =
                HeatModel.run(
                        WaterChambers.ofFilm(WaterChambers.film(true, Control.ON_OFF, 0.5, 6), 3),
                        Progress.SILENT);
        Course bursts =
                HeatModel.run(
                        WaterChambers.ofFilm(
                                WaterChambers.film(true, Control.MODULATING, 0.5, 6), 3),
                        Progress.SILENT);
        assertTrue(pulses.counts().thermostatSwitches() > 4);
        double a = mean(pulses, 48);
        double b = mean(bursts, 48);
        assertEquals(a, b, 0.6, "mean air of the third day");
        assertEquals(13, a, 1.2);
    }

    private static double mean(Course course, int from) {
        double sum = 0;
        for (int i = from; i < course.hours().size(); i++) {
            sum += course.hours().airC(i);
        }
        return sum / (course.hours().size() - from);
    }

    @Test
    void aColdSpringCoolsMoreWhenItIsColder() {
        Double[] day = new Double[24];
        for (int h = 0; h < 24; h++) {
            day[h] = h < 12 ? 6.0 : 12.0;
        }
        WaterFilm spring =
                new WaterFilm(
                        EnumSet.of(FaceName.NORTH, FaceName.EAST),
                        0.3,
                        List.of(day),
                        Optional.empty(),
                        0,
                        true,
                        10,
                        Control.MODULATING);
        ChamberRun run = WaterChambers.ofFilm(spring, 2).withSetting(new Setting(4, 0.5, 90));
        Course course = HeatModel.run(run, Progress.SILENT);
        double night = course.hours().waterOutC(24 + 10);
        double noon = course.hours().waterOutC(24 + 20);
        assertTrue(night > 6 && night < 9 && noon > 12 && noon < 14, night + " and " + noon);
    }

    @Test
    void waterByGravityRunsOnThroughAnOutageAndAPumpDoesNot() {
        WaterFilm pumped = WaterChambers.film(true, Control.MODULATING, 0.5, 6);
        WaterFilm gravity =
                new WaterFilm(
                        pumped.wets(),
                        0.5,
                        List.of(6.0),
                        Optional.empty(),
                        0,
                        true,
                        10,
                        Control.MODULATING);
        List<Outage> out = List.of(new Outage(6 * 3_600, 18 * 3_600));
        Course stands =
                HeatModel.run(WaterChambers.ofFilm(pumped, 1).withOutages(out), Progress.SILENT);
        Course runs =
                HeatModel.run(WaterChambers.ofFilm(gravity, 1).withOutages(out), Progress.SILENT);
        assertTrue(stands.hours().airC(16) > runs.hours().airC(16) + 2);
        assertTrue(Double.isNaN(stands.hours().waterOutC(12)));
        assertTrue(runs.hours().waterOutC(12) > 6);
    }
}

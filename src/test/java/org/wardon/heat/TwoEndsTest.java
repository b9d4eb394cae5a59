package org.wardon.heat;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;
import org.wardon.air.MoistAir;
import org.wardon.air.Weather;
import org.wardon.cooling.Control;
import org.wardon.cooling.Cooler;
import org.wardon.cooling.NightAir;
import org.wardon.enclosure.AirZones;
import org.wardon.enclosure.Beyond;
import org.wardon.enclosure.Box;
import org.wardon.enclosure.Enclosure;
import org.wardon.enclosure.FaceName;
import org.wardon.enclosure.Gains;
import org.wardon.errors.Progress;

/** A chamber whose air is two: against one air, against hand calculation, and its balances. */
class TwoEndsTest {
    private static Optional<AirZones> zones(double share, OptionalDouble exchangeM3S) {
        return Optional.of(new AirZones(FaceName.EAST, share, exchangeM3S));
    }

    private static ChamberRun stored(Control control, Optional<AirZones> zones) {
        ChamberRun run = Chambers.full(control, 6, 4);
        List<Stay> stays = new ArrayList<>();
        for (int i = 0; i < 6; i++) {
            Stay stay = run.stays().get(i);
            stays.add(
                    new Stay(
                            stay.lot(),
                            i * 3_600.0,
                            i == 5 ? 60 * 3_600 : Double.POSITIVE_INFINITY,
                            stay.pulpC(),
                            Double.NEGATIVE_INFINITY,
                            1,
                            Berth.DOOR.at(i < 3 ? Berth.Spot.BY_DOOR : Berth.Spot.MIDDLE)));
        }
        return run.withStays(stays).withEnclosure(run.enclosure().withZones(zones));
    }

    private static Course course(ChamberRun run) {
        return HeatModel.run(run, Progress.SILENT);
    }

    /** In finer steps than usual, so that the two differ by their airs and not by their steps. */
    private static Course fine(ChamberRun run) {
        return HeatModel.run(run, Progress.SILENT, new Accuracy(2e-3, 2e-2), false);
    }

    @Test
    void withVeryMuchExchangeTwoEndsAreOneAir() {
        Course one = fine(stored(Control.MODULATING, Optional.empty()));
        Course two = fine(stored(Control.MODULATING, zones(0.4, OptionalDouble.of(2_000))));
        for (int i = 0; i < one.hours().size(); i++) {
            assertEquals(one.hours().airC(i), two.hours().airC(i), 0.01, "hour " + i);
            assertEquals(one.hours().airC(i), two.hours().doorEndC(i), 0.01, "hour " + i);
            assertEquals(one.hours().humidityRatio(i), two.hours().humidityRatio(i), 1e-5);
        }
        for (int i = 0; i < one.lots().size(); i++) {
            LotCourse lot = one.lots().get(i);
            int last = lot.size() - 1;
            assertEquals(lot.coreC(last), two.lots().get(i).coreC(last), 0.01, "lot " + i);
            assertEquals(lot.massKg(last), two.lots().get(i).massKg(last), 0.01, "lot " + i);
        }
        assertEquals(one.heat().removed(), two.heat().removed(), 1e-3 * one.heat().removed());
    }

    @ParameterizedTest
    @EnumSource(Control.class)
    void heatAndWaterCloseAndTheDoorEndIsTheWarmerOne(Control control) {
        Course course = course(stored(control, zones(0.5, OptionalDouble.empty())));
        assertTrue(course.balanceErrorPct() < 1e-6, course.balanceErrorPct() + " %");
        assertTrue(course.heat().throughput() > 1e8, "throughput " + course.heat().throughput());
        int warmer = 0;
        for (int i = 0; i < course.hours().size(); i++) {
            warmer += course.hours().doorEndC(i) > course.hours().airC(i) ? 1 : 0;
        }
        assertEquals(course.hours().size(), warmer, "hours with a warmer door end");
        double byDoor = course.lots().get(0).coreC(course.lots().get(0).size() - 1);
        LotCourse same = course(stored(control, Optional.empty())).lots().get(0);
        assertTrue(byDoor > same.coreC(same.size() - 1) + 0.1, "core by the door " + byDoor);
    }

    @Test
    void withNoExchangeEachEndKeepsItsOwn() {
        Course course = course(stored(Control.MODULATING, zones(0.5, OptionalDouble.of(0))));
        assertTrue(course.balanceErrorPct() < 1e-6, course.balanceErrorPct() + " %");
        int last = course.hours().size() - 1;
        // The coil end keeps the setting; the door end, uncooled, follows outdoors and its lots.
        assertEquals(4, course.hours().airC(last), 1);
        assertTrue(course.hours().doorEndC(last) > 20, "" + course.hours().doorEndC(last));
    }

    private static Enclosure withFans(double fansW, Optional<AirZones> zones) {
        return new Enclosure(
                new Box(4, 3, 2.5),
                Chambers.faces(
                        new Beyond.Shade(),
                        new Beyond.Shade(),
                        List.of(Chambers.SHEET, Chambers.FOAM, Chambers.SHEET)),
                0,
                Optional.empty(),
                0,
                0,
                new Gains(0, 0, 0, fansW),
                0,
                false,
                zones);
    }

    /** A/(Rsi + d/k + Rse) of the coil end of that box and of its door end, 0.3 of the length. */
    private static double[] conductancesWK() {
        double panel = 0.08 / 0.024 + 0.04;
        double shared = 2 * 4 * 2.5 / (panel + 0.13) + 12 / (panel + 0.10) + 12 / (panel + 0.17);
        double wall = 3 * 2.5 / (panel + 0.13);
        return new double[] {0.7 * shared + wall, 0.3 * shared + wall};
    }

    private static Course settled(OptionalDouble exchangeM3S) {
        ChamberRun run =
                Chambers.passive(withFans(300, zones(0.3, exchangeM3S)), Weather.steady(25, 60), 12)
                        .withStart(Start.at(25, 60));
        return course(run);
    }

    @Test
    void theSpreadIsTheHeatOfTheDoorEndOverTheCapacityOfWhatIsExchanged() {
        double exchange = 0.02;
        Course course = settled(OptionalDouble.of(exchange));
        double[] ua = conductancesWK();
        double pressure = RunCompiler.pressurePa(stored(Control.ON_OFF, Optional.empty()));
        double ratio = course.hours().humidityRatio(0);
        double capacity =
                exchange
                        / MoistAir.specificVolumeM3kg(25, 0, pressure)
                        * MoistAir.heatCapacityJkgK(ratio);
        // Fans of 300 W at the coil end: 300 = UAc a + C (a - b) and C (a - b) = UAd b.
        double b = 300 * capacity / (ua[0] * ua[1] + capacity * (ua[0] + ua[1]));
        double a = b * (ua[1] + capacity) / capacity;
        int last = course.hours().size() - 1;
        double coil = course.hours().airC(last);
        double door = course.hours().doorEndC(last);
        assertEquals(25 + a, coil, 0.005 * a);
        assertEquals(25 + b, door, 0.005 * b);
        assertEquals(ua[1] * b / capacity, coil - door, 0.005 * (a - b));
    }

    /**
     * Brown and Solvason 1962 (from memory): volume flow each way through an opening = C/3 W (g
     * drho/rho)^0.5 H^1.5, C of 0.6 to 1; here 0.66.
     */
    @Test
    void withFansAtRestTheDifferenceOfDensityDrivesTheExchange() {
        Course course = settled(OptionalDouble.empty());
        int last = course.hours().size() - 1;
        double coil = course.hours().airC(last);
        double door = course.hours().doorEndC(last);
        double mean = 273.15 + 0.5 * (coil + door);
        double flow = 0.66 / 3 * 3 * Math.sqrt(9.81 * (coil - door) / mean) * Math.pow(2.5, 1.5);
        double pressure = RunCompiler.pressurePa(stored(Control.ON_OFF, Optional.empty()));
        double kgS = flow / MoistAir.specificVolumeM3kg(mean - 273.15, 0.012, pressure);
        double heat = conductancesWK()[1] * (door - 25);
        assertEquals(heat / (kgS * 1_030), coil - door, 0.03 * (coil - door));
        assertTrue(coil - door > 0.05, "spread " + (coil - door));
    }

    @Test
    void coolersThatBlowOutdoorAirInAreRefused() {
        Cooler night = new NightAir(0.15, 90, 2, 3, 30, 80, Control.ON_OFF);
        ChamberRun run =
                stored(Control.ON_OFF, zones(0.5, OptionalDouble.empty()))
                        .withCoolers(List.of(night));
        Exception refused = assertThrows(IllegalArgumentException.class, () -> course(run));
        assertEquals(
                "two air zones need coolers that stand in the room and blow no outdoor air in",
                refused.getMessage());
    }
}

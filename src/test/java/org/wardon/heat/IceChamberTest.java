package org.wardon.heat;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.time.LocalTime;
import java.util.List;
import java.util.Optional;
import java.util.SplittableRandom;
import org.junit.jupiter.api.Test;
import org.wardon.Source;
import org.wardon.air.Weather;
import org.wardon.cooling.Control;
import org.wardon.cooling.IceBank;
import org.wardon.cooling.Outage;
import org.wardon.cooling.Recharge;
import org.wardon.cooling.Setting;
import org.wardon.enclosure.Enclosure;
import org.wardon.enclosure.Gains;
import org.wardon.errors.Progress;

/** Chambers cooled by ice. */
class IceChamberTest {
    private static Course run(ChamberRun run) {
        Course course = HeatModel.run(run, Progress.SILENT);
        assertTrue(course.balanceErrorPct() < 1e-6, course.balanceErrorPct() + " %");
        return course;
    }

    private static IceBank bank(double iceKg, double uaWK, double fanW, Optional<Recharge> by) {
        return new IceBank(iceKg, iceKg, IceBank.Material.ICE, uaWK, fanW, by, Control.MODULATING);
    }

    private static Recharge night(double coldW) {
        return new Recharge(coldW, 0.4 * coldW, LocalTime.of(21, 0), LocalTime.of(5, 0));
    }

    private static ChamberRun chamber(double days, IceBank bank) {
        return Chambers.passive(
                        Chambers.panelRoom(10), Chambers.weather((int) (24 * days) + 3), days)
                .withSetting(new Setting(8, 1, 85))
                .withCoolers(List.of(bank))
                .withStays(Chambers.load(2, 400, 12));
    }

    private static IceLedger ice(Course course) {
        return course.coolers().get(0).ice().orElseThrow();
    }

    private static List<CourseEvent> gone(Course course) {
        return course.events().stream().filter(e -> e.kind() == CourseEvent.Kind.ICE_GONE).toList();
    }

    /** A chamber in air of its own temperature with a steady load: nothing but the load melts. */
    @Source("course note on ice banks, by way of checks-enclosure.csv, row ice_hours, 0.1 %")
    @Test
    void iceLastsAsLongAsPrintedForItsLoad() {
        Enclosure shut = Chambers.shut(List.of(Chambers.FOAM));
        Enclosure loaded =
                new Enclosure(
                        shut.box(),
                        shut.faces(),
                        0,
                        Optional.empty(),
                        0,
                        0,
                        new Gains(0, 0, 0, 1_200),
                        0,
                        false);
        Course course =
                run(
                        Chambers.passive(loaded, Weather.steady(10, 30), 1)
                                .withSetting(new Setting(10, 0.5, 30))
                                .withCoolers(List.of(bank(200, 500, 0, Optional.empty()))));
        // 15.463 h of 334 kJ/kg, to the last hundredth of the ice, which counts as gone.
        double printedS = 15.463 * 3_600 * 333.5 / 334 * 0.99;
        double reached = gone(course).get(0).fromS();
        // Found at the end of a step, and the air starts half a band too cold: some minutes.
        assertEquals(printedS, reached, 0.01 * printedS);
        assertTrue(course.hours().airC(14) < 10.5);
        assertTrue(course.hours().airC(20) > 12, "without ice it warms");
    }

    @Test
    void heatTakenIsIceMeltedTimesItsLatentHeat() {
        Course course = run(chamber(2, bank(2_000, 500, 50, Optional.empty())));
        IceLedger ice = ice(course);
        // What drains at 0 °C carries no enthalpy, so all that leaves the air melts ice.
        double removed = course.heat().removed();
        assertEquals(removed, ice.meltedKg() * 333_500, 1e-9 * removed);
        assertEquals(removed, (ice.startKg() - ice.endKg()) * 333_500, 1e-6 * removed);
        assertTrue(-course.water().coolers() > 1, "the ice dried the air");
        assertEquals(2_000, ice.startKg());
        assertEquals(
                50 * course.coolers().get(0).ranS(),
                course.heat().electricity() - 60 * 2 * 2 * 3_600,
                1e-3 * course.heat().electricity());
        for (int i = 12; i < 48; i++) {
            assertEquals(8, course.hours().airC(i), 1.2, "hour " + i);
            assertTrue(course.hours().airLowestC(i) > 6.5, "not driven to the melting point");
            assertTrue(course.hours().iceKg(i) <= course.hours().iceKg(i - 1));
        }
        assertTrue(gone(course).isEmpty());
    }

    @Test
    void itIsMadeAgainInItsHoursAndWithPowerOnly() {
        ChamberRun run = chamber(3, bank(300, 120, 50, Optional.of(night(4_000))));
        Course course = run(run);
        Hours hours = course.hours();
        for (int i = 1; i < 72; i++) {
            int from = i % 24;
            boolean night = from >= 21 || from < 5;
            double gained = hours.iceKg(i) - hours.iceKg(i - 1);
            assertTrue(night || gained <= 1e-9, "hour " + i + ": " + gained + " kg");
            assertTrue(hours.iceKg(i) <= 300 + 1e-9 && hours.iceKg(i) >= 0, "hour " + i);
        }
        assertTrue(ice(course).refrozenKg() > 50, ice(course).refrozenKg() + " kg");
        Course cut = run(run.withOutages(List.of(new Outage(20 * 3_600, 44 * 3_600))));
        for (int i = 21; i < 44; i++) {
            assertEquals(hours.iceKg(19), cut.hours().iceKg(i), 0.02, "stands still, hour " + i);
            assertEquals(0, cut.hours().powerW(i), 1e-9);
        }
        assertTrue(cut.hours().airC(43) > hours.airC(43) + 3);
    }

    @Test
    void aDamperGoesOnCoolingWithoutPower() {
        ChamberRun run =
                chamber(2, bank(2_000, 120, 0, Optional.empty()))
                        .withOutages(List.of(new Outage(10 * 3_600, 34 * 3_600)));
        Course damper = run(run);
        Course fan = run(run.withCoolers(List.of(bank(2_000, 120, 50, Optional.empty()))));
        assertEquals(8, damper.hours().airC(32), 1.5);
        assertTrue(fan.hours().airC(32) > 12, fan.hours().airC(32) + " °C");
    }

    @Test
    void openAndShutKeepsTheBandAndTheSameMean() {
        ChamberRun run = chamber(3, bank(3_000, 250, 50, Optional.empty()));
        Course smooth = run(run);
        IceBank switched =
                new IceBank(
                        3_000,
                        3_000,
                        IceBank.Material.ICE,
                        250,
                        50,
                        Optional.empty(),
                        Control.ON_OFF);
        Course course = run(run.withCoolers(List.of(switched)));
        assertTrue(course.counts().thermostatSwitches() > 20);
        assertEquals(ice(smooth).meltedKg(), ice(course).meltedKg(), 0.05 * ice(smooth).meltedKg());
        for (int i = 54; i < 62; i++) {
            assertTrue(course.hours().airLowestC(i) > 6.8, "hour " + i);
        }
    }

    @Test
    void randomBanksCloseTheirBalancesAndStayBetweenNothingAndFull() {
        SplittableRandom random = new SplittableRandom(29);
        int ranOut = 0;
        for (int k = 0; k < 12; k++) {
            double full = random.nextDouble(20, 500);
            double fan = random.nextBoolean() ? 0 : random.nextDouble(10, 100);
            Control control = random.nextBoolean() ? Control.ON_OFF : Control.MODULATING;
            IceBank bank =
                    new IceBank(
                            full,
                            random.nextDouble(0, full),
                            new IceBank.Material(
                                    random.nextDouble(-5, 3), random.nextDouble(150, 340)),
                            random.nextDouble(20, 300),
                            fan,
                            random.nextBoolean()
                                    ? Optional.of(night(random.nextDouble(500, 8_000)))
                                    : Optional.empty(),
                            control);
            Course course = run(chamber(2, bank));
            String what = "run " + k + " of " + bank;
            for (int i = 0; i < 48; i++) {
                double kg = course.hours().iceKg(i);
                assertTrue(kg >= 0 && kg <= full * (1 + 1e-6), what + ": " + kg + " kg");
            }
            assertTrue(ice(course).endKg() >= -1e-3 * full, what);
            assertTrue(ice(course).meltedKg() >= 0 && ice(course).refrozenKg() >= 0, what);
            ranOut += gone(course).isEmpty() ? 0 : 1;
        }
        assertTrue(ranOut > 2, "banks that ran out: " + ranOut);
    }
}

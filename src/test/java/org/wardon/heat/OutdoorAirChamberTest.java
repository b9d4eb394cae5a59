package org.wardon.heat;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.OptionalDouble;
import java.util.SplittableRandom;
import org.junit.jupiter.api.Test;
import org.wardon.air.MoistAir;
import org.wardon.air.SaturatedAir;
import org.wardon.air.Weather;
import org.wardon.air.WetBulb;
import org.wardon.cooling.Compressor;
import org.wardon.cooling.Control;
import org.wardon.cooling.Cooler;
import org.wardon.cooling.EvaporativePad;
import org.wardon.cooling.NightAir;
import org.wardon.cooling.Outage;
import org.wardon.cooling.Setting;
import org.wardon.enclosure.Beyond;
import org.wardon.enclosure.Enclosure;
import org.wardon.errors.Progress;

/** Chambers cooled by outdoor air, through a pad or at night. */
class OutdoorAirChamberTest {
    private static final double FLOW_M3S = 0.3;

    private static Course run(ChamberRun run) {
        Course course = HeatModel.run(run, Progress.SILENT);
        assertTrue(course.balanceErrorPct() < 1e-6, course.balanceErrorPct() + " %");
        return course;
    }

    private static EvaporativePad pad(Control control) {
        return new EvaporativePad(0.8, FLOW_M3S, 60, 25, control);
    }

    /** A shaded room, so that nothing but air and load can be colder than outdoors. */
    private static Enclosure shaded(double leakage) {
        Enclosure room = Chambers.panelRoom(20);
        return new Enclosure(
                room.box(),
                Chambers.faces(
                        new Beyond.Shade(),
                        new Beyond.Shade(),
                        List.of(Chambers.SHEET, Chambers.FOAM, Chambers.SHEET)),
                10,
                room.door(),
                leakage,
                0,
                room.gains(),
                50_000,
                false);
    }

    /** Days that swing round a mean, vapour pressure held. */
    private static Weather swinging(double meanC, double swingK, double meanPct, int hours) {
        double[] t = new double[hours];
        double[] rh = new double[hours];
        double pa = meanPct / 100 * SaturatedAir.overWaterPa(meanC);
        for (int h = 0; h < hours; h++) {
            t[h] = meanC + swingK * Math.cos(2 * Math.PI * (h - 15) / 24);
            rh[h] = Math.min(100, 100 * pa / SaturatedAir.overWaterPa(t[h]));
        }
        return new Weather(t, rh, new double[hours], new double[hours]);
    }

    private static ChamberRun chamber(Weather weather, double setC, double days, Cooler cooler) {
        return Chambers.passive(shaded(3), weather, days)
                .withSetting(new Setting(setC, 1, 85))
                .withCoolers(List.of(cooler));
    }

    private static double wetBulbC(Weather weather, int h) {
        double pa =
                weather.humidityPct(h) / 100 * SaturatedAir.overWaterPa(weather.temperatureC(h));
        return WetBulb.temperatureC(
                weather.temperatureC(h), MoistAir.humidityRatio(pa, 101_085), 101_085);
    }

    @Test
    void aPadCoolsADryDayAndItsWaterAddsUp() {
        Weather dry = swinging(33, 6, 25, 80);
        ChamberRun passive =
                Chambers.passive(shaded(3), dry, 3).withStays(Chambers.load(2, 800, 30));
        Course without = run(passive);
        Course with =
                run(chamber(dry, 15, 3, pad(Control.ON_OFF)).withStays(Chambers.load(2, 800, 30)));
        CoolerTotals did = with.coolers().get(0);
        assertEquals("evaporative-pad", did.kind());
        // The setting is out of reach, so it runs on and on.
        assertEquals(3 * 86_400, did.ranS(), 900);
        assertEquals(60 * did.ranS(), did.electricityJ(), 1e-6 * did.electricityJ());
        double meanWithout = 0;
        double meanWith = 0;
        double water = 0;
        for (int i = 24; i < 72; i++) {
            meanWithout += without.hours().airC(i) / 48;
            meanWith += with.hours().airC(i) / 48;
            double coldest = Math.min(wetBulbC(dry, i), wetBulbC(dry, i + 1));
            assertTrue(with.hours().supplyC(i) >= coldest, "hour " + i);
            assertTrue(with.hours().airLowestC(i) >= coldest, "hour " + i);
            assertEquals(1, with.hours().ran(0, i), 1e-6);
        }
        for (int i = 0; i < 72; i++) {
            water += with.hours().waterUsedKg(i);
        }
        assertTrue(meanWith < meanWithout - 6, meanWithout + " to " + meanWith);
        assertEquals(did.waterKg(), water, 1e-9 * water);
        assertEquals(with.waterUsedKg(), water, 1e-9 * water);
    }

    @Test
    void blownInAirKeepsLeakageOutAndCarriesTheGases() {
        Weather dry = swinging(33, 4, 25, 52);
        ChamberRun run =
                chamber(dry, 15, 2, pad(Control.ON_OFF)).withStays(Chambers.load(2, 2_000, 30));
        Course course = run(run);
        Course leaking =
                run(run.withCoolers(List.of(new EvaporativePad(0.8, 0.001, 0, 0, Control.ON_OFF))));
        assertTrue(
                Math.abs(course.water().leakage()) < 0.01 * Math.abs(leaking.water().leakage()),
                course.water().leakage() + " kg");
        double kgS = course.hours().respirationW(28) / 10.7e6;
        double exchange = course.hours().exchangeM3s(28);
        // A night hour, the door shut. Counted at the temperature of the chamber's air at its
        // setting.
        assertEquals(FLOW_M3S, exchange, 0.1 * FLOW_M3S);
        double m3PerKg = 188.92 * (course.hours().airC(28) + 273.15) / 101_085;
        double settles = 420 + 1e6 * kgS * m3PerKg / exchange;
        assertEquals(settles, course.hours().co2Ppm(28), 0.02 * (settles - 420) + 1);
        assertTrue(leaking.hours().co2Ppm(28) > 3 * course.hours().co2Ppm(28));
    }

    @Test
    void aPadRestsWithoutPowerAndInHumidAir() {
        Weather dry = swinging(33, 4, 25, 52);
        Course course =
                run(
                        chamber(dry, 15, 2, pad(Control.ON_OFF))
                                .withOutages(List.of(new Outage(36_000, 54_000))));
        assertEquals(0, course.hours().ran(0, 12));
        assertEquals(0, course.hours().waterUsedKg(12));
        assertEquals(0, course.hours().powerW(12), 1e-9);
        assertTrue(course.hours().ran(0, 17) > 0.9);
        // In saturated air a pad is a fan, and a chamber without load is no warmer than outdoors.
        Course humid = run(chamber(swinging(28, 0, 100, 52), 15, 2, pad(Control.ON_OFF)));
        assertEquals(0, humid.waterUsedKg(), 1e-6);
    }

    @Test
    void smoothControlKeepsTheMeanOfOnAndOff() {
        Weather dry = swinging(28, 6, 30, 100);
        ChamberRun run =
                chamber(dry, 21, 4, pad(Control.ON_OFF)).withStays(Chambers.load(2, 800, 24));
        Course switched = run(run);
        Course smooth = run(run.withControlMode(ControlMode.MODULATING));
        assertTrue(switched.counts().thermostatSwitches() > 10);
        for (int i = 0; i < 2; i++) {
            LotCourse a = switched.lots().get(i);
            LotCourse b = smooth.lots().get(i);
            assertEquals(a.meanC(a.size() - 1), b.meanC(b.size() - 1), 0.5);
        }
        double waterA = switched.waterUsedKg();
        assertEquals(waterA, smooth.waterUsedKg(), 0.15 * waterA);
    }

    @Test
    void nightAirRunsOnlyInsideItsBounds() {
        Weather nights = swinging(15, 8, 70, 124);
        NightAir fan = new NightAir(FLOW_M3S, 60, 2, 8, 0, 100, Control.ON_OFF);
        ChamberRun run = chamber(nights, 9, 5, fan).withStays(Chambers.load(2, 800, 20));
        Course course = run(run);
        int ran = 0;
        for (int i = 0; i < 120; i++) {
            double warmest = Math.max(nights.temperatureC(i), nights.temperatureC(i + 1));
            double coldest = Math.min(nights.temperatureC(i), nights.temperatureC(i + 1));
            if (course.hours().ran(0, i) > 0) {
                ran++;
                assertTrue(warmest >= 8, "hour " + i + " of " + warmest + " °C");
                assertTrue(course.hours().airHighestC(i) >= coldest + 2 - 1e-6, "hour " + i);
            }
            if (coldest > course.hours().airHighestC(i)) {
                assertEquals(0, course.hours().ran(0, i), "hour " + i);
            }
        }
        assertTrue(ran > 20 && ran < 100, "ran in " + ran + " of 120 hours");
        Course still = run(run.withCoolers(List.of()));
        double saved =
                still.lots().get(0).meanC(still.lots().get(0).size() - 1)
                        - course.lots().get(0).meanC(course.lots().get(0).size() - 1);
        assertTrue(saved > 1.5, "night air took off " + saved + " K");
        assertEquals(
                60 * course.coolers().get(0).ranS(), course.coolers().get(0).electricityJ(), 1);
        assertEquals(0, course.waterUsedKg());
    }

    @Test
    void randomRunsCloseTheirBalancesAndStayAboveTheWetBulb() {
        SplittableRandom random = new SplittableRandom(17);
        for (int k = 0; k < 12; k++) {
            double meanC = random.nextDouble(6, 36);
            Weather weather =
                    swinging(meanC, random.nextDouble(0, 8), random.nextDouble(15, 95), 52);
            Control control = random.nextBoolean() ? Control.ON_OFF : Control.MODULATING;
            double flow = random.nextDouble(0.05, 1.5);
            Cooler cooler =
                    k % 2 == 0
                            ? new EvaporativePad(
                                    random.nextDouble(0.5, 1), flow, 200 * flow, 20, control)
                            : new NightAir(
                                    flow,
                                    200 * flow,
                                    random.nextDouble(0, 4),
                                    random.nextDouble(-5, 5),
                                    random.nextDouble(0, 40),
                                    random.nextDouble(70, 100),
                                    control);
            double setC = random.nextDouble(2, 25);
            ChamberRun run =
                    chamber(weather, setC, 2, cooler).withStays(Chambers.load(2, 500, meanC));
            Course course = run(run);
            String what = "run " + k + " of " + cooler;
            double lowest = Double.POSITIVE_INFINITY;
            for (int h = 0; h <= 48; h++) {
                lowest = Math.min(lowest, wetBulbC(weather, h));
            }
            for (int i = 0; i < 48; i++) {
                assertTrue(course.hours().airLowestC(i) >= lowest - 1e-6, what);
                assertEquals(0.5, course.hours().ran(0, i), 0.5, what);
            }
            assertTrue(course.counts().steps() < 40_000, what + " " + course.counts().steps());
        }
    }

    /** What a daily energy limits is the cooler that names it; the next one takes over. */
    @Test
    void anEnergyUsedUpStopsTheCoolerOnItAlone() {
        Compressor plain = Chambers.unit(Control.ON_OFF, 0);
        Compressor solar =
                new Compressor(
                        plain.ratedCapacityW(),
                        plain.ratedPowerW(),
                        plain.ratedAirC(),
                        plain.ratedOutdoorC(),
                        plain.fanW(),
                        false,
                        plain.coilUaWK(),
                        plain.airFlowM3s(),
                        plain.control(),
                        0,
                        0,
                        plain.condenserRiseK(),
                        plain.lowestC(),
                        plain.defrost(),
                        OptionalDouble.of(1.5));
        Weather dry = swinging(33, 4, 25, 52);
        Course course =
                run(
                        chamber(dry, 12, 2, solar)
                                .withCoolers(List.of(solar, pad(Control.ON_OFF)))
                                .withStays(Chambers.load(2, 800, 30)));
        assertTrue(
                course.events().stream()
                        .anyMatch(e -> e.kind() == CourseEvent.Kind.ENERGY_USED_UP));
        double kWh = course.coolers().get(0).electricityJ() / 3.6e6;
        // Two days of 1.5 kWh, and half a minute of full power at most until it is noticed.
        assertEquals(3, kWh, 2 * 30 * solar.mostElectricW() / 3.6e6);
        assertEquals(0, course.hours().ran(0, 20), "used up by evening");
        assertTrue(course.hours().ran(1, 20) > 0.9, "the pad goes on");
    }
}

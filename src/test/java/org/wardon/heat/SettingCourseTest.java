package org.wardon.heat;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import org.junit.jupiter.api.Test;
import org.wardon.Source;
import org.wardon.air.Timeline;
import org.wardon.air.Weather;
import org.wardon.air.YearWave;
import org.wardon.cooling.Control;
import org.wardon.cooling.IceBank;
import org.wardon.cooling.Setting;
import org.wardon.cooling.SettingCourse;
import org.wardon.enclosure.Enclosure;
import org.wardon.enclosure.Gains;
import org.wardon.enclosure.Layer;
import org.wardon.enclosure.Surroundings;
import org.wardon.errors.Progress;
import org.wardon.heat.network.ChamberNetwork;

/** A chamber whose setting changes within the run. */
class SettingCourseTest {
    private static final double CHANGE_S = 2 * 86_400;
    private static final Setting FIRST = new Setting(12, 1, 85);
    private static final Setting THEN = new Setting(4, 1, 95);

    /** Much finer than usual, so that what differs is not the steps. */
    private static final Accuracy TIGHT = new Accuracy(1e-5, 1e-4, Accuracy.USUAL.steps());

    /** Told, or each run would take the mean of its own hours for the soil below the floor. */
    private static final YearWave YEAR = new YearWave(27, 0, 1);

    private static Course run(ChamberRun run) {
        Course course = HeatModel.run(run, Progress.SILENT);
        // The law of energy and water, far inside the 0.1 % a forecast may be off.
        assertTrue(course.balanceErrorPct() < 1e-6, course.balanceErrorPct() + " %");
        return course;
    }

    private static ChamberRun with(ChamberRun run, double atS, Setting to) {
        return run.withSettings(
                new SettingCourse(run.setting(), List.of(new SettingCourse.Change(atS, to))));
    }

    private static ChamberRun full(Control control) {
        return Chambers.full(control, 4, 4)
                .withSetting(FIRST)
                .withExtras(new ChamberRun.Extras(500, 2, java.util.Map.of()));
    }

    @Test
    void aChangeToTheSameOrAfterTheEndChangesNothing() {
        ChamberRun plain = full(Control.MODULATING);
        Course steady = run(plain);
        Course late = run(with(plain, plain.durationS(), THEN));
        Course same = run(with(plain, CHANGE_S + 600, FIRST));
        for (int i = 0; i < steady.hours().size(); i++) {
            assertEquals(steady.hours().airC(i), late.hours().airC(i), 0, "hour " + i);
            // Other steps, to the error they are allowed in the air.
            assertEquals(steady.hours().airC(i), same.hours().airC(i), 0.01, "hour " + i);
        }
        assertEquals(steady.heat().removed(), late.heat().removed(), 0);
        assertEquals(
                steady.heat().removed(), same.heat().removed(), 1e-4 * steady.heat().removed());
    }

    /** The second run starts where the first ended: air, faces, racks and water on the coil. */
    @Test
    void oneChangeIsTwoRunsJoinedThere() {
        ChamberRun whole =
                moved(with(full(Control.MODULATING).withStays(List.of()), CHANGE_S, THEN), 0);
        Course course = HeatModel.run(whole, Progress.SILENT, TIGHT, false);
        assertTrue(course.balanceErrorPct() < 1e-6, course.balanceErrorPct() + " %");
        ChamberRun before = whole.withSetting(FIRST).withDurationS(CHANGE_S);
        ChamberRun after =
                moved(whole.withSetting(THEN).withDurationS(whole.durationS() - CHANGE_S), 48);
        double meanC = RunCompiler.surroundings(whole).insideMeanC();
        ChamberNetwork network = network(before, meanC);
        double[] y = WarmUp.start(before, network, TIGHT, false);
        Course one = new ChamberRunner(before, network, y, TIGHT).run(Progress.SILENT);
        Course two = new ChamberRunner(after, network(after, meanC), y, TIGHT).run(Progress.SILENT);
        for (int i = 0; i < 96; i++) {
            double joined = i < 48 ? one.hours().airC(i) : two.hours().airC(i - 48);
            assertEquals(joined, course.hours().airC(i), 0.001, "hour " + i);
            double humidity =
                    i < 48 ? one.hours().humidityFraction(i) : two.hours().humidityFraction(i - 48);
            assertEquals(humidity, course.hours().humidityFraction(i), 0.001, "hour " + i);
        }
        double removed = one.heat().removed() + two.heat().removed();
        assertEquals(removed, course.heat().removed(), 1e-4 * removed);
        double electricity = one.heat().electricity() + two.heat().electricity();
        assertEquals(electricity, course.heat().electricity(), 1e-4 * electricity);
        assertTrue(course.hours().airC(95) < 5.5 && course.hours().airC(47) > 10.5);
    }

    private static ChamberNetwork network(ChamberRun run, double insideMeanC) {
        Surroundings around = RunCompiler.surroundings(run).keeping(insideMeanC);
        return RunCompiler.network(run, around, false);
    }

    private static ChamberRun moved(ChamberRun run, int hours) {
        int left = (int) (run.durationS() / 3_600) + 3;
        double[][] shifted = new double[4][left];
        for (int h = 0; h < left; h++) {
            shifted[0][h] = run.weather().temperatureC(h + hours);
            shifted[1][h] = run.weather().humidityPct(h + hours);
            shifted[2][h] = run.weather().globalWm2(h + hours);
            shifted[3][h] = Double.NaN;
        }
        return new ChamberRun(
                run.chamberId(),
                run.site().withYear(YEAR),
                new Timeline(run.timeline().from().plusHours(hours), run.site().zone()),
                new Weather(shifted[0], shifted[1], shifted[2], shifted[3]),
                run.enclosure(),
                run.coolers(),
                run.settings(),
                run.outages(),
                run.stays(),
                run.factors(),
                run.start(),
                run.durationS(),
                run.doorMode(),
                run.controlMode(),
                run.extras());
    }

    @Test
    void theThermostatSwitchesAtTheBandInForce() {
        ChamberRun run =
                Chambers.full(Control.ON_OFF, 4, 7)
                        .withCoolers(List.of(Chambers.unit(Control.ON_OFF, 0)))
                        .withSetting(THEN);
        double warmer = 102 * 3_600;
        Course course = run(with(run, warmer, FIRST));
        for (int i = 96; i < 102; i++) {
            // Night hours, the door is shut. A switching may be 0.01 K late.
            assertTrue(course.hours().airHighestC(i) <= 5.011, "hour " + i);
        }
        assertEquals(0, course.hours().ran(0, 102), 0.2, "it soon rests while the air warms");
        int warm = 102;
        while (course.hours().airHighestC(warm) < 13) {
            warm++;
        }
        for (int i = warm; i < course.hours().size(); i++) {
            assertTrue(course.hours().airHighestC(i) <= 13.011, "hour " + i);
            assertTrue(course.hours().airLowestC(i) >= 5, "hour " + i);
        }
        assertTrue(warm < 150, "it came up in hour " + warm);
    }

    /**
     * Racks that follow the air in time s, the air between a wall and ice, all else without mass:
     * the racks fall by one exponential.
     */
    @Source("lumped capacity in closed form, Newton's law of cooling")
    @Test
    void iceBringsRacksDownAsALumpDoes() {
        double capacityJK = 5e6;
        double iceWK = 200;
        double outdoorC = 25;
        Layer light = new Layer("light", 0.08, 0.024, 10, 100);
        Enclosure shut = Chambers.shut(List.of(light));
        Enclosure racks =
                new Enclosure(
                        shut.box(),
                        shut.faces(),
                        0,
                        Optional.empty(),
                        0,
                        0,
                        Gains.NONE,
                        capacityJK,
                        false);
        IceBank bank =
                new IceBank(
                        5_000,
                        5_000,
                        IceBank.Material.ICE,
                        iceWK,
                        0,
                        Optional.empty(),
                        Control.MODULATING);
        ChamberRun run =
                Chambers.passive(racks, Weather.steady(outdoorC, 10), 4)
                        .withSetting(new Setting(14, 0.5, 5))
                        .withCoolers(List.of(bank))
                        .withStart(
                                new Start(
                                        OptionalDouble.of(14),
                                        OptionalDouble.of(5),
                                        Optional.empty()));
        Course course = run(with(run, CHANGE_S, new Setting(6, 0.5, 5)));
        double wallWK = course.hours().coolingW(47) / (outdoorC - course.hours().airC(47));
        double filmWK = capacityJK / 1_200;
        double rackC = course.hours().airC(47);
        double all = wallWK + iceWK + filmWK;
        double endC = wallWK * outdoorC / (wallWK + iceWK);
        double timeS = 1_200 * all / (wallWK + iceWK);
        double compared = 0;
        for (int h = 0; rackC > 7; h++) {
            // Mean of the racks over the hour, and the air that stands between.
            double fallen = Math.exp(-3_600 / timeS);
            double meanRackC = endC + (rackC - endC) * (1 - fallen) * timeS / 3_600;
            double airC = (wallWK * outdoorC + filmWK * meanRackC) / all;
            if (airC > 6.7) {
                assertEquals(airC, course.hours().airC(48 + h), 0.05, "hour " + h);
                compared++;
            }
            rackC = endC + (rackC - endC) * fallen;
        }
        assertTrue(compared >= 6, compared + " hours");
    }
}

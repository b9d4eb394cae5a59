package org.wardon.heat;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Collections;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.stream.IntStream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;
import org.wardon.air.Weather;
import org.wardon.cooling.Compressor;
import org.wardon.cooling.Control;
import org.wardon.cooling.Cooler;
import org.wardon.cooling.Setting;
import org.wardon.enclosure.Enclosure;
import org.wardon.enclosure.Gains;
import org.wardon.errors.Progress;

/** Equal units that come on one after the other, in a shut chamber with a steady load. */
class StagedUnitsTest {
    private static final double SET_C = 10;

    /** The first day is left out: the chamber comes to rest in it. */
    private static final int FROM_H = 24;

    private static final int TO_H = 72;

    private static Compressor unit(Control control, double capacityW) {
        return new Compressor(
                capacityW,
                0.4 * capacityW,
                SET_C,
                30,
                0,
                false,
                capacityW / 6,
                capacityW / 6_000,
                control,
                0,
                0,
                0,
                -30,
                Optional.empty(),
                OptionalDouble.empty());
    }

    private static Course run(double loadW, Setting setting, List<Cooler> units) {
        Enclosure shut = Chambers.shut(List.of(Chambers.FOAM));
        Enclosure loaded =
                new Enclosure(
                        shut.box(),
                        shut.faces(),
                        0,
                        Optional.empty(),
                        0,
                        0,
                        new Gains(0, 0, 0, loadW),
                        200_000,
                        false);
        Course course =
                HeatModel.run(
                        Chambers.passive(loaded, Weather.steady(30, 30), 3)
                                .withSetting(setting)
                                .withCoolers(units),
                        Progress.SILENT);
        assertTrue(course.balanceErrorPct() < 1e-6, course.balanceErrorPct() + " %");
        return course;
    }

    private static List<Cooler> units(Control control, int count) {
        return Collections.nCopies(count, unit(control, 3_000));
    }

    private static Setting stages(double stageK) {
        return new Setting(SET_C, 0.5, 90, stageK);
    }

    private static double share(Course course, int unit) {
        return IntStream.range(FROM_H, TO_H)
                .mapToDouble(i -> course.hours().ran(unit, i))
                .average()
                .orElseThrow();
    }

    private static double airC(Course course) {
        return IntStream.range(FROM_H, TO_H)
                .mapToDouble(course.hours()::airC)
                .average()
                .orElseThrow();
    }

    private static double removedW(Course course) {
        return IntStream.range(FROM_H, TO_H)
                .mapToDouble(course.hours()::coolingW)
                .average()
                .orElseThrow();
    }

    /** Faces bring 20 K x 59 m2 x 0.28 W/m2K = 330 W beside the load. */
    @ParameterizedTest
    @EnumSource(Control.class)
    void twoShareALoadThatOneDoesNotHold(Control control) {
        Course two = run(4_000, stages(1), units(control, 2));
        assertEquals(1, share(two, 0), 0.01, "the first runs on");
        // Each takes its rated 3 kW, less up to a tenth because the air is dry.
        double eachW = two.coolers().get(0).removedJ() / two.coolers().get(0).ranS();
        assertEquals(2_850, eachW, 150);
        // One that changes its speed needs less of its time for the same heat.
        double leeway = control == Control.ON_OFF ? 0.01 : 0.1;
        assertEquals(removedW(two) / eachW - 1, share(two, 1), leeway);
        assertEquals(4_330, removedW(two), 0.03 * 4_330);
        // The second keeps the air a stage above the first.
        assertEquals(SET_C + 1, airC(two), 0.5);
        Course one = run(4_000, stages(1), units(control, 1));
        assertTrue(airC(one) > SET_C + 5, "one alone: " + airC(one));
    }

    @ParameterizedTest
    @EnumSource(Control.class)
    void theSecondRestsWhereOneHolds(Control control) {
        Course course = run(1_500, stages(1), units(control, 3));
        assertEquals((1_500 + 330) / 3_000.0, share(course, 0), 0.06);
        assertEquals(0, course.coolers().get(1).ranS());
        assertEquals(0, course.coolers().get(2).ranS());
        assertEquals(0, course.coolers().get(2).electricityJ());
        assertEquals(SET_C, airC(course), 0.5);
    }

    @Test
    void withoutAStageAllActTogether() {
        Course course = run(4_000, stages(0), units(Control.ON_OFF, 2));
        assertEquals(share(course, 0), share(course, 1), 1e-9);
        assertEquals(4_330 / (2 * 2_850.0), share(course, 0), 0.04);
        assertEquals(SET_C, airC(course), 0.5);
    }

    /** What one unit of twice the size does, two together do. */
    @Test
    void twoTogetherAreOneOfTwiceTheSize() {
        Course two = run(4_000, stages(0), units(Control.MODULATING, 2));
        Course large = run(4_000, stages(0), List.of(unit(Control.MODULATING, 6_000)));
        assertEquals(airC(large), airC(two), 1e-3);
        double joule = large.coolers().get(0).electricityJ();
        double both = two.coolers().stream().mapToDouble(CoolerTotals::electricityJ).sum();
        assertEquals(joule, both, 1e-3 * joule);
    }

    @Test
    void aSmallerStepKeepsTheAirNearerItsSetting() {
        double near = airC(run(7_000, stages(0.3), units(Control.ON_OFF, 3)));
        double far = airC(run(7_000, stages(2), units(Control.ON_OFF, 3)));
        // The third works in both: two steps of 1.7 K lie between.
        assertEquals(3.4, far - near, 0.5);
    }

    @Test
    void aSettingThatSaysNothingOfStagesHasThemABandApart() {
        assertEquals(0.7, new Setting(4, 0.7, 90).stageK());
    }
}

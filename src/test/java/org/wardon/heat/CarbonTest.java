package org.wardon.heat;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.time.LocalTime;
import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import org.wardon.Source;
import org.wardon.air.Weather;
import org.wardon.enclosure.Beyond;
import org.wardon.enclosure.Box;
import org.wardon.enclosure.Door;
import org.wardon.enclosure.Enclosure;
import org.wardon.enclosure.Gains;
import org.wardon.enclosure.GasLevel;
import org.wardon.enclosure.PeopleHeat;
import org.wardon.errors.Progress;

/** Carbon dioxide of a chamber against sums on paper. */
class CarbonTest {
    private static final Box BOX = new Box(4, 3, 2.5);
    private static final double PRESSURE_PA = 101_085;

    private static Enclosure room(double leaks, double freshM3H, double peopleHours, Door door) {
        return new Enclosure(
                BOX,
                Chambers.faces(new Beyond.Shade(), new Beyond.Shade(), List.of(Chambers.FOAM)),
                0,
                Optional.ofNullable(door),
                leaks,
                freshM3H,
                new Gains(0, 0, peopleHours, 0),
                0,
                false);
    }

    private static Door door(double openings) {
        return new Door(
                0.8,
                2,
                openings,
                40,
                LocalTime.of(7, 0),
                LocalTime.of(19, 0),
                0.5,
                "none",
                new Beyond.Outdoors());
    }

    private static Course run(Enclosure room, double kg, double days) {
        return HeatModel.run(planned(room, kg, days), Progress.SILENT);
    }

    private static ChamberRun planned(Enclosure room, double kg, double days) {
        ChamberRun run = Chambers.passive(room, Weather.steady(20, 60), days);
        return kg > 0 ? run.withStays(Chambers.load(1, kg, 20)) : run;
    }

    private static double last(Course course) {
        return course.hours().co2Ppm(course.hours().size() - 1);
    }

    private static double m3PerKg(double airC) {
        return 188.92 * (airC + 273.15) / PRESSURE_PA;
    }

    @Test
    void settlesWhereBreathingLeakageAndFreshAirBalance() {
        Course course = run(room(4, 6, 0, null), 200, 10);
        int end = course.hours().size() - 1;
        double sourceKgS = course.hours().respirationW(end) / 10.7e6;
        double free = course.hours().freeM3(end);
        double sourcePpmH = 1e6 * sourceKgS * 3_600 * m3PerKg(course.hours().airC(end)) / free;
        // Leakage counts the gross volume, fresh air its own; both pass the free one.
        double changesH = (4 * BOX.volumeM3() / 24 + 6) / free;
        double settles = new GasLevel(sourcePpmH, changesH, 420).restsAtPpm();
        assertEquals(settles, last(course), 0.005 * settles);
        assertTrue(settles > 600, "settles at " + settles);
    }

    @Test
    @Source("ASHRAE 62.1, appendix on indoor air: 0.0052 L/s an adult at 1.2 met, from memory")
    void anAdultAtRestBreathesOutThePublishedRate() {
        double wattsAtOnePointTwoMet = 1.2 * 58.2 * 1.8;
        double litresS = wattsAtOnePointTwoMet * PeopleHeat.CO2_KG_PER_J / 1.977 * 1_000;
        assertEquals(0.0052, litresS, 0.0001);
    }

    @Test
    void whatPeopleBreatheOutInAShutRoomStaysThere() {
        Course course = run(room(0, 0, 6, null), 0, 1);
        double kg = course.heat().people() * PeopleHeat.CO2_KG_PER_J;
        double rise = 1e6 * kg * m3PerKg(20) / BOX.volumeM3();
        assertEquals(rise, last(course) - 420, 0.02 * rise);
        // Six hours of one person at about 150 W: some 130 litres into 30 m3.
        assertTrue(rise > 3_000 && rise < 7_000, "rise " + rise);
        assertEquals(0, course.counts().co2AtFirstOpeningPpm());
    }

    @Test
    void pulsesAndTheAverageOfADoorCarryLikeAmountsOfGas() {
        ChamberRun pulses = planned(room(0.5, 0, 0, door(12)), 300, 8);
        Course each = HeatModel.run(pulses, Progress.SILENT);
        Course averaged =
                HeatModel.run(
                        pulses.withDoorMode(DoorMode.AVERAGED)
                                .withControlMode(ControlMode.MODULATING),
                        Progress.SILENT);
        assertEquals(meanOfLastDays(each), meanOfLastDays(averaged), 0.1 * meanOfLastDays(each));
        assertTrue(each.counts().co2AtFirstOpeningPpm() > meanOfLastDays(each));
        assertTrue(each.counts().co2HighestPpm() >= each.counts().co2AtFirstOpeningPpm());
    }

    private static double meanOfLastDays(Course course) {
        int n = course.hours().size();
        double sum = 0;
        for (int i = n - 72; i < n; i++) {
            sum += course.hours().co2Ppm(i);
        }
        return sum / 72;
    }
}

package org.wardon.heat;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.EnumSource;
import org.wardon.air.Sunshine;
import org.wardon.cooling.Control;
import org.wardon.cooling.Cooler;
import org.wardon.cooling.Outage;
import org.wardon.cooling.solar.PanelPower;
import org.wardon.cooling.solar.SolarSupply;
import org.wardon.enclosure.Beyond;
import org.wardon.enclosure.Box;
import org.wardon.enclosure.Enclosure;
import org.wardon.enclosure.Gains;
import org.wardon.errors.Progress;

/** A chamber fed by panels and a battery. */
class SolarRunTest {
    private static SolarSupply supply(double panelWp, double kWh, double startPct) {
        return new SolarSupply(
                panelWp,
                12,
                180,
                0.8,
                new SolarSupply.Cells(kWh, 0.9, startPct, 20),
                OptionalDouble.empty());
    }

    private static ChamberRun on(ChamberRun run, SolarSupply supply) {
        return run.withExtras(new ChamberRun.Extras(0, 0, Map.of(), Optional.of(supply)));
    }

    private static Course run(ChamberRun run) {
        return HeatModel.run(run, Progress.SILENT);
    }

    private static List<CourseEvent> empties(Course course) {
        return course.events().stream()
                .filter(event -> event.kind() == CourseEvent.Kind.BATTERY_EMPTY)
                .toList();
    }

    private static ChamberRun fansOnly(double fansW, double days) {
        Enclosure shut =
                new Enclosure(
                        new Box(4, 3, 2.5),
                        Chambers.faces(
                                new Beyond.Shade(), new Beyond.Shade(), List.of(Chambers.FOAM)),
                        0,
                        Optional.empty(),
                        2,
                        0,
                        new Gains(0, 0, 0, fansW),
                        0,
                        false);
        return Chambers.passive(shut, Chambers.weather((int) (24 * days) + 3), days)
                .withStart(Start.at(25, 60));
    }

    @Test
    void anEvenDrawEmptiesTheBatteryWhenTheSumOnPaperSays() {
        // From midnight, no sun: half of 1 kWh, 0.9 half on the way out, 200 W.
        double paperS = 0.5 * 3.6e6 * Math.sqrt(0.9) / 200;
        Course course = run(on(fansOnly(200, 1), supply(400, 1, 50)));
        CourseEvent first = empties(course).get(0);
        assertEquals(paperS, first.fromS(), 36 / 200.0 + 1e-6, "a hundredth of a watt-hour late");
        // Then everything rests until a fifth of the capacity has come in by the sun.
        ChamberRun asRun = fansOnly(200, 1);
        Sunshine sun = Sunshine.of(asRun.site(), asRun.timeline(), asRun.weather(), 25);
        double[] watts = PanelPower.hourlyW(supply(400, 1, 50), sun, asRun.weather(), 25);
        double in = 0;
        double atS = paperS;
        for (double step = 1; in < 0.2 * 3.6e6 / Math.sqrt(0.9); atS += step) {
            int h = (int) (atS / 3600);
            in += watts[h] + (atS / 3600 - h) * (watts[h + 1] - watts[h]);
        }
        assertEquals(atS, first.untilS(), 2, "summed by the second");
    }

    @ParameterizedTest
    @CsvSource({"ON_OFF,1", "MODULATING,1", "ON_OFF,2", "MODULATING,2"})
    void whatThePanelsGaveIsUsedLostSpilledOrStored(Control control, int coolers) {
        List<Cooler> units = List.copyOf(java.util.Collections.nCopies(coolers, unit(control)));
        Course course =
                run(on(Chambers.full(control, 3, 4).withCoolers(units), supply(9_000, 6, 50)));
        SolarLedger solar = course.solar().orElseThrow();
        assertTrue(solar.errorShare() < 1e-9, "error " + solar.errorShare());
        assertTrue(course.balanceErrorPct() < 1e-6, course.balanceErrorPct() + " %");
        assertEquals(course.heat().electricity(), solar.usedJ(), 1e-9 * solar.usedJ());
        assertTrue(solar.spilledJ() > 0 && solar.lostJ() > 0 && solar.withoutS() > 0);
        assertEquals(0, solar.lowestShare());
        assertEquals(course.heat().electricity(), sum(course.hours()), 1e-6 * solar.usedJ());
    }

    private static Cooler unit(Control control) {
        return Chambers.unit(control, 2);
    }

    private static double sum(Hours hours) {
        double joules = 0;
        for (int i = 0; i < hours.size(); i++) {
            joules += hours.powerW(i) * (hours.atS(i) - (i == 0 ? 0 : hours.atS(i - 1)));
        }
        return joules;
    }

    @Test
    void nothingRunsWhileTheBatteryIsEmptyAndTheAirWarms() {
        Course course = run(on(Chambers.full(Control.ON_OFF, 3, 4), supply(9_000, 6, 50)));
        int checked = 0;
        for (CourseEvent event : empties(course)) {
            Hours hours = course.hours();
            for (int i = 1; i < hours.size(); i++) {
                if (hours.atS(i - 1) >= event.fromS() && hours.atS(i) <= event.untilS()) {
                    assertEquals(0, hours.powerW(i), 1e-9, "hour " + i);
                    assertEquals(0, hours.coolingW(i), 1e-9, "hour " + i);
                    checked++;
                }
            }
        }
        assertTrue(checked > 5, checked + " whole hours without power");
    }

    @Test
    void aLargerBatteryCarriesTheChamberThroughTheNight() {
        ChamberRun run = Chambers.full(Control.ON_OFF, 3, 4);
        Course small = run(on(run, supply(25_000, 6, 50)));
        Course large = run(on(run, supply(25_000, 120, 50)));
        Course grid = run(run);
        assertTrue(small.solar().orElseThrow().withoutS() > 0);
        assertEquals(List.of(), empties(large));
        assertTrue(large.solar().orElseThrow().lowestShare() > 0);
        // Fed without a break, the chamber is the one on the grid, its thermostat within 0.01 K.
        for (int i = 0; i < grid.hours().size(); i++) {
            assertEquals(grid.hours().airC(i), large.hours().airC(i), 0.02, "hour " + i);
        }
        double gridJ = grid.heat().electricity();
        assertEquals(gridJ, large.solar().orElseThrow().usedJ(), 1e-3 * gridJ);
    }

    @ParameterizedTest
    @EnumSource(names = {"AVERAGED", "SKETCHED"})
    void drawsWithAnAveragedDoorRunOnItToo(DoorMode door) {
        ChamberRun drawn =
                Chambers.full(Control.ON_OFF, 3, 4)
                        .withDoorMode(door)
                        .withControlMode(ControlMode.MODULATING);
        Course course = run(on(drawn, supply(9_000, 6, 50)));
        assertTrue(course.solar().orElseThrow().errorShare() < 1e-9);
        assertTrue(course.solar().orElseThrow().withoutS() > 3_600);
        Course pulses = run(on(Chambers.full(Control.ON_OFF, 3, 4), supply(9_000, 6, 50)));
        double hours = pulses.solar().orElseThrow().withoutS() / 3_600;
        assertEquals(hours, course.solar().orElseThrow().withoutS() / 3_600, 0.15 * hours);
    }

    @Test
    void anOutageStopsTheChamberWhileThePanelsGoOnCharging() {
        ChamberRun run =
                Chambers.full(Control.ON_OFF, 2, 2)
                        .withOutages(List.of(new Outage(9 * 3600, 15 * 3600)));
        Course course = run(on(run, supply(20_000, 60, 60)));
        for (int i = 9; i < 15; i++) {
            assertEquals(0, course.hours().powerW(i), 1e-9);
        }
        assertTrue(course.hours().batteryShare(14) > course.hours().batteryShare(8) + 0.2);
        assertTrue(course.solar().orElseThrow().errorShare() < 1e-9);
    }

    @Test
    void theIdealLoadKnowsNoBattery() {
        ChamberRun run = Chambers.full(Control.ON_OFF, 2, 2).withControlMode(ControlMode.IDEAL);
        Course course = run(on(run, supply(100, 0.1, 0)));
        assertEquals(Optional.empty(), course.solar());
        assertEquals(4, course.hours().airC(30), 0.3);
    }

    @Test
    void aCoolerBeyondTheInverterStaysOff() {
        Cooler unit = Chambers.unit(Control.ON_OFF, 2);
        ChamberRun run = Chambers.full(Control.ON_OFF, 3, 2).withCoolers(List.of(unit, unit));
        SolarSupply plenty = supply(60_000, 200, 80);
        SolarSupply one =
                new SolarSupply(
                        60_000,
                        12,
                        180,
                        0.8,
                        plenty.battery(),
                        OptionalDouble.of(1.2 * unit.mostElectricW()));
        assertTrue(run(on(run, plenty)).coolers().get(1).ranS() > 0);
        assertEquals(0, run(on(run, one)).coolers().get(1).ranS());
        assertTrue(run(on(run, one)).coolers().get(0).ranS() > 0);
    }

    @Test
    void theDailyEnergyOfAUnitStillEndsItsDay() {
        ChamberRun plain = Chambers.full(Control.ON_OFF, 3, 3);
        Cooler unlimited = plain.coolers().get(0);
        double aDayJ = run(plain).heat().electricity() / 3;
        Cooler limited = Chambers.limited(Control.ON_OFF, 0.3 * aDayJ / 3.6e6);
        Course course = run(plain.withCoolers(List.of(limited)));
        CourseEvent used =
                course.events().stream()
                        .filter(e -> e.kind() == CourseEvent.Kind.ENERGY_USED_UP)
                        .findFirst()
                        .orElseThrow();
        assertEquals(86_400, used.untilS(), 1e-6, "until midnight");
        assertEquals(unlimited.mostElectricW(), limited.mostElectricW());
        assertTrue(course.coolers().get(0).electricityJ() < 3 * 0.32 * aDayJ);
    }
}

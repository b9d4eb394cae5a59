package org.wardon.heat;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import com.sun.management.ThreadMXBean;
import java.lang.management.ManagementFactory;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.wardon.air.Weather;
import org.wardon.cooling.Control;
import org.wardon.cooling.Outage;
import org.wardon.errors.Progress;
import org.wardon.errors.RunStopped;
import org.wardon.heat.network.ChamberNetwork;
import org.wardon.heat.solver.Integrator;

/** A chamber with its cooler: thermostat, outage, ideal load, gases, door ways, allocation. */
class CooledChamberTest {
    private static Course run(ChamberRun run) {
        return HeatModel.run(run, Progress.SILENT);
    }

    @Test
    void thermostatKeepsTheBandOnceTheLoadIsCold() {
        Course course =
                run(
                        Chambers.full(Control.ON_OFF, 4, 5)
                                .withCoolers(List.of(Chambers.unit(Control.ON_OFF, 0))));
        assertTrue(course.counts().thermostatSwitches() > 50);
        for (int i = 96; i < 102; i++) {
            // Night hours: the door is shut. A switching may be 0.01 K late.
            assertTrue(course.hours().airHighestC(i) <= 5.011, "at most");
            assertTrue(course.hours().airLowestC(i) >= 2.989, "at least");
        }
        assertTrue(course.balanceErrorPct() < 1e-6, course.balanceErrorPct() + " %");
    }

    @Test
    void theThermostatOffsetShiftsTheAir() {
        ChamberRun plain = Chambers.full(Control.MODULATING, 2, 3);
        ChamberRun reading = plain.withFactors(new Factors(1, 1, 1, 1, 1, 1, 2));
        int end = 72 - 1;
        double difference = run(plain).hours().airC(end) - run(reading).hours().airC(end);
        assertEquals(2, difference, 0.25);
    }

    @Test
    void anOutageLetsTheAirRiseAndIsTold() {
        ChamberRun run =
                Chambers.full(Control.ON_OFF, 3, 4)
                        .withOutages(List.of(new Outage(3 * 86_400, 3 * 86_400 + 6 * 3600)));
        Course course = run(run);
        assertTrue(
                course.hours().airC(72 + 5) > course.hours().airC(71) + 1,
                course.hours().airC(71) + " to " + course.hours().airC(77));
        assertEquals(0, course.hours().coolingW(72 + 3), 1e-9);
        assertEquals(0, course.hours().powerW(72 + 3), 1e-9);
        CourseEvent outage =
                course.events().stream()
                        .filter(e -> e.kind() == CourseEvent.Kind.OUTAGE)
                        .findFirst()
                        .orElseThrow();
        assertEquals(6 * 3600, outage.untilS() - outage.fromS(), 1e-6);
        assertTrue(course.balanceErrorPct() < 1e-6, course.balanceErrorPct() + " %");
    }

    @Test
    void theIdealCoolerHoldsTheSettingAndItsPeakIsAboveWhatASmallUnitRemoves() {
        ChamberRun run = Chambers.full(Control.MODULATING, 4, 3);
        Course ideal = run(run.withControlMode(ControlMode.IDEAL));
        for (int i = 0; i < ideal.hours().size(); i++) {
            assertEquals(4, ideal.hours().airHighestC(i), 0.3);
        }
        double peak = 0;
        double removed = 0;
        Course real = run(run.withFactors(new Factors(1, 1, 0.4, 1, 1, 1, 0)));
        for (int i = 0; i < real.hours().size(); i++) {
            peak = Math.max(peak, ideal.hours().coolingW(i));
            removed = Math.max(removed, real.hours().coolingW(i));
        }
        assertTrue(peak > 1.2 * removed, "peak " + peak + ", removed " + removed);
        assertTrue(ideal.balanceErrorPct() < 1e-6, ideal.balanceErrorPct() + " %");
    }

    @Test
    void pulsesAndTheAverageExchangeLikeAmounts() {
        ChamberRun pulses = Chambers.full(Control.MODULATING, 4, 6);
        Course each = run(pulses);
        Course averaged =
                run(pulses.withDoorMode(DoorMode.AVERAGED).withControlMode(ControlMode.MODULATING));
        assertEquals(120, each.counts().doorOpenings());
        assertEquals(each.heat().door(), averaged.heat().door(), 0.12 * each.heat().door());
        for (int i = 0; i < 4; i++) {
            LotCourse a = each.lots().get(i);
            LotCourse b = averaged.lots().get(i);
            assertEquals(a.meanC(a.size() - 1), b.meanC(b.size() - 1), 0.1);
        }
        assertTrue(averaged.counts().steps() < each.counts().steps() / 5);
    }

    @Test
    void anImpossibleStateStopsTheRunWithTimeAndChamber() {
        // A tonne that sets free fifty watts a kilogram in a small shut box of foam.
        var lot = Chambers.lot("hot", 1_000, 0.03, 4);
        var fire =
                new org.wardon.lots.Lot(
                        "hot",
                        1_000,
                        lot.item(),
                        lot.packing(),
                        Chambers.breath(50, 0),
                        lot.transpiration());
        ChamberRun run =
                Chambers.passive(Chambers.shut(List.of(Chambers.FOAM)), Weather.steady(25, 60), 3)
                        .withStays(List.of(new Stay(fire, 0, Double.POSITIVE_INFINITY, 25)));
        RunStopped stopped = assertThrows(RunStopped.class, () -> run(run));
        assertEquals("north", stopped.chamber());
        assertTrue(stopped.timeS() > 0 && stopped.timeS() < 86_400, stopped.getMessage());
    }

    @Test
    void stepsAllocateNothing() {
        ChamberRun run = Chambers.full(Control.MODULATING, 12, 1);
        ChamberNetwork network = RunCompiler.network(run, false);
        double[] y = network.start(RunCompiler.startC(run), RunCompiler.startRatio(run, network));
        for (int i = 0; i < 12; i++) {
            network.lot(i).arrive(22, 0, network.ratio(y), y);
        }
        network.accuracy(1e-6, 1e-5);
        Integrator integrator = new Integrator(network, 1, 1, 1e-6);
        SwitchedCoolers thermostats = new SwitchedCoolers(network);
        Integrator.StepListener deaf = (from, to, state) -> {};
        double t = integrator.advance(0, y, 600, thermostats, deaf);
        ThreadMXBean threads = (ThreadMXBean) ManagementFactory.getThreadMXBean();
        long id = Thread.currentThread().getId();
        long before = threads.getThreadAllocatedBytes(id);
        long steps = integrator.steps();
        integrator.advance(t, y, 3_600, thermostats, deaf);
        long allocated = threads.getThreadAllocatedBytes(id) - before;
        assertTrue(integrator.steps() - steps > 50);
        assertTrue(allocated < 512, "allocated " + allocated + " bytes");
    }
}

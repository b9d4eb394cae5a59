package org.wardon.heat;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.List;
import org.apache.commons.math3.ode.FirstOrderDifferentialEquations;
import org.apache.commons.math3.ode.nonstiff.DormandPrince853Integrator;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;
import org.wardon.cooling.Control;
import org.wardon.errors.Progress;
import org.wardon.heat.network.ChamberNetwork;

/**
 * A full chamber (12 lots, sun, door pulses, people, modulating compressor) against an explicit
 * integrator of Commons Math at tight tolerance on the laws asked directly.
 */
class ReferenceIntegratorTest {
    private static final double DAYS = 1;
    private static final ChamberRun RUN = Chambers.full(Control.MODULATING, 12, DAYS);
    private static final List<double[]> REFERENCE = new ArrayList<>();
    private static final List<Double> AIR_MEAN = new ArrayList<>();

    /** Integrates edge by edge; keeps surface and core of each lot and the mean air, hourly. */
    @BeforeAll
    static void integrateReference() {
        ChamberNetwork network = RunCompiler.network(RUN, true);
        double[] y = network.start(RunCompiler.startC(RUN), RunCompiler.startRatio(RUN, network));
        List<Edge> edges = Schedule.of(RUN);
        double t = 0;
        int next = 0;
        double[] carried = new double[y.length + 1];
        for (int hour = 0; hour < 24 * DAYS; hour++) {
            network.hour(hour);
            double end = (hour + 1) * 3600.0;
            double airBefore = carried[y.length];
            while (t < end) {
                while (next < edges.size() && edges.get(next).atS() <= t) {
                    pass(edges.get(next++), network, y);
                }
                double edge = next < edges.size() ? edges.get(next).atS() : end;
                double until = Math.min(edge, end);
                System.arraycopy(y, 0, carried, 0, y.length);
                explicit(network, t, carried, until);
                System.arraycopy(carried, 0, y, 0, y.length);
                t = until;
            }
            AIR_MEAN.add((carried[y.length] - airBefore) / 3600);
            double[] lots = new double[2 * RUN.stays().size()];
            for (int i = 0; i < RUN.stays().size(); i++) {
                lots[2 * i] = network.lot(i).surfaceC(y);
                lots[2 * i + 1] = network.lot(i).coreC(y);
            }
            REFERENCE.add(lots);
        }
    }

    private static void pass(Edge edge, ChamberNetwork network, double[] y) {
        switch (edge.kind()) {
            case DOOR_OPENS -> network.door(1);
            case DOOR_SHUTS -> network.door(0);
            case LIGHTS_ON -> network.light(1);
            case LIGHTS_OFF -> network.light(0);
            case USE_STARTS -> network.people(2.0 / 12);
            case USE_ENDS -> network.people(0);
            case ARRIVES -> {
                network.lot(edge.index())
                        .arrive(RUN.stays().get(edge.index()).pulpC(), 0, network.ratio(y), y);
                double free = network.freeM3();
                var lot = RUN.stays().get(edge.index()).lot();
                network.changeFreeVolume(free - 1.05 * lot.massKg() / lot.item().densityKgM3(), y);
            }
            default -> {}
        }
    }

    private static void explicit(ChamberNetwork network, double t, double[] y, double until) {
        double[] flows = new double[network.flows()];
        int n = y.length - 1;
        double[] state = new double[n];
        double[] f = new double[n];
        new DormandPrince853Integrator(1e-6, 600, 1e-7, 1e-9)
                .integrate(
                        new FirstOrderDifferentialEquations() {
                            @Override
                            public int getDimension() {
                                return n + 1;
                            }

                            @Override
                            public void computeDerivatives(double at, double[] x, double[] out) {
                                System.arraycopy(x, 0, state, 0, n);
                                network.rates(at, state, f, flows);
                                System.arraycopy(f, 0, out, 0, n);
                                out[n] = network.airC(state);
                            }
                        },
                        t,
                        y,
                        until,
                        y);
    }

    private static double worstLotK(Course course) {
        double worst = 0;
        for (int hour = 0; hour < REFERENCE.size(); hour++) {
            for (int i = 0; i < RUN.stays().size(); i++) {
                LotCourse lot = course.lots().get(i);
                int row = hour + 1;
                assertEquals((hour + 1) * 3600.0, lot.atS(row), 1e-9);
                double[] exact = REFERENCE.get(hour);
                worst = Math.max(worst, Math.abs(lot.surfaceC(row) - exact[2 * i]));
                worst = Math.max(worst, Math.abs(lot.coreC(row) - exact[2 * i + 1]));
            }
        }
        return worst;
    }

    private static double worstAirK(Course course) {
        double worst = 0;
        for (int hour = 0; hour < AIR_MEAN.size(); hour++) {
            worst = Math.max(worst, Math.abs(course.hours().airC(hour) - AIR_MEAN.get(hour)));
        }
        return worst;
    }

    @Test
    void agreesToFiveThousandthsOfAKelvin() {
        Course course = HeatModel.run(RUN, Progress.SILENT, new Accuracy(2e-4, 1e-3), false);
        assertTrue(worstLotK(course) < 0.005, "lots " + worstLotK(course) + " K");
        assertTrue(worstAirK(course) < 0.005, "air " + worstAirK(course) + " K");
    }

    @Test
    void theUsualAccuracyKeepsLotsWithinTwoHundredths() {
        Course course = HeatModel.run(RUN, Progress.SILENT);
        assertTrue(worstLotK(course) < 0.02, "lots " + worstLotK(course) + " K");
        assertTrue(worstAirK(course) < 0.06, "air " + worstAirK(course) + " K");
    }

    @Test
    void errorFallsWithTheTolerance() {
        double last = Double.POSITIVE_INFINITY;
        for (double airK : new double[] {0.1, 0.01, 0.001}) {
            Course course = HeatModel.run(RUN, Progress.SILENT, new Accuracy(airK / 5, airK), true);
            double worst = worstLotK(course) + worstAirK(course);
            assertTrue(worst < last / 2, "at " + airK + ": " + worst + " after " + last);
            last = worst;
        }
    }
}

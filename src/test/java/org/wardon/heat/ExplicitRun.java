package org.wardon.heat;

import java.util.List;
import org.apache.commons.math3.ode.FirstOrderDifferentialEquations;
import org.apache.commons.math3.ode.nonstiff.DormandPrince853Integrator;
import org.wardon.heat.network.ChamberNetwork;

/**
 * A chamber of {@link Chambers} run edge by edge by an explicit integrator of Commons Math, Dormand
 * and Prince of order 8: the reference of the solver, and what it is faster than.
 */
final class ExplicitRun {
    private final ChamberRun run;
    private final ChamberNetwork network;
    private final Tolerance tolerance;

    /** Error allowed a step: absolute, in the unit of each unknown, and as a share of it. */
    record Tolerance(double absolute, double relative) {}

    /** Hears of each hour: the state at its end and the mean air in it, °C. */
    interface Hourly {
        void hour(ChamberNetwork network, double[] y, double meanAirC);
    }

    ExplicitRun(ChamberRun run, boolean plain, Tolerance tolerance) {
        this.run = run;
        this.network = RunCompiler.network(run, plain);
        this.tolerance = tolerance;
    }

    void go(Hourly hourly) {
        double[] y = network.start(RunCompiler.startC(run), RunCompiler.startRatio(run, network));
        List<Edge> edges = Schedule.of(run);
        double t = 0;
        int next = 0;
        double[] carried = new double[y.length + 1];
        for (int hour = 0; hour < run.durationS() / 3_600; hour++) {
            network.hour(hour);
            double end = (hour + 1) * 3600.0;
            double airBefore = carried[y.length];
            while (t < end) {
                while (next < edges.size() && edges.get(next).atS() <= t) {
                    pass(edges.get(next++), y);
                }
                double edge = next < edges.size() ? edges.get(next).atS() : end;
                double until = Math.min(edge, end);
                System.arraycopy(y, 0, carried, 0, y.length);
                explicit(t, carried, until);
                System.arraycopy(carried, 0, y, 0, y.length);
                t = until;
            }
            hourly.hour(network, y, (carried[y.length] - airBefore) / 3600);
        }
    }

    private void pass(Edge edge, double[] y) {
        switch (edge.kind()) {
            case DOOR_OPENS -> network.door(1);
            case DOOR_SHUTS -> network.door(0);
            case LIGHTS_ON -> network.light(1);
            case LIGHTS_OFF -> network.light(0);
            case USE_STARTS -> network.people(2.0 / 12);
            case USE_ENDS -> network.people(0);
            case ARRIVES -> {
                Stay stay = run.stays().get(edge.index());
                network.lot(edge.index()).arrive(stay.pulpC(), 0, network.ratio(y), y);
                double free = network.freeM3();
                double takes = 1.05 * stay.lot().massKg() / stay.lot().item().densityKgM3();
                network.changeFreeVolume(free - takes, y);
            }
            default -> {}
        }
    }

    private void explicit(double t, double[] y, double until) {
        double[] flows = new double[network.flows()];
        int n = y.length - 1;
        double[] state = new double[n];
        double[] f = new double[n];
        new DormandPrince853Integrator(1e-6, 600, tolerance.absolute(), tolerance.relative())
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
}

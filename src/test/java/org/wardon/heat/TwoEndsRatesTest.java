package org.wardon.heat;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.SplittableRandom;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import org.wardon.air.MoistAir;
import org.wardon.cooling.Control;
import org.wardon.enclosure.AirZones;
import org.wardon.enclosure.FaceName;
import org.wardon.heat.network.ChamberNetwork;
import org.wardon.heat.solver.DenseJacobian;
import org.wardon.heat.solver.TreeSystem;

/**
 * A network of two ends at random states: its derivatives against differences, and what one end
 * feels of the other. With an exchange given, in m3/s, or below 0 with fans and natural convection.
 */
class TwoEndsRatesTest {
    private final SplittableRandom random = new SplittableRandom(11);

    private static ChamberRun run(double exchangeM3S) {
        OptionalDouble given =
                exchangeM3S < 0 ? OptionalDouble.empty() : OptionalDouble.of(exchangeM3S);
        ChamberRun run = Chambers.full(Control.MODULATING, 4, 1);
        List<Stay> stays = new ArrayList<>();
        for (int i = 0; i < 4; i++) {
            Berth.Spot spot = Berth.Spot.values()[i % 3];
            Stay stay = run.stays().get(i);
            stays.add(
                    new Stay(
                            stay.lot(),
                            0,
                            Double.POSITIVE_INFINITY,
                            stay.pulpC(),
                            Double.NEGATIVE_INFINITY,
                            0,
                            Berth.DOOR.at(spot)));
        }
        return run.withStays(stays)
                .withEnclosure(
                        run.enclosure()
                                .withZones(Optional.of(new AirZones(FaceName.WEST, 0.4, given))));
    }

    private static ChamberNetwork network(double exchangeM3S) {
        ChamberNetwork network = RunCompiler.network(run(exchangeM3S), true);
        network.door(1);
        network.people(1.5);
        network.light(1);
        return network;
    }

    private double[] randomState(ChamberNetwork network) {
        double[] y = network.start(random.nextDouble(2, 8), 0.005);
        double pressure = RunCompiler.pressurePa(run(0));
        for (int node = 0; node < 4; node += 2) {
            double airC = random.nextDouble(2, 8) + 2 * node;
            double saturated = MoistAir.saturatedHumidityRatio(airC, pressure);
            double ratio = random.nextDouble(0.3, 1.05) * saturated;
            y[node] = MoistAir.enthalpyJkg(airC, ratio);
            y[node + 1] = ratio;
        }
        for (int i = 0; i < 4; i++) {
            network.lot(i).arrive(random.nextDouble(0, 35), random.nextDouble(0, 2), 0.004, y);
        }
        for (int i = 4; i < y.length; i++) {
            y[i] *= random.nextDouble(0.97, 1.03);
        }
        return y;
    }

    private static double[] rates(ChamberNetwork network, double t, double[] y, double[] flows) {
        double[] f = new double[y.length];
        network.rates(t, y, f, flows);
        return f;
    }

    @ParameterizedTest
    @ValueSource(doubles = {-1, 0, 0.8})
    void jacobianEqualsDifferences(double exchangeM3S) {
        ChamberNetwork network = network(exchangeM3S);
        int size = network.tree().size();
        double[] none = new double[network.flows()];
        for (int k = 0; k < 20; k++) {
            double[] y = randomState(network);
            TreeSystem.Change now = new TreeSystem.Change(size, network.flows());
            network.linearise(1800, y, now, new TreeSystem.Change(size, network.flows()));
            double[][] j = DenseJacobian.of(network.tree());
            for (int c = 0; c < size; c++) {
                double step = 1e-6 * Math.max(Math.abs(y[c]), 1e-2);
                double[] up = y.clone();
                double[] down = y.clone();
                up[c] += step;
                down[c] -= step;
                double[] fUp = rates(network, 1800, up, none);
                double[] fDown = rates(network, 1800, down, none);
                for (int r = 0; r < size; r++) {
                    double scale = Math.abs(j[r][r]) + Math.abs(j[r][c]);
                    double allowed = 2e-4 * scale + 1e-9 * Math.abs(fUp[r]) / step;
                    double difference = (fUp[r] - fDown[r]) / (2 * step);
                    assertEquals(difference, j[r][c], allowed, "state " + k + " " + r + " by " + c);
                }
            }
        }
    }

    @ParameterizedTest
    @ValueSource(doubles = {-1, 0.8})
    void flowsAlongADirectionAndInTimeEqualDifferences(double exchangeM3S) {
        ChamberNetwork network = network(exchangeM3S);
        int size = network.tree().size();
        double[] along = new double[network.flows()];
        double[] up = new double[network.flows()];
        double[] down = new double[network.flows()];
        for (int k = 0; k < 40; k++) {
            double[] y = randomState(network);
            TreeSystem.Change slope = new TreeSystem.Change(size, network.flows());
            network.linearise(1800, y, new TreeSystem.Change(size, network.flows()), slope);
            double[] plus = y.clone();
            double[] minus = y.clone();
            double[] v = new double[size];
            for (int i = 0; i < size; i++) {
                v[i] = 1e-5 * Math.abs(y[i]) * random.nextDouble(-1, 1);
                plus[i] += v[i];
                minus[i] -= v[i];
            }
            network.flowsAlong(v, along);
            rates(network, 1800, plus, up);
            rates(network, 1800, minus, down);
            for (int i = 0; i < along.length; i++) {
                double difference = 0.5 * (up[i] - down[i]);
                double scale = Math.abs(difference) + 1e-6 * Math.abs(up[i]);
                assertEquals(difference, along[i], 1e-3 * scale + 1e-12, "flow " + i);
            }
            double[] later = rates(network, 1830, y, up);
            double[] before = rates(network, 1770, y, down);
            for (int i = 0; i < size; i++) {
                double difference = (later[i] - before[i]) / 60;
                double allowed = 2e-3 * Math.abs(difference) + 1e-9;
                assertEquals(difference, slope.rates()[i], allowed, "node " + i);
            }
            for (int i = 0; i < along.length; i++) {
                double difference = (up[i] - down[i]) / 60;
                double allowed = 2e-3 * Math.abs(difference) + 1e-7;
                assertEquals(difference, slope.flows()[i], allowed, "flow " + i);
            }
        }
    }

    @ParameterizedTest
    @ValueSource(doubles = {-1, 0, 0.8})
    void oneEndFeelsTheOtherByTheirExchangeAlone(double exchangeM3S) {
        ChamberNetwork network = network(exchangeM3S);
        double[] flows = new double[network.flows()];
        for (int k = 0; k < 50; k++) {
            double[] y = randomState(network);
            double[] f = rates(network, 1800, y, flows);
            double[] other = y.clone();
            other[2] += 500;
            other[3] += 1e-4;
            double[] changed = flows.clone();
            double[] g = rates(network, 1800, other, changed);
            double kg = 0.6 * network.airKg();
            double heat = network.terms().mixed(changed) - network.terms().mixed(flows);
            double vapour =
                    network.terms().mixedVapour(changed) - network.terms().mixedVapour(flows);
            double scale = 1e-11 * (1 + Math.abs(f[0]));
            assertEquals(heat / kg, g[0] - f[0], scale, "enthalpy of the coil end");
            assertEquals(vapour / kg, g[1] - f[1], 1e-11, "vapour of the coil end");
            assertEquals(exchangeM3S == 0, heat == 0, "heat between the ends");
        }
    }
}

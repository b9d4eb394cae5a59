package org.wardon.heat;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.SplittableRandom;
import java.util.TreeMap;
import java.util.stream.Stream;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import org.wardon.air.MoistAir;
import org.wardon.cooling.Control;
import org.wardon.cooling.Cooler;
import org.wardon.cooling.WaterFilm;
import org.wardon.enclosure.Beyond;
import org.wardon.heat.network.ChamberNetwork;
import org.wardon.heat.solver.DenseJacobian;
import org.wardon.heat.solver.TreeSystem;

/** Faces under water and walls kept wet: Jacobian, slopes and flows against differences. */
class WaterRatesTest {
    private static final Map<String, ChamberRun> RUNS = runs();

    private static Map<String, ChamberRun> runs() {
        Map<String, ChamberRun> runs = new TreeMap<>();
        runs.put("wetted in shade", WaterChambers.ofBrick(40, Chambers.weather(27), 1));
        runs.put("wetted in sun", sunny(WaterChambers.wetted(40)));
        WaterFilm.Chiller small = new WaterFilm.Chiller(700, 0.45, 6, 12);
        for (Control control : Control.values()) {
            for (boolean open : new boolean[] {true, false}) {
                String kind = (open ? "film " : "jacket ") + control;
                runs.put(kind, WaterChambers.ofFilm(WaterChambers.film(open, control, 0.4, 6), 1));
                runs.put(
                        kind + " by chiller",
                        WaterChambers.ofFilm(
                                WaterChambers.film(open, control, 0.4, 6, Optional.of(small)), 1));
            }
        }
        return runs;
    }

    private static ChamberRun sunny(Cooler cooler) {
        return Chambers.passive(
                        WaterChambers.brickAndSand(new Beyond.Outdoors()), Chambers.weather(27), 1)
                .withCoolers(List.of(cooler));
    }

    static Stream<String> names() {
        return RUNS.keySet().stream();
    }

    private final SplittableRandom random = new SplittableRandom(9);

    private double[] randomState(ChamberNetwork network, double pressurePa) {
        double airC = random.nextDouble(8, 25);
        double ratio =
                random.nextDouble(0.3, 0.95) * MoistAir.saturatedHumidityRatio(airC, pressurePa);
        double[] y = network.start(airC, ratio);
        for (int i = 2; i < y.length; i++) {
            y[i] = y[i] == 0 ? random.nextDouble(0, 0.4) : y[i] * random.nextDouble(0.9, 1.1);
        }
        for (int i = 0; i < network.coolerCount(); i++) {
            network.cooler(i).switchOn(random.nextInt(3) > 0);
        }
        network.settle(y);
        return y;
    }

    private static double[] rates(ChamberNetwork network, double t, double[] y, double[] flows) {
        double[] f = new double[y.length];
        network.rates(t, y, f, flows);
        return f;
    }

    private static ChamberNetwork network(String name) {
        ChamberNetwork network = RunCompiler.network(RUNS.get(name), true);
        network.hour(9);
        return network;
    }

    @ParameterizedTest
    @MethodSource("names")
    void jacobianEqualsDifferences(String name) {
        ChamberNetwork network = network(name);
        double t = 9 * 3_600 + 1_800;
        int size = network.tree().size();
        double[] none = new double[network.flows()];
        int compared = 0;
        for (int k = 0; k < 40; k++) {
            double[] y = randomState(network, RunCompiler.pressurePa(RUNS.get(name)));
            network.linearise(
                    t,
                    y,
                    new TreeSystem.Change(size, network.flows()),
                    new TreeSystem.Change(size, network.flows()));
            double[][] j = DenseJacobian.of(network.tree());
            for (int c = 0; c < size; c++) {
                double step = 1e-6 * Math.max(Math.abs(y[c]), 1e-2);
                double[] up = y.clone();
                double[] down = y.clone();
                up[c] += step;
                down[c] -= step;
                double[] fUp = rates(network, t, up, none);
                double[] fDown = rates(network, t, down, none);
                for (int r = 0; r < size; r++) {
                    double difference = (fUp[r] - fDown[r]) / (2 * step);
                    double scale = Math.abs(j[r][r]) + Math.abs(j[r][c]);
                    compared += j[r][c] != 0 ? 1 : 0;
                    assertEquals(
                            difference,
                            j[r][c],
                            2e-4 * scale + 2e-9 * Math.abs(fUp[r]) / step,
                            name + " state " + k + " row " + r + " column " + c);
                }
            }
        }
        assertTrue(compared > 3_000, "entries compared: " + compared);
    }

    @ParameterizedTest
    @MethodSource("names")
    void slopesInTimeEqualDifferences(String name) {
        ChamberNetwork network = network(name);
        int size = network.tree().size();
        double t = 9 * 3_600 + 1_800;
        for (int k = 0; k < 20; k++) {
            double[] y = randomState(network, RunCompiler.pressurePa(RUNS.get(name)));
            double[] slope = new double[size];
            double[] flowSlope = new double[network.flows()];
            double[] flowsUp = new double[network.flows()];
            double[] flowsDown = new double[network.flows()];
            network.linearise(
                    t,
                    y,
                    new TreeSystem.Change(size, network.flows()),
                    new TreeSystem.Change(slope, flowSlope));
            double[] up = rates(network, t + 30, y, flowsUp);
            double[] down = rates(network, t - 30, y, flowsDown);
            for (int i = 0; i < flowSlope.length; i++) {
                double difference = (flowsUp[i] - flowsDown[i]) / 60;
                assertEquals(
                        difference, flowSlope[i], 2e-3 * Math.abs(difference) + 1e-7, "flow " + i);
            }
            for (int i = 0; i < size; i++) {
                double difference = (up[i] - down[i]) / 60;
                assertEquals(difference, slope[i], 2e-3 * Math.abs(difference) + 1e-9, "node " + i);
            }
        }
    }

    @ParameterizedTest
    @MethodSource("names")
    void flowsAlongADirectionEqualDifferences(String name) {
        ChamberNetwork network = network(name);
        int size = network.tree().size();
        double t = 9 * 3_600 + 1_800;
        for (int k = 0; k < 40; k++) {
            double[] y = randomState(network, RunCompiler.pressurePa(RUNS.get(name)));
            network.linearise(
                    t,
                    y,
                    new TreeSystem.Change(size, network.flows()),
                    new TreeSystem.Change(size, network.flows()));
            double[] v = new double[size];
            double[] plus = y.clone();
            double[] minus = y.clone();
            for (int i = 0; i < size; i++) {
                v[i] = 1e-6 * Math.abs(y[i]) * random.nextDouble(-1, 1);
                plus[i] += v[i];
                minus[i] -= v[i];
            }
            double[] along = new double[network.flows()];
            double[] up = new double[network.flows()];
            double[] down = new double[network.flows()];
            network.flowsAlong(v, along);
            rates(network, t, plus, up);
            rates(network, t, minus, down);
            for (int i = 0; i < along.length; i++) {
                double difference = 0.5 * (up[i] - down[i]);
                double scale = Math.abs(difference) + 1e-6 * Math.abs(up[i]);
                assertEquals(difference, along[i], 1e-3 * scale + 1e-11, name + " flow " + i);
            }
        }
    }
}

package org.wardon.heat;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import com.sun.management.ThreadMXBean;
import java.lang.management.ManagementFactory;
import java.time.LocalTime;
import java.util.List;
import java.util.Optional;
import java.util.SplittableRandom;
import org.junit.jupiter.api.Test;
import org.wardon.air.MoistAir;
import org.wardon.air.Weather;
import org.wardon.cooling.Compressor;
import org.wardon.cooling.Control;
import org.wardon.cooling.Cooler;
import org.wardon.cooling.CoolerEffect;
import org.wardon.cooling.EvaporativePad;
import org.wardon.cooling.IceBank;
import org.wardon.cooling.NightAir;
import org.wardon.cooling.Recharge;
import org.wardon.cooling.Setting;
import org.wardon.enclosure.Enclosure;
import org.wardon.heat.network.ChamberNetwork;
import org.wardon.heat.solver.DenseJacobian;
import org.wardon.heat.solver.Integrator;
import org.wardon.heat.solver.TreeSystem;

/**
 * A chamber with coolers of every kind that acts on its air: what the network states of them equals
 * differences, at states where thermostats and own conditions are partly fulfilled.
 */
class CoolersInNetworkTest {
    private static final double T = 1_800;

    /** The coil's balance ends within 1e-11 x (1 + T) K, times some 5 kW/K; shares bend. */
    private static final double NOISE_W_S = 3e-6;

    /** The same in W a kilogram of the chamber's air, and in kg/s on its water. */
    private static final double NOISE_W_KG = 1e-8;

    private static final double NOISE_KG_S = 1e-14;

    private final SplittableRandom random = new SplittableRandom(5);
    private final ChamberRun run = run();
    private final ChamberNetwork network = RunCompiler.network(run, true);
    private final int size = network.tree().size();

    private static List<Cooler> coolers() {
        Compressor plain = Chambers.unit(Control.MODULATING);
        Compressor airy =
                new Compressor(
                        plain.ratedCapacityW(),
                        plain.ratedPowerW(),
                        plain.ratedAirC(),
                        plain.ratedOutdoorC(),
                        plain.fanW(),
                        true,
                        plain.coilUaWK(),
                        plain.airFlowM3s(),
                        plain.control(),
                        plain.minRunMinutes(),
                        plain.minRestMinutes(),
                        plain.condenserRiseK(),
                        plain.lowestC(),
                        plain.defrost(),
                        plain.dailyEnergyKWh());
        return List.of(
                new EvaporativePad(0.15, 0.1, 80, 20, Control.MODULATING),
                new NightAir(0.15, 90, 2, 3, 30, 80, Control.MODULATING),
                airy,
                ice(),
                new EvaporativePad(0.8, 0.05, 30, 0, Control.MODULATING));
    }

    /** So little ice that a random state has it both full and at its end. */
    private static IceBank ice() {
        return new IceBank(
                1.5,
                1,
                IceBank.Material.ICE,
                30,
                20,
                Optional.of(new Recharge(500, 200, LocalTime.MIDNIGHT, LocalTime.MIDNIGHT)),
                Control.MODULATING);
    }

    private static ChamberRun run() {
        Weather weather =
                new Weather(
                        new double[] {19, 17.5, 17, 17},
                        new double[] {45, 50, 50, 50},
                        new double[4],
                        new double[4]);
        Enclosure leaky =
                new Enclosure(
                        Chambers.panelRoom(20).box(),
                        Chambers.panelRoom(20).faces(),
                        10,
                        Chambers.panelRoom(20).door(),
                        150,
                        20,
                        Chambers.panelRoom(20).gains(),
                        50_000,
                        false);
        return Chambers.passive(leaky, weather, 1 / 12.0)
                .withSetting(new Setting(20, 1.5, 80))
                .withControlMode(ControlMode.MODULATING)
                .withCoolers(coolers());
    }

    private double[] randomState() {
        double airC = random.nextDouble(16.5, 27);
        double pressure = RunCompiler.pressurePa(run);
        double ratio =
                random.nextDouble(0.3, 0.98) * MoistAir.saturatedHumidityRatio(airC, pressure);
        double[] y = network.start(airC, ratio);
        network.cooler(3).recharge(random.nextBoolean());
        for (int i = 2; i < size; i++) {
            boolean own = y[i] == 0 || y[i] == 1;
            y[i] = own ? random.nextDouble(0, 1.5) : y[i] * random.nextDouble(0.97, 1.03);
        }
        return y;
    }

    private double[] rates(double t, double[] y, double[] flows) {
        double[] f = new double[size];
        network.rates(t, y, f, flows);
        return f;
    }

    @Test
    void jacobianEqualsDifferences() {
        double[] none = new double[network.flows()];
        double[] slope = new double[size];
        double[] flowSlope = new double[network.flows()];
        int[] partly = new int[network.coolerCount()];
        for (int k = 0; k < 150; k++) {
            double[] y = randomState();
            network.linearise(
                    T,
                    y,
                    new TreeSystem.Change(size, network.flows()),
                    new TreeSystem.Change(slope, flowSlope));
            for (int i = 0; i < partly.length; i++) {
                CoolerEffect effect = network.cooler(i).effect();
                partly[i] += effect.ran > 0.01 && effect.ran < 0.99 ? 1 : 0;
            }
            double[][] j = DenseJacobian.of(network.tree());
            for (int c = 0; c < size; c++) {
                double step = 1e-6 * Math.max(Math.abs(y[c]), c < 2 ? 1e-2 : 1);
                double[] up = y.clone();
                double[] down = y.clone();
                up[c] += step;
                down[c] -= step;
                double[] fUp = rates(T, up, none);
                double[] fDown = rates(T, down, none);
                for (int r = 0; r < size; r++) {
                    double difference = (fUp[r] - fDown[r]) / (2 * step);
                    double scale = Math.abs(j[r][r]) + Math.abs(j[r][c]);
                    double noise = r == 0 ? NOISE_W_KG : NOISE_KG_S;
                    assertEquals(
                            difference,
                            j[r][c],
                            2e-4 * scale + (1e-9 * Math.abs(fUp[r]) + noise) / step,
                            "state " + k + " row " + r + " column " + c);
                }
            }
        }
        for (int i = 0; i < partly.length; i++) {
            assertTrue(partly[i] > 5, "cooler " + i + " partly ran in " + partly[i] + " states");
        }
    }

    @Test
    void slopesInTimeEqualDifferences() {
        double[] slope = new double[size];
        double[] flowSlope = new double[network.flows()];
        double[] flowsUp = new double[network.flows()];
        double[] flowsDown = new double[network.flows()];
        for (int k = 0; k < 100; k++) {
            double[] y = randomState();
            network.linearise(
                    T,
                    y,
                    new TreeSystem.Change(size, network.flows()),
                    new TreeSystem.Change(slope, flowSlope));
            double[] up = rates(T + 1, y, flowsUp);
            double[] down = rates(T - 1, y, flowsDown);
            for (int i = 0; i < flowSlope.length; i++) {
                double difference = (flowsUp[i] - flowsDown[i]) / 2;
                assertEquals(
                        difference,
                        flowSlope[i],
                        2e-3 * Math.abs(difference) + NOISE_W_S,
                        "state " + k + " flow " + i);
            }
            for (int i = 0; i < size; i++) {
                double difference = (up[i] - down[i]) / 2;
                assertEquals(
                        difference,
                        slope[i],
                        2e-3 * Math.abs(difference) + NOISE_W_S / 100,
                        "node " + i);
            }
        }
    }

    @Test
    void flowsAlongADirectionEqualDifferences() {
        double[] slope = new double[size];
        double[] flowSlope = new double[network.flows()];
        double[] up = new double[network.flows()];
        double[] down = new double[network.flows()];
        double[] along = new double[network.flows()];
        for (int k = 0; k < 150; k++) {
            double[] y = randomState();
            network.linearise(
                    T,
                    y,
                    new TreeSystem.Change(size, network.flows()),
                    new TreeSystem.Change(slope, flowSlope));
            double[] v = new double[size];
            double[] plus = y.clone();
            double[] minus = y.clone();
            for (int i = 0; i < size; i++) {
                v[i] = 1e-5 * Math.abs(y[i]) * random.nextDouble(-1, 1);
                plus[i] += v[i];
                minus[i] -= v[i];
            }
            network.flowsAlong(v, along);
            rates(T, plus, up);
            rates(T, minus, down);
            for (int i = 0; i < along.length; i++) {
                double difference = 0.5 * (up[i] - down[i]);
                double scale = Math.abs(difference) + 1e-6 * Math.abs(up[i]);
                assertEquals(
                        difference, along[i], 1e-3 * scale + 1e-12, "state " + k + " flow " + i);
            }
        }
    }

    @Test
    void stepsAllocateNothing() {
        for (Control control : Control.values()) {
            List<Cooler> kinds =
                    List.of(
                            new EvaporativePad(0.8, 0.1, 80, 20, control),
                            new NightAir(0.15, 90, 2, 3, 30, 80, control),
                            new IceBank(
                                    150, 150, ice().material(), 30, 20, ice().recharge(), control));
            ChamberRun mixed = run.withControlMode(ControlMode.AS_BUILT).withCoolers(kinds);
            ChamberNetwork built = RunCompiler.network(mixed, false);
            built.accuracy(1e-8, 1e-7);
            double[] y = built.start(24, 0.01);
            Integrator integrator = new Integrator(built, 1, 1, 1e-6);
            SwitchedCoolers thermostats = new SwitchedCoolers(built);
            Integrator.StepListener deaf = (from, to, state) -> {};
            thermostats.fire(0, y);
            double t = integrator.advance(0, y, 600, thermostats, deaf);
            thermostats.fire(t, y);
            ThreadMXBean threads = (ThreadMXBean) ManagementFactory.getThreadMXBean();
            long id = Thread.currentThread().getId();
            long before = threads.getThreadAllocatedBytes(id);
            long steps = integrator.steps();
            integrator.advance(t, y, t + 600, thermostats, deaf);
            long allocated = threads.getThreadAllocatedBytes(id) - before;
            assertTrue(integrator.steps() - steps > 5, control + " " + integrator.steps());
            assertTrue(allocated < 512, control + " allocated " + allocated + " bytes");
        }
    }
}

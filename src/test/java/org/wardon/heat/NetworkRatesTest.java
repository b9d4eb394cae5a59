package org.wardon.heat;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.SplittableRandom;
import org.apache.commons.math3.analysis.solvers.BrentSolver;
import org.junit.jupiter.api.Test;
import org.wardon.air.MoistAir;
import org.wardon.air.SaturatedAir;
import org.wardon.cooling.Compressor;
import org.wardon.cooling.CompressorLaw;
import org.wardon.cooling.Control;
import org.wardon.cooling.CoolerEffect;
import org.wardon.cooling.CoolerInputs;
import org.wardon.cooling.Thermostat;
import org.wardon.enclosure.DoorExchange;
import org.wardon.enclosure.PeopleHeat;
import org.wardon.heat.laws.FaceWater;
import org.wardon.heat.laws.FreeWater;
import org.wardon.heat.laws.Mist;
import org.wardon.heat.laws.SkinWater;
import org.wardon.heat.network.ChamberNetwork;
import org.wardon.heat.solver.DenseJacobian;
import org.wardon.heat.solver.TreeSystem;
import org.wardon.lots.Lot;
import org.wardon.lots.Shells;

/**
 * The compiled network against the readable laws at random states, and its Jacobian against
 * differences. Lots lie from dry to wet, warmer and colder than the air, the door stands open.
 */
class NetworkRatesTest {
    private static final double PRESSURE = 101_085.0;
    private final SplittableRandom random = new SplittableRandom(7);
    private final ChamberRun run = Chambers.full(Control.MODULATING, 3, 1);
    private final ChamberNetwork network = RunCompiler.network(run, true);
    private final int size = network.tree().size();
    private final double pressurePa = RunCompiler.pressurePa(run);

    private double[] randomState() {
        double airC = random.nextDouble(0, 30);
        double ratio =
                random.nextDouble(0.2, 1.1) * MoistAir.saturatedHumidityRatio(airC, pressurePa);
        double[] y = network.start(airC, ratio);
        for (int i = 0; i < run.stays().size(); i++) {
            Lot lot = run.stays().get(i).lot();
            double film = lot.massKg() * lot.item().areaM2PerKg() * FreeWater.FULL_KG_M2;
            double water = random.nextBoolean() ? 0 : film * random.nextDouble(0, 1.4);
            network.lot(i).arrive(random.nextDouble(0, 35), water, ratio, y);
        }
        for (int i = 2; i < size; i++) {
            y[i] *= random.nextDouble(0.97, 1.03);
        }
        return y;
    }

    private double[] rates(double t, double[] y, double[] flows) {
        double[] f = new double[size];
        network.rates(t, y, f, flows);
        return f;
    }

    @Test
    void lotRatesEqualTheLawsAtAThousandStates() {
        double[] flows = new double[network.flows()];
        for (int k = 0; k < 334; k++) {
            double[] y = randomState();
            double[] f = rates(1800, y, flows);
            for (int i = 0; i < run.stays().size(); i++) {
                Lot lot = run.stays().get(i).lot();
                double[] expected = lotRates(lot, network.lot(i).nodes(y), y);
                double[] found = network.lot(i).nodes(f);
                for (int n = 0; n < expected.length; n++) {
                    double scale = Math.abs(expected[n]) + gross(lot, n);
                    assertEquals(expected[n], found[n], 1e-12 * scale, "state " + k + " node " + n);
                }
            }
        }
    }

    /**
     * What 30 K or 1000 Pa across the skin would do to a node: its rate is a difference of such.
     */
    private double gross(Lot lot, int node) {
        Shells cut = lot.shells();
        int n = cut.count();
        double heat = 30 * cut.skinConductanceWPerKgK();
        if (node == n + 1) {
            return heat
                    / lot.packing().airM3PerKg()
                    * MoistAir.specificVolumeM3kg(10, 0, pressurePa);
        }
        double film = lot.massKg() * lot.transpiration().filmKgPerKgSPa() * 1_000;
        if (node == n || node == n + 2) {
            return node == n ? film : film / lot.packing().airM3PerKg() / lot.massKg();
        }
        return node == n - 1
                ? heat / (cut.massFraction(node) * lot.item().specificHeatJkgK())
                : 1e-12;
    }

    /** Rates of a lot's nodes from shells, skin balance, respiration and water, by the laws. */
    private double[] lotRates(Lot lot, double[] own, double[] y) {
        Shells cut = lot.shells();
        int n = cut.count();
        double kg = lot.massKg();
        double ratio = own[n + 2];
        double dry =
                kg * lot.packing().airM3PerKg() / MoistAir.specificVolumeM3kg(10, 0, pressurePa);
        double tare = kg * lot.packing().tareJPerKgK() / dry;
        double packageC =
                (own[n + 1] - ratio * MoistAir.EVAPORATION_J_KG)
                        / (tare + MoistAir.heatCapacityJkgK(ratio));
        double packagePa = MoistAir.vapourPressurePa(ratio, pressurePa);
        double full = kg * lot.item().areaM2PerKg() * FreeWater.FULL_KG_M2;
        double wet = FreeWater.wetShare(own[n] / full);
        double film = lot.packing().filmWPerKgK();
        double skin =
                new BrentSolver(1e-14, 1e-13)
                        .solve(
                                200,
                                t ->
                                        cut.skinC(
                                                        own[n - 1],
                                                        packageC,
                                                        film,
                                                        latentW(lot, t, packagePa, wet))
                                                - t,
                                -40,
                                59);
        double psat = SaturatedAir.overWaterPa(skin);
        double fromFilm = SkinWater.fromFilmKgPerKgS(lot.transpiration(), psat, packagePa, wet);
        double gone =
                kg
                        * (fromFilm
                                + SkinWater.fromTissueKgPerKgS(
                                        lot.transpiration(), psat, packagePa, wet));
        double[] f = new double[n + 3];
        double c = lot.item().specificHeatJkgK();
        for (int i = 0; i < n; i++) {
            double in = i == 0 ? 0 : cut.conductanceWPerKgK(i - 1) * (own[i - 1] - own[i]);
            double out =
                    i == n - 1
                            ? cut.skinConductanceWPerKgK() * (own[i] - skin)
                            : cut.conductanceWPerKgK(i) * (own[i] - own[i + 1]);
            double breath = cut.massFraction(i) * lot.respiration().wattsPerKg(own[i]);
            f[i] = (in - out + breath) / (cut.massFraction(i) * c);
        }
        double airC = network.airC(y);
        double vapour =
                kg
                        * lot.packing().vapourKgPerKgSPa()
                        * (packagePa - MoistAir.vapourPressurePa(network.ratio(y), pressurePa));
        double toSkin = kg * cut.skinConductanceWPerKgK() * (own[n - 1] - skin);
        f[n] = -kg * fromFilm;
        f[n + 1] =
                (toSkin
                                + gone * MoistAir.WATER_J_KG_K * skin
                                - kg * lot.packing().chamberWPerKgK() * (packageC - airC)
                                - vapour * MoistAir.vapourEnthalpyJkg(packageC))
                        / dry;
        f[n + 2] = (gone - vapour) / dry;
        return f;
    }

    private static double latentW(Lot lot, double skinC, double packagePa, double wet) {
        double psat = SaturatedAir.overWaterPa(skinC);
        double gone =
                SkinWater.fromFilmKgPerKgS(lot.transpiration(), psat, packagePa, wet)
                        + SkinWater.fromTissueKgPerKgS(lot.transpiration(), psat, packagePa, wet);
        return gone * (MoistAir.vapourEnthalpyJkg(skinC) - MoistAir.WATER_J_KG_K * skinC);
    }

    @Test
    void airFeelsDoorLeakagePeopleFacesLotsAndCoolerByTheLaws() {
        network.door(1);
        network.people(1.5);
        network.light(1);
        double[] flows = new double[network.flows()];
        double hourShare = 0.5;
        for (int k = 0; k < 500; k++) {
            double[] y = randomState();
            double[] f = rates(1800, y, flows);
            double airC = network.airC(y);
            double ratio = network.ratio(y);
            double perM3 = 1 / MoistAir.specificVolumeM3kg(4, 0, pressurePa);
            double outC =
                    0.5 * run.weather().temperatureC(0) + hourShare * run.weather().temperatureC(1);
            double outRatio = 0.5 * network.outdoorRatio(0) + hourShare * network.outdoorRatio(1);
            double outH = MoistAir.enthalpyJkg(outC, outRatio);
            double inH = MoistAir.enthalpyJkg(airC, ratio);
            double leak = 2 * 90.0 / 86_400 * perM3;
            double door =
                    DoorExchange.FLOW_FACTOR
                            * DoorExchange.flowKgS(
                                    MoistAir.densityKgM3(airC, ratio, pressurePa),
                                    MoistAir.densityKgM3(outC, outRatio, pressurePa),
                                    0.9,
                                    2.0)
                            / (1 + ratio);
            double body = 1.5 * PeopleHeat.watts(airC);
            CoolerEffect cooler = cooler(airC, ratio, outC);
            double removed = cooler.sensibleW + cooler.vapourKgS * MoistAir.vapourEnthalpyJkg(airC);
            double heat = (leak + door) * (outH - inH) + body + 60 + cooler.fanW - removed;
            double water =
                    (leak + door) * (outRatio - ratio)
                            + PeopleHeat.LATENT_SHARE * body / MoistAir.vapourEnthalpyJkg(37)
                            - cooler.vapourKgS;
            for (int i = 0; i < run.stays().size(); i++) {
                heat += network.lot(i).toAirJ(flows);
                water += network.lot(i).vapourKg(flows);
            }
            heat += network.terms().walls(flows);
            heat += 50_000.0 / 1_200 * (network.structureJ(y) / 50_000 - airC);
            double kg = 90 * perM3;
            water += network.terms().wallVapour(flows);
            water -= Mist.waterKgS(kg, airC, ratio, pressurePa);
            assertEquals(heat / kg, f[0], 1e-9 * (1 + Math.abs(f[0])), "enthalpy, state " + k);
            assertEquals(water / kg, f[1], 1e-11 * (1e-3 + Math.abs(f[1])), "water, state " + k);
        }
    }

    private CoolerEffect cooler(double airC, double ratio, double outC) {
        Compressor unit = Chambers.unit(Control.MODULATING);
        CompressorLaw law = unit.law(pressurePa);
        CoolerInputs in = new CoolerInputs(law.ownStates());
        CoolerEffect out = new CoolerEffect(law.ownStates());
        in.airC = airC;
        in.humidityRatio = ratio;
        in.outdoorC = outC;
        in.run = Thermostat.modulatedShare(airC, 4, 1);
        law.effect(in, out);
        return out;
    }

    @Test
    void mistFallsOutOfOversaturatedAirOnly() {
        double[] flows = new double[network.flows()];
        int misty = 0;
        double airKg =
                run.enclosure().box().volumeM3()
                        / MoistAir.specificVolumeM3kg(run.setting().temperatureC(), 0, pressurePa);
        for (int k = 0; k < 200; k++) {
            double[] y = randomState();
            rates(1800, y, flows);
            double law = Mist.waterKgS(1, network.airC(y), network.ratio(y), pressurePa);
            double found = network.terms().mist(flows);
            misty += law > 0 ? 1 : 0;
            assertEquals(law > 0, found > 0, "state " + k);
            assertEquals(law * airKg, found, 1e-9 * law * airKg, "state " + k);
        }
        assertTrue(misty > 5 && misty < 195, "states with mist: " + misty);
    }

    @Test
    void vapourOfFacesFollowsTheLewisRelation() {
        double[] flows = new double[network.flows()];
        for (int k = 0; k < 200; k++) {
            double[] y = randomState();
            rates(1800, y, flows);
            double[] convective = {0.7, 5.0, 2.5, 2.5, 2.5, 2.5};
            double expected = 0;
            int at = 2;
            for (int i = 0; i < 6; i++) {
                double area = run.enclosure().box().areaM2(run.enclosure().faces().get(i).name());
                double surface = network.surfaceC(i, y);
                while (y[at] != surface) {
                    at++;
                }
                double full = area * FreeWater.FULL_KG_M2;
                expected +=
                        area
                                * FaceWater.vapourKgM2S(
                                        FaceWater.conductanceKgM2S(convective[i]),
                                        MoistAir.saturatedHumidityRatio(surface, pressurePa),
                                        network.ratio(y),
                                        FreeWater.wetShare(y[at + 1] / full));
            }
            double found = network.terms().wallVapour(flows);
            assertEquals(expected, found, 1e-12 * (1e-3 + Math.abs(expected)));
        }
    }

    @Test
    void jacobianEqualsDifferences() {
        network.door(1);
        network.people(1.5);
        double[] none = new double[network.flows()];
        double[] slope = new double[size];
        double[] flowSlope = new double[network.flows()];
        for (int k = 0; k < 40; k++) {
            double[] y = randomState();
            network.linearise(
                    1800,
                    y,
                    new TreeSystem.Change(size, network.flows()),
                    new TreeSystem.Change(slope, flowSlope));
            double[][] j = DenseJacobian.of(network.tree());
            for (int c = 0; c < size; c++) {
                double step = 1e-6 * Math.max(Math.abs(y[c]), 1e-2);
                double[] up = y.clone();
                double[] down = y.clone();
                up[c] += step;
                down[c] -= step;
                double[] fUp = rates(1800, up, none);
                double[] fDown = rates(1800, down, none);
                for (int r = 0; r < size; r++) {
                    double difference = (fUp[r] - fDown[r]) / (2 * step);
                    double scale = Math.abs(j[r][r]) + Math.abs(j[r][c]);
                    assertEquals(
                            difference,
                            j[r][c],
                            2e-4 * scale + 1e-9 * Math.abs(fUp[r]) / step,
                            "state " + k + " row " + r + " column " + c);
                }
            }
        }
    }

    @Test
    void slopesInTimeEqualDifferences() {
        network.door(1);
        double[] slope = new double[size];
        double[] flowSlope = new double[network.flows()];
        double[] flowsUp = new double[network.flows()];
        double[] flowsDown = new double[network.flows()];
        for (int k = 0; k < 40; k++) {
            double[] y = randomState();
            network.linearise(
                    1800,
                    y,
                    new TreeSystem.Change(size, network.flows()),
                    new TreeSystem.Change(slope, flowSlope));
            double[] up = rates(1830, y, flowsUp);
            double[] down = rates(1770, y, flowsDown);
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

    @Test
    void flowsAlongADirectionEqualDifferences() {
        network.door(1);
        double[] slope = new double[size];
        double[] flowSlope = new double[network.flows()];
        double[] up = new double[network.flows()];
        double[] down = new double[network.flows()];
        double[] along = new double[network.flows()];
        for (int k = 0; k < 40; k++) {
            double[] y = randomState();
            network.linearise(
                    1800,
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
            rates(1800, plus, up);
            rates(1800, minus, down);
            for (int i = 0; i < along.length; i++) {
                double difference = 0.5 * (up[i] - down[i]);
                double scale = Math.abs(difference) + 1e-6 * Math.abs(up[i]);
                assertEquals(difference, along[i], 1e-3 * scale + 1e-12, "flow " + i);
            }
        }
    }

    @Test
    void localCubicsStayNearTheLaws() {
        ChamberNetwork quick = RunCompiler.network(run, false);
        double[] slope = new double[size];
        double[] flowSlope = new double[network.flows()];
        double[] flows = new double[network.flows()];
        for (int k = 0; k < 100; k++) {
            double[] y = randomState();
            for (int i = 0; i < run.stays().size(); i++) {
                quick.lot(i).arrive(20, 0, network.ratio(y), y.clone());
            }
            quick.linearise(
                    1800,
                    y,
                    new TreeSystem.Change(size, network.flows()),
                    new TreeSystem.Change(slope, flowSlope));
            double[] exact = rates(1800, y, flows);
            double[] near = new double[size];
            quick.rates(1800, y, near, flows);
            for (int i = 0; i < size; i++) {
                assertEquals(exact[i], near[i], 1e-5 * Math.abs(exact[i]) + 1e-9, "node " + i);
            }
        }
    }

    @Test
    void pressureOfTheTestIsThatOfTheSite() {
        assertEquals(PRESSURE, pressurePa, 1);
        assertEquals(List.of(), run.outages());
    }
}

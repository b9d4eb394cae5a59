package org.wardon.heat.network;

import java.util.OptionalDouble;
import org.wardon.air.MoistAir;
import org.wardon.enclosure.AirZones;
import org.wardon.enclosure.Box;
import org.wardon.enclosure.DoorExchange;
import org.wardon.heat.solver.Tree;

/**
 * Air that the two ends of a chamber change with each other: the same mass of dry air each way, so
 * that heat and vapour one end gives are those the other takes.
 *
 * <p>As much as the plan gives; else, while fans run, half of what they move, and while they rest
 * what the difference in density drives through the whole cross-section, as through a doorway of
 * that size: {@link DoorExchange}. Brown and Solvason 1962 (from memory) found the same law for
 * large openings in vertical partitions, flow = C/3 W H^1.5 (g drho/rho)^0.5 with C of 0.6 to 1, of
 * which 0.221 x 3 = 0.66 is one. The half is common practice, no source: of the air a cooler throws
 * along the ceiling part sinks and turns back before the middle.
 */
final class Mixing {
    /** Flows: heat from the door end to the coil end, W. */
    static final int HEAT = 0;

    /** Vapour from the door end to the coil end, kg/s. */
    static final int VAPOUR = 1;

    /** Dry air each way, kg/s. */
    static final int AIR = 2;

    static final int FLOWS = 3;

    /** Share of a fan's air that crosses the cut. Source: common practice, no source. */
    static final double CROSSES = 0.5;

    private static final double STEP_K = 1e-4;
    private static final double STEP_RATIO = 1e-7;
    private static final int NODES = 4;
    private static final int NONE = -1;

    private final int flowAt;
    private final AirEnd coil;
    private final AirEnd door;
    private final Box box;
    private final OptionalDouble givenKgS;
    private final CoolerPart[] coolers;
    private final double[] fanKgS;

    private double byFans;
    private double resting;
    private double natural;
    private double flow;
    private double heat;
    private double vapour;
    private final double[] flowBy = new double[NODES];

    Mixing(int flowAt, AirEnd[] ends, NetworkInputs inputs, double airKgM3, CoolerPart[] coolers) {
        this.flowAt = flowAt;
        this.coil = ends[AirEnd.COIL];
        this.door = ends[1];
        this.box = inputs.enclosure().box();
        this.coolers = coolers.clone();
        OptionalDouble given = inputs.enclosure().zones().map(AirZones::exchangeM3S).orElseThrow();
        givenKgS =
                given.isPresent()
                        ? OptionalDouble.of(given.getAsDouble() * airKgM3)
                        : OptionalDouble.empty();
        fanKgS = new double[coolers.length];
        for (int i = 0; i < coolers.length; i++) {
            fanKgS[i] = CROSSES * coolers[i].unit().circulatesM3s() * airKgM3;
        }
    }

    /** Share of the time in which all fans rest, or all but one. */
    private double resting(int besides) {
        double share = 1;
        for (int i = 0; i < coolers.length; i++) {
            if (fanKgS[i] > 0 && i != besides) {
                share *= 1 - coolers[i].fanRuns();
            }
        }
        return share;
    }

    /** What the difference in density drives, kg dry air/s. */
    private double naturalKgS(double coilC, double coilRatio, double doorC, double doorRatio) {
        double pressure = coil.air.pressurePa;
        return DoorExchange.flowKgS(
                        MoistAir.densityKgM3(coilC, coilRatio, pressure),
                        MoistAir.densityKgM3(doorC, doorRatio, pressure),
                        box.widthM(),
                        box.heightM())
                / (1 + 0.5 * (coilRatio + doorRatio));
    }

    private void ask(AirState cold, AirState warm) {
        heat = warm.enthalpy - cold.enthalpy;
        vapour = warm.ratio - cold.ratio;
        if (givenKgS.isPresent()) {
            flow = givenKgS.getAsDouble();
            return;
        }
        byFans = 0;
        for (int i = 0; i < coolers.length; i++) {
            byFans += fanKgS[i] > 0 ? fanKgS[i] * coolers[i].fanRuns() : 0;
        }
        resting = resting(NONE);
        natural = naturalKgS(cold.airC, cold.ratio, warm.airC, warm.ratio);
        flow = byFans + resting * natural;
    }

    /** Adds what it does to both ends; coolers must have been asked before. */
    void rates(AirState cold, AirState warm, double[] rates, double[] flows) {
        ask(cold, warm);
        rates[cold.at] += flow * heat;
        rates[cold.at + 1] += flow * vapour;
        rates[warm.at] -= flow * heat;
        rates[warm.at + 1] -= flow * vapour;
        flows[flowAt + HEAT] = flow * heat;
        flows[flowAt + VAPOUR] = flow * vapour;
        flows[flowAt + AIR] = flow;
    }

    private void flowSlopes(AirState cold, AirState warm) {
        if (givenKgS.isPresent()) {
            return;
        }
        double coldC = resting * byCoilC(cold, warm);
        for (int i = 0; i < coolers.length; i++) {
            coldC += fanKgS[i] > 0 ? byFan(i) * coolers[i].fanRunsByAirC() : 0;
        }
        double warmC = resting * byDoorC(cold, warm);
        flowBy[0] = coldC * cold.airByEnthalpy;
        flowBy[1] = coldC * cold.airByRatio + resting * byCoilRatio(cold, warm);
        flowBy[2] = warmC * warm.airByEnthalpy;
        flowBy[3] = warmC * warm.airByRatio + resting * byDoorRatio(cold, warm);
    }

    /** What more of a fan's time gives, less what rests for it. */
    private double byFan(int i) {
        return fanKgS[i] - resting(i) * natural;
    }

    private double byCoilC(AirState cold, AirState warm) {
        return (naturalKgS(cold.airC + STEP_K, cold.ratio, warm.airC, warm.ratio)
                        - naturalKgS(cold.airC - STEP_K, cold.ratio, warm.airC, warm.ratio))
                / (2 * STEP_K);
    }

    private double byDoorC(AirState cold, AirState warm) {
        return (naturalKgS(cold.airC, cold.ratio, warm.airC + STEP_K, warm.ratio)
                        - naturalKgS(cold.airC, cold.ratio, warm.airC - STEP_K, warm.ratio))
                / (2 * STEP_K);
    }

    private double byCoilRatio(AirState cold, AirState warm) {
        return (naturalKgS(cold.airC, cold.ratio + STEP_RATIO, warm.airC, warm.ratio)
                        - naturalKgS(cold.airC, cold.ratio - STEP_RATIO, warm.airC, warm.ratio))
                / (2 * STEP_RATIO);
    }

    private double byDoorRatio(AirState cold, AirState warm) {
        return (naturalKgS(cold.airC, cold.ratio, warm.airC, warm.ratio + STEP_RATIO)
                        - naturalKgS(cold.airC, cold.ratio, warm.airC, warm.ratio - STEP_RATIO))
                / (2 * STEP_RATIO);
    }

    /**
     * Adds J of both ends and the change in time, after coolers and ends were linearised, to the
     * hub's J as the ends wrote it.
     */
    void linearise(Tree tree, double[] rateSlope, double[] flowSlope) {
        ask(coil.startAir, door.startAir);
        flowSlopes(coil.startAir, door.startAir);
        for (int c = 0; c < NODES; c++) {
            double ofHeat = flowBy[c] * heat + flow * byNode(c, 0);
            double ofVapour = flowBy[c] * vapour + flow * byNode(c, 1);
            tree.hubByHub[c] += ofHeat / coil.airKg;
            tree.hubByHub[NODES + c] += ofVapour / coil.airKg;
            tree.hubByHub[2 * NODES + c] -= ofHeat / door.airKg;
            tree.hubByHub[3 * NODES + c] -= ofVapour / door.airKg;
        }
        if (givenKgS.isEmpty()) {
            timeSlope(rateSlope, flowSlope);
        }
    }

    /** The difference between the ends by a node of the hub: of enthalpy at 0, of ratio at 1. */
    private static double byNode(int node, int of) {
        if (node % 2 != of) {
            return 0;
        }
        return node < 2 ? -1 : 1;
    }

    /** Fans follow the weather where their machine does. */
    private void timeSlope(double[] rateSlope, double[] flowSlope) {
        double slope = 0;
        for (int i = 0; i < coolers.length; i++) {
            if (fanKgS[i] > 0) {
                slope += byFan(i) * coolers[i].fanRunsSlope(flowSlope);
            }
        }
        rateSlope[0] += slope * heat;
        rateSlope[1] += slope * vapour;
        rateSlope[2] -= slope * heat;
        rateSlope[3] -= slope * vapour;
        flowSlope[flowAt + HEAT] = slope * heat;
        flowSlope[flowAt + VAPOUR] = slope * vapour;
        flowSlope[flowAt + AIR] = slope;
    }

    /** Writes the change of its flows along a direction. */
    void flowsAlong(double[] v, double[] change) {
        double more = 0;
        for (int c = 0; c < NODES; c++) {
            more += flowBy[c] * v[c];
        }
        change[flowAt + HEAT] = more * heat + flow * (v[2] - v[0]);
        change[flowAt + VAPOUR] = more * vapour + flow * (v[3] - v[1]);
        change[flowAt + AIR] = more;
    }
}

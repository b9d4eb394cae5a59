package org.wardon.heat.network;

import org.wardon.heat.solver.Branch;
import org.wardon.heat.solver.Tree;

/** Racks and structure inside: one capacity with a film to the air. */
final class StructurePart implements Part {
    /** Flows: heat to the air, W. */
    static final int HEAT = 0;

    static final int FLOWS = 1;

    /** Time in which structure follows the air, s (assumption: steel of 5 mm at 8 W/(m2 K)). */
    private static final double FOLLOWS_IN_S = 1_200;

    private final Branch branch;
    private final int flowAt;
    private final double capacityJK;
    private final double filmWK;

    StructurePart(Tree tree, int flowAt, double capacityJK) {
        this.branch = tree.addBranch(0, 1);
        this.flowAt = flowAt;
        this.capacityJK = capacityJK;
        this.filmWK = capacityJK / FOLLOWS_IN_S;
    }

    void start(double airC, double[] y) {
        y[branch.blockAt(0)] = airC;
    }

    double heatJ(double[] y) {
        return capacityJK * y[branch.blockAt(0)];
    }

    @Override
    public void rates(AirState air, Outside outside, double[] y, double[] rates, double[] flows) {
        double heat = filmWK * (y[branch.blockAt(0)] - air.airC);
        rates[branch.blockAt(0)] = -heat / capacityJK;
        rates[air.at] += heat;
        flows[flowAt + HEAT] = heat;
    }

    @Override
    public void linearise(AirState air, Outside outside, double airKg, double[] y) {
        branch.inner[0] = -filmWK / capacityJK;
        branch.byHub[0] = filmWK * air.airByEnthalpy / capacityJK;
        branch.byHub[1] = filmWK * air.airByRatio / capacityJK;
        branch.onHub[0] = filmWK / airKg;
        branch.onHub[1] = 0;
        air.byItself[0] -= filmWK * air.airByEnthalpy / airKg;
        air.byItself[1] -= filmWK * air.airByRatio / airKg;
    }

    @Override
    public void timeSlope(
            AirState air, Outside outside, double[] y, double[] rateSlope, double[] slope) {
        // Structure feels time only through the chamber's air.
    }

    @Override
    public void flowsAlong(AirState air, double[] v, double[] change) {
        change[flowAt + HEAT] = filmWK * (v[branch.blockAt(0)] - air.airAlong(v));
    }
}

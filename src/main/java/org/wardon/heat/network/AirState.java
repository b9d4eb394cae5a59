package org.wardon.heat.network;

import java.util.Arrays;
import org.wardon.air.MoistAir;
import org.wardon.heat.solver.Tree;

/**
 * The chamber's air, or that of one of its ends, at one stage, from the hub's unknowns enthalpy and
 * humidity ratio. Enthalpy and not temperature is carried, so that what crosses a border is counted
 * alike on both sides and a balance holds to rounding.
 */
final class AirState {
    /** Place of the enthalpy of the only air, or of the coil end, in the state, J/kg dry air. */
    static final int ENTHALPY = 0;

    /** Place of its humidity ratio in the state, kg/kg. */
    static final int HUMIDITY = 1;

    final double pressurePa;

    /** Place of the enthalpy in the state; the humidity ratio stands behind it. */
    final int at;

    double enthalpy;
    double ratio;
    double airC;
    double vapourPa;

    /** Derivatives of temperature by enthalpy and humidity ratio, of vapour pressure by ratio. */
    double airByEnthalpy;

    double airByRatio;
    double vapourByRatio;

    /** J of its two rows by itself, {@code [row * 2 + column]}, as parts add to it. */
    final double[] byItself = new double[4];

    AirState(double pressurePa, int at) {
        this.pressurePa = pressurePa;
        this.at = at;
    }

    void set(double[] y) {
        enthalpy = y[at];
        ratio = y[at + 1];
        airC = MoistAir.temperatureC(enthalpy, ratio);
        double inverse = 1 / MoistAir.heatCapacityJkgK(ratio);
        airByEnthalpy = inverse;
        airByRatio = -MoistAir.vapourEnthalpyJkg(airC) * inverse;
        double sum = MoistAir.MOLAR_MASS_RATIO + ratio;
        vapourPa = pressurePa * ratio / sum;
        vapourByRatio = pressurePa * MoistAir.MOLAR_MASS_RATIO / (sum * sum);
    }

    /** Change of temperature along a direction of the state, linearised. */
    double airAlong(double[] v) {
        return airByEnthalpy * v[at] + airByRatio * v[at + 1];
    }

    /** Empties its J before parts add to it. */
    void startJ() {
        Arrays.fill(byItself, 0);
    }

    /** Writes its J into the hub's. */
    void intoHub(Tree tree) {
        int row = at * tree.hub() + at;
        tree.hubByHub[row] = byItself[0];
        tree.hubByHub[row + 1] = byItself[1];
        tree.hubByHub[row + tree.hub()] = byItself[2];
        tree.hubByHub[row + tree.hub() + 1] = byItself[3];
    }
}

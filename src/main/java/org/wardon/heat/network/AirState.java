package org.wardon.heat.network;

import org.wardon.air.MoistAir;

/**
 * The chamber's air at one stage, from the hub's unknowns enthalpy and humidity ratio. Enthalpy and
 * not temperature is carried, so that what crosses a border is counted alike on both sides and a
 * balance holds to rounding.
 */
final class AirState {
    /** Place of the enthalpy in the state, J per kg dry air. */
    static final int ENTHALPY = 0;

    /** Place of the humidity ratio in the state, kg/kg. */
    static final int HUMIDITY = 1;

    final double pressurePa;
    double enthalpy;
    double ratio;
    double airC;
    double vapourPa;

    /** Derivatives of temperature by enthalpy and humidity ratio, of vapour pressure by ratio. */
    double airByEnthalpy;

    double airByRatio;
    double vapourByRatio;

    AirState(double pressurePa) {
        this.pressurePa = pressurePa;
    }

    void set(double[] y) {
        enthalpy = y[ENTHALPY];
        ratio = y[HUMIDITY];
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
        return airByEnthalpy * v[ENTHALPY] + airByRatio * v[HUMIDITY];
    }
}

package org.wardon.heat.network;

import org.wardon.air.MoistAir;
import org.wardon.heat.laws.FreeWater;
import org.wardon.heat.laws.Mist;

/** Mist, by {@link Mist}; its water runs off with that of the faces. */
final class MistPart implements Part {
    /** Flows: water out of the air, kg/s. */
    static final int WATER = 0;

    /** Its enthalpy, W. */
    static final int ENTHALPY = 1;

    static final int FLOWS = 2;

    private final int flowAt;
    private final double perS;
    private final LocalCurve saturation;
    private double byAirC;
    private double byRatio;
    private double heatByAirC;
    private double heatByRatio;

    /**
     * @param flowAt place of its flows
     * @param airKg dry air of the chamber, kg
     * @param plain true to ask the law of saturation itself each time
     */
    MistPart(int flowAt, double airKg, boolean plain) {
        this.flowAt = flowAt;
        this.perS = airKg / Mist.FALLS_IN_S;
        this.saturation = Saturation.curve(plain);
    }

    private double excess(AirState air) {
        double psat = saturation.value(air.airC);
        return air.ratio - MoistAir.MOLAR_MASS_RATIO * psat / (air.pressurePa - psat);
    }

    @Override
    public void near(AirState air, double[] y) {
        saturation.near(air.airC);
    }

    @Override
    public void rates(AirState air, Outside outside, double[] y, double[] rates, double[] flows) {
        double water = perS * FreeWater.positive(excess(air), Mist.ROUND_KG_KG);
        double heat = water * MoistAir.WATER_J_KG_K * air.airC;
        rates[air.at] -= heat;
        rates[air.at + 1] -= water;
        flows[flowAt + WATER] = water;
        flows[flowAt + ENTHALPY] = heat;
    }

    @Override
    public void linearise(AirState air, Outside outside, double airKg, double[] y) {
        double psat = saturation.value(air.airC);
        double dry = air.pressurePa - psat;
        double satByAirC =
                MoistAir.MOLAR_MASS_RATIO
                        * air.pressurePa
                        * saturation.slope(air.airC)
                        / (dry * dry);
        double over = excess(air);
        byRatio = perS * FreeWater.positiveSlope(over, Mist.ROUND_KG_KG);
        byAirC = -byRatio * satByAirC;
        double water = perS * FreeWater.positive(over, Mist.ROUND_KG_KG);
        heatByRatio = byRatio * MoistAir.WATER_J_KG_K * air.airC;
        heatByAirC = MoistAir.WATER_J_KG_K * (water + byAirC * air.airC);
        air.byItself[0] -= heatByAirC * air.airByEnthalpy / airKg;
        air.byItself[1] -= (heatByAirC * air.airByRatio + heatByRatio) / airKg;
        air.byItself[2] -= byAirC * air.airByEnthalpy / airKg;
        air.byItself[3] -= (byAirC * air.airByRatio + byRatio) / airKg;
    }

    @Override
    public void timeSlope(
            AirState air, Outside outside, double[] y, double[] rateSlope, double[] slope) {
        // Mist feels time only through the chamber's air.
    }

    @Override
    public void flowsAlong(AirState air, double[] v, double[] change) {
        double airC = air.airAlong(v);
        double ratio = v[air.at + 1];
        change[flowAt + WATER] = byAirC * airC + byRatio * ratio;
        change[flowAt + ENTHALPY] = heatByAirC * airC + heatByRatio * ratio;
    }
}

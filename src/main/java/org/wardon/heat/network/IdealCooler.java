package org.wardon.heat.network;

import org.wardon.air.MoistAir;
import org.wardon.cooling.Setting;
import org.wardon.heat.laws.FreeWater;

/**
 * A cooler without a limit, for the load: it takes whatever keeps the air from rising above the
 * setting. Air meets a coil a fixed difference below its own temperature, so what is condensed lies
 * on the straight line to saturation there (apparatus dew point).
 */
final class IdealCooler implements Part {
    /** Flows: enthalpy taken from the air, W. */
    static final int REMOVED = 0;

    /** Vapour taken from the air, kg/s. */
    static final int VAPOUR = 1;

    static final int FLOWS = 2;

    private static final double ROUND_K = 0.02;

    /** The air follows the ideal cooler in this time, s: the shorter, the nearer the setting. */
    private static final double FOLLOWS_IN_S = 0.3;

    /** Coil below the air, K (common practice for rooms of produce). */
    private static final double COIL_BELOW_K = 6;

    private final int flowAt;
    private final double offsetK;
    private double keptC;
    private final double coilBelowK;
    private final double wattsPerK;
    private final LocalCurve saturation;

    private double sensible;
    private double vapour;
    private double sensibleByAirC;
    private double vapourByAirC;
    private double vapourByRatio;
    private double removedByAirC;
    private double removedByRatio;

    /** {@code wattsPerK} is so large that the air stays within hundredths of the setting. */
    IdealCooler(int flowAt, double offsetK, double coilBelowK, double wattsPerK, boolean plain) {
        this.flowAt = flowAt;
        this.offsetK = offsetK;
        this.coilBelowK = coilBelowK;
        this.wattsPerK = wattsPerK;
        this.saturation = Saturation.curve(plain);
    }

    static IdealCooler of(int flowAt, NetworkInputs inputs, double airKg) {
        IdealCooler cooler =
                new IdealCooler(
                        flowAt,
                        inputs.tuning().thermostatOffsetK(),
                        COIL_BELOW_K,
                        airKg * MoistAir.DRY_AIR_J_KG_K / FOLLOWS_IN_S,
                        inputs.plain());
        cooler.set(inputs.setting());
        return cooler;
    }

    int flowAt() {
        return flowAt;
    }

    void set(Setting setting) {
        keptC = setting.temperatureC() - offsetK;
    }

    private double wetness(AirState air) {
        double psat = saturation.value(air.airC - coilBelowK);
        double saturated = MoistAir.MOLAR_MASS_RATIO * psat / (air.pressurePa - psat);
        return air.ratio - saturated;
    }

    private void ask(AirState air) {
        sensible = wattsPerK * FreeWater.positive(air.airC - keptC, ROUND_K);
        double wet = FreeWater.positive(wetness(air), 1e-5);
        vapour = sensible * wet / (MoistAir.DRY_AIR_J_KG_K * coilBelowK);
    }

    @Override
    public void near(AirState air, double[] y) {
        saturation.near(air.airC - coilBelowK);
    }

    @Override
    public void rates(AirState air, Outside outside, double[] y, double[] rates, double[] flows) {
        ask(air);
        double removed = sensible + vapour * MoistAir.vapourEnthalpyJkg(air.airC);
        flows[flowAt + REMOVED] = removed;
        flows[flowAt + VAPOUR] = vapour;
        rates[air.at] -= removed;
        rates[air.at + 1] -= vapour;
    }

    @Override
    public void linearise(AirState air, Outside outside, double airKg, double[] y) {
        ask(air);
        double perSensible = 1 / (MoistAir.DRY_AIR_J_KG_K * coilBelowK);
        double wetness = wetness(air);
        double psat = saturation.value(air.airC - coilBelowK);
        double rest = air.pressurePa - psat;
        double saturatedSlope =
                MoistAir.MOLAR_MASS_RATIO
                        * air.pressurePa
                        / (rest * rest)
                        * saturation.slope(air.airC - coilBelowK);
        double wetSlope = FreeWater.positiveSlope(wetness, 1e-5);
        sensibleByAirC = wattsPerK * FreeWater.positiveSlope(air.airC - keptC, ROUND_K);
        vapourByRatio = sensible * wetSlope * perSensible;
        vapourByAirC =
                sensibleByAirC * FreeWater.positive(wetness, 1e-5) * perSensible
                        - vapourByRatio * saturatedSlope;
        double enthalpy = MoistAir.vapourEnthalpyJkg(air.airC);
        removedByAirC = sensibleByAirC + vapourByAirC * enthalpy + vapour * MoistAir.VAPOUR_J_KG_K;
        removedByRatio = vapourByRatio * enthalpy;
        air.byItself[0] -= removedByAirC * air.airByEnthalpy / airKg;
        air.byItself[1] -= (removedByAirC * air.airByRatio + removedByRatio) / airKg;
        air.byItself[2] -= vapourByAirC * air.airByEnthalpy / airKg;
        air.byItself[3] -= (vapourByAirC * air.airByRatio + vapourByRatio) / airKg;
    }

    @Override
    public void timeSlope(
            AirState air, Outside outside, double[] y, double[] rateSlope, double[] slope) {
        // Nothing here follows the weather.
    }

    @Override
    public void flowsAlong(AirState air, double[] v, double[] change) {
        double airC = air.airAlong(v);
        double ratio = v[air.at + 1];
        change[flowAt + REMOVED] = removedByAirC * airC + removedByRatio * ratio;
        change[flowAt + VAPOUR] = vapourByAirC * airC + vapourByRatio * ratio;
    }
}

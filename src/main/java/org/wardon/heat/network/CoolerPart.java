package org.wardon.heat.network;

import org.wardon.air.MoistAir;
import org.wardon.cooling.CoolerEffect;
import org.wardon.cooling.CoolerInputs;
import org.wardon.cooling.CoolerLaw;
import org.wardon.cooling.Thermostat;
import org.wardon.heat.solver.Branch;
import org.wardon.heat.solver.Tree;

/**
 * One cooler on the chamber's air. The thermostat switches it, or it follows the air within the
 * band; its own states, such as water on its coil, are a branch.
 */
public final class CoolerPart implements Part {
    /** Flows: enthalpy taken from the air, W. */
    static final int REMOVED = 0;

    /** Vapour taken from the air, kg/s. */
    static final int VAPOUR = 1;

    /** Electric power of compressor or pump, W. */
    static final int ELECTRIC = 2;

    /** Power of its fan, W. */
    static final int FAN = 3;

    /** Heater of a defrost, W. */
    static final int DEFROST = 4;

    /** Running share. */
    static final int RUN = 5;

    static final int FLOWS = 6;

    private static final double COLDEST_C = -45;
    private static final double WARMEST_C = 55;
    private static final double WETTEST = 0.08;
    private static final double SHIFT_K = 0.01;

    /** Error of an own state that counts as 1: water on a coil, kg. */
    private static final double OWN_TOLERANCE = 0.005;

    private final CoolerLaw law;
    private final int flowAt;
    private final int own;
    private final boolean modulating;
    private final double followedC;
    private final double bandK;
    private final double fanAlwaysW;
    private final Branch[] branch;
    private final CoolerInputs in;
    private final CoolerEffect effect;
    private final CoolerEffect shifted;
    private boolean powered = true;
    private boolean on;
    private double defrostW;
    private boolean defrosting;

    private double removedByAirC;
    private double removedByRatio;
    private double vapourByAirC;
    private double vapourByRatio;
    private double fanByAirC;
    private double electricByAirC;
    private double electricByRatio;
    private double runByAirC;
    private final double[] vapourByOwn;
    private final double[] removedByOwn;

    /** What a cooler follows. {@code fanAlwaysW} is the fan that runs through rest and defrost. */
    record Following(boolean modulating, double followedC, double bandK, double fanAlwaysW) {}

    CoolerPart(Tree tree, int flowAt, CoolerLaw law, Following following) {
        this.law = law;
        this.flowAt = flowAt;
        this.own = law.ownStates();
        this.modulating = following.modulating;
        this.followedC = following.followedC;
        this.bandK = following.bandK;
        this.fanAlwaysW = following.fanAlwaysW;
        this.branch = own > 0 ? new Branch[] {tree.addBranch(0, own)} : new Branch[0];
        this.in = new CoolerInputs(own);
        in.airC = Double.NaN; // unlike anything it will be asked first
        this.effect = new CoolerEffect(own);
        this.shifted = new CoolerEffect(own);
        this.vapourByOwn = new double[own];
        this.removedByOwn = new double[own];
    }

    /**
     * Tells whether there is power.
     *
     * @param available true where there is
     */
    public void power(boolean available) {
        powered = available;
    }

    /**
     * Switches it by the thermostat.
     *
     * @param running true for on
     */
    public void switchOn(boolean running) {
        on = running;
    }

    /**
     * Returns whether the thermostat has it on.
     *
     * @return true for on
     */
    public boolean on() {
        return on;
    }

    /**
     * Returns whether it follows the air within the band.
     *
     * @return false where it is switched on and off
     */
    public boolean modulating() {
        return modulating;
    }

    /**
     * Returns the air temperature it keeps.
     *
     * @return °C
     */
    public double followedC() {
        return followedC;
    }

    /**
     * Returns the half width of its band.
     *
     * @return K
     */
    public double bandK() {
        return bandK;
    }

    /**
     * Starts or ends a defrost; the heater warms the chamber.
     *
     * @param running true for the start
     * @param heaterW heater, W
     */
    public void defrost(boolean running, double heaterW) {
        defrosting = running;
        defrostW = running ? heaterW : 0;
    }

    /**
     * Returns whether it is being defrosted.
     *
     * @return true while it is
     */
    public boolean defrosting() {
        return defrosting;
    }

    /**
     * Returns whether it has power.
     *
     * @return true where it has
     */
    public boolean powered() {
        return powered;
    }

    /**
     * Returns what it did when it was last asked.
     *
     * @return live
     */
    public CoolerEffect effect() {
        return effect;
    }

    void tolerances(double[] tolerances) {
        for (int i = 0; i < own; i++) {
            tolerances[branch[0].blockAt(i)] = OWN_TOLERANCE;
        }
    }

    int flow(int kind) {
        return flowAt + kind;
    }

    /**
     * Returns the water on its coil.
     *
     * @param y state
     * @return kg
     */
    public double waterKg(double[] y) {
        double sum = 0;
        for (int i = 0; i < own; i++) {
            sum += y[branch[0].blockAt(i)];
        }
        return sum;
    }

    private double run(double airC) {
        if (!powered || defrosting) {
            return 0;
        }
        if (modulating) {
            return Thermostat.modulatedShare(airC, followedC, bandK);
        }
        return on ? 1 : 0;
    }

    private void ask(AirState air, Outside outside, double[] y) {
        // A refused step may ask beyond what a coil knows; the parts around it then refuse it.
        double airC = air.airC > COLDEST_C ? Math.min(air.airC, WARMEST_C) : COLDEST_C;
        double ratio = air.ratio > 0 ? Math.min(air.ratio, WETTEST) : 0;
        double outdoorC = outside.outdoors.airC;
        double outdoorRatio = outside.outdoors.ratio;
        double run = run(air.airC);
        boolean asBefore =
                airC == in.airC
                        && ratio == in.humidityRatio
                        && outdoorC == in.outdoorC
                        && outdoorRatio == in.outdoorHumidityRatio
                        && run == in.run;
        in.airC = airC;
        in.humidityRatio = ratio;
        in.outdoorC = outdoorC;
        in.outdoorHumidityRatio = outdoorRatio;
        in.run = run;
        for (int i = 0; i < own; i++) {
            double state = y[branch[0].blockAt(i)];
            asBefore &= state == in.own[i];
            in.own[i] = state;
        }
        if (!asBefore) {
            law.effect(in, effect);
        }
    }

    private double fanW() {
        if (!powered) {
            return 0;
        }
        return defrosting ? fanAlwaysW : effect.fanW;
    }

    @Override
    public void rates(AirState air, Outside outside, double[] y, double[] rates, double[] flows) {
        ask(air, outside, y);
        double removed = effect.sensibleW + effect.vapourKgS * MoistAir.vapourEnthalpyJkg(air.airC);
        double heater = powered ? defrostW : 0;
        flows[flowAt + REMOVED] = removed;
        flows[flowAt + VAPOUR] = effect.vapourKgS;
        flows[flowAt + ELECTRIC] = effect.electricW;
        flows[flowAt + FAN] = fanW();
        flows[flowAt + DEFROST] = heater;
        flows[flowAt + RUN] = in.run;
        rates[AirState.ENTHALPY] += fanW() + heater - removed;
        rates[AirState.HUMIDITY] -= effect.vapourKgS;
        for (int i = 0; i < own; i++) {
            rates[branch[0].blockAt(i)] = effect.ownRate[i];
        }
    }

    @Override
    public void linearise(AirState air, Outside outside, double airKg, double[] y, Tree tree) {
        ask(air, outside, y);
        runByAirC =
                modulating && powered && !defrosting
                        ? Thermostat.modulatedSlopePerK(air.airC, followedC, bandK)
                        : 0;
        double enthalpy = MoistAir.vapourEnthalpyJkg(air.airC);
        vapourByAirC = effect.vapourByAirC + runByAirC * effect.vapourByRun;
        vapourByRatio = effect.vapourByHumidity;
        removedByAirC =
                effect.sensibleByAirC
                        + runByAirC * effect.sensibleByRun
                        + vapourByAirC * enthalpy
                        + effect.vapourKgS * MoistAir.VAPOUR_J_KG_K;
        removedByRatio = effect.sensibleByHumidity + vapourByRatio * enthalpy;
        fanByAirC = in.run > 0 ? runByAirC * (effect.fanW - fanAlwaysW) / in.run : 0;
        electricByAirC = effect.electricByAirC + runByAirC * effect.electricByRun;
        electricByRatio = effect.electricByHumidity;
        double heatByAirC = fanByAirC - removedByAirC;
        tree.hubByHub[0] += heatByAirC * air.airByEnthalpy / airKg;
        tree.hubByHub[1] += (heatByAirC * air.airByRatio - removedByRatio) / airKg;
        tree.hubByHub[2] -= vapourByAirC * air.airByEnthalpy / airKg;
        tree.hubByHub[3] -= (vapourByAirC * air.airByRatio + vapourByRatio) / airKg;
        ownJ(air, airKg, enthalpy);
    }

    private void ownJ(AirState air, double airKg, double enthalpy) {
        for (int i = 0; i < own; i++) {
            Branch b = branch[0];
            b.inner[i * own + i] = effect.ownRateByOwn[i];
            b.byHub[i * 2] = effect.ownRateByAirC[i] * air.airByEnthalpy;
            b.byHub[i * 2 + 1] =
                    effect.ownRateByAirC[i] * air.airByRatio + effect.ownRateByHumidity[i];
            vapourByOwn[i] = effect.vapourByOwn[i];
            removedByOwn[i] = effect.sensibleByOwn[i] + vapourByOwn[i] * enthalpy;
            b.onHub[i] = -removedByOwn[i] / airKg;
            b.onHub[own + i] = -vapourByOwn[i] / airKg;
        }
    }

    @Override
    public void timeSlope(
            AirState air, Outside outside, double[] y, double[] rateSlope, double[] slope) {
        if (in.run <= 0) {
            return;
        }
        double outdoorC = in.outdoorC;
        in.outdoorC = outdoorC + SHIFT_K;
        shifted.evaporatingC = effect.evaporatingC;
        law.effect(in, shifted);
        in.outdoorC = outdoorC;
        double a = outside.outdoors.airSlope / SHIFT_K;
        double vapour = a * (shifted.vapourKgS - effect.vapourKgS);
        double removed =
                a * (shifted.sensibleW - effect.sensibleW)
                        + vapour * MoistAir.vapourEnthalpyJkg(air.airC);
        slope[flowAt + REMOVED] = removed;
        slope[flowAt + VAPOUR] = vapour;
        slope[flowAt + ELECTRIC] = a * (shifted.electricW - effect.electricW);
        rateSlope[AirState.ENTHALPY] -= removed;
        rateSlope[AirState.HUMIDITY] -= vapour;
        for (int i = 0; i < own; i++) {
            rateSlope[branch[0].blockAt(i)] += a * (shifted.ownRate[i] - effect.ownRate[i]);
        }
    }

    @Override
    public void flowsAlong(AirState air, double[] v, double[] change) {
        double airC = air.airAlong(v);
        double ratio = v[AirState.HUMIDITY];
        double vapour = vapourByAirC * airC + vapourByRatio * ratio;
        double removed = removedByAirC * airC + removedByRatio * ratio;
        for (int i = 0; i < own; i++) {
            double water = v[branch[0].blockAt(i)];
            vapour += vapourByOwn[i] * water;
            removed += removedByOwn[i] * water;
        }
        change[flowAt + REMOVED] = removed;
        change[flowAt + VAPOUR] = vapour;
        change[flowAt + ELECTRIC] = electricByAirC * airC + electricByRatio * ratio;
        change[flowAt + FAN] = fanByAirC * airC;
        change[flowAt + RUN] = runByAirC * airC;
    }
}

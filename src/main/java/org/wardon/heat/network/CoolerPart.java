package org.wardon.heat.network;

import org.wardon.air.MoistAir;
import org.wardon.cooling.Compressor;
import org.wardon.cooling.Control;
import org.wardon.cooling.Cooler;
import org.wardon.cooling.CoolerEffect;
import org.wardon.cooling.CoolerInputs;
import org.wardon.cooling.CoolerLaw;
import org.wardon.cooling.Following;
import org.wardon.cooling.Thermostat;
import org.wardon.heat.solver.Branch;
import org.wardon.heat.solver.Tree;

/**
 * One cooler on the chamber's air. The thermostat switches it, or it follows the air within the
 * band; its own states, such as water on its coil, are a branch.
 */
public final class CoolerPart implements Part, FilmedFace.Control {
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

    /** Share of the time it really runs. */
    static final int RUN = 5;

    /** Outdoor air driven through the chamber, kg dry air/s. */
    static final int EXCHANGED = 6;

    /** Water used up, kg/s. */
    static final int WATER = 7;

    /** Heat that melts its ice, W. */
    static final int MELTS = 8;

    /** Heat its machine takes out of its ice, W. */
    static final int REFREEZES = 9;

    static final int FLOWS = 10;

    private static final double COLDEST_C = -45;
    private static final double WARMEST_C = 55;
    private static final double WETTEST = 0.08;

    /** Time over which the slope by the weather is taken, s; conditions change over less. */
    private static final double SHIFT_S = 10;

    private static final double SHIFT_OF_CONDITIONS_S = 0.25;

    private final Cooler unit;
    private final CoolerLaw law;
    private final int flowAt;
    private final int own;
    private final boolean follows;
    private final boolean modulating;
    private Band band = new Band(0, 1);
    private final double fanAlwaysW;
    private final Branch[] branch;
    private final CoolerInputs in;
    private final CoolerEffect effect;
    private final CoolerEffect after;
    private final CoolerEffect before;
    private boolean powered = true;
    private boolean mains = true;
    private boolean rechargeHours;
    private boolean on;
    private double defrostW;
    private boolean defrosting;

    private double runByAirC;

    /** Slopes of the flows at the start of a step: by air, by humidity ratio, by own states. */
    private final double[] byAirC = new double[FLOWS];

    private final double[] byRatio = new double[FLOWS];
    private final double[] byOwn;

    /** The air it keeps: a temperature, and half a band to either side. */
    record Band(double followedC, double bandK) {}

    CoolerPart(Tree tree, int flowAt, Cooler unit, CoolerLaw law) {
        this.unit = unit;
        this.law = law;
        this.flowAt = flowAt;
        this.own = law.ownStates();
        this.follows = unit.following().isPresent();
        this.modulating = unit.following().map(Following::modulating).orElse(false);
        this.fanAlwaysW = unit.following().map(Following::fanAlwaysW).orElse(0.0);
        this.branch = own > 0 ? new Branch[] {tree.addBranch(0, own)} : new Branch[0];
        this.in = new CoolerInputs(own);
        in.airC = Double.NaN; // unlike anything it will be asked first
        this.effect = new CoolerEffect(own);
        this.after = new CoolerEffect(own);
        this.before = new CoolerEffect(own);
        this.byOwn = new double[FLOWS * own];
    }

    /** Lets it keep other air from now on. */
    void keep(Band other) {
        band = other;
    }

    /** Writes its own states as they are at the start of a run. */
    void start(double[] y) {
        for (int i = 0; i < own; i++) {
            y[branch[0].blockAt(i)] = law.ownAtStart(i);
        }
    }

    /**
     * Returns the cooler it was built from, as the run asked for it.
     *
     * @return the record
     */
    public Cooler unit() {
        return unit;
    }

    /**
     * Tells whether there is power.
     *
     * @param available true where there is
     */
    public void power(boolean available) {
        mains = available;
        powered = available || !unit.needsPower();
        recharge(rechargeHours);
    }

    /**
     * Tells whether it is the hour of its machine that makes ice; it needs power too.
     *
     * @param hours true within the hours
     */
    public void recharge(boolean hours) {
        rechargeHours = hours;
        in.recharging = hours && mains;
        in.airC = Double.NaN; // what it did last was another thing
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
     * Returns whether a thermostat switches it on and off.
     *
     * @return false where it follows the air within the band, or always acts
     */
    public boolean switched() {
        return follows && !modulating;
    }

    /**
     * Returns the air temperature it keeps.
     *
     * @return °C
     */
    public double followedC() {
        return band.followedC;
    }

    /**
     * Returns the half width of its band.
     *
     * @return K
     */
    public double bandK() {
        return band.bandK;
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
     * Returns whether it has the power it needs.
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

    /**
     * Returns the share of the time air leaves it; a compressor that changes its speed blows while
     * it runs at all.
     *
     * @return 0 to 1
     */
    public double blows() {
        if (Double.isNaN(effect.supplyC) || effect.ran <= 0) {
            return 0;
        }
        boolean bySpeed = unit instanceof Compressor asked && asked.control() == Control.MODULATING;
        return bySpeed ? 1 : Math.min(1, effect.ran);
    }

    /**
     * Returns how much colder than the room the air is that leaves it, by the share of the time.
     *
     * @param airC the room's air, °C
     * @return K; 0 while it rests
     */
    public double chillK(double airC) {
        double blows = blows();
        return blows > 0 ? blows * (airC - effect.supplyC) : 0;
    }

    void tolerances(double[] tolerances) {
        for (int i = 0; i < own; i++) {
            tolerances[branch[0].blockAt(i)] = law.ownTolerance(i);
        }
    }

    /** Whether a state is one its own states can be in, to the error allowed them. */
    boolean possible(double[] y) {
        for (int i = 0; i < own; i++) {
            double state = y[branch[0].blockAt(i)];
            double most = law.ownMost(i);
            double over = law.ownTolerance(i);
            if (Double.isFinite(most) && !(state >= -over && state <= most + over)) {
                return false;
            }
        }
        return true;
    }

    int flow(int kind) {
        return flowAt + kind;
    }

    /** Outdoor air it drove in when it was last asked, kg dry air/s. */
    double drivenKgS() {
        return effect.exchangeKgS;
    }

    /** The same by air temperature, where the network was linearised last, kg/(s K). */
    double drivenByAirC() {
        return byAirC[EXCHANGED];
    }

    /** Share of the time its fan runs, 0 to 1, as it was last asked. */
    double fanRuns() {
        if (!powered || defrosting) {
            return 0;
        }
        return fanAlwaysW > 0 ? 1 : Math.min(Math.max(effect.ran, 0), 1);
    }

    /** The same by air temperature, where the network was linearised last, 1/K. */
    double fanRunsByAirC() {
        return fanFollows() ? byAirC[RUN] : 0;
    }

    /** The same in time, out of the slopes of the flows, 1/s. */
    double fanRunsSlope(double[] flowSlope) {
        return fanFollows() ? flowSlope[flowAt + RUN] : 0;
    }

    private boolean fanFollows() {
        return powered && !defrosting && fanAlwaysW <= 0 && effect.ran < 1;
    }

    /**
     * Returns an own state, such as the water on its coil.
     *
     * @param i number of the state
     * @param y state of the network
     * @return in its unit
     */
    public double own(int i, double[] y) {
        return y[branch[0].blockAt(i)];
    }

    @Override
    public double share(double airC) {
        if (!powered || defrosting) {
            return 0;
        }
        if (modulating) {
            return Thermostat.modulatedShare(airC, band.followedC, band.bandK);
        }
        return on || !follows ? 1 : 0;
    }

    @Override
    public double shareByAirC(double airC) {
        return modulating && powered && !defrosting
                ? Thermostat.modulatedSlopePerK(airC, band.followedC, band.bandK)
                : 0;
    }

    /** Tells the scratch what it meets; returns whether it has met just that before. */
    private boolean meets(double airC, double ratio, Outside outside, double run) {
        double outdoorC = outside.outdoors.airC;
        double outdoorRatio = outside.outdoors.ratio;
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
        return asBefore;
    }

    private void ask(AirState air, Outside outside, double[] y) {
        // A refused step may ask beyond what a coil knows; the parts around it then refuse it.
        double airC = air.airC > COLDEST_C ? Math.min(air.airC, WARMEST_C) : COLDEST_C;
        double ratio = air.ratio > 0 ? Math.min(air.ratio, WETTEST) : 0;
        boolean asBefore = meets(airC, ratio, outside, share(air.airC));
        for (int i = 0; i < own; i++) {
            double state = y[branch[0].blockAt(i)];
            asBefore &= state == in.own[i];
            in.own[i] = state;
        }
        if (!asBefore) {
            law.effect(in, effect);
        }
    }

    /** How far it is inside its own conditions, K or percent; infinite where it has none. */
    double inside(double airC, double ratio, Outside outside) {
        if (!law.conditional()) {
            return Double.POSITIVE_INFINITY;
        }
        meets(airC, ratio, outside, on ? 1 : 0);
        double inside = law.inside(in, on, after);
        in.airC = Double.NaN; // what it did last answers to other air
        return inside;
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
        flows[flowAt + RUN] = effect.ran;
        flows[flowAt + EXCHANGED] = effect.exchangeKgS;
        flows[flowAt + WATER] = effect.waterKgS;
        flows[flowAt + MELTS] = effect.meltsW;
        flows[flowAt + REFREEZES] = effect.refreezesW;
        rates[air.at] += fanW() + heater - removed;
        rates[air.at + 1] -= effect.vapourKgS;
        for (int i = 0; i < own; i++) {
            rates[branch[0].blockAt(i)] = effect.ownRate[i];
        }
    }

    @Override
    public void linearise(AirState air, Outside outside, double airKg, double[] y) {
        ask(air, outside, y);
        slopes(air.airC);
        double heatByAirC = byAirC[FAN] - byAirC[REMOVED];
        air.byItself[0] += heatByAirC * air.airByEnthalpy / airKg;
        air.byItself[1] += (heatByAirC * air.airByRatio - byRatio[REMOVED]) / airKg;
        air.byItself[2] -= byAirC[VAPOUR] * air.airByEnthalpy / airKg;
        air.byItself[3] -= (byAirC[VAPOUR] * air.airByRatio + byRatio[VAPOUR]) / airKg;
        ownJ(air, airKg);
    }

    private void slopes(double airC) {
        runByAirC = shareByAirC(airC);
        double enthalpy = MoistAir.vapourEnthalpyJkg(airC);
        byAirC[VAPOUR] = effect.vapourByAirC + runByAirC * effect.vapourByRun;
        byRatio[VAPOUR] = effect.vapourByHumidity;
        byAirC[REMOVED] =
                effect.sensibleByAirC
                        + runByAirC * effect.sensibleByRun
                        + byAirC[VAPOUR] * enthalpy
                        + effect.vapourKgS * MoistAir.VAPOUR_J_KG_K;
        byRatio[REMOVED] = effect.sensibleByHumidity + byRatio[VAPOUR] * enthalpy;
        byAirC[ELECTRIC] = effect.electricByAirC + runByAirC * effect.electricByRun;
        byRatio[ELECTRIC] = effect.electricByHumidity;
        double ranByAirC = effect.ranByAirC + runByAirC * effect.ranByRun;
        double perRan = effect.ran > 0 ? ranByAirC / effect.ran : 0;
        byAirC[RUN] = ranByAirC;
        byAirC[FAN] = perRan * (effect.fanW - fanAlwaysW);
        byAirC[EXCHANGED] = perRan * effect.exchangeKgS;
        byAirC[WATER] = perRan * effect.waterKgS;
        byAirC[MELTS] = effect.meltsByAirC + runByAirC * effect.meltsByRun;
        byRatio[MELTS] = effect.meltsByHumidity;
        for (int i = 0; i < own; i++) {
            byOwn[MELTS * own + i] = effect.meltsByOwn[i];
            byOwn[REFREEZES * own + i] = effect.refreezesByOwn[i];
            byOwn[VAPOUR * own + i] = effect.vapourByOwn[i];
            byOwn[REMOVED * own + i] = effect.sensibleByOwn[i] + effect.vapourByOwn[i] * enthalpy;
            byOwn[ELECTRIC * own + i] = effect.electricByOwn[i];
        }
    }

    private void ownJ(AirState air, double airKg) {
        for (int i = 0; i < own; i++) {
            Branch b = branch[0];
            b.inner[i * own + i] = effect.ownRateByOwn[i];
            double byAir = effect.ownRateByAirC[i] + runByAirC * effect.ownRateByRun[i];
            b.byHub[i * 2] = byAir * air.airByEnthalpy;
            b.byHub[i * 2 + 1] = byAir * air.airByRatio + effect.ownRateByHumidity[i];
            b.onHub[i] = -byOwn[REMOVED * own + i] / airKg;
            b.onHub[own + i] = -byOwn[VAPOUR * own + i] / airKg;
        }
    }

    @Override
    public void timeSlope(
            AirState air, Outside outside, double[] y, double[] rateSlope, double[] slope) {
        if (in.run <= 0 && own == 0) {
            return;
        }
        CoolerEffect behind = effect;
        double span = SHIFT_S;
        if (law.conditional()) {
            // Shares of own conditions bend: their slope is taken from both sides, over less.
            span = 2 * SHIFT_OF_CONDITIONS_S;
            behind = before;
            shift(outside.outdoors, -SHIFT_OF_CONDITIONS_S, before);
        }
        shift(outside.outdoors, law.conditional() ? SHIFT_OF_CONDITIONS_S : SHIFT_S, after);
        double vapour = (after.vapourKgS - behind.vapourKgS) / span;
        double removed =
                (after.sensibleW - behind.sensibleW) / span
                        + vapour * MoistAir.vapourEnthalpyJkg(air.airC);
        double fan = powered && !defrosting ? (after.fanW - behind.fanW) / span : 0;
        slope[flowAt + REMOVED] = removed;
        slope[flowAt + VAPOUR] = vapour;
        slope[flowAt + ELECTRIC] = (after.electricW - behind.electricW) / span;
        slope[flowAt + FAN] = fan;
        slope[flowAt + RUN] = (after.ran - behind.ran) / span;
        slope[flowAt + EXCHANGED] = (after.exchangeKgS - behind.exchangeKgS) / span;
        slope[flowAt + WATER] = (after.waterKgS - behind.waterKgS) / span;
        slope[flowAt + MELTS] = (after.meltsW - behind.meltsW) / span;
        slope[flowAt + REFREEZES] = (after.refreezesW - behind.refreezesW) / span;
        rateSlope[air.at] += fan - removed;
        rateSlope[air.at + 1] -= vapour;
        for (int i = 0; i < own; i++) {
            rateSlope[branch[0].blockAt(i)] += (after.ownRate[i] - behind.ownRate[i]) / span;
        }
    }

    /** Asks what it would do in the outdoor air of a little later, or before. */
    private void shift(Outside.Place out, double seconds, CoolerEffect then) {
        double outdoorC = in.outdoorC;
        double outdoorRatio = in.outdoorHumidityRatio;
        in.outdoorC = outdoorC + seconds * out.airSlope;
        in.outdoorHumidityRatio = outdoorRatio + seconds * out.ratioSlope;
        then.expect(effect);
        law.effect(in, then);
        in.outdoorC = outdoorC;
        in.outdoorHumidityRatio = outdoorRatio;
    }

    @Override
    public void flowsAlong(AirState air, double[] v, double[] change) {
        double airC = air.airAlong(v);
        double ratio = v[air.at + 1];
        for (int kind = 0; kind < FLOWS; kind++) {
            double sum = byAirC[kind] * airC + byRatio[kind] * ratio;
            for (int i = 0; i < own; i++) {
                sum += byOwn[kind * own + i] * v[branch[0].blockAt(i)];
            }
            change[flowAt + kind] = sum;
        }
    }
}

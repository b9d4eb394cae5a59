package org.wardon.heat.network;

import java.util.Arrays;
import java.util.function.DoubleUnaryOperator;
import org.wardon.air.MoistAir;
import org.wardon.heat.laws.FreeWater;
import org.wardon.heat.solver.Bank;
import org.wardon.heat.solver.Tree;
import org.wardon.lots.RespirationLaw;
import org.wardon.lots.Shells;

/**
 * All lots that stand in one air, side by side: shells from the middle outwards, skin without mass,
 * free water, package air with the tare. The block of each holds the outermost shell, the free
 * water, and enthalpy and humidity ratio of the package air. Arrays are {@code [row * places +
 * slot]}; a lot takes the next slot when it arrives, so that those that stand are the first.
 *
 * <p>The skin's temperature solves {@code ks (Tn - Ts) + kf (Tp - Ts) = m (hv(Ts) - hl(Ts))}:
 * evaporation draws its heat at the skin. Within a step it is foreseen along the slopes found at
 * the step's start and corrected once by Newton, which is exact to the square of what it missed by.
 */
final class LotBank implements Part {
    /** Flows of a lot: heat and enthalpy to the chamber's air, W. */
    static final int TO_AIR = 0;

    /** Vapour to the chamber's air, kg/s. */
    static final int VAPOUR = 1;

    /** Heat of respiration, W. */
    static final int RESPIRATION = 2;

    /** Vapour from skin and free water to the package air, kg/s. */
    static final int EVAPORATED = 3;

    /** Enthalpy that water had as a liquid, W. */
    static final int LIQUID = 4;

    static final int FLOWS = 5;

    static final int SHELLS = Shells.USUAL;
    static final int BY = 4;

    /** Respiration is followed by a cubic this far to either side, K. */
    private static final double BREATH_REACH_K = 0.6;

    /** Newton's last step; what is left is of its square, K. */
    private static final double LAST_STEP_K = 1e-2;

    /** The same where laws are asked directly, K. */
    private static final double PLAIN_LAST_STEP_K = 1e-7;

    private static final int MOST_STEPS = 12;

    /** The skin found last is a good start when it lies this near to a dry one, K. */
    private static final double NEAR_K = 5;

    static final double L0 = MoistAir.EVAPORATION_J_KG;
    static final double VAPOUR_LESS_WATER = MoistAir.VAPOUR_J_KG_K - MoistAir.WATER_J_KG_K;
    static final double WATER = MoistAir.WATER_J_KG_K;
    static final double RATIO = MoistAir.MOLAR_MASS_RATIO;
    static final double WIDTH = FreeWater.ROUND_PA;

    /** Their place in the state. */
    final Bank bank;

    /** Slots there are. */
    final int places;

    final int flowAt;
    final double pressurePa;
    private final boolean plain;
    private final RespirationLaw[] laws;
    private final DoubleUnaryOperator[] breathes;
    private final double[] respirationFactor;

    /** Constants of the lots, as {@link LotPart} gives them. */
    final double[] perCapacity;

    final double[] shellKg;
    final double[] between;
    final double[] leaves;
    final double[] skinWK;
    final double[] filmWK;
    final double[] perFullKg;
    final double[] packageWK;
    final double[] packageKgSPa;
    final double[] perPackageKg;
    final double[] packageJkgK;
    final double[] tissueKgSPa;
    final double[] lowering;
    final double[] filmKgSPa;

    /** 1 for a lot that gives to the air, 0 for a shadow. */
    final double[] gives;

    /** 1 for a lot that stands in the cold blast, 0 for others. */
    final double[] inBlast;

    final LocalCubics breath;
    final LocalCubics saturation;

    /** What the state last asked for is like. */
    final double[] skinC;

    final double[] packageC;
    final double[] packagePa;
    final double[] evaporated;
    private final double[] filmWater;
    final double[] breathing;
    private final double[] flux;

    /** At the start of the step: the block's unknowns, skin, and what the former do to the rest. */
    private final double[] startBlock;

    private final double[] startSkinC;
    final double[] skinBy;
    private final LotSlopes slopes;
    private boolean starts;
    private double chillK;
    double dryPa;

    LotBank(Tree tree, int flowAt, int places, double pressurePa, boolean plain) {
        this.bank = tree.addBank(places, SHELLS - 1);
        this.places = places;
        this.flowAt = flowAt;
        this.pressurePa = pressurePa;
        this.plain = plain;
        laws = new RespirationLaw[places];
        breathes = new DoubleUnaryOperator[places];
        respirationFactor = new double[places];
        perCapacity = new double[SHELLS * places];
        shellKg = new double[SHELLS * places];
        between = new double[(SHELLS - 1) * places];
        leaves = new double[(SHELLS - 1) * places];
        skinWK = new double[places];
        filmWK = new double[places];
        perFullKg = new double[places];
        packageWK = new double[places];
        packageKgSPa = new double[places];
        perPackageKg = new double[places];
        packageJkgK = new double[places];
        tissueKgSPa = new double[places];
        lowering = new double[places];
        filmKgSPa = new double[places];
        gives = new double[places];
        inBlast = new double[places];
        breath = new LocalCubics(SHELLS * places, BREATH_REACH_K);
        saturation = new LocalCubics(places, Saturation.REACH_K);
        skinC = new double[places];
        packageC = new double[places];
        packagePa = new double[places];
        evaporated = new double[places];
        filmWater = new double[places];
        breathing = new double[places];
        flux = new double[places];
        startBlock = new double[BY * places];
        startSkinC = new double[places];
        skinBy = new double[BY * places];
        slopes = new LotSlopes(this);
    }

    /** Empties all slots. */
    void clear() {
        bank.count(0);
    }

    /** Opens the next slot for a lot that arrives with its flesh at a temperature. */
    int open(double pulpC) {
        int slot = bank.count();
        bank.count(slot + 1);
        skinC[slot] = pulpC;
        startSkinC[slot] = pulpC;
        for (int j = 0; j < BY; j++) {
            skinBy[j * places + slot] = 0;
        }
        saturation.renew(slot, pulpC, 1, Saturation::overWaterPa);
        return slot;
    }

    /** Changes the law of respiration of a lot whose shells are near a temperature. */
    void breathe(int slot, RespirationLaw law, double factor, double nearC) {
        laws[slot] = law;
        breathes[slot] = law::wattsPerKg;
        respirationFactor[slot] = factor;
        for (int k = 0; k < SHELLS; k++) {
            renewBreath(k, slot, nearC);
        }
    }

    /** Place of a flow of a lot. */
    int flow(int kind, int slot) {
        return flowAt + kind * places + slot;
    }

    /** Heat of respiration of a shell as the steps see it, W. */
    double breathW(int k, int slot, double t) {
        int j = k * places + slot;
        return plain || breath.stale(j, t) ? lawfulW(k, slot, t) : breath.value(j, t);
    }

    private double lawfulW(int k, int slot, double t) {
        return shellKg[k * places + slot] * respirationFactor[slot] * laws[slot].wattsPerKg(t);
    }

    /** Tells how much colder and drier than the room the air of the cold blast is. */
    void blast(double coolerByK, double drierByPa) {
        chillK = coolerByK;
        dryPa = drierByPa;
    }

    @Override
    public void near(AirState air, double[] y) {
        int n = bank.count();
        for (int k = 0; k < SHELLS; k++) {
            for (int i = 0; i < n; i++) {
                double t = y[bank.at(k, i)];
                if (breath.stale(k * places + i, t)) {
                    renewBreath(k, i, t);
                }
            }
        }
        starts = !plain;
        packageAir(y);
        int shell = bank.at(SHELLS - 1, 0);
        for (int i = 0; i < n; i++) {
            double dry =
                    (skinWK[i] * y[shell + i] + filmWK[i] * packageC[i]) / (skinWK[i] + filmWK[i]);
            // The skin of the state last asked for is the best guess, unless that was far off.
            startSkinC[i] = Math.abs(skinC[i] - dry) < NEAR_K ? skinC[i] : dry;
        }
        Arrays.fill(skinBy, 0);
    }

    private void renewBreath(int k, int i, double t) {
        int j = k * places + i;
        breath.renew(j, t, shellKg[j] * respirationFactor[i], breathes[i]);
    }

    @Override
    public void rates(AirState air, Outside outside, double[] y, double[] rates, double[] flows) {
        if (plain) {
            askBreath(y);
        }
        shells(y, rates);
        packageAir(y);
        foreseeSkin(y);
        solveSkin(y);
        exchange(air, y, rates, flows);
    }

    /** Rates of all shells but what the outermost loses to the skin. */
    private void shells(double[] y, double[] rates) {
        int n = bank.count();
        int p = places;
        Arrays.fill(breathing, 0, n, 0);
        Arrays.fill(flux, 0, n, 0);
        for (int k = 0; k < SHELLS - 1; k++) {
            shell(k * p, bank.start + k * p, n, y, rates);
        }
        int row = (SHELLS - 1) * p;
        int at = bank.start + row;
        for (int i = 0; i < n; i++) {
            int j = row + i;
            double d = y[at + i] - breath.centre[j];
            double heat = breath.c0[j] + d * (breath.c1[j] + d * (breath.c2[j] + d * breath.c3[j]));
            breathing[i] += heat;
            rates[at + i] = (flux[i] + heat) * perCapacity[j];
        }
    }

    private void shell(int row, int at, int n, double[] y, double[] rates) {
        int p = places;
        double[] centre = breath.centre;
        double[] c0 = breath.c0;
        double[] c1 = breath.c1;
        double[] c2 = breath.c2;
        double[] c3 = breath.c3;
        for (int i = 0; i < n; i++) {
            int j = row + i;
            double t = y[at + i];
            double d = t - centre[j];
            double heat = c0[j] + d * (c1[j] + d * (c2[j] + d * c3[j]));
            double next = between[j] * (t - y[at + p + i]);
            rates[at + i] = (flux[i] - next + heat) * perCapacity[j];
            breathing[i] += heat;
            flux[i] = next;
        }
    }

    private void packageAir(double[] y) {
        int n = bank.count();
        int h = bank.at(SHELLS + 1, 0);
        int w = bank.at(SHELLS + 2, 0);
        for (int i = 0; i < n; i++) {
            double ratio = y[w + i];
            packageC[i] =
                    (y[h + i] - ratio * L0) / (packageJkgK[i] + MoistAir.VAPOUR_J_KG_K * ratio);
            packagePa[i] = pressurePa * ratio / (RATIO + ratio);
        }
    }

    private void foreseeSkin(double[] y) {
        int n = bank.count();
        int p = places;
        int b = bank.at(SHELLS - 1, 0);
        for (int i = 0; i < n; i++) {
            skinC[i] =
                    startSkinC[i]
                            + skinBy[i] * (y[b + i] - startBlock[i])
                            + skinBy[p + i] * (y[b + p + i] - startBlock[p + i])
                            + skinBy[2 * p + i] * (y[b + 2 * p + i] - startBlock[2 * p + i])
                            + skinBy[3 * p + i] * (y[b + 3 * p + i] - startBlock[3 * p + i]);
        }
    }

    private void solveSkin(double[] y) {
        double last = plain ? PLAIN_LAST_STEP_K : LAST_STEP_K;
        for (int k = 0; k < MOST_STEPS; k++) {
            if (plain) {
                askSaturation();
            }
            if (newton(y) < last && !(starts && renewSaturation())) {
                return;
            }
        }
    }

    /** Renews the cubics of skins that moved away; returns whether there was one. */
    private boolean renewSaturation() {
        boolean any = false;
        for (int i = 0; i < bank.count(); i++) {
            if (saturation.stale(i, skinC[i])) {
                saturation.renew(i, skinC[i], 1, Saturation::overWaterPa);
                any = true;
            }
        }
        return any;
    }

    /**
     * One step of Newton on the heat of the skins, with evaporation carried along by its slope;
     * returns the longest of them, K. By {@link org.wardon.heat.laws.SkinWater}; what condenses is
     * what evaporates less the drop. Branches here go the same way nearly always and cost less than
     * the larger of two numbers does.
     */
    private double newton(double[] y) {
        int n = bank.count();
        int shell = bank.at(SHELLS - 1, 0);
        int water = bank.at(SHELLS, 0);
        double longest = 0;
        for (int i = 0; i < n; i++) {
            double t = skinC[i];
            double pa = packagePa[i];
            double d = t - saturation.centre[i];
            double psat =
                    saturation.c0[i]
                            + d
                                    * (saturation.c1[i]
                                            + d * (saturation.c2[i] + d * saturation.c3[i]));
            double slope = saturation.c1[i] + d * (2 * saturation.c2[i] + d * 3 * saturation.c3[i]);
            double wet = FreeWater.wetShare(y[water + i] * perFullKg[i]);
            double drop = lowering[i] * psat - pa;
            double filmDrop = psat - pa;
            double dry = tissueKgSPa[i] * (1 - wet);
            double up = FreeWater.positive(filmDrop, WIDTH);
            double upSlope = FreeWater.positiveSlope(filmDrop, WIDTH);
            double film = filmKgSPa[i] * (wet * up - (up - filmDrop));
            double gone = dry * FreeWater.positive(drop, WIDTH) + film;
            double filmBySkin = filmKgSPa[i] * (wet * upSlope + (1 - upSlope)) * slope;
            double bySkin =
                    dry * FreeWater.positiveSlope(drop, WIDTH) * lowering[i] * slope + filmBySkin;
            double latent = L0 + VAPOUR_LESS_WATER * t;
            double miss =
                    skinWK[i] * (y[shell + i] - t) + filmWK[i] * (packageC[i] - t) - gone * latent;
            double fall = skinWK[i] + filmWK[i] + bySkin * latent + gone * VAPOUR_LESS_WATER;
            double step = miss / fall;
            skinC[i] = t + step;
            evaporated[i] = gone + bySkin * step;
            filmWater[i] = film + filmBySkin * step;
            double length = Math.abs(step);
            longest = length > longest ? length : longest;
        }
        return longest;
    }

    private void exchange(AirState air, double[] y, double[] rates, double[] flows) {
        int n = bank.count();
        int p = places;
        int b = bank.at(SHELLS - 1, 0);
        int last = (SHELLS - 1) * p;
        double heat = 0;
        double vapour = 0;
        for (int i = 0; i < n; i++) {
            double skin = skinC[i];
            double inside = packageC[i];
            double toSkin = skinWK[i] * (y[b + i] - skin);
            double liquid = evaporated[i] * WATER * skin;
            double out = packageKgSPa[i] * (packagePa[i] - (air.vapourPa - inBlast[i] * dryPa));
            double toAir =
                    packageWK[i] * (inside - (air.airC - inBlast[i] * chillK))
                            + out * (L0 + MoistAir.VAPOUR_J_KG_K * inside);
            rates[b + i] -= toSkin * perCapacity[last + i];
            rates[b + p + i] = -filmWater[i];
            rates[b + 2 * p + i] = (toSkin + liquid - toAir) * perPackageKg[i];
            rates[b + 3 * p + i] = (evaporated[i] - out) * perPackageKg[i];
            flows[flowAt + i] = toAir;
            flows[flowAt + VAPOUR * p + i] = out;
            flows[flowAt + RESPIRATION * p + i] = breathing[i];
            flows[flowAt + EVAPORATED * p + i] = evaporated[i];
            flows[flowAt + LIQUID * p + i] = liquid;
            heat += gives[i] * toAir;
            vapour += gives[i] * out;
        }
        rates[air.at] += heat;
        rates[air.at + 1] += vapour;
    }

    @Override
    public void linearise(AirState air, Outside outside, double airKg, double[] y) {
        int n = bank.count();
        int p = places;
        starts = false;
        System.arraycopy(skinC, 0, startSkinC, 0, n);
        for (int j = 0; j < BY; j++) {
            System.arraycopy(y, bank.at(SHELLS - 1 + j, 0), startBlock, j * p, n);
        }
        if (plain) {
            askSaturation();
        }
        slopes.at(air, airKg, y);
    }

    @Override
    public void timeSlope(
            AirState air, Outside outside, double[] y, double[] rateSlope, double[] slope) {
        // Lots feel time only through the chamber's air.
    }

    @Override
    public void flowsAlong(AirState air, double[] v, double[] change) {
        slopes.flowsAlong(air, v, change);
    }

    private void askBreath(double[] y) {
        for (int k = 0; k < SHELLS; k++) {
            for (int i = 0; i < bank.count(); i++) {
                double t = y[bank.at(k, i)];
                double slope =
                        shellKg[k * places + i]
                                * respirationFactor[i]
                                * laws[i].slopeWattsPerKgK(t);
                breath.exact(k * places + i, t, lawfulW(k, i, t), slope);
            }
        }
    }

    private void askSaturation() {
        for (int i = 0; i < bank.count(); i++) {
            double t = skinC[i];
            saturation.exact(i, t, Saturation.overWaterPa(t), Saturation.overWaterSlopePaPerK(t));
        }
    }
}

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
    private static final int BY = 4;

    /** Respiration is followed by a cubic this far to either side, K. */
    private static final double BREATH_REACH_K = 0.6;

    /** Newton's last step; what is left is of its square, K. */
    private static final double LAST_STEP_K = 2e-3;

    /** The same where laws are asked directly, K. */
    private static final double PLAIN_LAST_STEP_K = 1e-7;

    private static final int MOST_STEPS = 12;

    /** The skin found last is a good start when it lies this near to a dry one, K. */
    private static final double NEAR_K = 5;

    private static final double L0 = MoistAir.EVAPORATION_J_KG;
    private static final double VAPOUR_LESS_WATER = MoistAir.VAPOUR_J_KG_K - MoistAir.WATER_J_KG_K;
    private static final double WATER = MoistAir.WATER_J_KG_K;
    private static final double RATIO = MoistAir.MOLAR_MASS_RATIO;
    private static final double WIDTH = FreeWater.ROUND_PA;
    private static final double PER_WIDTH = 1 / (2 * WIDTH);

    /** Their place in the state. */
    final Bank bank;

    /** Slots there are. */
    final int places;

    private final int flowAt;
    private final double pressurePa;
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

    private final LocalCubics breath;
    private final LocalCubics saturation;

    /** What the state last asked for is like. */
    final double[] skinC;

    final double[] packageC;
    private final double[] packagePa;
    private final double[] evaporated;
    private final double[] filmWater;
    private final double[] breathing;
    private final double[] flux;

    /** At the start of the step: the block's unknowns, skin, and what the former do to the rest. */
    private final double[] startBlock;

    private final double[] startSkinC;
    private final double[] skinBy;
    private final double[] evaporatedBy;
    private final double[] liquidBy;
    private final double[] breathSlope;
    private final double[] packageByEnthalpy;
    private final double[] packageByRatio;
    private final double[] toAirByEnthalpy;
    private final double[] toAirByRatio;
    private final double[] vapourByRatio;
    private final double[] toAirByAirRatio;
    private boolean starts;
    private double chillK;
    private double dryPa;

    LotBank(Tree tree, int flowAt, int places, double pressurePa, boolean plain) {
        this.bank = tree.addBank(places, SHELLS - 1, AirState.ENTHALPY);
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
        evaporatedBy = new double[BY * places];
        liquidBy = new double[BY * places];
        breathSlope = new double[SHELLS * places];
        packageByEnthalpy = new double[places];
        packageByRatio = new double[places];
        toAirByEnthalpy = new double[places];
        toAirByRatio = new double[places];
        vapourByRatio = new double[places];
        toAirByAirRatio = new double[places];
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

    /** Heat of respiration of a shell, W. */
    double breathW(int k, int slot, double t) {
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
     * returns the longest of them, K. By {@link org.wardon.heat.laws.SkinWater}.
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
            double wet = wetShare(y[water + i] * perFullKg[i]);
            double drop = lowering[i] * psat - pa;
            double filmDrop = psat - pa;
            double near = within(drop);
            double nearFilm = within(filmDrop);
            double tissue = tissueKgSPa[i] * (1 - wet);
            double up = (nearFilm + WIDTH) * (nearFilm + WIDTH) * (0.5 * PER_WIDTH);
            double down = (WIDTH - nearFilm) * (WIDTH - nearFilm) * (0.5 * PER_WIDTH);
            double film =
                    filmKgSPa[i]
                            * (wet * (up + Math.max(filmDrop - WIDTH, 0))
                                    - (down + Math.max(-filmDrop - WIDTH, 0)));
            double gone =
                    tissue
                                    * ((near + WIDTH) * (near + WIDTH) * (0.5 * PER_WIDTH)
                                            + Math.max(drop - WIDTH, 0))
                            + film;
            double filmBySkin =
                    filmKgSPa[i]
                            * (wet * (nearFilm + WIDTH) + (WIDTH - nearFilm))
                            * PER_WIDTH
                            * slope;
            double bySkin = tissue * (near + WIDTH) * PER_WIDTH * lowering[i] * slope + filmBySkin;
            double latent = L0 + VAPOUR_LESS_WATER * t;
            double miss =
                    skinWK[i] * (y[shell + i] - t) + filmWK[i] * (packageC[i] - t) - gone * latent;
            double fall = skinWK[i] + filmWK[i] + bySkin * latent + gone * VAPOUR_LESS_WATER;
            double step = miss / fall;
            skinC[i] = t + step;
            evaporated[i] = gone + bySkin * step;
            filmWater[i] = film + filmBySkin * step;
            longest = Math.max(longest, Math.abs(step));
        }
        return longest;
    }

    /** {@link FreeWater#wetShare} without a branch. */
    private static double wetShare(double fullness) {
        double f = Math.min(fullness, 1);
        return f * (2 - Math.max(f, 0));
    }

    private static double within(double drop) {
        return Math.min(Math.max(drop, -WIDTH), WIDTH);
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
        rates[AirState.ENTHALPY] += heat;
        rates[AirState.HUMIDITY] += vapour;
    }

    @Override
    public void linearise(AirState air, Outside outside, double airKg, double[] y, Tree tree) {
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
        breathJ(y);
        for (int i = 0; i < n; i++) {
            skinJ(i, y);
        }
        hubJ(air, airKg, tree);
    }

    private void breathJ(double[] y) {
        int n = bank.count();
        for (int k = 0; k < SHELLS; k++) {
            int row = k * places;
            int at = bank.start + row;
            for (int j = row; j < row + n; j++) {
                double d = y[at + j - row] - breath.centre[j];
                breathSlope[j] = breath.c1[j] + d * (2 * breath.c2[j] + d * 3 * breath.c3[j]);
            }
            if (k < SHELLS - 1) {
                for (int j = row; j < row + n; j++) {
                    bank.self[j] = breathSlope[j] * perCapacity[j] - leaves[j];
                }
            }
        }
    }

    /** What the block's unknowns do to skin and evaporation; the block's rows. */
    private void skinJ(int i, double[] y) {
        int p = places;
        int b = bank.at(SHELLS - 1, i);
        double t = skinC[i];
        double pa = packagePa[i];
        double ratio = y[b + 3 * p];
        double d = t - saturation.centre[i];
        double psat =
                saturation.c0[i]
                        + d * (saturation.c1[i] + d * (saturation.c2[i] + d * saturation.c3[i]));
        double slope = saturation.c1[i] + d * (2 * saturation.c2[i] + d * 3 * saturation.c3[i]);
        double fullness = y[b + p] * perFullKg[i];
        double wet = wetShare(fullness);
        double wetSlope = 2 * (1 - Math.min(Math.max(fullness, 0), 1)) * perFullKg[i];
        double drop = lowering[i] * psat - pa;
        double filmDrop = psat - pa;
        double near = within(drop);
        double nearFilm = within(filmDrop);
        double tissueBy = tissueKgSPa[i] * (1 - wet) * (near + WIDTH) * PER_WIDTH;
        double filmBy = filmKgSPa[i] * (wet * (nearFilm + WIDTH) + (WIDTH - nearFilm)) * PER_WIDTH;
        double up =
                (nearFilm + WIDTH) * (nearFilm + WIDTH) * (0.5 * PER_WIDTH)
                        + Math.max(filmDrop - WIDTH, 0);
        double tissueUp =
                (near + WIDTH) * (near + WIDTH) * (0.5 * PER_WIDTH) + Math.max(drop - WIDTH, 0);
        double sum = RATIO + ratio;
        double paByRatio = pressurePa * RATIO / (sum * sum);
        double bySkin = (tissueBy * lowering[i] + filmBy) * slope;
        double byRatio = -(tissueBy + filmBy) * paByRatio;
        double byWater = (filmKgSPa[i] * up - tissueKgSPa[i] * tissueUp) * wetSlope;
        double gone = evaporated[i];
        double latent = L0 + VAPOUR_LESS_WATER * t;
        double inverse = 1 / (packageJkgK[i] + MoistAir.VAPOUR_J_KG_K * ratio);
        double cByRatio = -(L0 + MoistAir.VAPOUR_J_KG_K * packageC[i]) * inverse;
        double perFall = 1 / (skinWK[i] + filmWK[i] + bySkin * latent + gone * VAPOUR_LESS_WATER);
        double s0 = skinWK[i] * perFall;
        double s1 = -latent * byWater * perFall;
        double s2 = filmWK[i] * inverse * perFall;
        double s3 = (filmWK[i] * cByRatio - latent * byRatio) * perFall;
        double e0 = bySkin * s0;
        double e1 = bySkin * s1 + byWater;
        double e2 = bySkin * s2;
        double e3 = bySkin * s3 + byRatio;
        double filmBySkin = filmBy * slope;
        double[] j = bank.inner;
        j[4 * p + i] = -filmBySkin * s0;
        j[5 * p + i] = -filmBySkin * s1 - filmKgSPa[i] * up * wetSlope;
        j[6 * p + i] = -filmBySkin * s2;
        j[7 * p + i] = -filmBySkin * s3 + filmBy * paByRatio;
        keep(skinBy, i, s0, s1, s2, s3);
        keep(evaporatedBy, i, e0, e1, e2, e3);
        keep(
                liquidBy,
                i,
                WATER * (e0 * t + gone * s0),
                WATER * (e1 * t + gone * s1),
                WATER * (e2 * t + gone * s2),
                WATER * (e3 * t + gone * s3));
        packageByEnthalpy[i] = inverse;
        packageByRatio[i] = cByRatio;
        vapourByRatio[i] = packageKgSPa[i] * paByRatio;
    }

    private void keep(double[] by, int i, double v0, double v1, double v2, double v3) {
        by[i] = v0;
        by[places + i] = v1;
        by[2 * places + i] = v2;
        by[3 * places + i] = v3;
    }

    /** The other rows of the block, and what hangs on the chamber's air. */
    private void hubJ(AirState air, double airKg, Tree tree) {
        int n = bank.count();
        int p = places;
        int last = (SHELLS - 1) * p;
        double[] j = bank.inner;
        double perAirKg = 1 / airKg;
        double byEnthalpy = 0;
        double byRatio = 0;
        double vapourBy = 0;
        for (int i = 0; i < n; i++) {
            double per = perPackageKg[i];
            double perShell = perCapacity[last + i];
            double skin = skinWK[i];
            double enthalpy = L0 + MoistAir.VAPOUR_J_KG_K * packageC[i];
            double out = packageKgSPa[i] * (packagePa[i] - (air.vapourPa - inBlast[i] * dryPa));
            double byPackageC = packageWK[i] + out * MoistAir.VAPOUR_J_KG_K;
            double jRatio = vapourByRatio[i];
            double toAir2 = byPackageC * packageByEnthalpy[i];
            double toAir3 = byPackageC * packageByRatio[i] + enthalpy * jRatio;
            double jAir = -packageKgSPa[i] * air.vapourByRatio;
            double toAirByAir = enthalpy * jAir;
            double hubEnthalpy = -packageWK[i] * air.airByEnthalpy;
            double hubRatio = -packageWK[i] * air.airByRatio + toAirByAir;
            double s0 = skin * (1 - skinBy[i]);
            double s1 = -skin * skinBy[p + i];
            double s2 = -skin * skinBy[2 * p + i];
            double s3 = -skin * skinBy[3 * p + i];
            j[i] = (breathSlope[last + i] - between[last - p + i] - s0) * perShell;
            j[p + i] = -s1 * perShell;
            j[2 * p + i] = -s2 * perShell;
            j[3 * p + i] = -s3 * perShell;
            j[8 * p + i] = (s0 + liquidBy[i]) * per;
            j[9 * p + i] = (s1 + liquidBy[p + i]) * per;
            j[10 * p + i] = (s2 + liquidBy[2 * p + i] - toAir2) * per;
            j[11 * p + i] = (s3 + liquidBy[3 * p + i] - toAir3) * per;
            j[12 * p + i] = evaporatedBy[i] * per;
            j[13 * p + i] = evaporatedBy[p + i] * per;
            j[14 * p + i] = evaporatedBy[2 * p + i] * per;
            j[15 * p + i] = (evaporatedBy[3 * p + i] - jRatio) * per;
            bank.byHub[i] = -hubEnthalpy * per;
            bank.byHub[p + i] = -hubRatio * per;
            bank.byHub[2 * p + i] = 0;
            bank.byHub[3 * p + i] = -jAir * per;
            double share = gives[i] * perAirKg;
            bank.onHub[i] = toAir2 * share;
            bank.onHub[p + i] = toAir3 * share;
            bank.onHub[2 * p + i] = 0;
            bank.onHub[3 * p + i] = jRatio * share;
            toAirByEnthalpy[i] = toAir2;
            toAirByRatio[i] = toAir3;
            toAirByAirRatio[i] = toAirByAir;
            byEnthalpy += hubEnthalpy * share;
            byRatio += hubRatio * share;
            vapourBy += jAir * share;
        }
        tree.hubByHub[0] += byEnthalpy;
        tree.hubByHub[1] += byRatio;
        tree.hubByHub[tree.hub() + 1] += vapourBy;
    }

    @Override
    public void timeSlope(
            AirState air, Outside outside, double[] y, double[] rateSlope, double[] slope) {
        // Lots feel time only through the chamber's air.
    }

    @Override
    public void flowsAlong(AirState air, double[] v, double[] change) {
        int n = bank.count();
        int p = places;
        int b = bank.at(SHELLS - 1, 0);
        double airC = air.airAlong(v);
        double ratio = v[AirState.HUMIDITY];
        Arrays.fill(breathing, 0, n, 0);
        for (int k = 0; k < SHELLS; k++) {
            int at = bank.at(k, 0);
            for (int i = 0; i < n; i++) {
                breathing[i] += breathSlope[k * p + i] * v[at + i];
            }
        }
        for (int i = 0; i < n; i++) {
            double v0 = v[b + i];
            double v1 = v[b + p + i];
            double v2 = v[b + 2 * p + i];
            double v3 = v[b + 3 * p + i];
            change[flowAt + i] =
                    toAirByEnthalpy[i] * v2
                            + toAirByRatio[i] * v3
                            - packageWK[i] * airC
                            + toAirByAirRatio[i] * ratio;
            change[flowAt + VAPOUR * p + i] =
                    vapourByRatio[i] * v3 - packageKgSPa[i] * air.vapourByRatio * ratio;
            change[flowAt + RESPIRATION * p + i] = breathing[i];
            change[flowAt + EVAPORATED * p + i] =
                    evaporatedBy[i] * v0
                            + evaporatedBy[p + i] * v1
                            + evaporatedBy[2 * p + i] * v2
                            + evaporatedBy[3 * p + i] * v3;
            change[flowAt + LIQUID * p + i] =
                    liquidBy[i] * v0
                            + liquidBy[p + i] * v1
                            + liquidBy[2 * p + i] * v2
                            + liquidBy[3 * p + i] * v3;
        }
    }

    private void askBreath(double[] y) {
        for (int k = 0; k < SHELLS; k++) {
            for (int i = 0; i < bank.count(); i++) {
                double t = y[bank.at(k, i)];
                double slope =
                        shellKg[k * places + i]
                                * respirationFactor[i]
                                * laws[i].slopeWattsPerKgK(t);
                breath.exact(k * places + i, t, breathW(k, i, t), slope);
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

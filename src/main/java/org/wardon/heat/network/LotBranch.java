package org.wardon.heat.network;

import org.wardon.air.MoistAir;
import org.wardon.heat.laws.FreeWater;
import org.wardon.heat.solver.Branch;
import org.wardon.heat.solver.Tree;
import org.wardon.lots.Lot;
import org.wardon.lots.Packing;
import org.wardon.lots.RespirationLaw;
import org.wardon.lots.Shells;

/**
 * One lot: shells from the middle outwards, skin without mass, free water, package air with the
 * tare. The block holds the outermost shell, the free water, and enthalpy and humidity ratio of the
 * package air.
 *
 * <p>The skin's temperature solves {@code ks (Tn - Ts) + kf (Tp - Ts) = m (hv(Ts) - hl(Ts))}:
 * evaporation draws its heat at the skin. Heat capacity, breathing mass and surface of a lot are
 * those at arrival: a lot that lost 5 % of its water would differ by as much, less than any of them
 * is known.
 */
public final class LotBranch implements Part {
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

    private static final double PACKAGE_AIR_C = 10;

    /** Respiration is followed by a cubic this far to either side, K. */
    private static final double BREATH_REACH_K = 0.6;

    private static final double L0 = MoistAir.EVAPORATION_J_KG;
    private static final double VAPOUR_LESS_WATER = MoistAir.VAPOUR_J_KG_K - MoistAir.WATER_J_KG_K;
    private static final double WATER = MoistAir.WATER_J_KG_K;

    /** The skin found last is a good start when it lies this near, K. */
    private static final double NEAR_K = 5;

    /** Newton ends with a step shorter than this, K. */
    private static final double LAST_STEP_K = 1e-7;

    /** Its place in the state. */
    final Branch branch;

    private final int flowAt;
    private final double pressurePa;
    private final int shells;
    private final double[] capacity;
    private final double[] perCapacity;
    private final double[] leaves;
    private final double[] shellKg;
    private final double[] between;
    private final double skin;
    private final double film;
    private final double fullKg;
    private final double packageWK;
    private final double packageKgSPa;
    private final double packageKg;
    private final double perPackageKg;
    private final double packageJkgK;
    private final SkinEvaporation dew;
    private LocalCurve[] breath;
    private final boolean plain;
    private final double respirationFactor;
    private boolean gives = true;

    double skinC;
    double packageC;
    private double packagePa;

    /** What the block's four unknowns do to skin, evaporation and the rest, at the last start. */
    private final double[] skinBy = new double[4];

    private final double[] evaporatedBy = new double[4];
    private final double[] filmWaterBy = new double[4];
    private final double[] liquidBy = new double[4];
    private final double[] packageCBy = new double[4];
    private final double[] toAirBy = new double[4];
    private final double[] breathSlope;
    private double jRatio;
    private double jAirRatio;
    private double toAirByAirRatio;

    LotBranch(
            Tree tree,
            int flowAt,
            Lot lot,
            Packing packing,
            double respirationFactor,
            double transpirationFactor,
            double pressurePa,
            boolean plain) {
        Shells cut = lot.shells();
        double kg = lot.massKg();
        this.shells = cut.count();
        this.branch = tree.addBranch(shells - 1, 4);
        this.flowAt = flowAt;
        this.pressurePa = pressurePa;
        this.plain = plain;
        this.respirationFactor = respirationFactor;
        capacity = new double[shells];
        perCapacity = new double[shells];
        leaves = new double[shells - 1];
        shellKg = new double[shells];
        between = new double[shells - 1];
        breathSlope = new double[shells];
        for (int i = 0; i < shells; i++) {
            shellKg[i] = kg * cut.massFraction(i);
            capacity[i] = shellKg[i] * lot.item().specificHeatJkgK();
            perCapacity[i] = 1 / capacity[i];
            if (i < shells - 1) {
                between[i] = kg * cut.conductanceWPerKgK(i);
            }
        }
        conductionJ();
        skin = kg * cut.skinConductanceWPerKgK();
        film = kg * packing.filmWPerKgK();
        fullKg = kg * lot.item().areaM2PerKg() * FreeWater.FULL_KG_M2;
        packageWK = kg * packing.chamberWPerKgK();
        packageKgSPa = kg * packing.vapourKgPerKgSPa();
        packageKg =
                kg
                        * packing.airM3PerKg()
                        / MoistAir.specificVolumeM3kg(PACKAGE_AIR_C, 0, pressurePa);
        perPackageKg = 1 / packageKg;
        packageJkgK = MoistAir.DRY_AIR_J_KG_K + kg * packing.tareJPerKgK() / packageKg;
        dew = new SkinEvaporation(lot, transpirationFactor, plain);
        breath = new LocalCurve[shells];
        breathe(lot.respiration());
    }

    /**
     * Changes the law of respiration.
     *
     * @param law the law from now on
     */
    public void breathe(RespirationLaw law) {
        for (int i = 0; i < shells; i++) {
            breath[i] =
                    new LocalCurve(
                            t -> respirationFactor * law.wattsPerKg(t),
                            t -> respirationFactor * law.slopeWattsPerKgK(t),
                            BREATH_REACH_K,
                            plain);
        }
    }

    /**
     * Makes the lot a shadow, or a lot again.
     *
     * @param toTheAir false for a shadow
     */
    public void give(boolean toTheAir) {
        gives = toTheAir;
    }

    /**
     * Returns whether the lot gives to the air.
     *
     * @return false for a shadow
     */
    public boolean gives() {
        return gives;
    }

    /**
     * Writes an even lot: package at the temperature of the flesh with the chamber's humidity; from
     * then on it takes part.
     *
     * @param pulpC flesh, °C
     * @param waterKg free water, kg
     * @param ratio humidity ratio of the chamber's air, kg/kg
     * @param y state, changed in place
     */
    public void arrive(double pulpC, double waterKg, double ratio, double[] y) {
        for (int i = 0; i < shells; i++) {
            y[branch.start + i] = pulpC;
        }
        int b = branch.blockAt(0);
        double cap = MoistAir.saturatedHumidityRatio(pulpC, pressurePa);
        double packageRatio = Math.min(ratio, cap);
        y[b + 1] = waterKg;
        y[b + 2] = packageJkgK * pulpC + packageRatio * MoistAir.vapourEnthalpyJkg(pulpC);
        y[b + 3] = packageRatio;
        branch.activate(true);
    }

    void tolerances(double lotK, double airK, double[] tolerances) {
        int b = branch.blockAt(0);
        for (int i = 0; i < shells; i++) {
            tolerances[branch.start + i] = lotK;
        }
        tolerances[b + 1] = 0.05 * fullKg;
        tolerances[b + 2] = airK * packageJkgK;
        tolerances[b + 3] = airK * 5e-4;
    }

    /**
     * Returns the heat of respiration.
     *
     * @param totals integrals of the flows
     * @return J
     */
    public double respirationJ(double[] totals) {
        return totals[flowAt + RESPIRATION];
    }

    /**
     * Returns the vapour that left skin and free water.
     *
     * @param totals integrals of the flows
     * @return kg
     */
    public double evaporatedKg(double[] totals) {
        return totals[flowAt + EVAPORATED];
    }

    /**
     * Returns the enthalpy that water had as a liquid.
     *
     * @param totals integrals of the flows
     * @return J
     */
    public double liquidJ(double[] totals) {
        return totals[flowAt + LIQUID];
    }

    /**
     * Returns the vapour that reached the chamber's air.
     *
     * @param totals integrals of the flows
     * @return kg
     */
    public double vapourKg(double[] totals) {
        return totals[flowAt + VAPOUR];
    }

    /**
     * Returns the enthalpy that reached the chamber's air.
     *
     * @param totals integrals of the flows
     * @return J
     */
    public double toAirJ(double[] totals) {
        return totals[flowAt + TO_AIR];
    }

    /**
     * Returns the mass average.
     *
     * @param y state
     * @return °C
     */
    public double meanC(double[] y) {
        double heat = 0;
        double whole = 0;
        for (int i = 0; i < shells; i++) {
            heat += capacity[i] * y[branch.start + i];
            whole += capacity[i];
        }
        return heat / whole;
    }

    /**
     * Returns the outermost shell.
     *
     * @param y state
     * @return °C
     */
    public double surfaceC(double[] y) {
        return y[branch.start + shells - 1];
    }

    /**
     * Returns the innermost shell.
     *
     * @param y state
     * @return °C
     */
    public double coreC(double[] y) {
        return y[branch.start];
    }

    /**
     * Returns the coldest shell.
     *
     * @param y state
     * @return °C
     */
    public double coldestC(double[] y) {
        double least = y[branch.start];
        for (int i = 1; i < shells; i++) {
            least = Math.min(least, y[branch.start + i]);
        }
        return least;
    }

    /**
     * Returns the warmest shell.
     *
     * @param y state
     * @return °C
     */
    public double warmestC(double[] y) {
        double most = y[branch.start];
        for (int i = 1; i < shells; i++) {
            most = Math.max(most, y[branch.start + i]);
        }
        return most;
    }

    /**
     * Returns the free water on the lot.
     *
     * @param y state
     * @return kg
     */
    public double waterKg(double[] y) {
        return y[branch.blockAt(1)];
    }

    /**
     * Returns the share of the skin under free water.
     *
     * @param y state
     * @return 0 to 1
     */
    public double wetShare(double[] y) {
        return FreeWater.wetShare(waterKg(y) / fullKg);
    }

    /**
     * Returns the relative humidity of package air at its own temperature.
     *
     * @param y state
     * @return 0 to 1 and a little above
     */
    public double humidityFraction(double[] y) {
        int b = branch.blockAt(0);
        packageAir(y[b + 2], y[b + 3]);
        return packagePa / Saturation.pressurePa(packageC);
    }

    /**
     * Returns the heat in the shells.
     *
     * @param y state
     * @return J from 0 °C
     */
    public double heatJ(double[] y) {
        double sum = 0;
        for (int i = 0; i < shells; i++) {
            sum += capacity[i] * y[branch.start + i];
        }
        return sum;
    }

    /**
     * Returns the enthalpy of package and package air.
     *
     * @param y state
     * @return J
     */
    public double packageHeatJ(double[] y) {
        return packageKg * y[branch.blockAt(2)];
    }

    /**
     * Returns the vapour in the package air.
     *
     * @param y state
     * @return kg
     */
    public double packageWaterKg(double[] y) {
        return packageKg * y[branch.blockAt(3)];
    }

    /**
     * Returns the heat of respiration.
     *
     * @param y state
     * @return W
     */
    public double respirationW(double[] y) {
        double sum = 0;
        for (int i = 0; i < shells; i++) {
            sum += shellKg[i] * breath[i].value(y[branch.start + i]);
        }
        return sum;
    }

    private void conductionJ() {
        for (int i = 0; i < shells - 1; i++) {
            double left = i == 0 ? 0 : between[i - 1];
            branch.before[i] = left * perCapacity[i];
            branch.after[i] = between[i] * perCapacity[i];
            leaves[i] = (left + between[i]) * perCapacity[i];
        }
        branch.blockByRun = between[shells - 2] * perCapacity[shells - 1];
    }

    private void packageAir(double enthalpy, double ratio) {
        packageC = (enthalpy - ratio * L0) / (packageJkgK + MoistAir.VAPOUR_J_KG_K * ratio);
        packagePa = pressurePa * ratio / (MoistAir.MOLAR_MASS_RATIO + ratio);
    }

    /** Newton on the heat of the skin; ends with evaporation at the skin found. */
    private void solveSkin(double shellC, double waterKg) {
        double wet = FreeWater.wetShare(waterKg / fullKg);
        double dry = (skin * shellC + film * packageC) / (skin + film);
        double t = Math.abs(skinC - dry) < NEAR_K ? skinC : dry;
        for (int i = 0; i < 12; i++) {
            dew.at(t, wet, packagePa);
            double latent = L0 + VAPOUR_LESS_WATER * t;
            double miss = skin * (shellC - t) + film * (packageC - t) - dew.evaporated * latent;
            double fall =
                    skin
                            + film
                            + dew.evaporatedBySkin * latent
                            + dew.evaporated * VAPOUR_LESS_WATER;
            double step = miss / fall;
            t += step;
            if (Math.abs(step) < LAST_STEP_K) {
                // What is left is of the square of this step: the slope carries it.
                dew.evaporated += dew.evaporatedBySkin * step;
                dew.filmWater += dew.filmWaterBySkin * step;
                break;
            }
        }
        skinC = t;
    }

    @Override
    public void rates(AirState air, Outside outside, double[] y, double[] rates, double[] flows) {
        int start = branch.start;
        int b = branch.blockAt(0);
        double breathing = 0;
        double flux = 0;
        for (int i = 0; i < shells - 1; i++) {
            double heat = shellKg[i] * breath[i].value(y[start + i]);
            double next = between[i] * (y[start + i] - y[start + i + 1]);
            rates[start + i] = (flux - next + heat) * perCapacity[i];
            breathing += heat;
            flux = next;
        }
        double heat = shellKg[shells - 1] * breath[shells - 1].value(y[b]);
        breathing += heat;
        packageAir(y[b + 2], y[b + 3]);
        solveSkin(y[b], y[b + 1]);
        double toSkin = skin * (y[b] - skinC);
        double liquid = dew.evaporated * WATER * skinC;
        double out = packageKgSPa * (packagePa - air.vapourPa);
        double toAir =
                packageWK * (packageC - air.airC) + out * MoistAir.vapourEnthalpyJkg(packageC);
        rates[b] = (flux - toSkin + heat) * perCapacity[shells - 1];
        rates[b + 1] = -dew.filmWater;
        rates[b + 2] = (toSkin + liquid - toAir) * perPackageKg;
        rates[b + 3] = (dew.evaporated - out) * perPackageKg;
        flows[flowAt + TO_AIR] = toAir;
        flows[flowAt + VAPOUR] = out;
        flows[flowAt + RESPIRATION] = breathing;
        flows[flowAt + EVAPORATED] = dew.evaporated;
        flows[flowAt + LIQUID] = liquid;
        if (gives) {
            rates[AirState.ENTHALPY] += toAir;
            rates[AirState.HUMIDITY] += out;
        }
    }

    @Override
    public void linearise(AirState air, Outside outside, double airKg, double[] y, Tree tree) {
        int start = branch.start;
        int b = branch.blockAt(0);
        for (int i = 0; i < shells; i++) {
            breath[i].near(y[start + i]);
            breathSlope[i] = shellKg[i] * breath[i].slope(y[start + i]);
            if (i < shells - 1) {
                branch.self[i] = breathSlope[i] * perCapacity[i] - leaves[i];
            }
        }
        dew.near(skinC);
        packageAir(y[b + 2], y[b + 3]);
        solveSkin(y[b], y[b + 1]);
        skinSlopes(y[b + 1], y[b + 3]);
        writeBlock();
        writeHub(air, airKg, tree);
    }

    private void skinSlopes(double waterKg, double ratio) {
        double byPa = pressurePa * MoistAir.MOLAR_MASS_RATIO;
        double sum = MoistAir.MOLAR_MASS_RATIO + ratio;
        double paByRatio = byPa / (sum * sum);
        double wetSlope = FreeWater.wetShareSlope(waterKg / fullKg) / fullKg;
        dew.evaporatedByRatio *= paByRatio;
        dew.filmWaterByRatio *= paByRatio;
        dew.evaporatedByWater *= wetSlope;
        dew.filmWaterByWater *= wetSlope;
        double inverse = 1 / (packageJkgK + MoistAir.VAPOUR_J_KG_K * ratio);
        packageCBy[2] = inverse;
        packageCBy[3] = -MoistAir.vapourEnthalpyJkg(packageC) * inverse;
        double latent = L0 + VAPOUR_LESS_WATER * skinC;
        double fall =
                skin + film + dew.evaporatedBySkin * latent + dew.evaporated * VAPOUR_LESS_WATER;
        skinBy[0] = skin / fall;
        skinBy[1] = -latent * dew.evaporatedByWater / fall;
        skinBy[2] = film * packageCBy[2] / fall;
        skinBy[3] = (film * packageCBy[3] - latent * dew.evaporatedByRatio) / fall;
        for (int i = 0; i < 4; i++) {
            double direct = i == 1 ? dew.evaporatedByWater : i == 3 ? dew.evaporatedByRatio : 0;
            double directFilm = i == 1 ? dew.filmWaterByWater : i == 3 ? dew.filmWaterByRatio : 0;
            evaporatedBy[i] = dew.evaporatedBySkin * skinBy[i] + direct;
            filmWaterBy[i] = dew.filmWaterBySkin * skinBy[i] + directFilm;
            liquidBy[i] = WATER * (evaporatedBy[i] * skinC + dew.evaporated * skinBy[i]);
        }
        jRatio = packageKgSPa * paByRatio;
    }

    private void writeBlock() {
        double perShell = perCapacity[shells - 1];
        double[] j = branch.inner;
        for (int i = 0; i < 4; i++) {
            double toSkinBy = skin * ((i == 0 ? 1 : 0) - skinBy[i]);
            j[i] = -toSkinBy * perShell;
            j[4 + i] = -filmWaterBy[i];
            j[8 + i] = (toSkinBy + liquidBy[i]) * perPackageKg;
            j[12 + i] = evaporatedBy[i] * perPackageKg;
        }
        j[0] += (breathSlope[shells - 1] - between[shells - 2]) * perShell;
        j[15] -= jRatio * perPackageKg;
    }

    private void writeHub(AirState air, double airKg, Tree tree) {
        double enthalpy = MoistAir.vapourEnthalpyJkg(packageC);
        double out = packageKgSPa * (packagePa - air.vapourPa);
        jAirRatio = -packageKgSPa * air.vapourByRatio;
        double byPackageC = packageWK + out * MoistAir.VAPOUR_J_KG_K;
        toAirBy[2] = byPackageC * packageCBy[2];
        toAirBy[3] = byPackageC * packageCBy[3] + enthalpy * jRatio;
        toAirByAirRatio = enthalpy * jAirRatio;
        double toAirByRatio = -packageWK * air.airByRatio + toAirByAirRatio;
        double toAirByEnthalpy = -packageWK * air.airByEnthalpy;
        branch.inner[10] -= toAirBy[2] * perPackageKg;
        branch.inner[11] -= toAirBy[3] * perPackageKg;
        branch.byHub[4] = -toAirByEnthalpy * perPackageKg;
        branch.byHub[5] = -toAirByRatio * perPackageKg;
        branch.byHub[7] = -jAirRatio * perPackageKg;
        double share = gives ? 1 / airKg : 0;
        branch.onHub[2] = toAirBy[2] * share;
        branch.onHub[3] = toAirBy[3] * share;
        branch.onHub[7] = jRatio * share;
        tree.hubByHub[0] += toAirByEnthalpy * share;
        tree.hubByHub[1] += toAirByRatio * share;
        tree.hubByHub[3] += jAirRatio * share;
    }

    @Override
    public void timeSlope(
            AirState air, Outside outside, double[] y, double[] rateSlope, double[] slope) {
        // A lot feels time only through the chamber's air.
    }

    @Override
    public void flowsAlong(AirState air, double[] v, double[] change) {
        int b = branch.blockAt(0);
        double breathing = 0;
        for (int i = 0; i < shells; i++) {
            breathing += breathSlope[i] * v[branch.start + i];
        }
        double evaporating = 0;
        double liquid = 0;
        for (int i = 0; i < 4; i++) {
            evaporating += evaporatedBy[i] * v[b + i];
            liquid += liquidBy[i] * v[b + i];
        }
        double ratio = v[AirState.HUMIDITY];
        change[flowAt + RESPIRATION] = breathing;
        change[flowAt + EVAPORATED] = evaporating;
        change[flowAt + LIQUID] = liquid;
        change[flowAt + VAPOUR] = jRatio * v[b + 3] + jAirRatio * ratio;
        change[flowAt + TO_AIR] =
                toAirBy[2] * v[b + 2]
                        + toAirBy[3] * v[b + 3]
                        - packageWK * air.airAlong(v)
                        + toAirByAirRatio * ratio;
    }
}

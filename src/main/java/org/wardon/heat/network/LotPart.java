package org.wardon.heat.network;

import org.wardon.air.MoistAir;
import org.wardon.errors.Require;
import org.wardon.heat.laws.FreeWater;
import org.wardon.lots.Lot;
import org.wardon.lots.Packing;
import org.wardon.lots.RespirationLaw;
import org.wardon.lots.Shells;

/**
 * One lot of a {@link LotBank}: its constants, and what it is like in a state. Heat capacity,
 * breathing mass and surface of a lot are those at arrival: a lot that lost 5 % of its water would
 * differ by as much, less than any of them is known.
 */
public final class LotPart {
    private static final double PACKAGE_AIR_C = 10;
    private static final int NOWHERE = -1;

    /** Place in the block behind the shells: free water, then enthalpy and ratio of package air. */
    private static final int WATER_ROW = LotBank.SHELLS;

    private static final int ENTHALPY_ROW = LotBank.SHELLS + 1;
    private static final int RATIO_ROW = LotBank.SHELLS + 2;

    private final LotBank bank;
    private final Lot lot;
    private final Packing packing;
    private final Shells cut;
    private final double respirationFactor;
    private final double transpirationFactor;
    private final double pressurePa;
    private final double fullKg;
    private final double packageKg;
    private final double packageJkgK;
    private RespirationLaw law;
    private int slot = NOWHERE;
    private boolean gives = true;
    private boolean inBlast;

    LotPart(LotBank bank, Lot lot, Tuning tuning, double pressurePa) {
        this.bank = bank;
        this.lot = lot;
        this.packing = LotInGivenAir.packing(lot, tuning.packageTime());
        this.cut = lot.shells();
        this.respirationFactor = tuning.respiration();
        this.transpirationFactor = tuning.transpiration();
        this.pressurePa = pressurePa;
        double kg = lot.massKg();
        fullKg = kg * lot.item().areaM2PerKg() * FreeWater.FULL_KG_M2;
        packageKg =
                kg
                        * packing.airM3PerKg()
                        / MoistAir.specificVolumeM3kg(PACKAGE_AIR_C, 0, pressurePa);
        packageJkgK = MoistAir.DRY_AIR_J_KG_K + kg * packing.tareJPerKgK() / packageKg;
        law = lot.respiration();
    }

    /**
     * Changes the law of respiration.
     *
     * @param now the law from now on
     */
    public void breathe(RespirationLaw now) {
        law = now;
        if (there()) {
            bank.breathe(slot, now, respirationFactor, bank.skinC[slot]);
        }
    }

    /**
     * Makes the lot a shadow, or a lot again.
     *
     * @param toTheAir false for a shadow
     */
    public void give(boolean toTheAir) {
        gives = toTheAir;
        if (there()) {
            bank.gives[slot] = toTheAir ? 1 : 0;
        }
    }

    /**
     * Returns whether the lot has arrived; one that left stays as a shadow.
     *
     * @return true from its arrival on
     */
    public boolean there() {
        return slot != NOWHERE;
    }

    void standInBlast() {
        inBlast = true;
    }

    /** Takes it out of the bank, which must be emptied too. */
    void takeOut() {
        slot = NOWHERE;
    }

    private void takeSlot(double pulpC) {
        if (!there()) {
            slot = bank.open(pulpC);
        }
        int p = bank.places;
        double kg = lot.massKg();
        double left = 0;
        for (int k = 0; k < LotBank.SHELLS; k++) {
            int j = k * p + slot;
            bank.shellKg[j] = kg * cut.massFraction(k);
            bank.perCapacity[j] = 1 / (bank.shellKg[j] * lot.item().specificHeatJkgK());
            if (k < LotBank.SHELLS - 1) {
                double right = kg * cut.conductanceWPerKgK(k);
                bank.between[j] = right;
                bank.bank.before[j] = left * bank.perCapacity[j];
                bank.bank.after[j] = right * bank.perCapacity[j];
                bank.leaves[j] = (left + right) * bank.perCapacity[j];
                left = right;
            } else {
                bank.bank.blockByRun[slot] = left * bank.perCapacity[j];
            }
        }
        bank.skinWK[slot] = kg * cut.skinConductanceWPerKgK();
        bank.filmWK[slot] = kg * packing.filmWPerKgK();
        bank.perFullKg[slot] = 1 / fullKg;
        bank.packageWK[slot] = kg * packing.chamberWPerKgK();
        bank.packageKgSPa[slot] = kg * packing.vapourKgPerKgSPa();
        bank.perPackageKg[slot] = 1 / packageKg;
        bank.packageJkgK[slot] = packageJkgK;
        bank.tissueKgSPa[slot] =
                kg * lot.transpiration().conductanceKgPerKgSPa() * transpirationFactor;
        bank.lowering[slot] = lot.transpiration().vapourPressureLowering();
        bank.filmKgSPa[slot] = kg * lot.transpiration().filmKgPerKgSPa();
        bank.gives[slot] = gives ? 1 : 0;
        bank.inBlast[slot] = inBlast ? 1 : 0;
        bank.breathe(slot, law, respirationFactor, pulpC);
    }

    /** Place of a node in the state, in the order shells, water, enthalpy, ratio. */
    private int at(int row) {
        return bank.bank.at(row, slot);
    }

    /** Whether a node of the state is one of its. */
    boolean holds(int node) {
        int from = bank.bank.start;
        return there()
                && node >= from
                && node < from + bank.bank.rows() * bank.places
                && (node - from) % bank.places == slot;
    }

    /**
     * Returns what its nodes hold, to be put into another chamber's state: shells, free water,
     * enthalpy and humidity ratio of the package air. Networks of one site cut a lot alike, so that
     * nothing is lost on the way.
     *
     * @param y state it is in
     * @return {@code [node]}, a copy
     */
    public double[] nodes(double[] y) {
        double[] all = new double[bank.bank.rows()];
        for (int k = 0; k < all.length; k++) {
            all[k] = y[at(k)];
        }
        return all;
    }

    /** Puts nodes into a state; from then on it takes part. */
    void put(double[] nodes, double[] y) {
        int rows = bank.bank.rows();
        Require.that(nodes.length == rows, "a lot of " + rows + " nodes, not " + nodes.length);
        takeSlot(nodes[LotBank.SHELLS - 1]);
        for (int k = 0; k < nodes.length; k++) {
            y[at(k)] = nodes[k];
        }
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
        takeSlot(pulpC);
        for (int k = 0; k < LotBank.SHELLS; k++) {
            y[at(k)] = pulpC;
        }
        double cap = MoistAir.saturatedHumidityRatio(pulpC, pressurePa);
        double packageRatio = Math.min(ratio, cap);
        y[at(WATER_ROW)] = waterKg;
        y[at(ENTHALPY_ROW)] =
                packageJkgK * pulpC + packageRatio * MoistAir.vapourEnthalpyJkg(pulpC);
        y[at(RATIO_ROW)] = packageRatio;
    }

    /** Writes what error of its nodes counts as 1, the other way round; once it is there. */
    void weights(double lotK, double airK, double[] weights) {
        for (int k = 0; k < LotBank.SHELLS; k++) {
            weights[at(k)] = 1 / lotK;
        }
        weights[at(WATER_ROW)] = 1 / (0.05 * fullKg);
        weights[at(ENTHALPY_ROW)] = 1 / (airK * packageJkgK);
        weights[at(RATIO_ROW)] = 1 / (airK * 5e-4);
    }

    /**
     * Returns the heat of respiration.
     *
     * @param totals integrals of the flows
     * @return J
     */
    public double respirationJ(double[] totals) {
        return totals[bank.flow(LotBank.RESPIRATION, slot)];
    }

    /**
     * Returns the vapour that left skin and free water.
     *
     * @param totals integrals of the flows
     * @return kg
     */
    public double evaporatedKg(double[] totals) {
        return totals[bank.flow(LotBank.EVAPORATED, slot)];
    }

    /**
     * Returns the enthalpy that water had as a liquid.
     *
     * @param totals integrals of the flows
     * @return J
     */
    public double liquidJ(double[] totals) {
        return totals[bank.flow(LotBank.LIQUID, slot)];
    }

    /**
     * Returns the vapour that reached the chamber's air.
     *
     * @param totals integrals of the flows
     * @return kg
     */
    public double vapourKg(double[] totals) {
        return totals[bank.flow(LotBank.VAPOUR, slot)];
    }

    /**
     * Returns the enthalpy that reached the chamber's air.
     *
     * @param totals integrals of the flows
     * @return J
     */
    public double toAirJ(double[] totals) {
        return totals[bank.flow(LotBank.TO_AIR, slot)];
    }

    /**
     * Returns the mass average.
     *
     * @param y state
     * @return °C
     */
    public double meanC(double[] y) {
        double sum = 0;
        double whole = 0;
        for (int k = 0; k < LotBank.SHELLS; k++) {
            sum += cut.massFraction(k) * y[at(k)];
            whole += cut.massFraction(k);
        }
        return sum / whole;
    }

    /**
     * Returns the outermost shell.
     *
     * @param y state
     * @return °C
     */
    public double surfaceC(double[] y) {
        return y[at(LotBank.SHELLS - 1)];
    }

    /**
     * Returns the innermost shell.
     *
     * @param y state
     * @return °C
     */
    public double coreC(double[] y) {
        return y[at(0)];
    }

    /**
     * Returns the coldest shell.
     *
     * @param y state
     * @return °C
     */
    public double coldestC(double[] y) {
        double least = y[at(0)];
        for (int k = 1; k < LotBank.SHELLS; k++) {
            least = Math.min(least, y[at(k)]);
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
        double most = y[at(0)];
        for (int k = 1; k < LotBank.SHELLS; k++) {
            most = Math.max(most, y[at(k)]);
        }
        return most;
    }

    /**
     * Returns whether all shells are within limits; asked at every step, as {@link #warmestC} is
     * not.
     *
     * @param lowC coldest allowed, °C
     * @param highC warmest allowed, °C
     * @param y state
     * @return false where one is beyond them or no number
     */
    public boolean within(double lowC, double highC, double[] y) {
        for (int k = 0; k < LotBank.SHELLS; k++) {
            double t = y[at(k)];
            if (!(t > lowC && t < highC)) {
                return false;
            }
        }
        return true;
    }

    /**
     * Returns a shell.
     *
     * @param k number of the shell, 0 in the middle
     * @param y state
     * @return °C
     */
    double shellC(int k, double[] y) {
        return y[at(k)];
    }

    /**
     * Returns the skin of the state the rates were asked for last.
     *
     * @return °C
     */
    double skinC() {
        return bank.skinC[slot];
    }

    /**
     * Returns the air of its package.
     *
     * @param y state
     * @return °C
     */
    double packageC(double[] y) {
        double ratio = y[at(RATIO_ROW)];
        return (y[at(ENTHALPY_ROW)] - ratio * MoistAir.EVAPORATION_J_KG)
                / (packageJkgK + MoistAir.VAPOUR_J_KG_K * ratio);
    }

    /**
     * Returns the free water on the lot.
     *
     * @param y state
     * @return kg
     */
    public double waterKg(double[] y) {
        return y[at(WATER_ROW)];
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
        double pa = MoistAir.vapourPressurePa(y[at(RATIO_ROW)], pressurePa);
        return pa / Saturation.pressurePa(packageC(y));
    }

    /**
     * Returns the heat in the shells.
     *
     * @param y state
     * @return J from 0 °C
     */
    public double heatJ(double[] y) {
        double sum = 0;
        for (int k = 0; k < LotBank.SHELLS; k++) {
            sum += y[at(k)] / bank.perCapacity[k * bank.places + slot];
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
        return packageKg * y[at(ENTHALPY_ROW)];
    }

    /**
     * Returns the vapour in the package air.
     *
     * @param y state
     * @return kg
     */
    public double packageWaterKg(double[] y) {
        return packageKg * y[at(RATIO_ROW)];
    }

    /**
     * Returns the heat of respiration.
     *
     * @param y state
     * @return W
     */
    public double respirationW(double[] y) {
        double sum = 0;
        for (int k = 0; k < LotBank.SHELLS; k++) {
            sum += bank.breathW(k, slot, y[at(k)]);
        }
        return sum;
    }
}

package org.wardon.heat.network;

import java.util.Arrays;
import org.wardon.air.MoistAir;
import org.wardon.heat.solver.Tree;
import org.wardon.heat.solver.TreeSystem;
import org.wardon.lots.Lot;
import org.wardon.lots.PackageFit;
import org.wardon.lots.Packing;

/** One lot in air that is given instead of computed: the same branch on a hub that is told. */
public final class LotInGivenAir implements TreeSystem {
    private final Tree tree = new Tree(2);
    private final AirState air;
    private final AirState startAir;
    private final Outside nowhere = new Outside();
    private final LotBranch lot;
    private final double[] tolerances;
    private double enthalpySlope;
    private double ratioSlope;

    /**
     * Compiles a lot.
     *
     * @param lot the lot
     * @param tuning factors on it
     * @param pressurePa air pressure, Pa
     */
    public LotInGivenAir(Lot lot, Tuning tuning, double pressurePa) {
        air = new AirState(pressurePa);
        startAir = new AirState(pressurePa);
        this.lot =
                new LotBranch(
                        tree,
                        0,
                        lot,
                        packing(lot, tuning.packageTime()),
                        tuning.respiration(),
                        tuning.transpiration(),
                        pressurePa,
                        false);
        this.lot.give(false);
        tolerances = new double[tree.size()];
    }

    /** The packing of a lot, slowed by a factor on its half-cooling time. */
    static Packing packing(Lot lot, double slower) {
        return Math.abs(slower - 1) < 1e-12
                ? lot.packing()
                : PackageFit.slowed(lot.item(), lot.packing(), slower);
    }

    /**
     * Returns the lot.
     *
     * @return its branch
     */
    public LotBranch lot() {
        return lot;
    }

    /**
     * Sets what error counts as 1.
     *
     * @param lotK of the lot, K
     * @param airK of package air, K
     */
    public void accuracy(double lotK, double airK) {
        Arrays.fill(tolerances, 1);
        lot.tolerances(lotK, airK, tolerances);
    }

    /**
     * Sets the air exactly and how it goes on: enthalpy and humidity ratio straight to those at the
     * end of the stretch.
     *
     * @param y state, changed in place
     * @param airC air now, °C
     * @param ratio humidity ratio now, kg/kg
     * @param thenC air at the end of the stretch, °C
     * @param thenRatio humidity ratio there, kg/kg
     * @param seconds length of the stretch, s, above 0
     */
    public void air(
            double[] y, double airC, double ratio, double thenC, double thenRatio, double seconds) {
        y[AirState.ENTHALPY] = MoistAir.enthalpyJkg(airC, ratio);
        y[AirState.HUMIDITY] = ratio;
        enthalpySlope = (MoistAir.enthalpyJkg(thenC, thenRatio) - y[AirState.ENTHALPY]) / seconds;
        ratioSlope = (thenRatio - ratio) / seconds;
    }

    @Override
    public Tree tree() {
        return tree;
    }

    @Override
    public int flows() {
        return LotBranch.FLOWS;
    }

    @Override
    public double[] tolerances() {
        return tolerances;
    }

    @Override
    public void rates(double t, double[] y, double[] rates, double[] flows) {
        air.set(y);
        rates[AirState.ENTHALPY] = enthalpySlope;
        rates[AirState.HUMIDITY] = ratioSlope;
        lot.rates(air, nowhere, y, rates, flows);
    }

    @Override
    public void linearise(double t, double[] y, double[] rateSlope, double[] flowSlope) {
        startAir.set(y);
        Arrays.fill(tree.hubByHub, 0);
        Arrays.fill(rateSlope, 0);
        Arrays.fill(flowSlope, 0);
        lot.linearise(startAir, nowhere, 1, y, tree);
    }

    @Override
    public void flowsAlong(double[] direction, double[] change) {
        lot.flowsAlong(startAir, direction, change);
    }
}

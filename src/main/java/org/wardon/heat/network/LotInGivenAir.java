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
    private final LotBank bank;
    private final LotPart lot;
    private final double[] weights;
    private double lotK;
    private double airK;
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
        air = new AirState(pressurePa, AirState.ENTHALPY);
        startAir = new AirState(pressurePa, AirState.ENTHALPY);
        bank = new LotBank(tree, 0, 1, pressurePa, false);
        this.lot = new LotPart(bank, lot, tuning, pressurePa);
        this.lot.give(false);
        weights = new double[tree.size()];
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
    public LotPart lot() {
        return lot;
    }

    /**
     * Sets what error counts as 1.
     *
     * @param lotK of the lot, K
     * @param airK of package air, K
     */
    public void accuracy(double lotK, double airK) {
        this.lotK = lotK;
        this.airK = airK;
    }

    /**
     * Lets the lot arrive.
     *
     * @param pulpC flesh, °C
     * @param waterKg free water, kg
     * @param ratio humidity ratio of the air, kg/kg
     * @param y state, changed in place
     */
    public void arrive(double pulpC, double waterKg, double ratio, double[] y) {
        lot.arrive(pulpC, waterKg, ratio, y);
        Arrays.fill(weights, 1);
        lot.weights(lotK, airK, weights);
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
        return LotBank.FLOWS;
    }

    @Override
    public double[] weights() {
        return weights;
    }

    @Override
    public void rates(double t, double[] y, double[] rates, double[] flows) {
        ask(air, y, rates, flows);
    }

    private void ask(AirState state, double[] y, double[] rates, double[] flows) {
        state.set(y);
        rates[AirState.ENTHALPY] = enthalpySlope;
        rates[AirState.HUMIDITY] = ratioSlope;
        bank.rates(state, nowhere, y, rates, flows);
    }

    @Override
    public void linearise(double t, double[] y, Change now, Change slope) {
        bank.near(startAir, y);
        ask(startAir, y, now.rates(), now.flows());
        startAir.startJ();
        Arrays.fill(slope.rates(), 0);
        Arrays.fill(slope.flows(), 0);
        bank.linearise(startAir, nowhere, 1, y);
        startAir.intoHub(tree);
    }

    @Override
    public void flowsAlong(double[] direction, double[] change) {
        bank.flowsAlong(startAir, direction, change);
    }
}

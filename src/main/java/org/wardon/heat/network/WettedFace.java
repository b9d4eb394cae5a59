package org.wardon.heat.network;

import org.wardon.air.MoistAir;
import org.wardon.heat.laws.FaceWater;
import org.wardon.heat.laws.FreeWater;
import org.wardon.heat.laws.WetOutside;
import org.wardon.heat.solver.Tree;

/**
 * A face kept wet outside, and damp inside on a share of its area, by water poured into its sand.
 * The run holds, before the layers, the water the outer side draws from, the block behind them the
 * inner surface, free water on it, and what the inner side has drawn: a balance that no rate
 * depends on, so the two need not know each other. Whether the sand still feeds the surfaces is
 * switched between steps: {@link #wet}.
 */
final class WettedFace extends FaceChain {
    private static final int LATENT_OUTSIDE = COMMON;
    private static final int OUTSIDE_KG = COMMON + 1;
    private static final int DAMP_KG = COMMON + 2;

    private static final int WET = COMMON + 3;

    static final int FLOWS = COMMON + 4;

    /** Less than this share of what the sand holds clings to it (assumption). */
    static final double CLINGS = 0.02;

    private static final double LATENT_SLOPE = MoistAir.VAPOUR_J_KG_K - MoistAir.WATER_J_KG_K;

    private final Sand sand;
    private final SurfaceWater inside;
    private final LocalCurve saturation;
    private double outsideKgS;
    private boolean wet;

    private double outVapour;
    private double outBySurface;
    private double outByRatio;
    private double outLatentBySurface;
    private double outLatent;

    /**
     * The sand of a face.
     *
     * @param holdsKg water it holds, kg
     * @param dampShare share of the inner side it keeps damp, 0 to 1
     * @param radiantWm2K radiant part of the far film, W/(m2 K)
     */
    record Sand(double holdsKg, double dampShare, double radiantWm2K) {}

    WettedFace(Tree tree, Build build, Sand sand) {
        super(tree.addBranch(build.grid().capacity.length, 3), build, 1);
        this.sand = sand;
        this.inside = new SurfaceWater(areaM2, build.convectiveWm2K(), build.plain());
        this.saturation = Saturation.curve(build.plain());
        farFilm(25);
    }

    @Override
    public void farFilm(double wattsM2K) {
        super.farFilm(wattsM2K);
        double convective = Math.max(wattsM2K - sand.radiantWm2K, 0) * wallFactor;
        outsideKgS = areaM2 * FaceWater.conductanceKgM2S(convective);
    }

    @Override
    int waterAt() {
        return innermost + 1;
    }

    private int drawnInsideAt() {
        return innermost + 2;
    }

    @Override
    public void steadyProfile(double airC, double[] y) {
        super.steadyProfile(airC, y);
        y[branch.start] = sand.holdsKg;
        y[waterAt()] = 0;
        y[drawnInsideAt()] = 0;
        follow(y);
    }

    @Override
    public void tolerances(double airK, double[] tolerances) {
        super.tolerances(airK, tolerances);
        tolerances[branch.start] = 0.01 * sand.holdsKg + 1e-3;
        tolerances[drawnInsideAt()] = tolerances[branch.start];
    }

    double holdsKg() {
        return sand.holdsKg;
    }

    /** Water in the sand, kg. */
    double sandKg(double[] y) {
        return y[branch.start] + y[drawnInsideAt()];
    }

    /** Pours water into the sand; returns what it cannot hold and lets run off, kg. */
    double pour(double kg, double[] y) {
        double after = sandKg(y) + kg;
        y[branch.start] = Math.min(after, sand.holdsKg);
        y[drawnInsideAt()] = 0;
        follow(y);
        return Math.max(after - sand.holdsKg, 0);
    }

    /** Takes from the state whether the sand still feeds the surfaces. */
    void follow(double[] y) {
        wet = sand.holdsKg > 0 && dryness(y) <= 0;
    }

    /** How far the sand is beyond drying out, as a share of what it holds; below 0 before. */
    double dryness(double[] y) {
        return CLINGS - sandKg(y) / sand.holdsKg;
    }

    /** Whether the sand feeds the surfaces. */
    boolean wet() {
        return wet;
    }

    /** Lets the surfaces dry. */
    void dry() {
        wet = false;
    }

    private double damp() {
        return wet ? sand.dampShare : 0;
    }

    private double drop(double surfaceC, AirState air, Outside outside) {
        double psat = saturation.value(surfaceC);
        double saturated = MoistAir.MOLAR_MASS_RATIO * psat / (air.pressurePa - psat);
        return saturated - outside.outdoors.ratio;
    }

    private void outside(double surfaceC, AirState air, Outside outside) {
        outVapour =
                wet
                        ? outsideKgS
                                * FreeWater.positive(
                                        drop(surfaceC, air, outside), FaceWater.ROUND_KG_KG)
                        : 0;
        outLatent = WetOutside.latentJkg(surfaceC);
    }

    private void outsideSlopes(double surfaceC, AirState air, Outside outside) {
        outside(surfaceC, air, outside);
        double slope =
                wet
                        ? outsideKgS
                                * FreeWater.positiveSlope(
                                        drop(surfaceC, air, outside), FaceWater.ROUND_KG_KG)
                        : 0;
        double psat = saturation.value(surfaceC);
        double rest = air.pressurePa - psat;
        outBySurface =
                slope
                        * MoistAir.MOLAR_MASS_RATIO
                        * air.pressurePa
                        / (rest * rest)
                        * saturation.slope(surfaceC);
        outByRatio = -slope;
        outLatentBySurface = outBySurface * outLatent + outVapour * LATENT_SLOPE;
    }

    @Override
    public void near(AirState air, double[] y) {
        saturation.near(y[outermost]);
        inside.near(y[innermost]);
    }

    @Override
    public void rates(AirState air, Outside outside, double[] y, double[] rates, double[] flows) {
        double outerC = y[outermost];
        outside(outerC, air, outside);
        double in = outer * (beyondC - outerC);
        double latentOut = outVapour * outLatent;
        double flux = conduct(in - latentOut / areaM2, y, rates);
        double surfaceC = y[innermost];
        inside.at(air, surfaceC, y[waterAt()], damp());
        double film = areaM2 * grid.inner * (surfaceC - air.airC);
        double latent = inside.vapour * inside.latent;
        double enthalpy = inside.vapour * inside.enthalpy;
        double bridge = bridgeWK * (beyondC - air.airC);
        int last = grid.capacity.length - 1;
        rates[innermost] = (areaM2 * flux - film - latent) / (areaM2 * grid.capacity[last]);
        rates[branch.start] = -outVapour;
        rates[waterAt()] = inside.fromDamp - inside.vapour - inside.runOff;
        rates[drawnInsideAt()] = -inside.fromDamp;
        rates[air.at] += film + bridge + enthalpy;
        rates[air.at + 1] += inside.vapour;
        flows[flowAt + HEAT] = film + bridge;
        flows[flowAt + VAPOUR] = inside.vapour;
        flows[flowAt + VAPOUR_ENTHALPY] = enthalpy;
        flows[flowAt + FROM_BEYOND] = areaM2 * in;
        flows[flowAt + LATENT] = latent;
        flows[flowAt + RUNS_OFF] = inside.runOff;
        flows[flowAt + BRIDGE] = bridge;
        flows[flowAt + LATENT_OUTSIDE] = latentOut;
        flows[flowAt + OUTSIDE_KG] = outVapour;
        flows[flowAt + DAMP_KG] = inside.fromDamp;
        flows[flowAt + WET] = wet ? 1 : 0;
    }

    @Override
    public void linearise(AirState air, Outside outside, double airKg, double[] y) {
        outsideSlopes(y[outermost], air, outside);
        inside.slopesAt(air, y[innermost], y[waterAt()], damp());
        int last = grid.capacity.length - 1;
        double capacity = areaM2 * grid.capacity[last];
        branch.self[0] = 0;
        branch.after[0] = -outBySurface;
        double evaporates = outLatentBySurface / (areaM2 * grid.capacity[0]);
        double film = areaM2 * grid.inner;
        double self = -(areaM2 * intoInnermost() + film + inside.latentBySurface) / capacity;
        if (last > 0) {
            branch.self[1] = -(outer + grid.between[0]) / grid.capacity[0] - evaporates;
        } else {
            self -= evaporates;
        }
        block(self, film, capacity, air);
        branch.onHub[0] = (film + inside.enthalpyBySurface) / airKg;
        branch.onHub[1] = inside.enthalpy * inside.byWater / airKg;
        branch.onHub[3] = inside.bySurface / airKg;
        branch.onHub[4] = inside.byWater / airKg;
        double toAir = film + bridgeWK;
        air.byItself[0] -= toAir * air.airByEnthalpy / airKg;
        air.byItself[1] += (-toAir * air.airByRatio + inside.enthalpy * inside.byRatio) / airKg;
        air.byItself[3] += inside.byRatio / airKg;
    }

    private void block(double self, double film, double capacity, AirState air) {
        branch.inner[0] = self;
        branch.inner[1] = -inside.latent * inside.byWater / capacity;
        branch.inner[3] = inside.dampBySurface - inside.bySurface;
        branch.inner[4] = -inside.byWater - inside.runOffByWater;
        branch.inner[6] = -inside.dampBySurface;
        branch.byHub[0] = film * air.airByEnthalpy / capacity;
        branch.byHub[1] = (film * air.airByRatio - inside.latent * inside.byRatio) / capacity;
        branch.byHub[3] = inside.dampByRatio - inside.byRatio;
        branch.byHub[5] = -inside.dampByRatio;
    }

    @Override
    public void timeSlope(
            AirState air, Outside outside, double[] y, double[] rateSlope, double[] slope) {
        double in = areaM2 * outer * beyondSlope;
        double vapour = outByRatio * outside.outdoors.ratioSlope;
        double latent = vapour * outLatent;
        rateSlope[outermost] += (in - latent) / (areaM2 * grid.capacity[0]);
        rateSlope[branch.start] -= vapour;
        rateSlope[air.at] += bridgeWK * beyondSlope;
        slope[flowAt + FROM_BEYOND] = in;
        slope[flowAt + HEAT] = bridgeWK * beyondSlope;
        slope[flowAt + BRIDGE] = bridgeWK * beyondSlope;
        slope[flowAt + LATENT_OUTSIDE] = latent;
        slope[flowAt + OUTSIDE_KG] = vapour;
    }

    @Override
    public void flowsAlong(AirState air, double[] v, double[] change) {
        double airC = air.airAlong(v);
        double ratio = v[air.at + 1];
        double surface = v[innermost];
        double byWater = inside.byWater * v[waterAt()] + inside.byRatio * ratio;
        change[flowAt + HEAT] = areaM2 * grid.inner * (surface - airC) - bridgeWK * airC;
        change[flowAt + BRIDGE] = -bridgeWK * airC;
        change[flowAt + VAPOUR] = inside.bySurface * surface + byWater;
        change[flowAt + VAPOUR_ENTHALPY] =
                inside.enthalpyBySurface * surface + inside.enthalpyAtStart * byWater;
        change[flowAt + LATENT] = inside.latentBySurface * surface + inside.latentAtStart * byWater;
        change[flowAt + FROM_BEYOND] = -areaM2 * outer * v[outermost];
        change[flowAt + RUNS_OFF] = inside.runOffByWater * v[waterAt()];
        change[flowAt + LATENT_OUTSIDE] = outLatentBySurface * v[outermost];
        change[flowAt + OUTSIDE_KG] = outBySurface * v[outermost];
        change[flowAt + WET] = 0;
        change[flowAt + DAMP_KG] = inside.dampBySurface * surface + inside.dampByRatio * ratio;
    }

    @Override
    public double takenJ(double[] totals) {
        return totals[flowAt + LATENT_OUTSIDE];
    }

    @Override
    public double waterUsedKg(double[] totals) {
        return totals[flowAt + OUTSIDE_KG] + totals[flowAt + DAMP_KG];
    }

    /** Time it was wet, s. */
    double wetS(double[] totals) {
        return totals[flowAt + WET];
    }
}

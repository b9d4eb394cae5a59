package org.wardon.heat.network;

import java.util.ArrayList;
import java.util.List;
import org.wardon.air.MoistAir;
import org.wardon.enclosure.Enclosure;
import org.wardon.enclosure.Face;
import org.wardon.enclosure.Layer;
import org.wardon.enclosure.OutsideBoundary;
import org.wardon.heat.laws.FaceWater;
import org.wardon.heat.laws.FreeWater;
import org.wardon.heat.solver.Branch;
import org.wardon.heat.solver.Tree;

/**
 * One face: conduction through its nodes, film and thermal bridge to the air, water condensing on
 * the inner surface, drying again or running off. Runs from the outside in; the block holds the
 * inner surface and the water on it. The thermal bridge is a conductance without mass beside the
 * layers.
 */
final class FaceBranch implements FacePart {
    private static final double EVAPORATION = MoistAir.EVAPORATION_J_KG;
    private static final double VAPOUR_LESS_WATER = MoistAir.VAPOUR_J_KG_K - MoistAir.WATER_J_KG_K;

    private final Branch branch;
    private final int flowAt;
    private final double areaM2;
    private final FaceGrid grid;
    private final double bridgeWK;
    private final double vapourKgS;
    private final LocalCurve saturation;
    private final double wallFactor;
    private double farFilm;
    private double outer;
    private double beyondC;
    private double beyondSlope;

    private double vapour;
    private double vapourBySurface;
    private double vapourByWater;
    private double vapourByRatio;
    private double latentBySurface;
    private double enthalpyBySurface;
    private double runOff;
    private double runOffByWater;

    private FaceBranch(
            Tree tree,
            int flowAt,
            double areaM2,
            FaceGrid grid,
            double bridgeWK,
            double convectiveWm2K,
            double wallFactor,
            boolean plain) {
        this.branch = tree.addBranch(grid.capacity.length - 1, 2);
        this.flowAt = flowAt;
        this.areaM2 = areaM2;
        this.grid = grid;
        this.bridgeWK = bridgeWK;
        this.vapourKgS = areaM2 * FaceWater.conductanceKgM2S(convectiveWm2K);
        this.wallFactor = wallFactor;
        this.saturation = Saturation.curve(plain);
        farFilm(25);
    }

    /** Compiles a face of a chamber. */
    static FaceBranch of(
            Tree tree, int flowAt, Face face, OutsideBoundary boundary, NetworkInputs inputs) {
        Enclosure enclosure = inputs.enclosure();
        List<Layer> layers = new ArrayList<>(boundary.addedLayers());
        layers.addAll(face.asBuilt());
        double wall = inputs.tuning().wall();
        FaceFilms.Film inside = FaceFilms.inside(enclosure, face, boundary, inputs);
        FaceGrid grid = new FaceGrid(layers, inside.resistanceM2KW(), wall);
        double area = enclosure.box().areaM2(face.name());
        double steady = grid.steady(boundary.filmWm2K(0) * wall);
        return new FaceBranch(
                tree,
                flowAt,
                area,
                grid,
                enclosure.thermalBridgePct() / 100 * area * steady,
                inside.convectiveWm2K(),
                wall,
                inputs.plain());
    }

    private void conductionJ() {
        for (int i = 0; i < branch.run; i++) {
            double left = i == 0 ? outer : grid.between[i - 1];
            double right = grid.between[i];
            branch.before[i] = left / grid.capacity[i];
            branch.after[i] = right / grid.capacity[i];
            branch.self[i] = -(left + right) / grid.capacity[i];
        }
        if (branch.run > 0) {
            branch.blockByRun = grid.between[branch.run - 1] / grid.capacity[branch.run];
        }
    }

    @Override
    public void farFilm(double wattsM2K) {
        farFilm = wattsM2K * wallFactor;
        outer = 1 / (1 / farFilm + grid.outerM2KW);
        conductionJ();
    }

    @Override
    public void beyond(double temperatureC, double slopeKs) {
        beyondC = temperatureC;
        beyondSlope = slopeKs;
    }

    @Override
    public void steadyProfile(double airC, double[] y) {
        double flux = grid.steady(farFilm) * (beyondC - airC);
        double t = beyondC - flux / outer;
        for (int i = 0; i < grid.capacity.length; i++) {
            y[branch.start + i] = t;
            if (i < grid.between.length) {
                t -= flux / grid.between[i];
            }
        }
        y[branch.blockAt(1)] = 0;
    }

    @Override
    public double heatJ(double[] y) {
        double sum = 0;
        for (int i = 0; i < grid.capacity.length; i++) {
            sum += grid.capacity[i] * y[branch.start + i];
        }
        return areaM2 * sum;
    }

    @Override
    public FaceGrid grid() {
        return grid;
    }

    @Override
    public int outermost() {
        return branch.start;
    }

    @Override
    public double beyondC() {
        return beyondC;
    }

    @Override
    public double farFilmWm2K() {
        return farFilm;
    }

    @Override
    public double areaM2() {
        return areaM2;
    }

    @Override
    public int firstNode() {
        return branch.start;
    }

    @Override
    public int lastNode() {
        return branch.blockAt(1);
    }

    @Override
    public double surfaceC(double[] y) {
        return y[branch.blockAt(0)];
    }

    @Override
    public double waterKg(double[] y) {
        return y[branch.blockAt(1)];
    }

    @Override
    public void tolerances(double airK, double[] tolerances) {
        for (int i = 0; i < grid.capacity.length; i++) {
            tolerances[branch.start + i] = 2 * airK;
        }
        tolerances[branch.blockAt(1)] = 0.05 * areaM2 * FreeWater.FULL_KG_M2;
    }

    @Override
    public int flow(int kind) {
        return flowAt + kind;
    }

    private void water(AirState air, double surfaceC, double waterKg) {
        double psat = saturation.value(surfaceC);
        double rest = air.pressurePa - psat;
        double saturated = MoistAir.MOLAR_MASS_RATIO * psat / rest;
        double drop = saturated - air.ratio;
        double full = areaM2 * FreeWater.FULL_KG_M2;
        double wet = FreeWater.wetShare(waterKg / full);
        double up = FreeWater.positive(drop, FaceWater.ROUND_KG_KG);
        double down = FreeWater.positive(-drop, FaceWater.ROUND_KG_KG);
        vapour = vapourKgS * (wet * up - down);
        runOff = areaM2 * FaceWater.runsOffKgM2S(waterKg / areaM2);
    }

    private void waterSlopes(AirState air, double surfaceC, double waterKg) {
        water(air, surfaceC, waterKg);
        double psat = saturation.value(surfaceC);
        double rest = air.pressurePa - psat;
        double saturatedSlope =
                MoistAir.MOLAR_MASS_RATIO
                        * air.pressurePa
                        / (rest * rest)
                        * saturation.slope(surfaceC);
        double drop = MoistAir.MOLAR_MASS_RATIO * psat / rest - air.ratio;
        double full = areaM2 * FreeWater.FULL_KG_M2;
        double wet = FreeWater.wetShare(waterKg / full);
        double up = FreeWater.positive(drop, FaceWater.ROUND_KG_KG);
        double byDrop =
                vapourKgS
                        * (wet * FreeWater.positiveSlope(drop, FaceWater.ROUND_KG_KG)
                                + FreeWater.positiveSlope(-drop, FaceWater.ROUND_KG_KG));
        vapourBySurface = byDrop * saturatedSlope;
        vapourByRatio = -byDrop;
        vapourByWater = vapourKgS * up * FreeWater.wetShareSlope(waterKg / full) / full;
        runOffByWater =
                FreeWater.positiveSlope(waterKg / areaM2 - FreeWater.FACE_HOLDS_KG_M2, 0.01)
                        / FreeWater.RUNS_OFF_S;
        double latent = EVAPORATION + VAPOUR_LESS_WATER * surfaceC;
        latentBySurface = vapourBySurface * latent + vapour * VAPOUR_LESS_WATER;
        double enthalpy = MoistAir.vapourEnthalpyJkg(surfaceC);
        enthalpyBySurface = vapourBySurface * enthalpy + vapour * MoistAir.VAPOUR_J_KG_K;
    }

    @Override
    public void rates(AirState air, Outside outside, double[] y, double[] rates, double[] flows) {
        int start = branch.start;
        double flux = outer * (beyondC - y[start]);
        flows[flowAt + FROM_BEYOND] = areaM2 * flux;
        for (int i = 0; i < branch.run; i++) {
            double next = grid.between[i] * (y[start + i] - y[start + i + 1]);
            rates[start + i] = (flux - next) / grid.capacity[i];
            flux = next;
        }
        int surface = branch.blockAt(0);
        double surfaceC = y[surface];
        water(air, surfaceC, y[surface + 1]);
        double film = areaM2 * grid.inner * (surfaceC - air.airC);
        double latent = vapour * (EVAPORATION + VAPOUR_LESS_WATER * surfaceC);
        double enthalpy = vapour * MoistAir.vapourEnthalpyJkg(surfaceC);
        double bridge = bridgeWK * (beyondC - air.airC);
        rates[surface] = (areaM2 * flux - film - latent) / (areaM2 * grid.capacity[branch.run]);
        rates[surface + 1] = -vapour - runOff;
        rates[AirState.ENTHALPY] += film + bridge + enthalpy;
        rates[AirState.HUMIDITY] += vapour;
        flows[flowAt + HEAT] = film + bridge;
        flows[flowAt + VAPOUR] = vapour;
        flows[flowAt + VAPOUR_ENTHALPY] = enthalpy;
        flows[flowAt + LATENT] = latent;
        flows[flowAt + RUNS_OFF] = runOff;
        flows[flowAt + BRIDGE] = bridge;
    }

    @Override
    public void linearise(AirState air, Outside outside, double airKg, double[] y, Tree tree) {
        int surface = branch.blockAt(0);
        double surfaceC = y[surface];
        saturation.near(surfaceC);
        waterSlopes(air, surfaceC, y[surface + 1]);
        double film = areaM2 * grid.inner;
        double capacity = areaM2 * grid.capacity[branch.run];
        double latent = EVAPORATION + VAPOUR_LESS_WATER * surfaceC;
        double enthalpy = MoistAir.vapourEnthalpyJkg(surfaceC);
        double left = branch.run > 0 ? areaM2 * grid.between[branch.run - 1] : areaM2 * outer;
        branch.inner[0] = -(left + film + latentBySurface) / capacity;
        branch.inner[1] = -latent * vapourByWater / capacity;
        branch.inner[2] = -vapourBySurface;
        branch.inner[3] = -vapourByWater - runOffByWater;
        branch.byHub[0] = film * air.airByEnthalpy / capacity;
        branch.byHub[1] = (film * air.airByRatio - latent * vapourByRatio) / capacity;
        branch.byHub[2] = 0;
        branch.byHub[3] = -vapourByRatio;
        branch.onHub[0] = (film + enthalpyBySurface) / airKg;
        branch.onHub[1] = enthalpy * vapourByWater / airKg;
        branch.onHub[2] = vapourBySurface / airKg;
        branch.onHub[3] = vapourByWater / airKg;
        double toAir = film + bridgeWK;
        tree.hubByHub[0] -= toAir * air.airByEnthalpy / airKg;
        tree.hubByHub[1] += (-toAir * air.airByRatio + enthalpy * vapourByRatio) / airKg;
        tree.hubByHub[3] += vapourByRatio / airKg;
        latentNow = latent;
        enthalpyNow = enthalpy;
    }

    private double latentNow;
    private double enthalpyNow;

    @Override
    public void timeSlope(
            AirState air, Outside outside, double[] y, double[] rateSlope, double[] slope) {
        double left = areaM2 * outer * beyondSlope;
        rateSlope[branch.start] += left / (areaM2 * grid.capacity[0]);
        rateSlope[AirState.ENTHALPY] += bridgeWK * beyondSlope;
        slope[flowAt + FROM_BEYOND] = left;
        slope[flowAt + HEAT] = bridgeWK * beyondSlope;
        slope[flowAt + BRIDGE] = bridgeWK * beyondSlope;
    }

    @Override
    public void flowsAlong(AirState air, double[] v, double[] change) {
        int surface = branch.blockAt(0);
        double airC = air.airAlong(v);
        double ratio = v[AirState.HUMIDITY];
        double byWater = vapourByWater * v[surface + 1] + vapourByRatio * ratio;
        change[flowAt + HEAT] = areaM2 * grid.inner * (v[surface] - airC) - bridgeWK * airC;
        change[flowAt + BRIDGE] = -bridgeWK * airC;
        change[flowAt + VAPOUR] = vapourBySurface * v[surface] + byWater;
        change[flowAt + VAPOUR_ENTHALPY] = enthalpyBySurface * v[surface] + enthalpyNow * byWater;
        change[flowAt + LATENT] = latentBySurface * v[surface] + latentNow * byWater;
        change[flowAt + FROM_BEYOND] = -areaM2 * outer * v[branch.start];
        change[flowAt + RUNS_OFF] = runOffByWater * v[surface + 1];
    }
}

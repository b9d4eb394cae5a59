package org.wardon.heat.network;

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
    private final double perFullKg;
    private final double[] perCapacity;
    private final double filmWK;
    private final double perSurface;
    private final LocalCurve saturation;
    private final double wallFactor;
    private double farFilm;
    private double outer;
    private double beyondC;
    private double beyondSlope;

    private double psat;
    private double drop;
    private double wet;
    private double up;
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
        perFullKg = 1 / (areaM2 * FreeWater.FULL_KG_M2);
        filmWK = areaM2 * grid.inner;
        perCapacity = new double[grid.capacity.length];
        for (int i = 0; i < perCapacity.length; i++) {
            perCapacity[i] = 1 / grid.capacity[i];
        }
        perSurface = perCapacity[branch.run] / areaM2;
        this.saturation = Saturation.curve(plain);
        farFilm(25);
    }

    /** Compiles a share of a face of a chamber. */
    static FaceBranch of(
            Tree tree,
            int flowAt,
            Face face,
            double share,
            OutsideBoundary boundary,
            NetworkInputs inputs) {
        Enclosure enclosure = inputs.enclosure();
        List<Layer> layers = face.asBuilt();
        double wall = inputs.tuning().wall();
        FaceFilms.Film inside = FaceFilms.inside(enclosure, face, boundary, inputs);
        FaceGrid grid = new FaceGrid(boundary.addedLayers(), layers, inside.resistanceM2KW(), wall);
        double area = enclosure.box().areaM2(face.name()) * share;
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
        double film = wattsM2K * wallFactor;
        if (film == farFilm) {
            return; // most hours are like the one before
        }
        farFilm = film;
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
        psat = saturation.value(surfaceC);
        drop = MoistAir.MOLAR_MASS_RATIO * psat / (air.pressurePa - psat) - air.ratio;
        wet = FreeWater.wetShare(waterKg * perFullKg);
        up = FreeWater.positive(drop, FaceWater.ROUND_KG_KG);
        double down = FreeWater.positive(-drop, FaceWater.ROUND_KG_KG);
        vapour = vapourKgS * (wet * up - down);
        runOff = areaM2 * FaceWater.runsOffKgM2S(waterKg / areaM2);
    }

    /** The slopes of what {@link #water} was asked for last. */
    private void waterSlopes(AirState air, double surfaceC, double waterKg) {
        double rest = air.pressurePa - psat;
        double saturatedSlope =
                MoistAir.MOLAR_MASS_RATIO
                        * air.pressurePa
                        / (rest * rest)
                        * saturation.slope(surfaceC);
        double byDrop =
                vapourKgS
                        * (wet * FreeWater.positiveSlope(drop, FaceWater.ROUND_KG_KG)
                                + FreeWater.positiveSlope(-drop, FaceWater.ROUND_KG_KG));
        vapourBySurface = byDrop * saturatedSlope;
        vapourByRatio = -byDrop;
        vapourByWater = vapourKgS * up * FreeWater.wetShareSlope(waterKg * perFullKg) * perFullKg;
        runOffByWater =
                FreeWater.positiveSlope(waterKg / areaM2 - FreeWater.FACE_HOLDS_KG_M2, 0.01)
                        / FreeWater.RUNS_OFF_S;
        double latent = EVAPORATION + VAPOUR_LESS_WATER * surfaceC;
        latentBySurface = vapourBySurface * latent + vapour * VAPOUR_LESS_WATER;
        double enthalpy = MoistAir.vapourEnthalpyJkg(surfaceC);
        enthalpyBySurface = vapourBySurface * enthalpy + vapour * MoistAir.VAPOUR_J_KG_K;
    }

    @Override
    public void near(AirState air, double[] y) {
        saturation.near(y[branch.blockAt(0)]);
    }

    @Override
    public void rates(AirState air, Outside outside, double[] y, double[] rates, double[] flows) {
        int start = branch.start;
        double flux = outer * (beyondC - y[start]);
        flows[flowAt + FROM_BEYOND] = areaM2 * flux;
        for (int i = 0; i < branch.run; i++) {
            double next = grid.between[i] * (y[start + i] - y[start + i + 1]);
            rates[start + i] = (flux - next) * perCapacity[i];
            flux = next;
        }
        int surface = branch.blockAt(0);
        double surfaceC = y[surface];
        water(air, surfaceC, y[surface + 1]);
        double film = filmWK * (surfaceC - air.airC);
        double latent = vapour * (EVAPORATION + VAPOUR_LESS_WATER * surfaceC);
        double enthalpy = vapour * MoistAir.vapourEnthalpyJkg(surfaceC);
        double bridge = bridgeWK * (beyondC - air.airC);
        rates[surface] = (areaM2 * flux - film - latent) * perSurface;
        rates[surface + 1] = -vapour - runOff;
        rates[air.at] += film + bridge + enthalpy;
        rates[air.at + 1] += vapour;
        flows[flowAt + HEAT] = film + bridge;
        flows[flowAt + VAPOUR] = vapour;
        flows[flowAt + VAPOUR_ENTHALPY] = enthalpy;
        flows[flowAt + LATENT] = latent;
        flows[flowAt + RUNS_OFF] = runOff;
        flows[flowAt + BRIDGE] = bridge;
    }

    @Override
    public void linearise(AirState air, Outside outside, double airKg, double[] y) {
        int surface = branch.blockAt(0);
        double surfaceC = y[surface];
        waterSlopes(air, surfaceC, y[surface + 1]);
        double film = filmWK;
        double perAirKg = 1 / airKg;
        double latent = EVAPORATION + VAPOUR_LESS_WATER * surfaceC;
        double enthalpy = MoistAir.vapourEnthalpyJkg(surfaceC);
        double left = branch.run > 0 ? areaM2 * grid.between[branch.run - 1] : areaM2 * outer;
        branch.inner[0] = -(left + film + latentBySurface) * perSurface;
        branch.inner[1] = -latent * vapourByWater * perSurface;
        branch.inner[2] = -vapourBySurface;
        branch.inner[3] = -vapourByWater - runOffByWater;
        branch.byHub[0] = film * air.airByEnthalpy * perSurface;
        branch.byHub[1] = (film * air.airByRatio - latent * vapourByRatio) * perSurface;
        branch.byHub[2] = 0;
        branch.byHub[3] = -vapourByRatio;
        branch.onHub[0] = (film + enthalpyBySurface) * perAirKg;
        branch.onHub[1] = enthalpy * vapourByWater * perAirKg;
        branch.onHub[2] = vapourBySurface * perAirKg;
        branch.onHub[3] = vapourByWater * perAirKg;
        double toAir = film + bridgeWK;
        air.byItself[0] -= toAir * air.airByEnthalpy * perAirKg;
        air.byItself[1] += (-toAir * air.airByRatio + enthalpy * vapourByRatio) * perAirKg;
        air.byItself[3] += vapourByRatio * perAirKg;
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
        rateSlope[air.at] += bridgeWK * beyondSlope;
        slope[flowAt + FROM_BEYOND] = left;
        slope[flowAt + HEAT] = bridgeWK * beyondSlope;
        slope[flowAt + BRIDGE] = bridgeWK * beyondSlope;
    }

    @Override
    public void flowsAlong(AirState air, double[] v, double[] change) {
        int surface = branch.blockAt(0);
        double airC = air.airAlong(v);
        double ratio = v[air.at + 1];
        double byWater = vapourByWater * v[surface + 1] + vapourByRatio * ratio;
        change[flowAt + HEAT] = filmWK * (v[surface] - airC) - bridgeWK * airC;
        change[flowAt + BRIDGE] = -bridgeWK * airC;
        change[flowAt + VAPOUR] = vapourBySurface * v[surface] + byWater;
        change[flowAt + VAPOUR_ENTHALPY] = enthalpyBySurface * v[surface] + enthalpyNow * byWater;
        change[flowAt + LATENT] = latentBySurface * v[surface] + latentNow * byWater;
        change[flowAt + FROM_BEYOND] = -areaM2 * outer * v[branch.start];
        change[flowAt + RUNS_OFF] = runOffByWater * v[surface + 1];
    }
}

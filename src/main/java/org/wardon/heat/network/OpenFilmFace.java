package org.wardon.heat.network;

import org.wardon.air.MoistAir;
import org.wardon.cooling.water.FilmAir;
import org.wardon.cooling.water.LiquidWater;
import org.wardon.cooling.water.WaterSheet;
import org.wardon.enclosure.RadiantFilm;
import org.wardon.heat.laws.FaceWater;
import org.wardon.heat.laws.FreeWater;
import org.wardon.heat.solver.Tree;

/**
 * A wall with an open film of water running down its inner side. While it runs, the water meets
 * wall and air; at rest the wall is a plain face with what the film left on it. The block holds the
 * inner surface and the free water on it.
 */
final class OpenFilmFace extends FilmedFace {
    /** Own quantity: rate of the free water on the surface, kg/s. */
    private static final int WATER_RATE = FLOWS;

    /** The running film brings the surface to its full hold in this time, s (assumption). */
    private static final double FILLS_IN_S = 60;

    /** Vapour to and from the film is told apart within this of 0, kg/(m2 s). */
    private static final double ROUND_KG_M2S = 1e-8;

    private static final double LATENT_SLOPE = MoistAir.VAPOUR_J_KG_K - MoistAir.WATER_J_KG_K;
    private static final double COLDEST_C = -20;
    private static final double WARMEST_C = 50;

    private final SurfaceWater surface;

    OpenFilmFace(Tree tree, Build build, Water water, double pressurePa) {
        super(tree.addBranch(build.grid().capacity.length - 1, 2), build, water, pressurePa, 1);
        surface = new SurfaceWater(areaM2, build.convectiveWm2K(), build.plain());
        farFilm(25);
    }

    @Override
    int waterAt() {
        return innermost + 1;
    }

    /** Its water is meant to be there: none that lies about. */
    @Override
    public double waterKg(double[] y) {
        return 0;
    }

    @Override
    public void steadyProfile(double airC, double[] y) {
        super.steadyProfile(airC, y);
        y[waterAt()] = 0;
    }

    @Override
    void settle(AirState air, double[] y) {
        double airC = Math.min(Math.max(air.airC, COLDEST_C), WARMEST_C);
        double met = Double.isFinite(film.meanC) ? film.meanC : inletC;
        double filmC = Math.min(Math.max(met, COLDEST_C), WARMEST_C);
        double convective =
                FilmAir.convectiveWm2K(water.wayM(), filmC, airC, air.ratio, air.pressurePa);
        double before = convective + RadiantFilm.wattsM2K(0.5 * (filmC + airC));
        double vapour = FaceWater.conductanceKgM2S(convective);
        double wall = LiquidWater.at(inletC).film().wallWm2K(water.flowKgS() / water.widthM());
        double along =
                fromDepthWm2K(wall)
                        + before
                        + WaterSheet.latentWm2K(vapour, filmC, airC, air.pressurePa);
        sheet(new WaterSheet.Sides(wall, before, vapour, along));
    }

    private void state(AirState air, double surfaceC) {
        double heat = areaM2 * grid.inner * (surfaceC - air.airC);
        atRest[HEAT] = heat;
        atRest[VAPOUR] = surface.vapour;
        atRest[VAPOUR_ENTHALPY] = surface.vapour * surface.enthalpy;
        atRest[LATENT] = surface.vapour * surface.latent;
        atRest[RUNS_OFF] = surface.runOff;
        atRest[WATER_RATE] = -surface.vapour - surface.runOff;
        running[HEAT] = -film.fromBeforeW;
        running[VAPOUR] = film.vapourKgS;
        running[VAPOUR_ENTHALPY] = film.vapourKgS * MoistAir.vapourEnthalpyJkg(film.meanC);
        running[LATENT] = film.vapourKgS * film.latent;
        double round = areaM2 * ROUND_KG_M2S;
        running[RUNS_OFF] = FreeWater.positive(-film.vapourKgS, round);
        running[USED] = FreeWater.positive(film.vapourKgS, round);
        waterFlows();
    }

    private void fill(double waterKg) {
        running[WATER_RATE] = (areaM2 * FreeWater.FACE_HOLDS_KG_M2 - waterKg) / FILLS_IN_S;
    }

    @Override
    public void near(AirState air, double[] y) {
        surface.near(y[innermost]);
    }

    @Override
    public void rates(AirState air, Outside outside, double[] y, double[] rates, double[] flows) {
        follow(air.airC);
        double in = outer * (beyondC - y[outermost]);
        double flux = conduct(in, y, rates);
        double surfaceC = y[innermost];
        surface.at(air, surfaceC, y[waterAt()], 0);
        film.at(surfaceC, air.airC, air.ratio);
        state(air, surfaceC);
        fill(y[waterAt()]);
        double fromWall = value(HEAT) + value(LATENT) + value(TAKEN);
        double bridge = bridgeWK * (beyondC - air.airC);
        int last = grid.capacity.length - 1;
        rates[innermost] = (areaM2 * flux - fromWall) / (areaM2 * grid.capacity[last]);
        rates[waterAt()] = value(WATER_RATE);
        rates[air.at] += value(HEAT) + bridge + value(VAPOUR_ENTHALPY);
        rates[air.at + 1] += value(VAPOUR);
        writeFlows(bridge, areaM2 * in, flows);
    }

    @Override
    public void linearise(AirState air, Outside outside, double airKg, double[] y) {
        follow(air.airC);
        double surfaceC = y[innermost];
        surface.slopesAt(air, surfaceC, y[waterAt()], 0);
        film.near();
        film.slopesAt(surfaceC, air.airC, air.ratio);
        state(air, surfaceC);
        fill(y[waterAt()]);
        slopes(air.airC);
        int last = grid.capacity.length - 1;
        double capacity = areaM2 * grid.capacity[last];
        branch.inner[0] = -(areaM2 * intoInnermost() + outOfWall(SURFACE)) / capacity;
        branch.inner[1] = -outOfWall(SECOND) / capacity;
        branch.inner[2] = by[SURFACE][WATER_RATE];
        branch.inner[3] = by[SECOND][WATER_RATE];
        branch.byHub[0] = -outOfWall(AIR) * air.airByEnthalpy / capacity;
        branch.byHub[1] = -(outOfWall(AIR) * air.airByRatio + outOfWall(RATIO)) / capacity;
        branch.byHub[2] = by[AIR][WATER_RATE] * air.airByEnthalpy;
        branch.byHub[3] = by[AIR][WATER_RATE] * air.airByRatio + by[RATIO][WATER_RATE];
        branch.onHub[0] = toAir(SURFACE) / airKg;
        branch.onHub[1] = toAir(SECOND) / airKg;
        branch.onHub[2] = by[SURFACE][VAPOUR] / airKg;
        branch.onHub[3] = by[SECOND][VAPOUR] / airKg;
        double byAir = toAir(AIR) - bridgeWK;
        air.byItself[0] += byAir * air.airByEnthalpy / airKg;
        air.byItself[1] += (byAir * air.airByRatio + toAir(RATIO)) / airKg;
        air.byItself[2] += by[AIR][VAPOUR] * air.airByEnthalpy / airKg;
        air.byItself[3] += (by[AIR][VAPOUR] * air.airByRatio + by[RATIO][VAPOUR]) / airKg;
    }

    private double outOfWall(int partial) {
        return by[partial][HEAT] + by[partial][LATENT] + by[partial][TAKEN];
    }

    private double toAir(int partial) {
        return by[partial][HEAT] + by[partial][VAPOUR_ENTHALPY];
    }

    private void slopes(double airC) {
        startSlopes(airC);
        restSlopes();
        filmSlopes(SURFACE, FilmExchange.BY_WALL);
        filmSlopes(AIR, FilmExchange.BY_BEFORE);
        filmSlopes(RATIO, FilmExchange.BY_RATIO);
        by[SECOND][WATER_RATE] -= share / FILLS_IN_S;
    }

    private void restSlopes() {
        double film = rest * areaM2 * grid.inner;
        by[SURFACE][HEAT] += film;
        by[AIR][HEAT] -= film;
        by[SURFACE][VAPOUR] += rest * surface.bySurface;
        by[SURFACE][VAPOUR_ENTHALPY] += rest * surface.enthalpyBySurface;
        by[SURFACE][LATENT] += rest * surface.latentBySurface;
        by[SURFACE][WATER_RATE] -= rest * surface.bySurface;
        vapourSlopes(SECOND, rest * surface.byWater);
        vapourSlopes(RATIO, rest * surface.byRatio);
        by[SECOND][RUNS_OFF] += rest * surface.runOffByWater;
        by[SECOND][WATER_RATE] -= rest * surface.runOffByWater;
    }

    private void vapourSlopes(int partial, double vapour) {
        by[partial][VAPOUR] += vapour;
        by[partial][VAPOUR_ENTHALPY] += vapour * surface.enthalpy;
        by[partial][LATENT] += vapour * surface.latent;
        by[partial][WATER_RATE] -= vapour;
    }

    private void filmSlopes(int partial, int input) {
        double vapour = film.vapourBy[input];
        double mean = film.meanBy[input];
        by[partial][HEAT] -= share * film.fromBeforeBy[input];
        by[partial][VAPOUR] += share * vapour;
        by[partial][VAPOUR_ENTHALPY] +=
                share
                        * (vapour * MoistAir.vapourEnthalpyJkg(film.meanC)
                                + film.vapourKgS * MoistAir.VAPOUR_J_KG_K * mean);
        by[partial][LATENT] +=
                share * (vapour * film.latent + film.vapourKgS * LATENT_SLOPE * mean);
        double round = areaM2 * ROUND_KG_M2S;
        by[partial][RUNS_OFF] -= share * vapour * FreeWater.positiveSlope(-film.vapourKgS, round);
        by[partial][USED] += share * vapour * FreeWater.positiveSlope(film.vapourKgS, round);
        waterSlopes(partial, input);
    }

    @Override
    public void flowsAlong(AirState air, double[] v, double[] change) {
        along(air, v, v[waterAt()], change);
    }
}

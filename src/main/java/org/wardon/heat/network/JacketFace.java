package org.wardon.heat.network;

import org.wardon.cooling.water.JacketGap;
import org.wardon.cooling.water.LiquidWater;
import org.wardon.cooling.water.WaterSheet;
import org.wardon.heat.solver.Tree;

/**
 * A face with a closed jacket of water before its inner side. The water touches the face and the
 * sheet that keeps it from the air; it exchanges no vapour, but the sheet is a cold face and what
 * condenses on it drips like on any other. The block holds the inner surface of the layers, the
 * sheet with the water in the jacket, and the free water on the sheet.
 */
final class JacketFace extends FilmedFace {
    /** Own quantity: heat from the water side into the sheet, W. */
    private static final int INTO_SHEET = FLOWS;

    /** Heat capacity of a sheet of steel 1 mm thick, J/(m2 K) (assumption). */
    private static final double SHEET_JM2K = 3_900;

    private static final double WATER_J_M3K = 4.186e6;

    private final SurfaceWater surface;
    private final JacketGap gap;
    private final double sheetJK;
    private double standingWK;

    JacketFace(Tree tree, Build build, Water water, JacketGap gap, double pressurePa) {
        super(tree.addBranch(build.grid().capacity.length - 1, 3), build, water, pressurePa, 1);
        this.gap = gap;
        surface = new SurfaceWater(areaM2, build.convectiveWm2K(), build.plain());
        sheetJK = areaM2 * (SHEET_JM2K + gap.gapM() * WATER_J_M3K);
        farFilm(25);
    }

    private int sheetAt() {
        return innermost + 1;
    }

    @Override
    int waterAt() {
        return innermost + 2;
    }

    /** The sheet is what the air meets. */
    @Override
    public double surfaceC(double[] y) {
        return y[sheetAt()];
    }

    @Override
    public double heatJ(double[] y) {
        return super.heatJ(y) + sheetJK * y[sheetAt()];
    }

    @Override
    public void steadyProfile(double airC, double[] y) {
        super.steadyProfile(airC, y);
        y[sheetAt()] = airC;
        y[waterAt()] = 0;
    }

    @Override
    void settle(AirState air, double[] y) {
        LiquidWater properties = LiquidWater.at(inletC);
        double side = gap.sideWm2K(properties);
        standingWK = areaM2 * gap.standingWm2K(properties);
        double along = fromDepthWm2K(side) + 1 / (1 / side + 1 / grid.inner);
        sheet(new WaterSheet.Sides(side, side, 0, along));
    }

    private void state(AirState air, double wallC, double sheetC) {
        double heat = areaM2 * grid.inner * (sheetC - air.airC);
        both(HEAT, heat);
        both(VAPOUR, surface.vapour);
        both(VAPOUR_ENTHALPY, surface.vapour * surface.enthalpy);
        both(LATENT, surface.vapour * surface.latent);
        both(RUNS_OFF, surface.runOff);
        atRest[INTO_SHEET] = standingWK * (wallC - sheetC);
        running[INTO_SHEET] = -film.fromBeforeW;
        waterFlows();
    }

    private void both(int kind, double value) {
        atRest[kind] = value;
        running[kind] = value;
    }

    @Override
    public void near(AirState air, double[] y) {
        surface.near(y[sheetAt()]);
    }

    @Override
    public void rates(AirState air, Outside outside, double[] y, double[] rates, double[] flows) {
        follow(air.airC);
        double in = outer * (beyondC - y[outermost]);
        double flux = conduct(in, y, rates);
        double wallC = y[innermost];
        double sheetC = y[sheetAt()];
        surface.at(air, sheetC, y[waterAt()], 0);
        film.at(wallC, sheetC, air.ratio);
        state(air, wallC, sheetC);
        double bridge = bridgeWK * (beyondC - air.airC);
        int last = grid.capacity.length - 1;
        double fromWall = value(INTO_SHEET) + value(TAKEN);
        rates[innermost] = (areaM2 * flux - fromWall) / (areaM2 * grid.capacity[last]);
        rates[sheetAt()] = (value(INTO_SHEET) - value(HEAT) - value(LATENT)) / sheetJK;
        rates[waterAt()] = -surface.vapour - surface.runOff;
        rates[air.at] += value(HEAT) + bridge + value(VAPOUR_ENTHALPY);
        rates[air.at + 1] += surface.vapour;
        writeFlows(bridge, areaM2 * in, flows);
    }

    @Override
    public void linearise(AirState air, Outside outside, double airKg, double[] y) {
        follow(air.airC);
        double wallC = y[innermost];
        double sheetC = y[sheetAt()];
        surface.slopesAt(air, sheetC, y[waterAt()], 0);
        film.near();
        film.slopesAt(wallC, sheetC, air.ratio);
        state(air, wallC, sheetC);
        slopes(air.airC);
        wallRow(air);
        sheetRows(air);
        double filmWK = areaM2 * grid.inner;
        branch.onHub[0] = 0;
        branch.onHub[1] = (filmWK + surface.enthalpyBySurface) / airKg;
        branch.onHub[2] = surface.enthalpy * surface.byWater / airKg;
        branch.onHub[3] = 0;
        branch.onHub[4] = surface.bySurface / airKg;
        branch.onHub[5] = surface.byWater / airKg;
        double toAir = filmWK + bridgeWK;
        air.byItself[0] -= toAir * air.airByEnthalpy / airKg;
        air.byItself[1] += (-toAir * air.airByRatio + surface.enthalpy * surface.byRatio) / airKg;
        air.byItself[3] += surface.byRatio / airKg;
    }

    private void wallRow(AirState air) {
        double capacity = areaM2 * grid.capacity[grid.capacity.length - 1];
        branch.inner[0] = -(areaM2 * intoInnermost() + outOfWall(SURFACE)) / capacity;
        branch.inner[1] = -outOfWall(SECOND) / capacity;
        branch.byHub[0] = -outOfWall(AIR) * air.airByEnthalpy / capacity;
        branch.byHub[1] = -outOfWall(AIR) * air.airByRatio / capacity;
    }

    private void sheetRows(AirState air) {
        branch.inner[3] = by[SURFACE][INTO_SHEET] / sheetJK;
        branch.inner[4] = intoSheet(SECOND) / sheetJK;
        branch.inner[5] = -surface.latent * surface.byWater / sheetJK;
        branch.inner[7] = -surface.bySurface;
        branch.inner[8] = -surface.byWater - surface.runOffByWater;
        branch.byHub[2] = intoSheet(AIR) * air.airByEnthalpy / sheetJK;
        branch.byHub[3] = (intoSheet(AIR) * air.airByRatio + intoSheet(RATIO)) / sheetJK;
        branch.byHub[5] = -surface.byRatio;
    }

    private double outOfWall(int partial) {
        return by[partial][INTO_SHEET] + by[partial][TAKEN];
    }

    private double intoSheet(int partial) {
        return by[partial][INTO_SHEET] - by[partial][HEAT] - by[partial][LATENT];
    }

    private void slopes(double airC) {
        startSlopes(airC);
        double filmWK = areaM2 * grid.inner;
        by[SECOND][HEAT] = filmWK;
        by[AIR][HEAT] = -filmWK;
        by[SECOND][VAPOUR] = surface.bySurface;
        by[SECOND][VAPOUR_ENTHALPY] = surface.enthalpyBySurface;
        by[SECOND][LATENT] = surface.latentBySurface;
        by[RATIO][VAPOUR] = surface.byRatio;
        by[RATIO][VAPOUR_ENTHALPY] = surface.byRatio * surface.enthalpy;
        by[RATIO][LATENT] = surface.byRatio * surface.latent;
        by[SURFACE][INTO_SHEET] += rest * standingWK;
        by[SECOND][INTO_SHEET] -= rest * standingWK;
        waterInto(SURFACE, FilmExchange.BY_WALL);
        waterInto(SECOND, FilmExchange.BY_BEFORE);
    }

    private void waterInto(int partial, int input) {
        by[partial][INTO_SHEET] -= share * film.fromBeforeBy[input];
        waterSlopes(partial, input);
    }

    @Override
    public void flowsAlong(AirState air, double[] v, double[] change) {
        along(air, v, v[sheetAt()], change);
        double byWater = surface.byWater * v[waterAt()];
        change[flowAt + VAPOUR] += byWater;
        change[flowAt + VAPOUR_ENTHALPY] += byWater * surface.enthalpyAtStart;
        change[flowAt + LATENT] += byWater * surface.latentAtStart;
        change[flowAt + RUNS_OFF] = surface.runOffByWater * v[waterAt()];
    }
}

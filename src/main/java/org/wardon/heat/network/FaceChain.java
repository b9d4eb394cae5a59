package org.wardon.heat.network;

import org.wardon.heat.laws.FreeWater;
import org.wardon.heat.solver.Branch;

/**
 * The layers of a face that a cooler acts on: the same conduction as of a plain face, with room for
 * more nodes before and behind. Apart from {@link FaceBranch} so that plain faces, the most run of
 * all, carry none of it.
 */
abstract class FaceChain implements FacePart {
    final Branch branch;
    final int flowAt;
    private final int cooler;
    final double areaM2;
    final FaceGrid grid;
    final double bridgeWK;
    final double wallFactor;

    /** Place of the outermost temperature in the state. */
    final int outermost;

    /** Place of the innermost temperature of the layers in the state. */
    final int innermost;

    /** Conductance from the far side to the outermost node, W/(m2 K). */
    double outer;

    double farFilm;
    double beyondC;
    double beyondSlope;

    /**
     * What every such face has.
     *
     * @param flowAt place of its flows
     * @param cooler number of the cooler that acts on it
     * @param areaM2 inside area, m2
     * @param grid its layers cut into nodes
     * @param bridgeWK thermal bridge, W/K
     * @param convectiveWm2K convective part of the inner film, W/(m2 K)
     * @param wallFactor factor on conductances
     * @param plain whether laws are asked directly
     */
    record Build(
            int flowAt,
            int cooler,
            double areaM2,
            FaceGrid grid,
            double bridgeWK,
            double convectiveWm2K,
            double wallFactor,
            boolean plain) {}

    FaceChain(Branch branch, Build build, int nodesBefore) {
        this.branch = branch;
        this.flowAt = build.flowAt;
        this.cooler = build.cooler;
        this.areaM2 = build.areaM2;
        this.grid = build.grid;
        this.bridgeWK = build.bridgeWK;
        this.wallFactor = build.wallFactor;
        this.outermost = branch.start + nodesBefore;
        this.innermost = outermost + grid.capacity.length - 1;
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

    /** Writes J of the nodes that lie in the branch's run; the block is written with each step. */
    private void conductionJ() {
        for (int i = 0; i < branch.run; i++) {
            int node = branch.start + i - outermost;
            if (node >= 0) {
                double left = node == 0 ? outer : grid.between[node - 1];
                double right = grid.between[node];
                branch.before[i] = node == 0 ? 0 : left / grid.capacity[node];
                branch.after[i] = right / grid.capacity[node];
                branch.self[i] = -(left + right) / grid.capacity[node];
            }
        }
        int last = grid.capacity.length - 1;
        branch.blockByRun = last > 0 ? grid.between[last - 1] / grid.capacity[last] : 0;
    }

    /** Conductance into the innermost node from its outer side, W/(m2 K). */
    double intoInnermost() {
        int last = grid.capacity.length - 1;
        return last > 0 ? grid.between[last - 1] : outer;
    }

    @Override
    public void beyond(double temperatureC, double slopeKs) {
        beyondC = temperatureC;
        beyondSlope = slopeKs;
    }

    /** Writes rates of all nodes but the innermost; returns the flux into that one, W/m2. */
    double conduct(double fluxIn, double[] y, double[] rates) {
        double flux = fluxIn;
        for (int i = 0; i < grid.between.length; i++) {
            double next = grid.between[i] * (y[outermost + i] - y[outermost + i + 1]);
            rates[outermost + i] = (flux - next) / grid.capacity[i];
            flux = next;
        }
        return flux;
    }

    @Override
    public void steadyProfile(double airC, double[] y) {
        double flux = grid.steady(farFilm) * (beyondC - airC);
        double t = beyondC - flux / outer;
        for (int i = 0; i < grid.capacity.length; i++) {
            y[outermost + i] = t;
            if (i < grid.between.length) {
                t -= flux / grid.between[i];
            }
        }
    }

    @Override
    public double heatJ(double[] y) {
        double sum = 0;
        for (int i = 0; i < grid.capacity.length; i++) {
            sum += grid.capacity[i] * y[outermost + i];
        }
        return areaM2 * sum;
    }

    @Override
    public FaceGrid grid() {
        return grid;
    }

    @Override
    public int outermost() {
        return outermost;
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
        return branch.blockAt(branch.block - 1);
    }

    @Override
    public double surfaceC(double[] y) {
        return y[innermost];
    }

    @Override
    public void tolerances(double airK, double[] tolerances) {
        for (int i = firstNode(); i <= lastNode(); i++) {
            tolerances[i] = 2 * airK;
        }
        tolerances[waterAt()] = 0.05 * areaM2 * FreeWater.FULL_KG_M2;
    }

    /** Place of the free water on the inner surface in the state. */
    abstract int waterAt();

    @Override
    public double waterKg(double[] y) {
        return y[waterAt()];
    }

    @Override
    public int cooler() {
        return cooler;
    }

    @Override
    public int flow(int kind) {
        return flowAt + kind;
    }
}

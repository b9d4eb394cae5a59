package org.wardon.heat;

import org.wardon.cooling.WettedWall;
import org.wardon.heat.network.ChamberNetwork;
import org.wardon.heat.network.WettedWalls;
import org.wardon.heat.solver.Integrator;

/** Pours water into wetted walls, notes when one stands dry, and keeps their water's account. */
final class Watering implements Integrator.Trigger {
    /** A wall may be found dry this much late, as a share of what its sand holds. */
    private static final double LATE_SHARE = 0.01;

    private final ChamberRun run;
    private final WettedWalls walls;
    private final Spans dry;
    private final double startKg;
    private double pouredKg;
    private double ranOffKg;

    Watering(ChamberRun run, ChamberNetwork network, double[] y) {
        this.run = run;
        this.walls = network.wettedWalls();
        this.dry = new Spans(CourseEvent.Kind.DRY_WALL, run.chamberId());
        this.startKg = walls.sandKg(y);
        dry.is(0, walls.anyDry());
    }

    @Override
    public double value(double t, double[] y) {
        return walls.dryness(y);
    }

    @Override
    public double tolerance() {
        return LATE_SHARE;
    }

    /** Lets dry what has dried out. */
    void fire(double t, double[] y) {
        walls.dry(y);
        dry.is(t, walls.anyDry());
    }

    /** Pours one share of the day's water into the walls of a cooler. */
    void pour(int cooler, double t, double[] y) {
        if (run.coolers().get(cooler) instanceof WettedWall wall) {
            double kg = wall.waterKgPerDay() / wall.pouredAt().size();
            pouredKg += kg;
            ranOffKg += walls.pour(cooler, kg, y);
            dry.is(t, walls.anyDry());
        }
    }

    Spans spans() {
        return dry;
    }

    SandLedger ledger(double[] y, double[] totals) {
        return new SandLedger(
                pouredKg, walls.evaporatedKg(totals), ranOffKg, walls.sandKg(y) - startKg);
    }
}

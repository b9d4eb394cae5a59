package org.wardon.keeping.chilling;

import java.util.Optional;
import org.apache.commons.math3.distribution.NormalDistribution;
import org.wardon.keeping.Draw;
import org.wardon.keeping.life.LifeLevel;
import org.wardon.produce.Commodity;
import org.wardon.produce.Ripeness;

/**
 * Chilling of a commodity at a ripeness: dose in kelvin-days below its floor or in its band.
 *
 * <p>Where the handbook's own condition lies inside the zone of another source, the floor moves
 * down until that condition keeps the published life: sources disagree, and the handbook's
 * condition is the one that must hold.
 */
public final class Chilling {
    private static final NormalDistribution NORMAL = new NormalDistribution(null, 0, 1);
    private static final double STEP_K = 0.5;

    private final Zone zone;
    private final DoseFit fit;
    private final LifeLevel handbook;

    private Chilling(Zone zone, DoseFit fit, LifeLevel handbook) {
        this.zone = zone;
        this.fit = fit;
        this.handbook = handbook;
    }

    /**
     * Returns the chilling of a commodity.
     *
     * @param commodity the commodity
     * @param ripeness how ripe the lot is; unknown is judged as green
     * @return its chilling; empty where it does not chill
     */
    public static Optional<Chilling> of(Commodity commodity, Ripeness ripeness) {
        return Floors.of(commodity, ripeness).map(zone -> of(commodity, ripeness, zone));
    }

    private static Chilling of(Commodity commodity, Ripeness ripeness, Zone zone) {
        LifeLevel handbook = LifeLevel.of(commodity);
        DoseFit first = DoseFit.of(commodity, ripeness, zone, 0);
        Chilling printed = new Chilling(zone, first, handbook);
        double shift =
                zone.bandLowC().isPresent() ? 0 : printed.shiftK(Math.exp(first.lnMedian()), 0.5);
        DoseFit fit = shift > 0 ? DoseFit.of(commodity, ripeness, zone, shift) : first;
        return new Chilling(zone, fit, handbook);
    }

    /**
     * Returns the zone that injures.
     *
     * @return floor or band with its source
     */
    public Zone zone() {
        return zone;
    }

    /**
     * Returns whether the dose rests on exposures of this commodity.
     *
     * @return false where it is that of all crops
     */
    public boolean calibrated() {
        return fit.rows() > 0;
    }

    /**
     * Returns whether injury mostly shows only after rewarming.
     *
     * @return true if so
     */
    public boolean showsAfterRewarming() {
        return fit.afterRewarming();
    }

    /**
     * Returns the injury of a draw.
     *
     * @param draw the draw
     * @return dose over temperature
     */
    public Injury at(Draw draw) {
        double dose =
                Math.exp(
                        fit.lnMedian()
                                + fit.deviation()
                                        * NORMAL.inverseCumulativeProbability(draw.chilling()));
        if (zone.bandLowC().isEmpty()) {
            return new Injury(zone, shiftK(dose, draw.chilling()), dose);
        }
        return new Injury(zone, 0, Math.max(dose, days(draw.chilling()) * worstInHandbookK()));
    }

    /** How far the floor moves down so that the handbook's coldest keeps the published life. */
    private double shiftK(double doseKd, double quantile) {
        return Math.max(0, zone.topC() - handbook.atLowC() - doseKd / days(quantile));
    }

    /** A tender lot must keep the shortest published life there, a hardy one the longest. */
    private double days(double quantile) {
        return handbook.lowDays() * Math.pow(handbook.highDays() / handbook.lowDays(), quantile);
    }

    private double worstInHandbookK() {
        double worst = zone.severityK(handbook.atHighC(), 0);
        for (double t = handbook.atLowC(); t < handbook.atHighC(); t += STEP_K) {
            worst = Math.max(worst, zone.severityK(t, 0));
        }
        return worst;
    }
}

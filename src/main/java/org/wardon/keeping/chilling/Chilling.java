package org.wardon.keeping.chilling;

import java.util.Optional;
import org.apache.commons.math3.distribution.NormalDistribution;
import org.wardon.keeping.Draw;
import org.wardon.produce.Commodity;
import org.wardon.produce.Fact;
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
    private final double handbookLowC;
    private final double handbookHighC;
    private final double publishedDays;

    private Chilling(
            Zone zone,
            DoseFit fit,
            double handbookLowC,
            double handbookHighC,
            double publishedDays) {
        this.zone = zone;
        this.fit = fit;
        this.handbookLowC = handbookLowC;
        this.handbookHighC = handbookHighC;
        this.publishedDays = publishedDays;
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
        Optional<Fact> handbook = commodity.needs().temperatureC();
        double low = handbook.map(Fact::lowest).orElse(zone.topC());
        double high = handbook.map(Fact::highest).orElse(zone.topC());
        double days =
                handbook.isPresent()
                        ? commodity.needs().lifeDays().map(Fact::lowest).orElse(0.0)
                        : 0;
        DoseFit first = DoseFit.of(commodity, ripeness, zone, 0);
        Chilling printed = new Chilling(zone, first, low, high, days);
        double shift = zone.bandLowC().isPresent() ? 0 : printed.shiftK(Math.exp(first.lnMedian()));
        DoseFit fit = shift > 0 ? DoseFit.of(commodity, ripeness, zone, shift) : first;
        return new Chilling(zone, fit, low, high, days);
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
            return new Injury(zone, shiftK(dose), dose);
        }
        return new Injury(zone, 0, Math.max(dose, publishedDays * worstInHandbookK()));
    }

    /** How far the floor moves down so that the handbook's coldest keeps the published life. */
    private double shiftK(double doseKd) {
        if (publishedDays <= 0) {
            return 0;
        }
        return Math.max(0, zone.topC() - handbookLowC - doseKd / publishedDays);
    }

    private double worstInHandbookK() {
        double worst = zone.severityK(handbookHighC, 0);
        for (double t = handbookLowC; t < handbookHighC; t += STEP_K) {
            worst = Math.max(worst, zone.severityK(t, 0));
        }
        return worst;
    }
}

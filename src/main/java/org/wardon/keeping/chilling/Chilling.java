package org.wardon.keeping.chilling;

import java.util.List;
import java.util.Optional;
import org.apache.commons.math3.distribution.NormalDistribution;
import org.wardon.keeping.Draw;
import org.wardon.keeping.life.LifeLevel;
import org.wardon.produce.Commodity;
import org.wardon.produce.Ripeness;
import org.wardon.produce.rows.ChillingExposure;

/**
 * Chilling of a commodity at a ripeness: dose in kelvin-days below its floor or in its band.
 *
 * <p>The handbook's own condition holds, {@link Handbook}.
 */
public final class Chilling {
    private static final NormalDistribution NORMAL = new NormalDistribution(null, 0, 1);

    private final Zone zone;
    private final DoseFit fit;
    private final Ripeness ripeness;
    private final Handbook handbook;

    private Chilling(Zone zone, DoseFit fit, Ripeness ripeness, Handbook handbook) {
        this.zone = zone;
        this.fit = fit;
        this.ripeness = ripeness;
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
        return of(commodity, ripeness, commodity.keeping().exposures(), "");
    }

    /**
     * Returns the chilling of the fruit of a trial by other exposures than all, for scoring.
     *
     * @param commodity the commodity
     * @param ripeness how ripe the lot is; unknown is judged as green
     * @param exposures the exposures to fit
     * @param trial source and variant of the trial as in {@link #trial}; "" for a lot of no trial
     * @return its chilling; empty where it does not chill
     */
    public static Optional<Chilling> of(
            Commodity commodity,
            Ripeness ripeness,
            List<ChillingExposure> exposures,
            String trial) {
        LifeLevel level = LifeLevel.of(commodity);
        return Zone.of(commodity, ripeness, exposures)
                .map(
                        zone ->
                                new Chilling(
                                        zone,
                                        DoseFit.of(commodity, zone, exposures, trial),
                                        ripeness,
                                        Handbook.of(level, zone)));
    }

    /**
     * Returns the trial an exposure is from.
     *
     * @param row the exposure
     * @return its source and variant
     */
    public static String trial(ChillingExposure row) {
        return Bearing.trial(row);
    }

    /**
     * Returns the zone that injures.
     *
     * @return floor or band as printed, with its source
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
        double z = NORMAL.inverseCumulativeProbability(draw.chilling());
        double dose = Math.exp(fit.lnMedian(ripeness) + fit.deviation() * z);
        return new Injury(zone, dose, handbook);
    }

    /**
     * Returns the probability that an exposure like a published one injures.
     *
     * @param commodity the commodity
     * @param row temperature, ripeness, variant and where injury is looked for
     * @param days time, days
     * @param handbookHolds whether the handbook's own condition must keep its published life
     * @return 0 to 1
     */
    public double probability(
            Commodity commodity, ChillingExposure row, double days, boolean handbookHolds) {
        double temperatureC = DoseFit.temperatureC(row);
        double kelvins = DoseFit.kelvins(commodity, zone, row);
        double dose =
                handbookHolds
                        ? handbook.dose(days, kelvins, temperatureC, zone.bandLowC().isPresent())
                        : days * kelvins;
        if (dose <= 0) {
            return 0;
        }
        double median =
                fit.lnMedian(
                        row.ripeness().equals("ripe"), row.visible().equals("after-rewarming"));
        return NORMAL.cumulativeProbability((Math.log(dose) - median) / fit.deviation());
    }
}

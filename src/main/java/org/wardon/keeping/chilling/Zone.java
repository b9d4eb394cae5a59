package org.wardon.keeping.chilling;

import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import org.wardon.produce.Commodity;
import org.wardon.produce.Ripeness;
import org.wardon.produce.rows.ChillingExposure;

/**
 * The temperatures that injure.
 *
 * @param topC injury below it, °C
 * @param bandLowC lower end of a damaging band, below which it is milder again, °C; empty where
 *     colder is always worse
 * @param bySkin whether the temperature of the skin counts, else the mean
 * @param assumed whether nobody printed it for the commodity
 * @param sourceId source of the temperature
 */
public record Zone(
        double topC, OptionalDouble bandLowC, boolean bySkin, boolean assumed, String sourceId) {
    /**
     * Share of the worst rate left at and below a band. From the rows of peach: 7 to 14 days at 5
     * °C and 21 at 0 °C (chilling-exposure table, memory): about 0.4.
     */
    private static final double BELOW_BAND = 0.4;

    /**
     * Returns the zone that injures a commodity.
     *
     * @param commodity the commodity
     * @param ripeness how ripe it is; unknown is judged as green
     * @return the zone as printed; empty where it does not chill
     */
    public static Optional<Zone> of(Commodity commodity, Ripeness ripeness) {
        return Floors.of(commodity, ripeness, commodity.keeping().exposures());
    }

    /** The zone by other exposures than all. */
    static Optional<Zone> of(
            Commodity commodity, Ripeness ripeness, List<ChillingExposure> exposures) {
        return Floors.of(commodity, ripeness, exposures);
    }

    /** The same zone with the floor somebody printed for one variant of the commodity. */
    Zone ofVariant(Commodity commodity, String variant) {
        if (variant.isEmpty()) {
            return this;
        }
        return commodity.keeping().floors().stream()
                .filter(row -> row.variant().equals(variant) && !row.zone().isEmpty())
                .flatMap(row -> row.lowestSafeC().stream())
                .findFirst()
                .map(own -> new Zone(own.highest(), bandLowC, bySkin, assumed, own.sourceId()))
                .orElse(this);
    }

    /**
     * Returns how strongly a temperature injures, in kelvin below the top.
     *
     * @param temperatureC temperature, °C
     * @return K, 0 at and above the top
     */
    double severityK(double temperatureC) {
        double below = topC - temperatureC;
        if (below <= 0) {
            return 0;
        }
        return bandLowC.isPresent() ? inBand(below, topC - bandLowC.getAsDouble()) : below;
    }

    private static double inBand(double below, double width) {
        double worst = width / 2;
        if (below <= worst) {
            return below;
        }
        double past = Math.min(1, (below - worst) / worst);
        return worst * (1 - past * (1 - BELOW_BAND));
    }
}

package org.wardon.keeping;

import java.util.Optional;
import java.util.function.DoubleFunction;
import org.wardon.lots.ClassValues;
import org.wardon.lots.Item;
import org.wardon.lots.Items;
import org.wardon.lots.TranspirationLaw;
import org.wardon.lots.Transpirations;
import org.wardon.produce.Commodity;

/**
 * A lot whose keeping is judged.
 *
 * @param id id of the lot
 * @param commodity what it is
 * @param door what was known at arrival
 * @param transpiration how it loses water in an open package, by the share of the published range
 *     (0 tight, 1 open); used for the permissible loss and for histories that bring no mass; empty
 *     to leave water loss out where the mass is not known
 * @param packageKgPerKgSPa vapour from package air to the air outside, for histories that bring no
 *     mass, kg/(kg s Pa); infinite for an open package
 */
public record KeptLot(
        String id,
        Commodity commodity,
        LotAtDoor door,
        Optional<DoubleFunction<TranspirationLaw>> transpiration,
        double packageKgPerKgSPa) {
    /**
     * A lot in an open package.
     *
     * @param id id of the lot
     * @param commodity what it is
     * @param door what was known at arrival
     * @param transpiration how it loses water, as above
     */
    public KeptLot(
            String id,
            Commodity commodity,
            LotAtDoor door,
            Optional<DoubleFunction<TranspirationLaw>> transpiration) {
        this(id, commodity, door, transpiration, Double.POSITIVE_INFINITY);
    }

    /**
     * Returns the lot in a package.
     *
     * @param vapourKgPerKgSPa package air to the air outside, kg/(kg s Pa)
     * @return the copy
     */
    public KeptLot packedIn(double vapourKgPerKgSPa) {
        return new KeptLot(id, commodity, door, transpiration, vapourKgPerKgSPa);
    }

    /**
     * Returns a lot in an open package, losing water as is printed for its commodity.
     *
     * @param id id of the lot
     * @param commodity what it is
     * @param door what was known at arrival
     * @param classes class values for what is not printed
     * @return the lot
     */
    public static KeptLot inOpenPackage(
            String id, Commodity commodity, LotAtDoor door, ClassValues classes) {
        Item item = Items.of(commodity, classes).value();
        DoubleFunction<TranspirationLaw> law =
                share -> Transpirations.of(commodity, item, classes, share).value();
        return new KeptLot(id, commodity, door, Optional.of(law));
    }
}

package org.wardon.keeping;

import java.util.List;
import java.util.Optional;
import java.util.function.ToDoubleFunction;
import org.wardon.keeping.dormancy.Dormancy;
import org.wardon.keeping.experience.Sighting;
import org.wardon.produce.Commodity;
import org.wardon.produce.Ripeness;
import org.wardon.produce.rows.OwnLot;

/**
 * Lots of the keeper's own as sightings of the published life. A lot that came ripe had a share of
 * it only, one kept until it was past eating the ripe days on top of the green ones; these shares
 * are drawn as they are for the lot asked about. Where printed days of ripening end ripe fruit,
 * lots that came ripe say nothing of the level of green life and are left out.
 */
final class OwnLots {
    private OwnLots() {}

    static List<Sighting> of(Commodity commodity) {
        return counted(commodity).stream().map(lot -> of(commodity, lot)).toList();
    }

    /** The lots that say something of the level of life. */
    static List<OwnLot> counted(Commodity commodity) {
        boolean ripens = !commodity.keeping().ripening().isEmpty();
        return commodity.keeping().ownLots().stream()
                .filter(lot -> !(ripens && cameRipe(lot)))
                .toList();
    }

    private static boolean cameRipe(OwnLot lot) {
        Ripeness began = lot.began().ripeness();
        return began == Ripeness.RIPE || began == Ripeness.TURNING;
    }

    static Sighting of(Commodity commodity, OwnLot lot) {
        return new Sighting(
                lot.spells(),
                lot.ended().ageing() ? Sighting.Kind.LOT : Sighting.Kind.LOT_AT_LEAST,
                share(commodity, lot),
                0);
    }

    private static ToDoubleFunction<Draw> share(Commodity commodity, OwnLot lot) {
        OwnLot.Began began = lot.began();
        LotAtDoor door = LotAtDoor.SOUND.withRipeness(began.ripeness());
        LifeSpan span = new LifeSpan(commodity, door);
        Dormancy dormancy = Dormancy.of(commodity);
        boolean pastGreen = span.twoClocks() && lot.ended() == OwnLot.Ended.AGED;
        Optional<Boolean> cured = began.cured();
        return draw ->
                span.share(draw)
                        * dormancy.lifeShare(cured, draw)
                        * (1 - began.usedFraction())
                        * (pastGreen ? 1 + LifeSpan.ripeShare(draw) : 1);
    }
}

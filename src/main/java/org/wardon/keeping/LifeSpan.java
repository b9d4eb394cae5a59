package org.wardon.keeping;

import org.wardon.keeping.ethylene.Stage;
import org.wardon.produce.Commodity;
import org.wardon.produce.Ripeness;

/**
 * What share of the published life a lot has by its ripeness and purpose.
 *
 * <p>The published life of a fruit that ripens is that of fruit picked green, unless the tables
 * keep a row for ripe fruit. Once ripe it keeps 0.15 to 0.5 of it (assumption; the handbook's ripe
 * banana keeps 2 to 4 days where the green one keeps 7 to 28).
 */
final class LifeSpan {
    private static final double RIPE_LEAST = 0.15;
    private static final double RIPE_MOST = 0.5;

    private final Ripeness ripeness;
    private final boolean twoClocks;
    private final boolean ripening;
    private final Purpose purpose;

    LifeSpan(Commodity commodity, LotAtDoor door) {
        ripeness = Stage.judged(commodity, door.ripeness());
        ripening = commodity.climacteric() && !Stage.soldRipe(commodity);
        twoClocks = ripening && ripeness == Ripeness.GREEN;
        purpose = door.purpose().orElse(twoClocks ? Purpose.SHIP_GREEN : Purpose.SELL_RIPE);
    }

    /** Whether green and edible life are told apart. */
    boolean twoClocks() {
        return twoClocks;
    }

    /** Whether ripening ends the lot, not ageing. */
    boolean shippedGreen() {
        return twoClocks && purpose == Purpose.SHIP_GREEN;
    }

    /** Whether the fruit ripens but nobody said how ripe it is. */
    boolean unknown() {
        return ripening && ripeness == Ripeness.UNKNOWN;
    }

    /** Whether the one clock of the lot is that of a fruit already ripening. */
    boolean pastGreen() {
        return ripening && (ripeness == Ripeness.RIPE || ripeness == Ripeness.TURNING);
    }

    Ripeness ripeness() {
        return ripeness;
    }

    /** Share of the published life that ripe fruit keeps. */
    static double ripeShare(Draw draw) {
        return RIPE_LEAST * Math.pow(RIPE_MOST / RIPE_LEAST, draw.ripening());
    }

    /** Life of the single clock over the published life. */
    double share(Draw draw) {
        if (!pastGreen()) {
            return 1;
        }
        double ripe = ripeShare(draw);
        return ripeness == Ripeness.RIPE ? ripe : Math.sqrt(ripe);
    }
}

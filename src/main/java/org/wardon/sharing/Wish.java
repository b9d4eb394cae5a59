package org.wardon.sharing;

import java.util.OptionalDouble;
import org.wardon.errors.Require;
import org.wardon.keeping.KeptLot;

/**
 * A lot and how long it is to keep.
 *
 * @param lot the lot
 * @param wantedDays days in the chamber
 * @param marketDays days from leaving to the buyer
 * @param marketC temperature of the market leg, °C; empty to count its days as if spent in the
 *     chamber
 */
public record Wish(KeptLot lot, double wantedDays, double marketDays, OptionalDouble marketC) {
    /** Days of the market leg where nobody says (common practice). */
    public static final double USUAL_MARKET_DAYS = 2;

    /** Checks the bounds. */
    public Wish {
        Require.within("wantedDays of " + lot.id(), wantedDays, 0.1, 730, "day", "");
        Require.within("marketDays of " + lot.id(), marketDays, 0, 60, "day", "");
    }

    /**
     * Returns the wish of a lot with the usual market leg.
     *
     * @param lot the lot
     * @param wantedDays days in the chamber
     * @return the wish
     */
    public static Wish of(KeptLot lot, double wantedDays) {
        return new Wish(lot, wantedDays, USUAL_MARKET_DAYS, OptionalDouble.empty());
    }

    /**
     * Returns the days the lot has to last.
     *
     * @return stay and market leg, days
     */
    public double wholeDays() {
        return wantedDays + marketDays;
    }
}

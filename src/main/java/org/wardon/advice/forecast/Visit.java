package org.wardon.advice.forecast;

import java.util.Optional;
import org.wardon.heat.Berth;
import org.wardon.heat.Stay;
import org.wardon.keeping.Draw;
import org.wardon.lots.LotHistory;

/**
 * One lot in one chamber for a time. A lot that is never moved has one visit, from arrival to
 * leaving.
 *
 * @param sheet the lot
 * @param chamber id of the chamber
 * @param arrivesS when it comes in, s since the start of the run, may be below 0
 * @param leavesS when it goes, s
 * @param from chamber it is carried from; absent where it comes in by the door
 * @param to chamber it is carried to; absent where it leaves by the door
 */
record Visit(
        LotSheet sheet,
        String chamber,
        double arrivesS,
        double leavesS,
        Optional<String> from,
        Optional<String> to) {
    /** A lot that stands in one chamber from arrival to leaving. */
    static Visit whole(LotSheet sheet, String chamber) {
        return new Visit(
                sheet,
                chamber,
                sheet.clock().arrivesS(),
                sheet.clock().leavesS(),
                Optional.empty(),
                Optional.empty());
    }

    String id() {
        return sheet.id();
    }

    /** Start of what the run knows of it, s. */
    double hereFromS() {
        return Math.max(0, arrivesS);
    }

    /** Whether it leaves the store from here. */
    boolean last() {
        return to.isEmpty();
    }

    /** Whether the lot is here from its arrival to its leaving. */
    boolean only() {
        return from.isEmpty() && to.isEmpty();
    }

    /** The visit as the heat model takes it. */
    Stay stay(Draw draw) {
        Stay whole = sheet.stay(draw);
        Berth berth = Berth.between(from, to);
        return new Stay(
                whole.lot(),
                arrivesS,
                leavesS,
                whole.pulpC(),
                whole.freshUntilS(),
                from.isEmpty() ? whole.surfaceWaterKg() : 0,
                berth.at(sheet.spot()));
    }

    /** Whether it stands in the blast of the cooler, here as anywhere. */
    boolean nearCooler() {
        return sheet.spot() == Berth.Spot.NEAR_COOLER;
    }

    /** What the lot goes through here, of all it goes through. */
    LotHistory within(LotHistory whole) {
        return only()
                ? whole
                : whole.within(hereFromS(), last() ? Double.POSITIVE_INFINITY : leavesS);
    }
}

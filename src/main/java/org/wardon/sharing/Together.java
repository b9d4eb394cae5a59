package org.wardon.sharing;

import java.util.List;
import org.wardon.keeping.Fate;
import org.wardon.keeping.KeepingModel;

/**
 * A lot in a chamber as it was worked out there.
 *
 * @param wish the lot and its days
 * @param model how it keeps
 * @param fates its fates in the draws, with the chamber's air, humidity and ethylene
 * @param massKg its mass, kg
 * @param arrivesS when it arrives, s
 * @param leavesS when it leaves, s
 * @param meanC its mean temperature while there, °C
 * @param ethylenePpm mean ethylene while it is there, µL/L
 */
public record Together(
        Wish wish,
        KeepingModel model,
        List<Fate> fates,
        double massKg,
        double arrivesS,
        double leavesS,
        double meanC,
        double ethylenePpm) {
    /** Copies the list. */
    public Together {
        fates = List.copyOf(fates);
    }

    /** Days both are there, 0 where their stays do not meet. */
    double daysWith(Together other) {
        double from = Math.max(arrivesS, other.arrivesS);
        double to = Math.min(leavesS, other.leavesS);
        return Math.max(0, to - from) / org.wardon.air.Timeline.DAY_S;
    }

    String id() {
        return wish.lot().id();
    }
}

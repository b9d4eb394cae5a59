package org.wardon.advice.forecast;

import java.util.List;
import org.wardon.air.Timeline;
import org.wardon.heat.Stay;
import org.wardon.keeping.Draw;
import org.wardon.keeping.KeepingModel;
import org.wardon.keeping.KeptLot;
import org.wardon.lots.ClassValues;
import org.wardon.lots.Lot;
import org.wardon.lots.Lots;
import org.wardon.lots.RespirationLaw;
import org.wardon.lots.Respirations;
import org.wardon.lots.Shares;
import org.wardon.lots.WithReasons;
import org.wardon.plan.LotPlan;
import org.wardon.produce.Commodity;
import org.wardon.produce.PackageKind;
import org.wardon.produce.Reason;

/**
 * One lot of a plan with all that is known of it.
 *
 * @param plan the lot as planned
 * @param commodity what it is
 * @param kind its package
 * @param classes class values for what nobody printed
 * @param clock arrival and leaving in seconds of the run
 * @param model how it keeps
 */
record LotSheet(
        LotPlan plan,
        Commodity commodity,
        PackageKind kind,
        ClassValues classes,
        Clock clock,
        KeepingModel model) {
    /**
     * When the lot comes and goes.
     *
     * @param arrivesS arrival, s since the start of the run, may be below 0
     * @param leavesS leaving, s
     * @param freshUntilS until then it breathes as freshly harvested, s
     */
    record Clock(double arrivesS, double leavesS, double freshUntilS) {
        /** Start of what the run knows of the lot, s. */
        double hereFromS() {
            return Math.max(0, arrivesS);
        }

        /** End of the market leg, s. */
        double soldS(double marketDays) {
            return leavesS + marketDays * Timeline.DAY_S;
        }
    }

    String id() {
        return plan.id();
    }

    KeptLot kept() {
        return model.lot();
    }

    double marketDays() {
        return plan.market().days();
    }

    double soldS() {
        return clock.soldS(marketDays());
    }

    /** The body of the lot in one draw, as the heat model takes it. */
    Stay stay(Draw draw) {
        double water = plan.atDoor().surfaceWaterPct() / 100 * plan.massKg();
        return new Stay(
                body(draw),
                clock.arrivesS(),
                clock.leavesS(),
                plan.temperatureC(),
                clock.freshUntilS(),
                water);
    }

    /** What the body of the lot rests on. */
    List<Reason> restsOn() {
        return built(Shares.MIDDLE).restsOn();
    }

    private Lot body(Draw draw) {
        Shares shares = new Shares(draw.respiration(), draw.transpiration(), draw.packaging());
        Lot lot = built(shares).value();
        return model.uncured()
                ? Respirations.uncured(commodity, draw.respiration())
                        .map(raw -> breathing(lot, raw.value()))
                        .orElse(lot)
                : lot;
    }

    private WithReasons<Lot> built(Shares shares) {
        return Lots.of(
                id(), commodity, plan.massKg(), kind, plan.atDoor().ripeness(), classes, shares);
    }

    private static Lot breathing(Lot lot, RespirationLaw law) {
        return new Lot(lot.id(), lot.massKg(), lot.item(), lot.packing(), law, lot.transpiration());
    }
}

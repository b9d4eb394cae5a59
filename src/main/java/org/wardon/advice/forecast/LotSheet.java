package org.wardon.advice.forecast;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.function.IntToDoubleFunction;
import org.wardon.air.Timeline;
import org.wardon.enclosure.Enclosure;
import org.wardon.heat.Berth;
import org.wardon.heat.Hours;
import org.wardon.heat.Stay;
import org.wardon.keeping.Draw;
import org.wardon.keeping.KeepingModel;
import org.wardon.keeping.KeptLot;
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
 * @param bodies its body in each draw
 * @param clock arrival and leaving in seconds of the run
 * @param model how it keeps
 */
record LotSheet(
        LotPlan plan,
        Commodity commodity,
        PackageKind kind,
        Bodies bodies,
        Clock clock,
        KeepingModel model) {
    /**
     * When the lot comes and goes.
     *
     * @param arrivesS arrival, s since the start of the run, may be below 0
     * @param leavesS leaving, s
     * @param freshUntilS until then it breathes as freshly harvested, s
     * @param moves to other chambers, in order of time
     */
    record Clock(double arrivesS, double leavesS, double freshUntilS, List<Moved> moves) {
        Clock {
            moves = List.copyOf(moves);
        }

        /** The lot is carried to a chamber at a time of the run, s. */
        record Moved(double atS, String to) {}

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

    /**
     * Where it stands in the run, in order of time; empty where it is to be placed. A chamber it
     * left before the run began, or at the moment it came, it never stood in.
     */
    List<Visit> visits() {
        if (plan.chamber().isEmpty()) {
            return List.of();
        }
        List<Visit> visits = new ArrayList<>();
        String here = plan.chamber().get();
        double since = clock.arrivesS();
        Optional<String> from = Optional.empty();
        for (Clock.Moved move : clock.moves()) {
            if (move.atS() > Math.max(since, 0)) {
                visits.add(new Visit(this, here, since, move.atS(), from, Optional.of(move.to())));
                from = Optional.of(here);
                since = move.atS();
            }
            here = move.to();
        }
        visits.add(new Visit(this, here, since, clock.leavesS(), from, Optional.empty()));
        return visits;
    }

    /** The chamber it ends in. */
    String endsIn() {
        List<Visit> visits = visits();
        return visits.get(visits.size() - 1).chamber();
    }

    /** The body of the lot in one draw, as the heat model takes it. */
    Stay stay(Draw draw) {
        double water = plan.atDoor().surfaceWaterPct() / 100 * plan.massKg();
        return new Stay(
                bodies.in(draw),
                clock.arrivesS(),
                clock.leavesS(),
                plan.temperatureC(),
                clock.freshUntilS(),
                water);
    }

    /** Where in a chamber it stands, in each alike. */
    Berth.Spot spot() {
        return switch (plan.place()) {
            case NEAR_COOLER -> Berth.Spot.NEAR_COOLER;
            case MIDDLE -> Berth.Spot.MIDDLE;
            case DOOR -> Berth.Spot.BY_DOOR;
        };
    }

    /** Hourly means of the air it stands in, by row of a chamber's course, °C. */
    IntToDoubleFunction airC(Enclosure built, Hours hours) {
        return spot().atDoorEnd(built) ? hours::doorEndC : hours::airC;
    }

    /** What the body of the lot rests on. */
    List<Reason> restsOn() {
        return bodies.restsOn();
    }

    /** The same lot planned otherwise: in another chamber, say. */
    LotSheet planned(LotPlan otherwise) {
        return new LotSheet(otherwise, commodity, kind, bodies, clock, model);
    }
}

package org.wardon.advice.forecast;

import java.time.temporal.ChronoUnit;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.wardon.air.Timeline;
import org.wardon.enclosure.section.Side;
import org.wardon.enclosure.section.Spot;
import org.wardon.enclosure.section.StillAirSection;
import org.wardon.heat.HourAccount;
import org.wardon.keeping.KeepingModel;
import org.wardon.plan.ChamberPlan;
import org.wardon.produce.Caution;
import org.wardon.produce.Caution.Level;
import org.wardon.produce.Reason;
import org.wardon.produce.Reason.Argument;

/** What the warm and the cold place of a chamber without a fan mean for its lots. */
final class StillPlaces {
    /** A lot that came further in the hours is still on its way (assumption), K. */
    private static final double NOT_AT_REST_K = 1;

    private static final String OWN_RULE = "assumption";

    private final StoreModel model;
    private final ChamberPlan chamber;
    private final StillChamber.Seen seen;
    private final StillAirSection section;
    private final Spot warm;
    private final Spot cold;

    StillPlaces(StoreModel model, ChamberPlan chamber, StillChamber.Seen seen) {
        this.model = model;
        this.chamber = chamber;
        this.seen = seen;
        section = seen.section();
        warm = section.field().warmest();
        cold = section.field().coldest();
    }

    /** How far apart warm and cold are, and where. */
    Reason spread() {
        return Reason.about(
                "section-spread",
                chamber.id(),
                OWN_RULE,
                Argument.text(at()),
                face(Side.LEFT),
                face(Side.RIGHT),
                Argument.of(section.spreadK(), "K"),
                Argument.of(warm.temperatureC(), "C"),
                inWhat(warm),
                height(warm),
                beside(warm),
                Argument.of(cold.temperatureC(), "C"),
                inWhat(cold),
                height(cold),
                beside(cold),
                hours());
    }

    private Argument hours() {
        double span = seen.last().untilS() - seen.hours().get(0).fromS();
        return Argument.of(span / Timeline.HOUR_S, "h");
    }

    /** How far the forecast's one air is from the places. */
    Reason againstOneAir() {
        double oneAirC = section.chest().airC();
        return Reason.about(
                "section-one-air",
                chamber.id(),
                OWN_RULE,
                Argument.of(oneAirC, "C"),
                Argument.of(section.airMeanC(), "C"),
                Argument.of(section.field().meanC(), "C"),
                Argument.of(warm.temperatureC() - oneAirC, "K"),
                Argument.of(cold.temperatureC() - oneAirC, "K"));
    }

    /** A lot that is still cooling or warming towards what the section shows. */
    Optional<Reason> notAtRest() {
        return seen.cameFurthest()
                .filter(came -> Math.abs(came.byK()) >= NOT_AT_REST_K)
                .map(
                        came ->
                                Reason.about(
                                        "section-not-at-rest",
                                        came.lot(),
                                        OWN_RULE,
                                        Argument.of(came.byK(), "K"),
                                        Argument.of(came.nowC(), "C")));
    }

    Argument coldestInStack() {
        return Argument.of(section.coldestInStack().orElseThrow().temperatureC(), "C");
    }

    Argument warmestInStack() {
        return Argument.of(section.warmestInStack().orElseThrow().temperatureC(), "C");
    }

    /**
     * What is told where places of the air are further apart than the band is wide. How warm the
     * middle of a load becomes hangs on how it is stacked, which is not known here.
     */
    Optional<Caution> wide() {
        double bandK = 2 * chamber.setting().bandK();
        Level level = seen.lots().isEmpty() ? Level.NOTE : Level.CAUTION;
        return section.airSpreadK() <= bandK
                ? Optional.empty()
                : Optional.of(new Caution(level, apart(bandK)));
    }

    private Reason apart(double bandK) {
        Spot warmAir = section.warmestInAir();
        Spot coldAir = section.coldestInAir();
        return Reason.about(
                "still-air-spread",
                chamber.id(),
                OWN_RULE,
                Argument.of(section.airSpreadK(), "K"),
                Argument.of(bandK, "K"),
                Argument.text(at()),
                Argument.of(warmAir.temperatureC(), "C"),
                height(warmAir),
                beside(warmAir),
                Argument.of(coldAir.temperatureC(), "C"),
                height(coldAir),
                beside(coldAir),
                hours());
    }

    /** All there is to beware of. */
    List<Caution> cautions() {
        List<Caution> all = new ArrayList<>();
        for (HourAccount.OfLot lot : seen.lots()) {
            judge(lot.id(), all);
        }
        wide().ifPresent(all::add);
        return all;
    }

    private void judge(String lot, List<Caution> all) {
        LotSheet sheet =
                model.sheets().stream().filter(s -> s.id().equals(lot)).findFirst().orElseThrow();
        double freezingC = sheet.model().freezingC();
        double lowestC = sheet.model().lowestSafeC();
        double setC = model.settings(chamber).until(seen.last().untilS()).temperatureC();
        double mostC = setC + chamber.setting().bandK() + Holding.RISE_MOST_K;
        if (cold.temperatureC() < freezingC + KeepingModel.FREEZING_MARGIN_K) {
            all.add(new Caution(Level.DANGER, told("freezes-in-cold-place", lot, cold, freezingC)));
        } else if (cold.temperatureC() < lowestC) {
            all.add(new Caution(Level.CAUTION, told("chills-in-cold-place", lot, cold, lowestC)));
        }
        section.warmestInStack()
                .filter(place -> place.temperatureC() > mostC)
                .map(place -> told("warm-in-warm-place", lot, place, mostC))
                .ifPresent(reason -> all.add(new Caution(Level.CAUTION, reason)));
    }

    private Reason told(String code, String lot, Spot place, double limitC) {
        return new Reason(
                code,
                List.of(lot, chamber.id()),
                List.of(
                        Argument.of(place.temperatureC(), "C"),
                        Argument.of(limitC, "C"),
                        inWhat(place),
                        height(place),
                        beside(place)),
                OWN_RULE);
    }

    private String at() {
        return model.plan()
                .timeline()
                .localAt(seen.last().untilS())
                .truncatedTo(ChronoUnit.MINUTES)
                .toString()
                .replace('T', ' ');
    }

    private Argument face(Side side) {
        return Argument.text(SectionFigures.word(section.chest().cut().face(side)));
    }

    private Argument inWhat(Spot place) {
        return Argument.text(inStack(place) ? "stack" : "air");
    }

    boolean inStack(Spot place) {
        return section.inStack(place);
    }

    /** A place, to be said in a line of its own. */
    Reason where(Spot place) {
        return Reason.about(
                "section-where",
                chamber.id(),
                OWN_RULE,
                inWhat(place),
                height(place),
                beside(place));
    }

    private Argument height(Spot place) {
        double share = place.yM() / section.field().heightM();
        return Argument.text(share < 1.0 / 3 ? "low" : share > 2.0 / 3 ? "high" : "middle");
    }

    private Argument beside(Spot place) {
        double share = place.xM() / section.field().widthM();
        if (share < 0.25) {
            return face(Side.LEFT);
        }
        return share > 0.75 ? face(Side.RIGHT) : Argument.text("middle");
    }
}

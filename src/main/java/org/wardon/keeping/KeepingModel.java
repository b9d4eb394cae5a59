package org.wardon.keeping;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.wardon.keeping.chilling.Chilling;
import org.wardon.keeping.dormancy.Dormancy;
import org.wardon.keeping.ethylene.Response;
import org.wardon.keeping.ethylene.Stage;
import org.wardon.keeping.experience.Sighting;
import org.wardon.keeping.life.LifeCurve;
import org.wardon.keeping.ripening.Ripening;
import org.wardon.lots.LotHistory;
import org.wardon.produce.Commodity;
import org.wardon.produce.Reason;
import org.wardon.produce.Ripeness;
import org.wardon.produce.rows.CompositionRow;
import org.wardon.produce.rows.OwnLot;

/**
 * How one lot keeps: all mechanisms, ready to follow histories. Build it once a lot; following is
 * cheap and changes nothing.
 */
public final class KeepingModel {
    /** Distance every part of a lot keeps from freezing, K (common practice, no source). */
    public static final double FREEZING_MARGIN_K = 0.5;

    /** Freezing point where none is printed: the warm side of what is printed (assumption). */
    private static final double USUAL_FREEZING_C = -0.5;

    private final KeptLot lot;
    private final LifeCurve curve;
    private final Optional<Chilling> chilling;
    private final Dormancy dormancy;
    private final Response response;
    private final LifeSpan span;
    private final WaterLimit water;
    private final Optional<Ripening> ripening;
    private final double freezingC;

    private KeepingModel(KeptLot lot) {
        Commodity commodity = lot.commodity();
        this.lot = lot;
        span = new LifeSpan(commodity, lot.door());
        Ripeness ripeness = span.ripeness();
        chilling = Chilling.of(commodity, ripeness);
        curve = LifeCurve.of(commodity, lot.door().knownLife(), OwnLots.of(commodity));
        dormancy = Dormancy.of(commodity);
        response = Response.of(commodity, lot.door().ripeness());
        water = new WaterLimit(commodity, curve);
        ripening = Ripening.of(commodity, lot.door().ripeness());
        freezingC = freezing(commodity);
    }

    /**
     * Returns the model of a lot.
     *
     * @param lot the lot
     * @return its model
     */
    public static KeepingModel of(KeptLot lot) {
        return new KeepingModel(lot);
    }

    private static double freezing(Commodity commodity) {
        if (commodity.needs().highestFreezingC().isPresent()) {
            return commodity.needs().highestFreezingC().get().highest();
        }
        return commodity.body().compositions().stream()
                .map(CompositionRow::initialFreezingC)
                .filter(java.util.OptionalDouble::isPresent)
                .mapToDouble(java.util.OptionalDouble::getAsDouble)
                .max()
                .orElse(USUAL_FREEZING_C);
    }

    /**
     * Follows a history; beyond its end each mechanism goes on at its mean rate of the last 24
     * hours.
     *
     * @param history what the lot goes through from its arrival on
     * @param draw the draw
     * @return its fate
     */
    public Fate follow(LotHistory history, Draw draw) {
        return follow(history, draw, Window.lastDay(history));
    }

    /**
     * Follows a history; beyond its end each mechanism goes on at its mean rate of a window.
     *
     * @param history what the lot goes through from its arrival on
     * @param draw the draw
     * @param beyond the window, the last 24 hours without an outage say
     * @return its fate
     */
    public Fate follow(LotHistory history, Draw draw, Window beyond) {
        return new Following(paces(draw), history, beyond).fate();
    }

    /**
     * Follows several histories, each by itself; quicker than one after the other.
     *
     * @param histories what the lot may go through from its arrival on
     * @param draw the draw
     * @return a fate a history
     */
    public List<Fate> follow(List<LotHistory> histories, Draw draw) {
        Paces paces = paces(draw);
        return histories.stream()
                .map(one -> new Following(paces, one, Window.lastDay(one)).fate())
                .toList();
    }

    /**
     * Returns the pace of each mechanism in a draw.
     *
     * @param draw the draw
     * @return paces, for constant conditions
     */
    public Paces paces(Draw draw) {
        return new Paces(this, draw);
    }

    /**
     * Follows a history in the plain run and all draws and puts them together.
     *
     * @param history what the lot goes through from its arrival on
     * @param draws the draws
     * @param fromS days left count from here, s
     * @param leavesS end of stay and market leg, s, for the risk of chilling
     * @return the outlook
     */
    public Outlook outlook(LotHistory history, List<Draw> draws, double fromS, double leavesS) {
        List<Fate> fates = new ArrayList<>(draws.size());
        for (Draw draw : draws) {
            fates.add(follow(history, draw));
        }
        double endS = history.timeS(history.size() - 1);
        return Outlook.of(
                follow(history, Draw.MEDIAN), fates, fromS, endS, leavesS, basis(history));
    }

    /**
     * Returns what an answer along a history rests on and why.
     *
     * @param history what the lot goes through
     * @return basis with reasons
     */
    public Basis basis(LotHistory history) {
        return new Grounds(this, history).basis();
    }

    /**
     * Returns the temperature below which the commodity freezes.
     *
     * @return highest freezing point, °C
     */
    public double freezingC() {
        return freezingC;
    }

    /**
     * Returns the temperature from which on nothing is chilled, as printed for the lot's ripeness.
     *
     * @return °C, minus infinity where it does not chill
     */
    public double lowestSafeC() {
        return chilling.map(c -> c.zone().topC()).orElse(Double.NEGATIVE_INFINITY);
    }

    /**
     * Returns the warm end of the temperature the handbook advises.
     *
     * @return °C; that of kin or plant part where none is printed
     */
    public double handbookC() {
        return water.handbookC();
    }

    /**
     * Returns the middle of the humidity the handbook advises.
     *
     * @return 0 to 1
     */
    public double handbookHumidityFraction() {
        return water.handbookHumidity();
    }

    /**
     * Returns whether the lot is to stay dry.
     *
     * @return true for bulbs that root and mould in damp air
     */
    public boolean wantsDry() {
        return dormancy.wantsDry();
    }

    /**
     * Returns whether the lot still has to be cured, or may have to.
     *
     * @return true where a cure is printed and nobody said it was done
     */
    public boolean uncured() {
        return dormancy.curable() && !lot.door().cured().orElse(false);
    }

    /**
     * Returns the lot.
     *
     * @return the lot as given
     */
    public KeptLot lot() {
        return lot;
    }

    /**
     * Returns the ethylene the lot gives off as ripe as it came.
     *
     * @param atC its temperature, °C
     * @param draw the draw
     * @return µL/(kg h)
     */
    public double ethyleneMicrolitrePerKgHour(double atC, Draw draw) {
        double stage = Stage.giving(lot.commodity(), lot.door().ripeness(), draw);
        return response.giving().microlitrePerKgHour(atC, stage, draw);
    }

    /**
     * Returns what ethylene does to the lot.
     *
     * @return its response
     */
    public Response response() {
        return response;
    }

    /**
     * Returns how the lot ripens.
     *
     * @return its ripening; empty where no times are printed or nobody said how ripe it is
     */
    public Optional<Ripening> ripening() {
        return ripening;
    }

    /** Whether the lot ends when it is overripe by printed times of ripening. */
    boolean endsOverripe() {
        return ripening.isPresent() && !span.shippedGreen();
    }

    /**
     * Returns the life of the commodity over temperature.
     *
     * @return the curve, moved by what the keeper has seen
     */
    public LifeCurve life() {
        return curve;
    }

    /**
     * Returns how long a lot of the keeper's own kept, or at least kept.
     *
     * @param lot the lot
     * @return its life over the published one in the middle run
     */
    public double timesPublished(OwnLot lot) {
        Sighting seen = OwnLots.of(this.lot.commodity(), lot);
        return Math.exp(seen.lnRatio(curve.published(Draw.MEDIAN), Draw.MEDIAN));
    }

    /**
     * Returns what the keeper's own figures and lots did to the life.
     *
     * @return reasons; none where there are no own ones
     */
    public List<Reason> ownGrounds() {
        return OwnGrounds.of(this);
    }

    LifeCurve curve() {
        return curve;
    }

    Optional<Chilling> chilling() {
        return chilling;
    }

    Dormancy dormancy() {
        return dormancy;
    }

    LifeSpan span() {
        return span;
    }

    WaterLimit water() {
        return water;
    }
}

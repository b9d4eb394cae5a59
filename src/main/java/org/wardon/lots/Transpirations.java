package org.wardon.lots;

import java.util.List;
import java.util.Optional;
import org.wardon.produce.Commodity;
import org.wardon.produce.Fact;
import org.wardon.produce.Reason;
import org.wardon.produce.rows.TranspirationRow;

/**
 * Chooses what a commodity transpires by.
 *
 * <p>Rule: a printed coefficient is skin and test film together, counted from saturation, and
 * stands alone; else the mean skin coefficient in series with the film of air in the package; else
 * a printed loss for each mbar of vapour pressure deficit, also counted from saturation; else the
 * class. The range is the printed skin range over its mean; × or ÷ 1.5 for a coefficient without
 * one, × or ÷ 2 for a loss, × or ÷ 3 for a class value (assumption).
 *
 * <p>Source: ASHRAE Handbook - Refrigeration 2006, chapter 9, 1/kt = 1/ks + 1/ka.
 */
public final class Transpirations {
    private static final double KG_PER_NG = 1e-12;
    private static final double KG_PER_UG = 1e-9;
    private static final double UNPRINTED_SPREAD = 1.5;
    private static final double LOSS_SPREAD = 2;
    private static final double CLASS_SPREAD = 3;

    /** One percent a day for each mbar, kg/(kg s Pa). */
    private static final double KG_PER_PCT_DAY_MBAR = 0.01 / 86_400 / 100;

    /** A printed coefficient is defined on the saturation pressure at the produce's temperature. */
    private static final double SATURATED = 1;

    /** Vapour pressure lowering where none is printed: the commonest in the table (assumption). */
    private static final double USUAL_LOWERING = 0.99;

    /** Low and high over the middle. */
    private record Spread(double low, double high) {
        static Spread both(double factor) {
            return new Spread(1 / factor, factor);
        }

        double at(double share) {
            return share < 0.5 ? Math.pow(low, 1 - 2 * share) : Math.pow(high, 2 * share - 1);
        }
    }

    private Transpirations() {}

    /**
     * Returns the law of a commodity.
     *
     * @param commodity the commodity
     * @param item its item, for the surface of a kilogram and the film
     * @param classes class values, for a commodity nobody measured
     * @param share 0 low, 0.5 the printed mean, 1 high; even in the logarithm on either side
     * @return the law and what it rests on
     */
    public static WithReasons<TranspirationLaw> of(
            Commodity commodity, Item item, ClassValues classes, double share) {
        return own(commodity, item, share)
                .orElseGet(() -> ofClass(commodity, item, classes, share));
    }

    private static Optional<WithReasons<TranspirationLaw>> own(
            Commodity commodity, Item item, double share) {
        return row(commodity)
                .map(row -> printed(commodity.id(), row, item, share))
                .or(() -> loss(commodity).map(loss -> ofLoss(commodity.id(), loss, item, share)));
    }

    private static WithReasons<TranspirationLaw> ofClass(
            Commodity commodity, Item item, ClassValues classes, double share) {
        ClassValues.Figure<Double> middle = classes.transpirationKgPerKgSPa(commodity);
        Reason reason =
                Reason.about(
                        "transpiration-class",
                        commodity.id(),
                        ClassValues.SOURCE,
                        Reason.Argument.text(middle.group()),
                        Reason.Argument.of(CLASS_SPREAD, "1"));
        double conductance = middle.value() * Spread.both(CLASS_SPREAD).at(share);
        return new WithReasons<>(
                new TranspirationLaw(conductance, USUAL_LOWERING, film(item)),
                List.of(reason),
                true);
    }

    private static WithReasons<TranspirationLaw> ofLoss(
            String id, Fact loss, Item item, double share) {
        double conductance = loss.middle() * KG_PER_PCT_DAY_MBAR;
        return new WithReasons<>(
                new TranspirationLaw(
                        conductance * Spread.both(LOSS_SPREAD).at(share), SATURATED, film(item)),
                List.of(Reason.about("transpiration-loss", id, loss.sourceId())),
                false);
    }

    private static double film(Item item) {
        return item.areaM2PerKg() * AirFilm.vapourKgPerSM2Pa(item);
    }

    private static WithReasons<TranspirationLaw> printed(
            String id, TranspirationRow row, Item item, double share) {
        double film = film(item);
        double factor = spread(row).at(share);
        if (row.coefficient().isPresent()) {
            Fact whole = row.coefficient().get();
            return new WithReasons<>(
                    new TranspirationLaw(whole.middle() * KG_PER_NG * factor, SATURATED, film),
                    List.of(Reason.about("transpiration-coefficient", id, whole.sourceId())),
                    false);
        }
        double lowering = row.vapourPressureLowering().orElse(USUAL_LOWERING);
        double skin = item.areaM2PerKg() * skinMean(row) * KG_PER_UG * factor;
        String source = row.skin().map(Fact::sourceId).orElse(ClassValues.SOURCE);
        return new WithReasons<>(
                new TranspirationLaw(inSeries(skin, film), lowering, film),
                List.of(Reason.about("transpiration-skin", id, source)),
                false);
    }

    /**
     * Returns the overall coefficient of skin and film.
     *
     * @param skin one conductance, any unit
     * @param film the other, same unit
     * @return both in series, same unit
     */
    public static double inSeries(double skin, double film) {
        return skin * film / (skin + film);
    }

    /** The conductance in the middle of a commodity's own range, empty where nobody measured. */
    static Optional<Double> ownMiddle(Commodity commodity) {
        Optional<Double> coefficient =
                row(commodity)
                        .flatMap(TranspirationRow::coefficient)
                        .map(ng -> ng.middle() * KG_PER_NG);
        return coefficient
                .or(() -> ownSkin(commodity))
                .or(() -> loss(commodity).map(loss -> loss.middle() * KG_PER_PCT_DAY_MBAR));
    }

    private static Optional<Double> ownSkin(Commodity commodity) {
        return row(commodity)
                .flatMap(
                        row ->
                                Items.printed(commodity)
                                        .map(item -> printed(commodity.id(), row, item, 0.5)))
                .map(law -> law.value().conductanceKgPerKgSPa());
    }

    private static Optional<Fact> loss(Commodity commodity) {
        return commodity.water().losses().stream()
                .flatMap(row -> row.loss().stream())
                .filter(fact -> fact.unit().equals("pct_per_day_per_mbar"))
                .findFirst();
    }

    private static Optional<TranspirationRow> row(Commodity commodity) {
        return commodity.water().transpiration().stream()
                .filter(r -> r.coefficient().isPresent() || hasSkin(r))
                .findFirst();
    }

    private static boolean hasSkin(TranspirationRow row) {
        return row.skinMean().isPresent() || row.skin().isPresent();
    }

    private static double skinMean(TranspirationRow row) {
        return row.skinMean().orElseGet(() -> row.skin().orElseThrow().atLogShare(0.5));
    }

    private static Spread spread(TranspirationRow row) {
        if (row.skin().isEmpty() || row.skin().get().lowest() >= row.skin().get().highest()) {
            return Spread.both(UNPRINTED_SPREAD);
        }
        double mean = skinMean(row);
        Fact skin = row.skin().get();
        return new Spread(Math.min(1, skin.lowest() / mean), Math.max(1, skin.highest() / mean));
    }
}

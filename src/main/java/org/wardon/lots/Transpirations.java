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
 * the median of the plant part. The range is the printed skin range over its mean; × or ÷ 1.5 where
 * none is printed (assumption), × or ÷ 3 for a class value (assumption).
 *
 * <p>Source: ASHRAE Handbook - Refrigeration 2006, chapter 9, 1/kt = 1/ks + 1/ka.
 */
public final class Transpirations {
    private static final double KG_PER_NG = 1e-12;
    private static final double KG_PER_UG = 1e-9;
    private static final double UNPRINTED_SPREAD = 1.5;
    private static final double CLASS_SPREAD = 3;

    /** A printed coefficient is defined on the saturation pressure at the produce's temperature. */
    private static final double SATURATED = 1;

    /** Vapour pressure lowering where none is printed: the commonest in the table (assumption). */
    private static final double USUAL_LOWERING = 0.99;

    /** Low and high over the middle. */
    private record Spread(double low, double high) {
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
        Optional<TranspirationRow> row = row(commodity);
        double film = item.areaM2PerKg() * AirFilm.vapourKgPerSM2Pa(item);
        double lowering =
                row.flatMap(r -> r.vapourPressureLowering().stream().boxed().findFirst())
                        .orElse(USUAL_LOWERING);
        if (row.isEmpty()) {
            double middle = classes.of(commodity.plantPart()).transpirationKgPerKgSPa();
            double factor = new Spread(1 / CLASS_SPREAD, CLASS_SPREAD).at(share);
            return new WithReasons<>(
                    new TranspirationLaw(middle * factor, lowering, film),
                    List.of(
                            Reason.about(
                                    "transpiration-class",
                                    commodity.id(),
                                    ClassValues.SOURCE,
                                    Reason.Argument.text(commodity.plantPart()),
                                    Reason.Argument.of(CLASS_SPREAD, "1"))),
                    true);
        }
        return printed(commodity.id(), row.get(), item, lowering, share);
    }

    private static WithReasons<TranspirationLaw> printed(
            String id, TranspirationRow row, Item item, double lowering, double share) {
        double area = item.areaM2PerKg();
        double film = area * AirFilm.vapourKgPerSM2Pa(item);
        double factor = spread(row).at(share);
        if (row.coefficient().isPresent()) {
            Fact whole = row.coefficient().get();
            return new WithReasons<>(
                    new TranspirationLaw(whole.middle() * KG_PER_NG * factor, SATURATED, film),
                    List.of(Reason.about("transpiration-coefficient", id, whole.sourceId())),
                    false);
        }
        double skin = area * skinMean(row) * KG_PER_UG * factor;
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
        return row(commodity).flatMap(row -> ownMiddle(commodity, row));
    }

    private static Optional<Double> ownMiddle(Commodity commodity, TranspirationRow row) {
        if (row.coefficient().isPresent()) {
            return Optional.of(row.coefficient().get().middle() * KG_PER_NG);
        }
        return Items.printed(commodity)
                .map(item -> printed(commodity.id(), row, item, USUAL_LOWERING, 0.5))
                .map(law -> law.value().conductanceKgPerKgSPa());
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
            return new Spread(1 / UNPRINTED_SPREAD, UNPRINTED_SPREAD);
        }
        double mean = skinMean(row);
        Fact skin = row.skin().get();
        return new Spread(Math.min(1, skin.lowest() / mean), Math.max(1, skin.highest() / mean));
    }
}

package org.wardon.lots;

import java.util.List;
import org.wardon.produce.Commodity;
import org.wardon.produce.PackageKind;
import org.wardon.produce.Ripeness;

/**
 * One lot in the ranges of what is printed about it: the rows are chosen once, {@link #at} gives
 * its body anywhere in their ranges.
 */
public final class LotRange {
    private record Named(String id, double massKg) {}

    private final Named named;
    private final Commodity commodity;
    private final PackageKind kind;
    private final ClassValues classes;
    private final WithReasons<Item> item;
    private final WithReasons<RespirationCurve> breath;
    private final double bareKgPerKgSPa;

    private LotRange(
            Named named,
            Commodity commodity,
            PackageKind kind,
            ClassValues classes,
            WithReasons<Item> item,
            WithReasons<RespirationCurve> breath) {
        this.named = named;
        this.commodity = commodity;
        this.kind = kind;
        this.classes = classes;
        this.item = item;
        this.breath = breath;
        bareKgPerKgSPa = transpiration(0.5).value().conductanceKgPerKgSPa();
    }

    /**
     * Chooses the rows of a lot.
     *
     * @param id id of the lot
     * @param commodity what it is of
     * @param massKg net mass, kg
     * @param kind its package
     * @param ripeness how far it has come
     * @param classes class values for what is not printed
     * @return the lot in its ranges
     */
    public static LotRange of(
            String id,
            Commodity commodity,
            double massKg,
            PackageKind kind,
            Ripeness ripeness,
            ClassValues classes) {
        return new LotRange(
                new Named(id, massKg),
                commodity,
                kind,
                classes,
                Items.of(commodity, classes),
                Respirations.of(commodity, ripeness, classes, 0.5));
    }

    /**
     * Returns the lot breathing as one that was not cured, where such rates are printed.
     *
     * @return the same but for its respiration
     */
    public LotRange uncured() {
        return Respirations.uncured(commodity, 0.5)
                .map(raw -> new LotRange(named, commodity, kind, classes, item, raw))
                .orElse(this);
    }

    private WithReasons<TranspirationLaw> transpiration(double share) {
        return Transpirations.of(commodity, item.value(), classes, share);
    }

    /**
     * Returns the lot somewhere in its ranges.
     *
     * @param shares where
     * @return the lot and what it rests on
     */
    public WithReasons<Lot> at(Shares shares) {
        WithReasons<TranspirationLaw> water = transpiration(shares.transpiration());
        WithReasons<Packing> packing =
                PackageFit.of(
                        item.value(),
                        PackageInside.of(
                                commodity,
                                item.value(),
                                kind,
                                new PackageInside.Vapour(
                                        bareKgPerKgSPa, water.value().conductanceKgPerKgSPa())),
                        kind,
                        shares.packageTime());
        RespirationCurve drawn = breath.value().withShare(shares.respiration());
        Lot lot =
                new Lot(
                        named.id,
                        named.massKg,
                        item.value(),
                        packing.value(),
                        drawn,
                        water.value());
        return item.and(packing)
                .and(breath)
                .and(water)
                .and(new WithReasons<>(lot, List.of(), false));
    }
}

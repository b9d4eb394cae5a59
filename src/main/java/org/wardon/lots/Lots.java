package org.wardon.lots;

import java.util.List;
import org.wardon.produce.Commodity;
import org.wardon.produce.PackageKind;
import org.wardon.produce.Ripeness;

/** Makes a lot of what is printed about its commodity and its package. */
public final class Lots {
    private Lots() {}

    /**
     * Returns a lot.
     *
     * @param id id of the lot
     * @param commodity what it is of
     * @param massKg net mass, kg
     * @param kind its package
     * @param ripeness how far it has come
     * @param classes class values for what is not printed
     * @param shares where in the printed ranges it lies
     * @return the lot and what it rests on
     */
    public static WithReasons<Lot> of(
            String id,
            Commodity commodity,
            double massKg,
            PackageKind kind,
            Ripeness ripeness,
            ClassValues classes,
            Shares shares) {
        WithReasons<Item> item = Items.of(commodity, classes);
        WithReasons<RespirationCurve> breath =
                Respirations.of(commodity, ripeness, classes, shares.respiration());
        WithReasons<TranspirationLaw> water =
                Transpirations.of(commodity, item.value(), classes, shares.transpiration());
        double bare =
                Transpirations.of(commodity, item.value(), classes, 0.5)
                        .value()
                        .conductanceKgPerKgSPa();
        WithReasons<Packing> packing =
                PackageFit.of(
                        item.value(),
                        PackageInside.of(
                                commodity,
                                item.value(),
                                kind,
                                new PackageInside.Vapour(
                                        bare, water.value().conductanceKgPerKgSPa())),
                        kind,
                        shares.packageTime());
        Lot lot = new Lot(id, massKg, item.value(), packing.value(), breath.value(), water.value());
        return item.and(packing)
                .and(breath)
                .and(water)
                .and(new WithReasons<>(lot, List.of(), false));
    }
}

package org.wardon.lots;

import java.util.OptionalDouble;
import org.wardon.produce.Commodity;
import org.wardon.produce.Fact;
import org.wardon.produce.PackageKind;
import org.wardon.produce.rows.GeometryRow;

/**
 * What a package holds beside the items, and how it lets vapour pass.
 *
 * @param commodityId whose items
 * @param sourceId source of the package's time
 * @param airM3PerKg air among the items, m3/kg
 * @param tareJPerKgK heat capacity of the empty package, J/(K kg of lot)
 * @param vapourKgPerKgSPa package air to chamber, kg/(kg s Pa)
 */
record PackageInside(
        String commodityId,
        String sourceId,
        double airM3PerKg,
        double tareJPerKgK,
        double vapourKgPerKgSPa) {
    /** Air among items over the whole where no bulk density is printed (assumption). */
    private static final double USUAL_VOIDS = 0.42;

    /** Empty package per kg of produce where not known (assumption). */
    private static final double USUAL_TARE = 0.08;

    /** Specific heat of board, wood and plastic, J/(kg K) (assumption). */
    private static final double TARE_J_KG_K = 1700;

    static PackageInside of(Commodity commodity, Item item, PackageKind kind, double bareVapour) {
        double tare = kind.tareKgPerKg().map(Fact::middle).orElse(USUAL_TARE);
        return new PackageInside(
                commodity.id(),
                kind.halfCoolingHours().sourceId(),
                airM3PerKg(commodity, item),
                TARE_J_KG_K * tare,
                PackageFit.vapourKgPerKgSPa(bareVapour, kind.vapourConductance().atLogShare(0.5)));
    }

    /** The same beside other conductances. */
    static PackageInside like(Packing packing) {
        return new PackageInside(
                "",
                ClassValues.SOURCE,
                packing.airM3PerKg(),
                packing.tareJPerKgK(),
                packing.vapourKgPerKgSPa());
    }

    Packing packing(double filmWPerKgK, double chamberWPerKgK) {
        return new Packing(filmWPerKgK, chamberWPerKgK, airM3PerKg, tareJPerKgK, vapourKgPerKgSPa);
    }

    private static double airM3PerKg(Commodity commodity, Item item) {
        double itemM3 = 1 / item.densityKgM3();
        OptionalDouble bulk =
                commodity.body().geometries().stream()
                        .map(GeometryRow::bulkDensityKgM3)
                        .flatMapToDouble(OptionalDouble::stream)
                        .findFirst();
        double usual = itemM3 * USUAL_VOIDS / (1 - USUAL_VOIDS);
        double voids = bulk.isPresent() ? 1 / bulk.getAsDouble() - itemM3 : usual;
        return voids > 0.1 * itemM3 ? voids : usual;
    }
}

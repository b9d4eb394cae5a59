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
 * @param vapourKgPerKgSPa package air to chamber, at most, kg/(kg s Pa)
 * @param leastFilmWPerKgK film of the items, at least, W/(kg K)
 */
record PackageInside(
        String commodityId,
        String sourceId,
        double airM3PerKg,
        double tareJPerKgK,
        double vapourKgPerKgSPa,
        double leastFilmWPerKgK) {
    /**
     * Vapour that moving air can carry for the heat it carries, kg/(s Pa) for W/K: 0.622/(cp p) at
     * sea level. What lets vapour pass by air lets heat pass with it, so no path for vapour is
     * wider than this; without the bound a lot could fall below the wet bulb of the air around it.
     *
     * <p>Source: Lewis relation for air and water with the number taken as 1, ASHRAE Handbook -
     * Fundamentals, 2017, chapter 6 (from memory of it).
     */
    static final double VAPOUR_PER_HEAT = 0.622 / (1006.0 * 101_325.0);

    /** Air among items over the whole where no bulk density is printed (assumption). */
    private static final double USUAL_VOIDS = 0.42;

    /** Empty package per kg of produce where not known (assumption). */
    private static final double USUAL_TARE = 0.08;

    /** Specific heat of board, wood and plastic, J/(kg K) (assumption). */
    private static final double TARE_J_KG_K = 1700;

    /**
     * Conductance for vapour from tissue to air without a package.
     *
     * @param usualKgPerKgSPa middle of its range, by which the package is measured
     * @param drawnKgPerKgSPa as drawn; the film must carry the heat that goes with it
     */
    record Vapour(double usualKgPerKgSPa, double drawnKgPerKgSPa) {}

    static PackageInside of(Commodity commodity, Item item, PackageKind kind, Vapour vapour) {
        double tare = kind.tareKgPerKg().map(Fact::middle).orElse(USUAL_TARE);
        return new PackageInside(
                commodity.id(),
                kind.halfCoolingHours().sourceId(),
                airM3PerKg(commodity, item),
                TARE_J_KG_K * tare,
                PackageFit.vapourKgPerKgSPa(
                        vapour.usualKgPerKgSPa(), kind.vapourConductance().atLogShare(0.5)),
                vapour.drawnKgPerKgSPa() / VAPOUR_PER_HEAT);
    }

    /** The same beside other conductances. */
    static PackageInside like(Packing packing) {
        return new PackageInside(
                "",
                ClassValues.SOURCE,
                packing.airM3PerKg(),
                packing.tareJPerKgK(),
                packing.vapourKgPerKgSPa(),
                0);
    }

    Packing packing(double filmWPerKgK, double chamberWPerKgK) {
        double vapour = Math.min(vapourKgPerKgSPa, VAPOUR_PER_HEAT * chamberWPerKgK);
        return new Packing(filmWPerKgK, chamberWPerKgK, airM3PerKg, tareJPerKgK, vapour);
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

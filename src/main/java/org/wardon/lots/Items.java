package org.wardon.lots;

import java.util.List;
import java.util.Optional;
import org.wardon.produce.Commodity;
import org.wardon.produce.Reason;
import org.wardon.produce.rows.CompositionRow;
import org.wardon.produce.rows.GeometryRow;

/**
 * Makes an item of what is printed about a commodity.
 *
 * <p>Heat properties are those of the chosen composition at 10 °C (Choi and Okos), with air spaces
 * where a density is printed. Size: the printed radius; else, from the printed mass of one item,
 * the body of that volume; a leaf of unprinted size is 0.5 mm thick (assumption). What is missing
 * is the class value.
 */
public final class Items {
    /** Half thickness of a leaf, m (assumption). */
    private static final double LEAF_M = 0.25e-3;

    private static final double AT_C = 10;

    private Items() {}

    /**
     * Returns an item of a commodity.
     *
     * @param commodity the commodity
     * @param classes class values for what is not printed
     * @return the item and what it rests on
     */
    public static WithReasons<Item> of(Commodity commodity, ClassValues classes) {
        WithReasons<ItemHeat> heat =
                ownHeat(commodity)
                        .map(
                                own ->
                                        found(
                                                own,
                                                "item-composition",
                                                commodity.id(),
                                                heatSource(commodity)))
                        .orElseGet(
                                () ->
                                        ofClass(
                                                classes.heat(commodity),
                                                "item-composition-class",
                                                commodity));
        WithReasons<ItemSize> size =
                printedSize(commodity)
                        .map(own -> found(own, "item-size", commodity.id(), sizeSource(commodity)))
                        .or(() -> unprintedSize(commodity, heat.value()))
                        .orElseGet(
                                () ->
                                        ofClass(
                                                classes.size(commodity),
                                                "item-size-class",
                                                commodity));
        return heat.and(size)
                .and(
                        new WithReasons<>(
                                item(commodity, heat.value(), size.value()), List.of(), false));
    }

    private static Item item(Commodity commodity, ItemHeat has, ItemSize size) {
        double mass = unitMass(commodity).orElseGet(() -> has.densityKgM3() * size.volumeM3());
        return new Item(
                size.shape(),
                size.radiusM(),
                has.densityKgM3(),
                has.specificHeatJkgK(),
                has.conductivityWmK(),
                mass);
    }

    /** The item where all of it is printed. */
    static Optional<Item> printed(Commodity commodity) {
        return ownHeat(commodity)
                .flatMap(heat -> printedSize(commodity).map(size -> item(commodity, heat, size)));
    }

    /** Heat properties that rest on the commodity's own composition. */
    static Optional<ItemHeat> ownHeat(Commodity commodity) {
        return commodity.body().compositions().stream()
                .findFirst()
                .map(row -> heat(row, geometry(commodity)));
    }

    private static ItemHeat heat(CompositionRow row, Optional<GeometryRow> geometry) {
        Composition made = Composition.of(row);
        double density =
                geometry.filter(g -> g.densityKgM3().isPresent())
                        .map(g -> g.densityKgM3().getAsDouble())
                        .orElseGet(() -> made.densityKgM3(AT_C));
        return new ItemHeat(
                density, made.specificHeatJkgK(AT_C), made.conductivityWmK(AT_C, density));
    }

    /** The size in print, empty where none is printed. */
    static Optional<ItemSize> printedSize(Commodity commodity) {
        return geometry(commodity)
                .filter(row -> row.characteristicMm().isPresent())
                .map(row -> new ItemSize(shape(row), row.characteristicMm().getAsDouble() / 1000));
    }

    /** From the mass of one item, or a leaf's usual thickness. */
    private static Optional<WithReasons<ItemSize>> unprintedSize(
            Commodity commodity, ItemHeat heat) {
        Optional<GeometryRow> row = geometry(commodity);
        boolean leaf = row.map(g -> g.shape().equals("leaf")).orElseGet(() -> leafy(commodity));
        if (leaf) {
            ItemSize thin = new ItemSize(Shape.SLAB, LEAF_M);
            return Optional.of(found(thin, "item-leaf-thickness", commodity.id(), "assumption"));
        }
        return row.flatMap(
                g ->
                        unitMass(commodity)
                                .map(mass -> ItemSize.ofVolume(shape(g), mass / heat.densityKgM3()))
                                .map(
                                        size ->
                                                found(
                                                        size,
                                                        "item-size-from-mass",
                                                        commodity.id(),
                                                        sizeSource(commodity))));
    }

    /** Herbs and what is named for its leaf, where no row says more. */
    private static boolean leafy(Commodity commodity) {
        return commodity.plantPart().equals("herb") || commodity.id().endsWith("-leaf");
    }

    private static Optional<Double> unitMass(Commodity commodity) {
        return geometry(commodity)
                .filter(row -> row.unitMassKg().isPresent())
                .map(row -> row.unitMassKg().getAsDouble());
    }

    private static Optional<GeometryRow> geometry(Commodity commodity) {
        return commodity.body().geometries().stream().findFirst();
    }

    private static Shape shape(GeometryRow row) {
        return switch (row.shape()) {
            case "sphere" -> Shape.SPHERE;
            case "cylinder" -> Shape.CYLINDER;
            case "slab", "leaf" -> Shape.SLAB;
            default ->
                    throw new IllegalArgumentException(
                            "shape '"
                                    + row.shape()
                                    + "'; accepted are sphere, cylinder, slab and leaf");
        };
    }

    private static String heatSource(Commodity commodity) {
        return commodity.body().compositions().get(0).sourceId();
    }

    /** The first of the joined sources. */
    private static String sizeSource(Commodity commodity) {
        String joined = geometry(commodity).map(GeometryRow::sourceIds).orElse("");
        int end = joined.indexOf(';');
        String first = end < 0 ? joined : joined.substring(0, end);
        return first.isBlank() ? "assumption" : first;
    }

    private static <T> WithReasons<T> found(T value, String code, String id, String sourceId) {
        return new WithReasons<>(value, List.of(Reason.about(code, id, sourceId)), false);
    }

    private static <T> WithReasons<T> ofClass(
            ClassValues.Figure<T> figure, String code, Commodity commodity) {
        Reason reason =
                Reason.about(
                        code,
                        commodity.id(),
                        ClassValues.SOURCE,
                        Reason.Argument.text(figure.group()));
        return new WithReasons<>(figure.value(), List.of(reason), true);
    }
}

package org.wardon.produce.rows;

import java.util.OptionalDouble;

/**
 * Shape and size of one item.
 *
 * @param shape {@code sphere}, {@code cylinder}, {@code slab} or {@code leaf}
 * @param characteristicMm radius, or half thickness of slab and leaf, mm; empty where not printed
 * @param lengthMm length, mm
 * @param unitMassKg mass of one item, kg
 * @param densityKgM3 density of the item, kg/m3
 * @param bulkDensityKgM3 bulk density, kg/m3
 * @param sourceIds sources joined by semicolons
 * @param evidence evidence as noted, with its reasons
 */
public record GeometryRow(
        String shape,
        OptionalDouble characteristicMm,
        OptionalDouble lengthMm,
        OptionalDouble unitMassKg,
        OptionalDouble densityKgM3,
        OptionalDouble bulkDensityKgM3,
        String sourceIds,
        String evidence) {}

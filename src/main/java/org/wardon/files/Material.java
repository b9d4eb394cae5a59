package org.wardon.files;

import java.util.OptionalDouble;

/**
 * A building material of the tables, as a plan may name it.
 *
 * @param id its id
 * @param conductivityWmK conductivity, W/(m K); absent where the table has none
 * @param densityKgM3 density, kg/m3; absent where the table has none
 * @param specificHeatJkgK specific heat, J/(kg K); absent where the table has none
 * @param resistanceM2KW resistance of the whole layer, m2 K/W, where the table has that instead of
 *     a conductivity
 * @param solarAbsorptance share of sunlight taken up, 0 to 1; absent where the table has none
 * @param sourceId source of the row
 */
public record Material(
        String id,
        OptionalDouble conductivityWmK,
        OptionalDouble densityKgM3,
        OptionalDouble specificHeatJkgK,
        OptionalDouble resistanceM2KW,
        OptionalDouble solarAbsorptance,
        String sourceId) {}

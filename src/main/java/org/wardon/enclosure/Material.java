package org.wardon.enclosure;

import java.util.OptionalDouble;
import org.wardon.produce.Evidence;

/**
 * A building material of the table: a solid with capacity, a layer that is a resistance alone, or a
 * surface finish.
 *
 * @param id id used in a plan's layers
 * @param name what it is
 * @param conductivityWmK conductivity, W/(m K); empty for a resistance or a finish
 * @param densityKgM3 density, kg/m3; empty for a resistance or a finish
 * @param specificHeatJkgK specific heat, J/(kg K); empty for a resistance or a finish
 * @param solarAbsorptance share of sunshine taken up, 0 to 1; empty where not printed
 * @param resistanceM2KW resistance of the layer as a whole, m2 K/W; empty for a solid
 * @param moisture how vapour and water go through it
 * @param sourceId source
 * @param evidence how it reached us
 * @param note the note of the table
 */
public record Material(
        String id,
        String name,
        OptionalDouble conductivityWmK,
        OptionalDouble densityKgM3,
        OptionalDouble specificHeatJkgK,
        OptionalDouble solarAbsorptance,
        OptionalDouble resistanceM2KW,
        Moisture moisture,
        String sourceId,
        Evidence evidence,
        String note) {
    /**
     * How vapour and water go through a material.
     *
     * @param vapourResistanceFactor resistance to vapour over that of still air; empty where not
     *     printed
     * @param coefficient f of conductivity x exp(f x water content in m3/m3); empty where not
     *     printed
     */
    public record Moisture(OptionalDouble vapourResistanceFactor, OptionalDouble coefficient) {
        /** Nothing printed. */
        public static final Moisture UNKNOWN =
                new Moisture(OptionalDouble.empty(), OptionalDouble.empty());
    }

    /**
     * Returns whether a layer can be made of it.
     *
     * @return true for a solid with conductivity, density and specific heat, and for a resistance
     *     that is no surface film
     */
    public boolean isLayer() {
        boolean solid =
                conductivityWmK.isPresent()
                        && densityKgM3.isPresent()
                        && specificHeatJkgK.isPresent();
        return solid || (resistanceM2KW.isPresent() && !id.startsWith("film-"));
    }
}

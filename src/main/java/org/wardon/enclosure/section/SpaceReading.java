package org.wardon.enclosure.section;

/**
 * How the air of one space of a section carries heat.
 *
 * @param space which
 * @param thicknessM the way the heat goes, m
 * @param differenceK between its two sides, K, taken without sign
 * @param rayleigh Rayleigh number on that thickness
 * @param nusselt Nusselt number, 1 or more
 * @param conductsWmK conductivity by rising and falling air, W/(m K)
 */
public record SpaceReading(
        Space space,
        double thicknessM,
        double differenceK,
        double rayleigh,
        double nusselt,
        double conductsWmK) {
    /** The spaces of air in a section. */
    public enum Space {
        /** Between the left wall and the stack. */
        LEFT,
        /** Between the stack and the right wall. */
        RIGHT,
        /** Between the floor and the stack. */
        BELOW,
        /** From the stack, or from the floor where there is none, to the roof. */
        OPEN
    }
}

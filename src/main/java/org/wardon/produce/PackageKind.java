package org.wardon.produce;

import java.util.Optional;
import org.wardon.errors.Require;

/**
 * A package and the way it is cooled.
 *
 * @param id id of the table of packages, or {@code own} for a half-cooling time given in a plan
 * @param description what it is
 * @param halfCoolingHours time for the sensible heat to fall to half, h
 * @param vapourConductance mass loss in the package over mass loss bare, 1 = bare; above 1 counts
 *     as bare
 * @param tareKgPerKg empty package per kg of produce; absent where not known
 * @param broad whether the time is a broad one not measured on this package
 */
public record PackageKind(
        String id,
        String description,
        Fact halfCoolingHours,
        Fact vapourConductance,
        Optional<Fact> tareKgPerKg,
        boolean broad) {
    /** Refuses a time that is not above 0. */
    public PackageKind {
        Require.that(
                halfCoolingHours.lowest() > 0, "half-cooling time of " + id + " must be above 0 h");
    }
}

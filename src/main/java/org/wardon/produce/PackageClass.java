package org.wardon.produce;

import java.util.Optional;

/**
 * A class of package: how it holds vapour back and what it weighs.
 *
 * @param id id of the table, such as {@code vented-carton}
 * @param heatPath the way heat takes, in words; may be empty
 * @param vapourConductance mass loss in the package over mass loss bare; 1 = bare, above 1 counts
 *     as bare
 * @param tareKgPerKg empty package per kg of produce; empty where not known
 * @param stackHalfThicknessM half the shortest side of a usual stack, m; empty where not known
 */
public record PackageClass(
        String id,
        String heatPath,
        Fact vapourConductance,
        Optional<Fact> tareKgPerKg,
        Optional<Fact> stackHalfThicknessM) {}

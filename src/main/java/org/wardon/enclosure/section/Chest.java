package org.wardon.enclosure.section;

import java.util.EnumMap;
import java.util.Map;
import java.util.Optional;
import org.wardon.enclosure.Box;
import org.wardon.errors.Require;

/**
 * A chamber that no fan stirs, at one moment.
 *
 * @param box inside measures
 * @param cut the way it is cut
 * @param surfaceC inner surfaces at the edges of the section, °C
 * @param stack its load, where there is one
 * @param airHeatW heat given off in its air besides the load, W; below 0 where ice takes more
 * @param airC the one temperature the chamber's model has for its air, °C
 * @param pressurePa air pressure, Pa
 */
public record Chest(
        Box box,
        Cut cut,
        Map<Side, Double> surfaceC,
        Optional<Stack> stack,
        double airHeatW,
        double airC,
        double pressurePa) {
    /** Checks the bounds. */
    public Chest {
        surfaceC = Map.copyOf(new EnumMap<>(surfaceC));
        Require.that(surfaceC.size() == 4, "four surfaces are needed, found " + surfaceC.keySet());
        surfaceC.forEach((side, c) -> Require.within("surface " + side, c, -60, 150, "°C", ""));
        Require.within("airHeatW", airHeatW, -1e6, 1e6, "W", "");
        Require.within("airC", airC, -60, 90, "°C", "");
        Require.within("pressurePa", pressurePa, 3e4, 1.2e5, "Pa", "");
    }

    /**
     * Returns the inner surface at an edge.
     *
     * @param side the edge
     * @return °C
     */
    public double at(Side side) {
        Double found = surfaceC.get(side);
        if (found == null) {
            throw new IllegalArgumentException("no surface " + side);
        }
        return found;
    }

    double widthM() {
        return cut.widthM(box);
    }

    /** Height of the open space, from the stack or the floor to the roof, m. */
    double openM() {
        double below = stack.isEmpty() ? 0 : Stack.clearM(box.heightM()) + stackM();
        return box.heightM() - below;
    }

    /** Height of the stack, m; 0 without one. */
    double stackM() {
        return stack.map(it -> it.heightM(box)).orElse(0.0);
    }

    /** Room the stack takes in the chamber, m3. */
    double stackM3() {
        double length = box.lengthM() - 2 * Stack.clearM(box.lengthM());
        double width = box.widthM() - 2 * Stack.clearM(box.widthM());
        return stackM() * length * width;
    }
}

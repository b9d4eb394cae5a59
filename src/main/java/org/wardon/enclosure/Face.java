package org.wardon.enclosure;

import java.util.List;
import org.wardon.errors.Require;

/**
 * One face of a chamber.
 *
 * @param name which face
 * @param beyond what lies behind it
 * @param azimuthDeg compass direction it looks to, degrees from north by east; not used level
 * @param solarAbsorptance share of sunlight taken up outside, 0 to 1
 * @param layers from outside to inside, at least one
 */
public record Face(
        FaceName name,
        Beyond beyond,
        double azimuthDeg,
        double solarAbsorptance,
        List<Layer> layers) {
    /** Copies the layers and checks the bounds. */
    public Face {
        layers = List.copyOf(layers);
        Require.that(!layers.isEmpty(), "face " + name + " needs at least one layer");
        Require.within("solarAbsorptance of " + name, solarAbsorptance, 0, 1, "", "");
        Require.within("azimuthDeg of " + name, azimuthDeg, -360, 360, "°", "");
    }

    /**
     * Returns whether the face is level.
     *
     * @return true for roof and floor
     */
    public boolean level() {
        return name == FaceName.ROOF || name == FaceName.FLOOR;
    }
}

package org.wardon.enclosure;

import org.wardon.errors.Require;

/**
 * Inside measures of a chamber.
 *
 * @param lengthM inside length, along north and south, m
 * @param widthM inside width, along east and west, m
 * @param heightM inside height, m
 */
public record Box(double lengthM, double widthM, double heightM) {
    /** Checks the bounds. */
    public Box {
        Require.within("lengthM", lengthM, 0.2, 200, "m", "Give the inside measure.");
        Require.within("widthM", widthM, 0.2, 200, "m", "Give the inside measure.");
        Require.within("heightM", heightM, 0.2, 30, "m", "Give the inside measure.");
    }

    /**
     * Returns the inside area of a face.
     *
     * @param name the face
     * @return m2
     */
    public double areaM2(FaceName name) {
        return switch (name) {
            case ROOF, FLOOR -> lengthM * widthM;
            case NORTH, SOUTH -> lengthM * heightM;
            case EAST, WEST -> widthM * heightM;
        };
    }

    /**
     * Returns the gross inside volume.
     *
     * @return m3
     */
    public double volumeM3() {
        return lengthM * widthM * heightM;
    }
}

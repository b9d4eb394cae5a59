package org.wardon.enclosure.section;

import org.wardon.enclosure.Box;
import org.wardon.enclosure.FaceName;

/** The way a chamber is cut upright to look at its section. */
public enum Cut {
    /** From the west wall to the east wall. */
    WEST_EAST(FaceName.WEST, FaceName.EAST),
    /** From the south wall to the north wall. */
    SOUTH_NORTH(FaceName.SOUTH, FaceName.NORTH);

    private final FaceName left;
    private final FaceName right;

    Cut(FaceName left, FaceName right) {
        this.left = left;
        this.right = right;
    }

    /**
     * Returns the face at an edge of the section.
     *
     * @param side the edge
     * @return the face
     */
    public FaceName face(Side side) {
        return switch (side) {
            case LEFT -> left;
            case RIGHT -> right;
            case FLOOR -> FaceName.FLOOR;
            case ROOF -> FaceName.ROOF;
        };
    }

    /**
     * Returns how wide the section is.
     *
     * @param box inside measures
     * @return m
     */
    public double widthM(Box box) {
        return this == WEST_EAST ? box.lengthM() : box.widthM();
    }

    /**
     * Returns how far the chamber goes on before and behind the section.
     *
     * @param box inside measures
     * @return m
     */
    public double depthM(Box box) {
        return this == WEST_EAST ? box.widthM() : box.lengthM();
    }
}

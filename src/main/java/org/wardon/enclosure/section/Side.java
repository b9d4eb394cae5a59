package org.wardon.enclosure.section;

/** The four edges of a section. */
public enum Side {
    /** Where x is 0. */
    LEFT,
    /** Where x is the width. */
    RIGHT,
    /** Where y is 0. */
    FLOOR,
    /** Where y is the height. */
    ROOF;

    /**
     * Returns whether the edge stands upright.
     *
     * @return true for left and right
     */
    public boolean upright() {
        return this == LEFT || this == RIGHT;
    }
}

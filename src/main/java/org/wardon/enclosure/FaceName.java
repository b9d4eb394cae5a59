package org.wardon.enclosure;

/** The six faces of a chamber. */
public enum FaceName {
    /** Roof. */
    ROOF,
    /** Floor. */
    FLOOR,
    /** North wall, {@code lengthM} long. */
    NORTH,
    /** East wall, {@code widthM} long. */
    EAST,
    /** South wall, {@code lengthM} long. */
    SOUTH,
    /** West wall, {@code widthM} long. */
    WEST
}

package org.wardon.enclosure;

/** Direction of the heat flow through a face. */
public enum HeatFlow {
    /** Upwards: a floor colder than the air above, or a roof under a warmer chamber. */
    UP,
    /** Level, through walls. */
    LEVEL,
    /** Downwards: a hot roof over a cold chamber. */
    DOWN;

    /**
     * Returns the direction through a face.
     *
     * @param face the face
     * @param outsideC mean temperature beyond it, °C
     * @param insideC mean temperature in the chamber, °C
     * @return level for walls
     */
    public static HeatFlow through(FaceName face, double outsideC, double insideC) {
        return switch (face) {
            case ROOF -> outsideC > insideC ? DOWN : UP;
            case FLOOR -> outsideC > insideC ? UP : DOWN;
            default -> LEVEL;
        };
    }
}

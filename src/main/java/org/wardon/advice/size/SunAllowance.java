package org.wardon.advice.size;

import org.wardon.enclosure.FaceName;
import org.wardon.errors.Require;

/**
 * What sunshine adds to the temperature difference across a face, in a design load.
 *
 * <p>Source: ASHRAE Handbook - Refrigeration, allowance for sun effect (from memory), internal
 * loads, rows solar_*. Which absorptance counts as light, medium or dark is ours (assumption: 0.4
 * and 0.7, after the surfaces the table names).
 */
public enum SunAllowance {
    /** White stone, light cement, white paint. */
    LIGHT(3, 2, 5),
    /** Brick, red tile, dark cement, grey or green paint. */
    MEDIUM(4, 3, 9),
    /** Tar, slate, black paint. */
    DARK(5, 3, 11);

    private static final double LIGHT_BELOW = 0.4;
    private static final double DARK_FROM = 0.7;

    private final double eastWestK;
    private final double equatorK;
    private final double roofK;

    SunAllowance(double eastWestK, double equatorK, double roofK) {
        this.eastWestK = eastWestK;
        this.equatorK = equatorK;
        this.roofK = roofK;
    }

    /**
     * Returns the class of a surface.
     *
     * @param solarAbsorptance share of sunlight taken up, 0 to 1
     * @return its class
     */
    public static SunAllowance of(double solarAbsorptance) {
        Require.within("solarAbsorptance", solarAbsorptance, 0, 1, "", "");
        return solarAbsorptance < LIGHT_BELOW
                ? LIGHT
                : solarAbsorptance < DARK_FROM ? MEDIUM : DARK;
    }

    /**
     * Returns the allowance of a face.
     *
     * @param face which
     * @param latitudeDeg latitude of the site, north positive; tells which wall looks to the
     *     equator
     * @return K; 0 for a floor and the wall that looks away from the equator
     */
    public double kelvin(FaceName face, double latitudeDeg) {
        return switch (face) {
            case ROOF -> roofK;
            case EAST, WEST -> eastWestK;
            case SOUTH -> latitudeDeg >= 0 ? equatorK : 0;
            case NORTH -> latitudeDeg < 0 ? equatorK : 0;
            case FLOOR -> 0;
        };
    }
}

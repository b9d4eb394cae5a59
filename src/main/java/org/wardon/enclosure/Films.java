package org.wardon.enclosure;

import org.wardon.errors.Require;

/**
 * Surface resistances, convection and radiation together.
 *
 * <p>Source: ISO 6946:2017, table 7 and annex C (from memory).
 */
public final class Films {
    /** Outdoor surface where the wind is not known, and surfaces in shade, m2 K/W. */
    public static final double OUTSIDE_M2KW = 0.04;

    private static final double UP_M2KW = 0.10;
    private static final double LEVEL_M2KW = 0.13;
    private static final double DOWN_M2KW = 0.17;

    /** Radiant part of an outdoor film, of a surface near 20 °C, W/(m2 K). */
    public static final double OUTDOOR_RADIATION_WM2K = 5.5;

    private Films() {}

    /**
     * Returns the resistance of a surface in still air.
     *
     * @param direction direction of the heat flow
     * @return m2 K/W
     */
    public static double insideM2KW(HeatFlow direction) {
        return switch (direction) {
            case UP -> UP_M2KW;
            case LEVEL -> LEVEL_M2KW;
            case DOWN -> DOWN_M2KW;
        };
    }

    /**
     * Returns the resistance of an outdoor surface: 1/(4 + 4v + 5.5) where the wind is known.
     *
     * @param windMs wind, m/s, 0 or more; NaN where not known
     * @return m2 K/W
     */
    public static double outsideM2KW(double windMs) {
        if (Double.isNaN(windMs)) {
            return OUTSIDE_M2KW;
        }
        Require.within("windMs", windMs, 0, 100, "m/s", "Give the wind speed, or none.");
        return 1 / (4 + 4 * windMs + OUTDOOR_RADIATION_WM2K);
    }

    /**
     * Returns the resistance of an inner surface by natural convection and radiation, where a plan
     * asks for computed films instead of the fixed ones.
     *
     * @param face the face
     * @param box inside measures
     * @param surfaceC its mean surface, °C
     * @param airC mean air of the chamber, °C
     * @param pressurePa air pressure, Pa
     * @return m2 K/W
     */
    public static double computedM2KW(
            FaceName face, Box box, double surfaceC, double airC, double pressurePa) {
        double convection = NaturalConvection.filmWm2K(face, box, surfaceC, airC, pressurePa);
        return 1 / (convection + RadiantFilm.wattsM2K(0.5 * (surfaceC + airC)));
    }
}

package org.wardon.heat.laws;

/**
 * Water lying free on a surface: how much of the surface it wets, and corners rounded so that rates
 * have no jump.
 */
public final class FreeWater {
    /** A film this thick wets all of a surface, kg/m2 (assumption: 0.05 mm). */
    public static final double FULL_KG_M2 = 0.05;

    /** More than this runs off a face, kg/m2 (assumption: 0.2 mm). */
    public static final double FACE_HOLDS_KG_M2 = 0.2;

    /** What a face cannot hold runs off over this time, s (assumption). */
    public static final double RUNS_OFF_S = 900;

    /**
     * Differences of vapour pressure are rounded within this of 0, Pa: 0.06 K of dew point at 10
     * °C.
     */
    public static final double ROUND_PA = 5;

    private FreeWater() {}

    /**
     * Returns the share of a surface that is wet.
     *
     * @param fullness water over the water that wets all
     * @return 0 dry, 1 wet; below 0 only where rounding made the water so
     */
    public static double wetShare(double fullness) {
        if (fullness >= 1) {
            return 1;
        }
        return fullness <= 0 ? 2 * fullness : fullness * (2 - fullness);
    }

    /**
     * Returns the slope of {@link #wetShare}.
     *
     * @param fullness water over the water that wets all
     * @return slope by fullness
     */
    public static double wetShareSlope(double fullness) {
        if (fullness >= 1) {
            return 0;
        }
        return fullness <= 0 ? 2 : 2 - 2 * fullness;
    }

    /**
     * Returns the larger of x and 0, rounded within a width of 0.
     *
     * @param x value
     * @param width half width of the rounding, in the unit of x
     * @return 0 below -width, x above width
     */
    public static double positive(double x, double width) {
        if (x <= -width) {
            return 0;
        }
        return x >= width ? x : (x + width) * (x + width) / (4 * width);
    }

    /**
     * Returns the slope of {@link #positive}.
     *
     * @param x value
     * @param width half width of the rounding, in the unit of x
     * @return 0 to 1
     */
    public static double positiveSlope(double x, double width) {
        if (x <= -width) {
            return 0;
        }
        return x >= width ? 1 : (x + width) / (2 * width);
    }
}

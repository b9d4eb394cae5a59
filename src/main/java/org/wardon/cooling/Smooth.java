package org.wardon.cooling;

/**
 * Corners rounded so that a function and its slope are continuous: what the solver's error control
 * needs. Outside the rounding they equal the sharp form exactly.
 */
final class Smooth {
    private Smooth() {}

    /** 0 below 0, 1 above 1, a cubic with level ends between. */
    static double step(double u) {
        double x = Math.min(Math.max(u, 0), 1);
        return x * x * (3 - 2 * x);
    }

    static double stepSlope(double u) {
        return u <= 0 || u >= 1 ? 0 : 6 * u * (1 - u);
    }

    /** The larger of x and 0, rounded within {@code width} of 0. */
    static double positive(double x, double width) {
        if (x <= -width) {
            return 0;
        }
        return x >= width ? x : (x + width) * (x + width) / (4 * width);
    }

    static double positiveSlope(double x, double width) {
        if (x <= -width) {
            return 0;
        }
        return x >= width ? 1 : (x + width) / (2 * width);
    }
}

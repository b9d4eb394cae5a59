package org.wardon.enclosure.section;

import org.apache.commons.math3.analysis.solvers.BrentSolver;

/**
 * Series of a rectangle whose warm side is the roof, 1 there and 0 beyond the other edges, with
 * films on all four. Written apart from the program, for checks.
 */
final class SectionSeries {
    private static final int TERMS = 60;

    private final double widthM;
    private final double heightM;
    private final double conductivityWmK;
    private final double[] filmsWm2K;
    private final double[] roots = new double[TERMS];

    /** Films of left, right, floor and roof, W/(m2 K). */
    SectionSeries(double widthM, double heightM, double conductivityWmK, double[] filmsWm2K) {
        this.widthM = widthM;
        this.heightM = heightM;
        this.conductivityWmK = conductivityWmK;
        this.filmsWm2K = filmsWm2K.clone();
        double left = filmsWm2K[0] / conductivityWmK;
        double right = filmsWm2K[1] / conductivityWmK;
        for (int n = 0; n < TERMS; n++) {
            // One root in each span of pi of the phase: w a - atan(left/w) - atan(right/w) = n pi.
            int turns = n;
            roots[n] =
                    new BrentSolver(1e-15, 1e-14)
                            .solve(
                                    200,
                                    w ->
                                            w * widthM
                                                    - Math.atan(left / w)
                                                    - Math.atan(right / w)
                                                    - turns * Math.PI,
                                    1e-9,
                                    (n + 1) * Math.PI / widthM);
        }
    }

    double widthM() {
        return widthM;
    }

    double heightM() {
        return heightM;
    }

    double conductivityWmK() {
        return conductivityWmK;
    }

    double[] filmsWm2K() {
        return filmsWm2K.clone();
    }

    private double across(double w, double x) {
        return Math.cos(w * x) + filmsWm2K[0] / conductivityWmK / w * Math.sin(w * x);
    }

    double at(double x, double y) {
        double floor = filmsWm2K[2] / conductivityWmK;
        double roof = filmsWm2K[3] / conductivityWmK;
        double left = filmsWm2K[0] / conductivityWmK;
        double sum = 0;
        for (double w : roots) {
            double a = widthM;
            double whole = Math.sin(w * a) / w + left / (w * w) * (1 - Math.cos(w * a));
            double squared =
                    a / 2
                            + Math.sin(2 * w * a) / (4 * w)
                            + left * left / (w * w) * (a / 2 - Math.sin(2 * w * a) / (4 * w))
                            + left / (w * w) * Math.sin(w * a) * Math.sin(w * a);
            // Upwards cosh + (floor/w) sinh, over what the roof asks for; scaled against overflow.
            double up = rising(w, y, floor / w);
            double grows = w * slope(w, floor / w) + roof * rising(w, heightM, floor / w);
            sum += whole / squared * across(w, x) * up / grows * roof;
        }
        return sum;
    }

    private double rising(double w, double y, double share) {
        double up = Math.exp(w * (y - heightM));
        double down = Math.exp(-w * (y + heightM));
        return 0.5 * ((1 + share) * up + (1 - share) * down);
    }

    private double slope(double w, double share) {
        double down = Math.exp(-2 * w * heightM);
        return 0.5 * ((1 + share) - (1 - share) * down);
    }

    /** Edges at fixed temperatures, the roof 1, all else 0. */
    static double fixed(double x, double y, double a, double b) {
        double sum = 0;
        for (int n = 1; n < 400; n += 2) {
            double w = n * Math.PI / a;
            double share =
                    Math.exp(w * (y - b)) * (1 - Math.exp(-2 * w * y)) / (1 - Math.exp(-2 * w * b));
            sum += Math.sin(w * x) * share / n;
        }
        return 4 / Math.PI * sum;
    }
}

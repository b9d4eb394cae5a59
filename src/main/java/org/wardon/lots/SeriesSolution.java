package org.wardon.lots;

import java.util.function.DoubleUnaryOperator;
import org.apache.commons.math3.analysis.solvers.BrentSolver;
import org.apache.commons.math3.special.BesselJ;
import org.wardon.errors.Require;

/**
 * A slab, long cylinder or sphere of one temperature put into a medium of another: the exact
 * series.
 *
 * <p>All temperatures are shares of the starting difference: (T - T medium)/(T start - T medium).
 * The Fourier number is diffusivity times time over radius (half thickness) squared, the Biot
 * number film coefficient times radius over conductivity; an infinite Biot number is no film at
 * all.
 *
 * <p>Source: Carslaw and Jaeger 1959; Incropera and DeWitt, Fundamentals of Heat and Mass Transfer,
 * chapter 5: sphere 1 - z cot z = Bi, cylinder z J1(z) = Bi J0(z), slab z tan z = Bi.
 */
public final class SeriesSolution {
    private static final int TERMS = 60;
    private static final double LN10 = Math.log(10);

    /** The longest Fourier number looked at when a time is sought, in units of (1 + 1/Bi). */
    private static final double LONGEST = 50;

    private final Shape shape;
    private final double lag;
    private final double[] root = new double[TERMS];
    private final double[] coefficient = new double[TERMS];

    private SeriesSolution(Shape shape, double biot) {
        this.shape = shape;
        lag = 1 + 1 / biot;
        for (int n = 0; n < TERMS; n++) {
            root[n] = root(shape, biot, n + 1);
            coefficient[n] = coefficient(shape, root[n]);
        }
    }

    /**
     * Returns the series of a body in a medium.
     *
     * @param shape the body
     * @param biot Biot number, 0.001 or more, {@link Double#POSITIVE_INFINITY} for none but the
     *     body's own resistance
     * @return the series, 60 terms; good from Fourier number 0.001 on
     */
    public static SeriesSolution of(Shape shape, double biot) {
        Require.that(biot >= 1e-3, "Biot number " + biot + " is below 0.001; use a uniform body.");
        return new SeriesSolution(shape, biot);
    }

    /**
     * Returns a root of the boundary condition.
     *
     * @param n 1 for the first, up to 60
     * @return rad
     */
    public double eigenvalue(int n) {
        return root[n - 1];
    }

    /**
     * Returns the coefficient of a term at the centre; that of the first is the lag factor j there.
     *
     * @param n 1 for the first, up to 60
     * @return share of the starting difference
     */
    public double coefficient(int n) {
        return coefficient[n - 1];
    }

    /**
     * Returns the time for the slow end of the curve to fall to a tenth.
     *
     * <p>Source: ASHRAE Handbook - Refrigeration 2006, chapter 10: f alpha/L2 = ln 10/z1 squared.
     *
     * @return Fourier number
     */
    public double fFactor() {
        return LN10 / (root[0] * root[0]);
    }

    /**
     * Returns the temperature at a place.
     *
     * @param place 0 centre to 1 surface, share of the radius
     * @param fourier Fourier number, 0.001 or more
     * @return share of the starting difference
     */
    public double at(double place, double fourier) {
        double sum = 0;
        for (int n = 0; n < TERMS; n++) {
            sum += coefficient[n] * decay(n, fourier) * profile(shape, root[n] * place);
        }
        return sum;
    }

    /**
     * Returns the mass-average temperature.
     *
     * @param fourier Fourier number, 0.001 or more
     * @return share of the starting difference
     */
    public double mean(double fourier) {
        double sum = 0;
        for (int n = 0; n < TERMS; n++) {
            sum += coefficient[n] * decay(n, fourier) * meanProfile(shape, root[n]);
        }
        return sum;
    }

    /**
     * Returns when the centre has come down to a share.
     *
     * @param share share of the starting difference, above 0 and below 1
     * @return Fourier number
     */
    public double fourierWhenCentre(double share) {
        return when(fourier -> at(0, fourier) - share);
    }

    /**
     * Returns when the mass average has come down to a share.
     *
     * @param share share of the starting difference, above 0, at most 0.9
     * @return Fourier number
     */
    public double fourierWhenMean(double share) {
        return when(fourier -> mean(fourier) - share);
    }

    private double when(DoubleUnaryOperator above) {
        return new BrentSolver(1e-12, 1e-12).solve(500, above::applyAsDouble, 1e-4, LONGEST * lag);
    }

    private double decay(int n, double fourier) {
        return Math.exp(-root[n] * root[n] * fourier);
    }

    private static double root(Shape shape, double biot, int n) {
        boolean bare = Double.isInfinite(biot);
        double tiny = 1e-9;
        return switch (shape) {
            case SLAB ->
                    bare
                            ? (n - 0.5) * Math.PI
                            : between(
                                    z -> z * Math.sin(z) - biot * Math.cos(z),
                                    (n - 1) * Math.PI + tiny,
                                    (n - 0.5) * Math.PI);
            case CYLINDER -> bare ? besselZero(0, n) : cylinderRoot(biot, n);
            case SPHERE ->
                    bare
                            ? n * Math.PI
                            : between(
                                    z -> (1 - biot) * Math.sin(z) - z * Math.cos(z),
                                    (n - 1) * Math.PI + tiny,
                                    n * Math.PI);
        };
    }

    private static double cylinderRoot(double biot, int n) {
        double low = n == 1 ? 1e-9 : besselZero(1, n - 1);
        return between(z -> z * j(1, z) - biot * j(0, z), low, besselZero(0, n));
    }

    /** J0 has its n-th zero between (n - 1/2) and n half turns, J1 between n and n + 1/2. */
    private static double besselZero(int order, int n) {
        double low = (n - 0.5 + 0.5 * order) * Math.PI;
        return between(z -> j(order, z), low, low + 0.5 * Math.PI);
    }

    private static double between(DoubleUnaryOperator function, double low, double high) {
        return new BrentSolver(1e-14, 1e-13).solve(200, function::applyAsDouble, low, high);
    }

    private static double coefficient(Shape shape, double z) {
        double sin = Math.sin(z);
        return switch (shape) {
            case SLAB -> 4 * sin / (2 * z + Math.sin(2 * z));
            case CYLINDER -> 2 / z * j(1, z) / (j(0, z) * j(0, z) + j(1, z) * j(1, z));
            case SPHERE -> 4 * (sin - z * Math.cos(z)) / (2 * z - Math.sin(2 * z));
        };
    }

    private static double profile(Shape shape, double z) {
        return switch (shape) {
            case SLAB -> Math.cos(z);
            case CYLINDER -> j(0, z);
            case SPHERE -> z < 1e-6 ? 1 : Math.sin(z) / z;
        };
    }

    private static double meanProfile(Shape shape, double z) {
        return switch (shape) {
            case SLAB -> Math.sin(z) / z;
            case CYLINDER -> 2 * j(1, z) / z;
            case SPHERE -> 3 * (Math.sin(z) - z * Math.cos(z)) / (z * z * z);
        };
    }

    private static double j(int order, double z) {
        return BesselJ.value(order, z);
    }
}

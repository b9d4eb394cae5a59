package org.wardon.keeping.pooling;

import java.util.List;
import java.util.function.ToDoubleFunction;
import org.apache.commons.math3.distribution.NormalDistribution;
import org.apache.commons.math3.linear.Array2DRowRealMatrix;
import org.apache.commons.math3.linear.ArrayRealVector;
import org.apache.commons.math3.linear.CholeskyDecomposition;
import org.apache.commons.math3.linear.RealVector;
import org.wardon.keeping.pooling.LifePoint.Trial;

/**
 * What all figures together say of each slope: the best linear unbiased prediction of a model whose
 * levels and slopes are drawn to each other as {@link Likeness} says. A bound is put where the
 * model expects the life beyond it, and moved until that agrees with itself (the expectation step
 * of censored regression).
 */
public final class PooledLives {
    private static final int MOST_ROUNDS = 200;
    private static final double SETTLED = 1e-7;
    private static final NormalDistribution NORMAL = new NormalDistribution(null, 0, 1);

    private final List<LifePoint> points;
    private final Likeness likeness;
    private final CholeskyDecomposition factor;
    private final double[] lnDays;
    private RealVector weights;

    /**
     * Fits.
     *
     * @param points the figures
     * @param deviations how much lives differ
     */
    public PooledLives(List<LifePoint> points, Deviations deviations) {
        this.points = List.copyOf(points);
        likeness = new Likeness(deviations);
        factor = factor(points, likeness);
        lnDays = points.stream().mapToDouble(LifePoint::lnDays).toArray();
        weights = solved();
        for (int round = 0; round < MOST_ROUNDS && moveBounds() > SETTLED; round++) {
            weights = solved();
        }
    }

    static CholeskyDecomposition factor(List<LifePoint> points, Likeness likeness) {
        int n = points.size();
        double[][] covariance = new double[n][n];
        for (int i = 0; i < n; i++) {
            for (int j = 0; j <= i; j++) {
                covariance[i][j] = likeness.between(points.get(i), points.get(j));
                covariance[j][i] = covariance[i][j];
            }
            covariance[i][i] += likeness.noise(points.get(i));
        }
        return new CholeskyDecomposition(new Array2DRowRealMatrix(covariance, false));
    }

    private RealVector solved() {
        double[] off = new double[lnDays.length];
        for (int i = 0; i < off.length; i++) {
            off[i] = lnDays[i] - Likeness.expected(points.get(i));
        }
        return factor.getSolver().solve(new ArrayRealVector(off, false));
    }

    private double moveBounds() {
        double moved = 0;
        for (int i = 0; i < lnDays.length; i++) {
            LifePoint point = points.get(i);
            if (point.exact()) {
                continue;
            }
            double noise = Math.sqrt(likeness.noise(point));
            double fitted = lnDays[i] - noise * noise * weights.getEntry(i);
            double beyond = beyond(point, fitted, noise);
            moved = Math.max(moved, Math.abs(beyond - lnDays[i]));
            lnDays[i] = beyond;
        }
        return moved;
    }

    /** Mean of a life known to lie beyond a bound. */
    private static double beyond(LifePoint point, double fitted, double noise) {
        double side = point.kind() == LifePoint.Kind.AT_LEAST ? 1 : -1;
        double z = side * (point.lnDays() - fitted) / noise;
        double left = NORMAL.cumulativeProbability(-z);
        double hazard = left > 1e-12 ? NORMAL.density(z) / left : z + 1 / z;
        return fitted + side * noise * hazard;
    }

    /**
     * Returns the slope of a trial's curve.
     *
     * @param trial what it speaks of; need not be among the points
     * @return slope, kJ/mol, higher for crops that suffer more from warmth
     */
    public double slopeKJMol(Trial trial) {
        return Likeness.expectedSlope(trial) + likenessTo(trial).dotProduct(weights);
    }

    /**
     * Returns how well that slope is known.
     *
     * @param trial what it speaks of
     * @return standard deviation, kJ/mol
     */
    public double slopeDeviationKJMol(Trial trial) {
        RealVector shared = likenessTo(trial);
        double seen = shared.dotProduct(factor.getSolver().solve(shared));
        return Math.sqrt(Math.max(0, likeness.slopes(trial, trial) - seen));
    }

    private RealVector likenessTo(Trial trial) {
        return vector(
                point -> likeness.slopes(trial, point.of()) * Likeness.x(point.temperatureC()));
    }

    private RealVector vector(ToDoubleFunction<LifePoint> value) {
        return new ArrayRealVector(points.stream().mapToDouble(value).toArray(), false);
    }

    /**
     * Returns the life the fit gives at each point, the source's own level included.
     *
     * @return {@code [point]}, ln days
     */
    public double[] fittedLnDays() {
        double[] fitted = lnDays.clone();
        for (int i = 0; i < fitted.length; i++) {
            fitted[i] -= likeness.noise(points.get(i)) * weights.getEntry(i);
        }
        return fitted;
    }
}

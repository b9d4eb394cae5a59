package org.wardon.keeping.pooling;

import java.util.List;
import org.apache.commons.math3.linear.ArrayRealVector;
import org.apache.commons.math3.linear.CholeskyDecomposition;
import org.apache.commons.math3.optim.InitialGuess;
import org.apache.commons.math3.optim.MaxEval;
import org.apache.commons.math3.optim.SimpleValueChecker;
import org.apache.commons.math3.optim.nonlinear.scalar.GoalType;
import org.apache.commons.math3.optim.nonlinear.scalar.ObjectiveFunction;
import org.apache.commons.math3.optim.nonlinear.scalar.noderiv.NelderMeadSimplex;
import org.apache.commons.math3.optim.nonlinear.scalar.noderiv.SimplexOptimizer;

/**
 * Finds the deviations under which the published lives are likeliest; bounds take no part. Each
 * deviation is drawn to the usual one as if that were known within a factor of two.
 */
public final class DeviationSearch {
    private static final double LN_TWO = Math.log(2);
    private static final int MOST_TRIES = 400;
    private static final double ENOUGH = 1e-3;
    private static final double FIRST_STEP = 0.2;

    private DeviationSearch() {}

    /**
     * Returns the likeliest deviations.
     *
     * @param points the figures
     * @return deviations; the same points give the same answer
     */
    public static Deviations of(List<LifePoint> points) {
        List<LifePoint> exact = points.stream().filter(LifePoint::exact).toList();
        double[] usual = Deviations.USUAL.logarithms();
        double[] steps = new double[usual.length];
        java.util.Arrays.fill(steps, FIRST_STEP);
        return Deviations.ofLogarithms(
                new SimplexOptimizer(new SimpleValueChecker(ENOUGH, ENOUGH))
                        .optimize(
                                new MaxEval(10 * MOST_TRIES),
                                new InitialGuess(usual),
                                GoalType.MINIMIZE,
                                new NelderMeadSimplex(steps),
                                new ObjectiveFunction(ln -> unlikely(exact, ln, usual)))
                        .getPoint());
    }

    private static double unlikely(List<LifePoint> points, double[] ln, double[] usual) {
        Likeness likeness = new Likeness(Deviations.ofLogarithms(ln));
        CholeskyDecomposition factor = PooledLives.factor(points, likeness);
        double[] off = new double[points.size()];
        double sum = 0;
        for (int i = 0; i < off.length; i++) {
            off[i] = points.get(i).lnDays() - Likeness.expected(points.get(i));
            sum += Math.log(factor.getL().getEntry(i, i));
        }
        ArrayRealVector y = new ArrayRealVector(off, false);
        sum += 0.5 * y.dotProduct(factor.getSolver().solve(y));
        for (int k = 0; k < ln.length; k++) {
            double away = (ln[k] - usual[k]) / LN_TWO;
            sum += 0.5 * away * away;
        }
        return sum;
    }
}

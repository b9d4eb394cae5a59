package org.wardon.keeping;

import java.util.ArrayList;
import java.util.List;
import java.util.SplittableRandom;
import org.apache.commons.math3.random.SobolSequenceGenerator;
import org.wardon.errors.Require;

/**
 * Numbered draws spread evenly over all ranges.
 *
 * <p>Source: Sobol points (Joe and Kuo directions, as carried by Commons Math), shifted modulo 1 by
 * a seeded point (Cranley and Patterson 1976).
 */
public final class Draws {
    private static final double SMALLEST = 0x1p-33;

    private Draws() {}

    /**
     * Returns draws 1 to {@code count}; the same seed gives the same draws, and a longer list
     * begins with the shorter one.
     *
     * @param seed the plan's seed
     * @param count how many, 1 to 65 536
     * @return the draws in order of their numbers
     */
    public static List<Draw> seeded(long seed, int count) {
        Require.within("count", count, 1, 65_536, "draws", "32 are usual.");
        SplittableRandom random = new SplittableRandom(seed);
        double[] shift = random.doubles(Draw.RANGES).toArray();
        SobolSequenceGenerator sobol = new SobolSequenceGenerator(Draw.RANGES);
        List<Draw> draws = new ArrayList<>(count);
        for (int number = 1; number <= count; number++) {
            draws.add(Draw.of(number, shifted(sobol.nextVector(), shift)));
        }
        return List.copyOf(draws);
    }

    private static double[] shifted(double[] point, double[] shift) {
        double[] quantiles = new double[point.length];
        for (int i = 0; i < point.length; i++) {
            double q = (point[i] + shift[i]) % 1;
            quantiles[i] = Math.min(Math.max(q, SMALLEST), 1 - SMALLEST);
        }
        return quantiles;
    }
}
